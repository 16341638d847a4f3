// The prices found are good: no random prices bound better, and "cannot be met" is never said of what can.
import { expect, test } from "vitest";
import { ascendCost, ascendFeasibility, ascendFrom } from "../../../src/search/blend/ascent.ts";
import { dualPoint, evaluateDual, wholeBound } from "../../../src/search/blend/dual.ts";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { anyPrices, tinyModel } from "../../support/blendModels.ts";

const ALL = Number.POSITIVE_INFINITY;

test("ascendCost: below the optimum, and within 2 % of the best of 300 random prices", () => {
  const point = dualPoint();
  for (let seed = 0; seed < 120; seed += 1) {
    const model = tinyModel(seed);
    const best = bruteForce(model);
    if (best === null) continue;
    const pool = buildPool(model, null, true);
    const top = ascendCost(pool, model.maxTypes, ALL);
    expect(wholeBound(top.value)).toBeLessThanOrEqual(best);
    for (let at = 0; at < 300; at += 1) {
      evaluateDual(pool, anyPrices(seed * 311 + at, best + 10), model.maxTypes, point);
      expect(point.value).toBeLessThanOrEqual(top.value + 0.02 * best + 1);
    }
  }
});

test("ascendFrom does not lose what it starts from", () => {
  for (let seed = 0; seed < 60; seed += 1) {
    const model = tinyModel(seed);
    if (bruteForce(model) === null) continue;
    const pool = buildPool(model, null, true);
    const top = ascendCost(pool, model.maxTypes, ALL);
    expect(ascendFrom(pool, model.maxTypes, top.prices, ALL, 10).value).toBeGreaterThanOrEqual(top.value - 1e-6);
  }
});

test("ascendFeasibility above 0 means that brute force finds nothing; it settles most of the rest", () => {
  let said = 0;
  let impossible = 0;
  for (let seed = 0; seed < 400; seed += 1) {
    const model = tinyModel(seed);
    const none = bruteForce(model) === null;
    const { value } = ascendFeasibility(buildPool(model, null, true), model.maxTypes);
    if (none) impossible += 1;
    if (value > 1e-9) {
      said += 1;
      expect(none).toBe(true);
    }
  }
  expect(said).toBeGreaterThan(impossible / 2);
});
