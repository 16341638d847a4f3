// No blend under the threshold loses an option or a count to the core.
import { expect, test } from "vitest";
import { ascendCost } from "../../../src/search/blend/ascent.ts";
import { buildCore, standing, survivingOptions } from "../../../src/search/blend/core.ts";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { tinyModel } from "../../support/blendModels.ts";

test("buildCore keeps every (option, count) of every blend that costs less: 150 models, all their blends", () => {
  let blends = 0;
  let dropped = 0;
  for (let seed = 0; seed < 150; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    if (best === null) continue;
    const threshold = Math.ceil(best * 1.3) + 1;
    const pool = buildPool(model, null, true);
    const { prices } = ascendCost(pool, model.maxTypes, Number.POSITIVE_INFINITY);
    const options = survivingOptions(pool, standing(pool, prices, model.maxTypes), threshold);
    const core = buildCore(model, pool, prices, threshold);
    const pairs = new Set(core.columns.flatMap((c) => [...c.strings].map((x) => `${c.option}:${x}`)));
    expect(pairs.size).toBe(core.pairs);
    dropped += model.options.reduce((sum, o) => sum + o.maxStrings, 0) - core.pairs;
    bruteForce(model, (counts, cost) => {
      if (cost >= threshold) return;
      // A count beyond what the others leave to be met, or worse than a smaller blend, is not of use and may go.
      const minimal = counts.every(({ option, strings }) => {
        const capacity = counts.reduce((sum, c) => sum + c.strings * model.options[c.option]!.capacity, 0);
        return strings === 0 || capacity - model.options[option]!.capacity < model.requirement * (1 - 1e-9);
      });
      if (!minimal) return;
      blends += 1;
      for (const { option, strings } of counts) {
        expect(options).toContain(option);
        expect(pairs.has(`${option}:${strings}`)).toBe(true);
      }
    });
  }
  expect(blends).toBeGreaterThan(50);
  expect(dropped).toBeGreaterThan(100);
});
