// Other good blends: no kind missed, none twice, none too dear.
import { expect, test } from "vitest";
import { findAlternatives } from "../../../src/search/blend/alternatives.ts";
import { isFittingBlend } from "../../../src/search/blend/evaluate.ts";
import { bruteForce, kinds } from "../../support/blendBrute.ts";
import { plainModel, tinyModel } from "../../support/blendModels.ts";

const model = plainModel(6, [
  { capacity: 1, most: 6, price: 10 },
  { capacity: 2, most: 3, price: 21 },
  { capacity: 3, most: 2, price: 33 },
]);

test("findAlternatives by hand: 60, then 61 with two parts, 63, 63 with three", () => {
  const { blends, complete } = findAlternatives(model, { cheapest: 60, within: 0.1, most: 9 });
  expect(complete).toBe(true);
  expect(blends.map(({ kind, cost }) => [kind, cost])).toEqual([
    ["0", 60],
    ["0+1", 61],
    ["0+2", 63],
    ["1", 63],
    ["0+1+2", 64],
    ["2", 66],
  ]);
});

test("findAlternatives keeps to the share and to the number", () => {
  expect(findAlternatives(model, { cheapest: 60, within: 0.05, most: 9 }).blends.map(({ cost }) => cost)).toEqual([
    60, 61, 63, 63,
  ]);
  expect(findAlternatives(model, { cheapest: 60, within: 0.1, most: 2 }).blends.map(({ cost }) => cost)).toEqual([
    60, 61,
  ]);
  expect(findAlternatives(model, { cheapest: 60, within: 0, most: 9 }).blends).toHaveLength(1);
});

test("findAlternatives by another kind: how many parts", () => {
  const kindOf = (counts: readonly unknown[]) => String(counts.length);
  expect(
    findAlternatives(model, { cheapest: 60, within: 0.1, most: 9, kindOf }).blends.map(({ kind, cost }) => [
      kind,
      cost,
    ]),
  ).toEqual([
    ["1", 60],
    ["2", 61],
    ["3", 64],
  ]);
});

test("findAlternatives: 200 models against trying everything", () => {
  for (let seed = 0; seed < 200; seed += 1) {
    const tiny = tinyModel(seed);
    const best = bruteForce(tiny);
    if (best === null) continue;
    const { blends } = findAlternatives(tiny, { cheapest: best, within: 0.4, most: 50 });
    expect(blends[0]!.cost).toBe(best);
    const found = new Map(blends.map(({ kind, cost }) => [kind, cost]));
    expect(found.size).toBe(blends.length);
    for (const { counts, cost } of blends) {
      expect(isFittingBlend(tiny, counts)).toBe(true);
      expect(cost).toBeLessThanOrEqual(best * 1.4 + 1e-9);
    }
    for (const [kind, cost] of kinds(tiny, Math.floor(best * 1.4 + 1e-9) + 1))
      expect(found.get(kind)).toBeLessThanOrEqual(cost);
  }
});
