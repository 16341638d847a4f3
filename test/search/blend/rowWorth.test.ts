// Shadow prices agree with the Lagrangian prices and with a re-solved relaxation.
import { expect, test } from "vitest";
import { ascendCost } from "../../../src/search/blend/ascent.ts";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { rowWorth } from "../../../src/search/blend/rowWorth.ts";
import { inventInstance } from "../../support/blendInstances.ts";
import { plainModel } from "../../support/blendModels.ts";

test("rowWorth by hand: a litre more saves the difference of two parts", () => {
  const model = plainModel(
    10,
    [
      { capacity: 1, most: 10, price: 5, volume: 1 },
      { capacity: 1, most: 10, price: 2, volume: 2 },
    ],
    { volume: 14, types: 2 },
  );
  // 6 at 5 and 4 at 2 fill 14; one more of volume turns one into the other: 3 saved.
  const worth = rowWorth(model, [0, 1])!;
  expect(worth.bound).toBeCloseTo(38, 4);
  expect(worth.volume).toBeCloseTo(3, 4);
  expect(worth.capacity).toBeCloseTo(8, 4);
  expect(worth.mass).toBe(0);
});

test("rowWorth's bound is the top of the Lagrangian bound: 40 catalogues of 20", () => {
  let met = 0;
  for (let seed = 1; seed <= 40; seed += 1) {
    const { model } = inventInstance({ parts: 20, seed: 900 + seed });
    const all = [...model.options.keys()];
    const worth = rowWorth(model, all);
    if (worth === null) continue;
    const top = ascendCost(buildPool(model, null, true), model.maxTypes, Number.POSITIVE_INFINITY);
    met += 1;
    expect(top.value).toBeLessThanOrEqual(worth.bound * (1 + 1e-5) + 1);
    expect(top.value).toBeGreaterThanOrEqual(worth.bound * 0.999 - 2);
  }
  expect(met).toBeGreaterThan(20);
});

test("rowWorth: null when there is no relaxation to price", () => {
  expect(rowWorth(plainModel(10, [{ capacity: 1, most: 3, price: 5 }]), [0])).toBeNull();
});
