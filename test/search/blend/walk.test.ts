// The walk meets the cheapest blend of a whole core, with and without its bounds, and says when it was cut off.
import { expect, test } from "vitest";
import { ascendFeasibility } from "../../../src/search/blend/ascent.ts";
import { buildCapacityBound } from "../../../src/search/blend/capacityBound.ts";
import { buildCore } from "../../../src/search/blend/core.ts";
import { isFittingBlend } from "../../../src/search/blend/evaluate.ts";
import { NO_PRICES } from "../../../src/search/blend/findBlend.ts";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { type Walk, walkCore } from "../../../src/search/blend/walk.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { inventInstance } from "../../support/blendInstances.ts";
import { anyPrices, tinyModel } from "../../support/blendModels.ts";

const budget = (most = 1e9, stop = () => false) => ({ spent: 0, most, stop });

test("walkCore: 300 models, whole core: the brute-force cost, plain and with the capacity bound and feasibility prices", () => {
  for (let seed = 0; seed < 300; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    const pool = buildPool(model, null, true);
    const core = buildCore(model, pool, NO_PRICES, 1e9);
    const bound = buildCapacityBound(core, 40, anyPrices(seed, best ?? 50));
    const feasibility = ascendFeasibility(pool, model.maxTypes).prices;
    for (const extra of [
      { bound: null, feasibility: null },
      { bound, feasibility },
    ]) {
      let least: number | null = null;
      const end = walkCore({
        core,
        threshold: 1e9,
        budget: budget(),
        most: 1e9,
        ...extra,
        found: (counts, cost) => {
          expect(isFittingBlend(model, counts)).toBe(true);
          least = cost;
          return cost;
        },
      });
      expect(end).toBe("complete");
      expect(least).toBe(best);
    }
  }
});

test("walkCore is capped by its own share and stopped by the budget or the callback", () => {
  const { model } = inventInstance({ parts: 20, seed: 4, maxTypes: 4 });
  const core = buildCore(model, buildPool(model, null, true), NO_PRICES, 1e9);
  const walk = (extra: Partial<Walk>) =>
    walkCore({
      core,
      threshold: 1e9,
      feasibility: null,
      bound: null,
      budget: budget(),
      most: 1e9,
      found: () => 1e9,
      ...extra,
    });
  expect(walk({ most: 100 })).toBe("capped");
  expect(walk({ budget: budget(100) })).toBe("stopped");
  let asked = 0;
  expect(walk({ budget: budget(1e9, () => ++asked > 2) })).toBe("stopped");
  expect(asked).toBe(3);
});
