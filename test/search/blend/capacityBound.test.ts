// The capacity bound never passes a true cost, and without ceilings it nearly reaches it.
import { expect, test } from "vitest";
import { buildCapacityBound, rootBound, stepsFor, stepsWithin } from "../../../src/search/blend/capacityBound.ts";
import { buildCore } from "../../../src/search/blend/core.ts";
import { wholeBound } from "../../../src/search/blend/dual.ts";
import { NO_PRICES } from "../../../src/search/blend/findBlend.ts";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { anyPrices, plainModel, tinyModel } from "../../support/blendModels.ts";

const wholeCore = (model: ReturnType<typeof tinyModel>) =>
  buildCore(model, buildPool(model, null, true), NO_PRICES, 1e9);

test("rootBound: no ceilings, needs in whole steps: the optimum itself", () => {
  let met = 0;
  for (let seed = 0; seed < 300; seed += 1) {
    const closed = tinyModel(seed);
    const open = Number.POSITIVE_INFINITY;
    const options = closed.options.map((o, partIndex) => ({ ...o, partIndex }));
    const model = { ...closed, options, ceilings: { volume: open, mass: open, units: open } };
    const best = bruteForce(model);
    const core = wholeCore(model);
    // All capacities are whole microfarads, so steps of one microfarad lose nothing.
    const bound = buildCapacityBound(core, Math.round(model.requirement * 1e6), NO_PRICES);
    expect(rootBound(core, bound)).toBe(best ?? Number.POSITIVE_INFINITY);
    if (best !== null) met += 1;
  }
  expect(met).toBeGreaterThan(100);
});

test("rootBound at any prices and few steps stays below the brute-force optimum", () => {
  for (let seed = 0; seed < 200; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    if (best === null) continue;
    const core = wholeCore(model);
    for (const steps of [3, 17, 200]) {
      expect(wholeBound(rootBound(core, buildCapacityBound(core, steps, anyPrices(seed, best))))).toBeLessThanOrEqual(
        best,
      );
    }
  }
});

test("rootBound with more types than it counts (9 of 10) is still a bound", () => {
  const options = Array.from({ length: 12 }, (_, at) => ({ capacity: (at + 1) * 1e-6, most: 1, price: 10 + at * at }));
  const model = plainModel(40e-6, options, { types: 10 });
  const core = wholeCore(model);
  expect(rootBound(core, buildCapacityBound(core, 40, NO_PRICES))).toBeLessThanOrEqual(bruteForce(model)!);
});

test("stepsFor rounds up, but not for an exact fit; stepsWithin keeps to its limits", () => {
  const core = wholeCore(tinyModel(1));
  const bound = buildCapacityBound(core, 10, NO_PRICES);
  expect(stepsFor(bound, 0.3)).toBe(3);
  expect(stepsFor(bound, 0.31)).toBe(4);
  expect(stepsFor(bound, 2)).toBe(10);
  expect(stepsFor(bound, -1)).toBe(0);
  expect(stepsWithin(core, 1)).toBe(64);
  expect(stepsWithin(core, 1e12, 500)).toBe(500);
});
