// Tightening loses no pair of any blend under the limit.
import { expect, test } from "vitest";
import { buildCapacityBound } from "../../../src/search/blend/capacityBound.ts";
import { buildCore } from "../../../src/search/blend/core.ts";
import { BOUND_SLACK } from "../../../src/search/blend/dual.ts";
import { NO_PRICES } from "../../../src/search/blend/findBlend.ts";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { tightenCore } from "../../../src/search/blend/tightenCore.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { anyPrices, tinyModel } from "../../support/blendModels.ts";

test("tightenCore: 200 models, every cheapest blend keeps its pairs, and pairs do go", () => {
  let gone = 0;
  for (let seed = 0; seed < 200; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    if (best === null) continue;
    const core = buildCore(model, buildPool(model, null, true), NO_PRICES, 1e9);
    const bound = buildCapacityBound(core, 50, { ...anyPrices(seed, best / 10), cost: 1 });
    const tight = tightenCore(core, bound, best + BOUND_SLACK);
    gone += core.pairs - tight.pairs;
    const pairs = new Set(tight.columns.flatMap((c) => [...c.strings].map((x) => `${c.option}:${x}`)));
    bruteForce(model, (counts, cost) => {
      if (cost > best) return;
      const spare = counts.some(({ option }) => {
        const capacity = counts.reduce((sum, c) => sum + c.strings * model.options[c.option]!.capacity, 0);
        return capacity - model.options[option]!.capacity >= model.requirement * (1 - 1e-9);
      });
      if (!spare) for (const { option, strings } of counts) expect(pairs.has(`${option}:${strings}`)).toBe(true);
    });
  }
  expect(gone).toBeGreaterThan(200);
});
