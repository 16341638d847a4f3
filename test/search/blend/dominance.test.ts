// Dropping dominated options loses no optimum; dropping those with a single rival would.
import { expect, test } from "vitest";
import { replaces, restrictedModel, undominated } from "../../../src/search/blend/dominance.ts";
import { findBlend } from "../../../src/search/blend/findBlend.ts";
import { bruteForce } from "../../support/blendBrute.ts";
import { inventInstance } from "../../support/blendInstances.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

test("one rival is not enough: its stock may be used up (2 cheap + 1 dear is the optimum)", () => {
  const model = plainModel(
    3,
    [
      { capacity: 1, most: 2, price: 5 },
      { capacity: 1, most: 1, price: 9 },
    ],
    { types: 2 },
  );
  expect(replaces(model.options[0]!, 2, model.options[1]!, 1)).toBe(true);
  expect(undominated(model)).toEqual([0, 1]);
  expect(findBlend(model).best!.cost).toBe(19);
  // With one type allowed the rival is free whenever it is wanted.
  expect(undominated({ ...model, requirement: 1, maxTypes: 1 })).toEqual([0]);
});

test("equals leave in order, not in a circle", () => {
  const same = { capacity: 1, most: 3, price: 5 };
  expect(undominated(plainModel(3, [same, same, same, same], { types: 2 }))).toEqual([0, 1]);
});

test("another way of the same part is enough alone", () => {
  const model = plainModel(
    3,
    [
      { capacity: 1, most: 3, price: 5, part: 7 },
      { capacity: 1, most: 3, price: 6, part: 7 },
    ],
    { types: 2 },
  );
  expect(undominated(model)).toEqual([0]);
});

test("replaces looks at every amount and every count", () => {
  const base = { capacity: 1, most: 4, price: 5, volume: 2, mass: 2, units: 2 };
  const [one] = plainModel(4, [base]).options;
  const against = (change: object) => replaces(plainModel(4, [{ ...base, ...change }]).options[0]!, 4, one!, 4);
  expect(against({})).toBe(true);
  expect(against({ price: 4 })).toBe(true);
  for (const worse of [
    { price: 6 },
    { volume: 3 },
    { mass: 3 },
    { units: 3 },
    { capacity: 0.9 },
    { price: [1, 1, 1, 21] },
  ]) {
    expect(against(worse)).toBe(false);
  }
});

test("undominated keeps the optimum: 600 tiny models and 40 catalogues of 100", () => {
  let dropped = 0;
  const check = (model: ReturnType<typeof tinyModel>, best: number | null) => {
    const keep = undominated(model);
    dropped += model.options.length - keep.length;
    expect(findBlend(restrictedModel(model, keep)).best?.cost ?? null).toBe(best);
  };
  for (let seed = 0; seed < 600; seed += 1) check(tinyModel(seed), bruteForce(tinyModel(seed)));
  for (let seed = 1; seed <= 40; seed += 1) {
    const { model } = inventInstance({ parts: 100, seed: 300 + seed });
    check(model, findBlend(model).best?.cost ?? null);
  }
  expect(dropped).toBeGreaterThan(1000);
});
