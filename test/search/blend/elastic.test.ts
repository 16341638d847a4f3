// The linear excess is a true lower bound on any loosening, and zero where a blend exists.
import { expect, test } from "vitest";
import { elasticCeilings } from "../../../src/search/blend/elastic.ts";
import { findLoosenings } from "../../../src/search/blend/loosen.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

test("elasticCeilings by hand: ten litres needed where eight are allowed is a quarter", () => {
  const model = plainModel(10, [{ capacity: 1, most: 20, price: 7, volume: 1 }], { volume: 8, mass: 3 });
  const found = elasticCeilings(model, [0])!;
  expect(found.volume).toBeCloseTo(0.25, 5);
  expect(found.excess).toBeCloseTo(0.25, 4);
  expect(found.mass).toBeCloseTo(0, 6);
});

test("elasticCeilings: stock that falls short shows as missing capacity", () => {
  const found = elasticCeilings(plainModel(10, [{ capacity: 1, most: 4, price: 7 }], { volume: 8 }), [0])!;
  expect(found.capacity).toBeCloseTo(0.6, 5);
});

test("elasticCeilings: 300 models: nothing to loosen where a blend exists, never more than the exact least change", () => {
  let possible = 0;
  let impossible = 0;
  for (let seed = 0; seed < 300; seed += 1) {
    const model = tinyModel(seed);
    const found = elasticCeilings(model, [...model.options.keys()]);
    if (found === null) continue;
    if (bruteForce(model) !== null) {
      possible += 1;
      expect(found.excess).toBeLessThan(1e-5);
      continue;
    }
    for (const { limit, change } of findLoosenings(model)) {
      if (change === null || (limit !== "volume" && limit !== "mass" && limit !== "units")) continue;
      impossible += 1;
      expect(found.excess).toBeLessThanOrEqual(change + 1e-5);
    }
  }
  expect(possible).toBeGreaterThan(40);
  expect(impossible).toBeGreaterThan(20);
});
