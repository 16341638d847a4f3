// Thinning leaves a cheapest blend, whatever the model; one rival alone does not remove a pair.
import { expect, test } from "vitest";
import { buildCore } from "../../../src/search/blend/core.ts";
import { NO_PRICES } from "../../../src/search/blend/findBlend.ts";
import { buildPool } from "../../../src/search/blend/pool.ts";
import { thinCore } from "../../../src/search/blend/thinCore.ts";
import { walkCore } from "../../../src/search/blend/walk.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { inventInstance } from "../../support/blendInstances.ts";
import { anyPrices, plainModel, tinyModel } from "../../support/blendModels.ts";

const wholeCore = (model: ReturnType<typeof tinyModel>, prices = NO_PRICES) =>
  buildCore(model, buildPool(model, null, true), prices, 1e9);

function least(core: ReturnType<typeof wholeCore>): number | null {
  let best: number | null = null;
  walkCore({
    core,
    threshold: 1e9,
    feasibility: null,
    bound: null,
    budget: { spent: 0, most: 1e9, stop: () => false },
    most: 1e9,
    found: (_, cost) => {
      best = cost;
      return cost;
    },
  });
  return best;
}

test("thinCore: the brute-force cost is still there: 800 tiny models and 60 catalogues, at random prices", () => {
  let gone = 0;
  const models = [
    ...Array.from({ length: 800 }, (_, seed) => tinyModel(seed)),
    ...Array.from(
      { length: 60 },
      (_, at) => inventInstance({ parts: 12, seed: 700 + at, mostStrings: 12, maxTypes: 3 }).model,
    ),
  ];
  models.forEach((model, seed) => {
    const core = wholeCore(model, seed % 2 === 0 ? NO_PRICES : anyPrices(seed, 60));
    const thin = thinCore(core);
    gone += core.pairs - thin.pairs;
    expect(least(thin)).toBe(bruteForce(model));
  });
  expect(gone).toBeGreaterThan(1000);
});

test("thinCore: with two types, one better rival does not remove a pair; a second one does", () => {
  const cheap = { capacity: 1, most: 1, price: 5 };
  const dear = { capacity: 1, most: 1, price: 9 };
  expect(thinCore(wholeCore(plainModel(2, [cheap, dear], { types: 2 }))).pairs).toBe(2);
  expect(thinCore(wholeCore(plainModel(2, [cheap, cheap, dear], { types: 2 }))).pairs).toBe(2);
});

test("thinCore: another way of the same part is enough alone, and of equals the first stays", () => {
  const one = { capacity: 1, most: 1, price: 5, part: 3 };
  const thin = thinCore(wholeCore(plainModel(1, [{ ...one, price: 6 }, one, one], { types: 3 })));
  expect(thin.columns.map(({ option }) => option)).toEqual([1]);
});
