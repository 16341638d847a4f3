// The front of cost against a row holds only points that nothing beats, and both ends.
import { expect, test } from "vitest";
import { blendTotals } from "../../../src/search/blend/evaluate.ts";
import { sweepFront } from "../../../src/search/blend/sweep.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

test("sweepFront by hand: cheap and bulky, dear and small, and the mixes between", () => {
  const model = plainModel(
    4,
    [
      { capacity: 1, most: 4, price: 10, volume: 3 },
      { capacity: 1, most: 4, price: 15, volume: 1 },
    ],
    { volume: 100 },
  );
  const front = sweepFront(model, "volume", 20);
  expect(front.map(({ amount, cost }) => [amount, cost])).toEqual([
    [12, 40],
    [10, 45],
    [8, 50],
    [6, 55],
    [4, 60],
  ]);
  expect(front.every(({ proven }) => proven)).toBe(true);
});

test("sweepFront: 120 models, each point is the cheapest under its ceiling, the last has the least amount", () => {
  let points = 0;
  for (let seed = 0; seed < 120; seed += 1) {
    const model = tinyModel(seed);
    const front = sweepFront(model, "volume", 6);
    if (bruteForce(model) === null) {
      expect(front).toEqual([]);
      continue;
    }
    let least = Number.POSITIVE_INFINITY;
    bruteForce(model, (counts) => {
      least = Math.min(least, blendTotals(model, counts)!.volume);
    });
    expect(front.at(-1)!.amount).toBeLessThanOrEqual(least * (1 + 1e-6) + 1e-15);
    for (const { ceiling, cost, amount, proven } of front) {
      points += 1;
      expect(proven).toBe(true);
      expect(amount).toBeLessThanOrEqual(ceiling * (1 + 1e-8));
      expect(bruteForce({ ...model, ceilings: { ...model.ceilings, volume: ceiling } })).toBe(cost);
    }
    for (let at = 1; at < front.length; at += 1) {
      expect(front[at]!.cost).toBeGreaterThan(front[at - 1]!.cost);
      expect(front[at]!.amount).toBeLessThan(front[at - 1]!.amount);
    }
  }
  expect(points).toBeGreaterThan(50);
});
