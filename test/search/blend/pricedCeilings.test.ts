// Prices for the capacity bound are worth having: never a worse bound than without, and always a bound.
import { expect, test } from "vitest";
import { buildCapacityBound, rootBound } from "../../../src/search/blend/capacityBound.ts";
import { buildCore } from "../../../src/search/blend/core.ts";
import { wholeBound } from "../../../src/search/blend/dual.ts";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { pricedCeilings, rootBlend } from "../../../src/search/blend/pricedCeilings.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

const NONE = { cost: 1, volume: 0, mass: 0, units: 0 } as const;

test("pricedCeilings: below the optimum; far better than no prices on many of 200 models", () => {
  let better = 0;
  for (let seed = 0; seed < 200; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    if (best === null) continue;
    const core = buildCore(model, buildPool(model, null, true), { ...NONE, capacity: best }, 1e9);
    const steps = Math.round(model.requirement * 1e6);
    const plain = rootBound(core, buildCapacityBound(core, steps, core.prices));
    const priced = rootBound(core, buildCapacityBound(core, steps, pricedCeilings(core, steps)));
    expect(wholeBound(priced)).toBeLessThanOrEqual(best);
    if (priced > plain + 1) better += 1;
  }
  expect(better).toBeGreaterThan(5);
});

test("rootBlend reads back the amounts of the blend behind the bound", () => {
  const model = plainModel(
    10e-6,
    [
      { capacity: 1e-6, most: 6, price: 5, volume: 2 },
      { capacity: 2e-6, most: 9, price: 14, volume: 1 },
    ],
    { volume: 100 },
  );
  const core = buildCore(model, buildPool(model, null, true), { ...NONE, capacity: 1 }, 1e9);
  // Six of the first (30) and two of the second (28) are cheapest: 14 of 100 in volume.
  const bound = buildCapacityBound(core, 10, core.prices);
  expect(rootBound(core, bound)).toBe(58);
  expect(rootBlend(core, bound).volume).toBeCloseTo(0.14, 6);
});
