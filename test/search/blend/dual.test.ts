// The bound is below every blend, at any prices, and its slope is a slope.
import { expect, test } from "vitest";
import { dualPoint, evaluateDual, wholeBound } from "../../../src/search/blend/dual.ts";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { anyPrices, plainModel, tinyModel } from "../../support/blendModels.ts";

test("evaluateDual: one option, no ceilings, by hand", () => {
  // Ten strings at 7 reach the need; at a price of 70 for the need each string is worth its cost, so the bound is 70.
  const model = plainModel(1e-3, [{ capacity: 1e-4, most: 20, price: 7 }]);
  const point = dualPoint();
  evaluateDual(buildPool(model, null, true), { cost: 1, capacity: 70, volume: 0, mass: 0, units: 0 }, 1, point);
  expect(point.value).toBeCloseTo(70, 5);
  expect(wholeBound(point.value)).toBe(70);
});

test("evaluateDual never passes the brute-force optimum: 300 models, 5 prices each", () => {
  const point = dualPoint();
  let met = 0;
  for (let seed = 0; seed < 300; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    if (best === null) continue;
    met += 1;
    const pool = buildPool(model, null, true);
    for (let at = 0; at < 5; at += 1) {
      evaluateDual(pool, anyPrices(seed * 7 + at, best + 10), model.maxTypes, point);
      expect(wholeBound(point.value)).toBeLessThanOrEqual(best);
    }
  }
  expect(met).toBeGreaterThan(50);
});

test("evaluateDual's slope overestimates every move (the bound is concave)", () => {
  const here = dualPoint();
  const there = dualPoint();
  for (let seed = 0; seed < 200; seed += 1) {
    const model = tinyModel(seed);
    const pool = buildPool(model, null, true);
    const a = anyPrices(seed, 200);
    const b = anyPrices(seed + 1000, 200);
    evaluateDual(pool, a, model.maxTypes, here);
    evaluateDual(pool, b, model.maxTypes, there);
    const move = [b.capacity - a.capacity, b.volume - a.volume, b.mass - a.mass, b.units - a.units];
    const line = move.reduce((sum, step, row) => sum + step * here.slope[row]!, here.value);
    expect(there.value).toBeLessThanOrEqual(line + 1e-6);
  }
});
