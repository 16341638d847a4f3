// The cost ladder against brute force at needs drawn between and on its steps.
import { expect, test } from "vitest";
import { costLadder } from "../../../src/search/blend/ladder.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { chance } from "../../support/blendInstances.ts";
import { plainModel, shippedModel, tinyModel } from "../../support/blendModels.ts";

test("costLadder by hand: 3 and 4 for 10 and 13", () => {
  const model = plainModel(1, [
    { capacity: 3, most: 2, price: 10 },
    { capacity: 4, most: 1, price: 13 },
  ]);
  const { steps, end } = costLadder(model, { from: 1, to: 20, most: 40 });
  expect(steps.map(({ from, to, cost }) => [from, to, cost])).toEqual([
    [1, 3, 10],
    [3, 4, 13],
    [4, 6, 20],
    [6, 7, 23],
    [7, 10, 33],
  ]);
  expect(end).toBe("out of reach");
  expect(costLadder(model, { from: 1, to: 20, most: 2 })).toMatchObject({ end: "cut", steps: [{}, {}] });
  expect(costLadder(model, { from: 1, to: 6.5, most: 40 }).end).toBe("complete");
});

test("costLadder: at any need the step on which it stands has the least cost of all mixes: 60 models, 12 needs each", () => {
  let met = 0;
  for (let seed = 0; seed < 60; seed += 1) {
    const model = seed % 2 === 0 ? tinyModel(seed) : shippedModel(seed);
    const { steps, end } = costLadder(model, { from: 4e-6, to: 60e-6, most: 1000 });
    const random = chance(seed + 9);
    const needs = [
      ...Array.from({ length: 8 }, () => 4e-6 + 56e-6 * random()),
      ...steps.slice(0, 4).map(({ to }) => to),
    ];
    for (const requirement of needs) {
      const step = steps.find(({ to }) => requirement <= to);
      const least = bruteForce({ ...model, requirement });
      expect(step?.cost ?? null, `seed ${seed}, ${requirement}`).toBe(least);
      if (step === undefined) expect(end).toBe("out of reach");
      met += 1;
    }
    steps.forEach(({ cost, proven }, at) => {
      expect(proven).toBe(true);
      if (at > 0) expect(cost).toBeGreaterThan(steps[at - 1]!.cost);
    });
  }
  expect(met).toBeGreaterThan(500);
});
