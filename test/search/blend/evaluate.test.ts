// Sums of a blend, and whether it fits.
import { expect, test } from "vitest";
import { blendTotals, isFittingBlend, tidyCounts } from "../../../src/search/blend/evaluate.ts";
import { plainModel } from "../../support/blendModels.ts";

const model = plainModel(
  500e-6,
  [
    { capacity: 50e-6, most: 12, price: 7, fixed: 3, volume: 1e-3, mass: 0.5, units: 2 },
    { capacity: 30e-6, most: 4, price: 5, volume: 2e-3, mass: 0.1, units: 3 },
    { capacity: 30e-6, most: 4, price: 5, part: 0 },
  ],
  { volume: 20e-3, mass: 6, units: 30, types: 2 },
);

test("blendTotals(model, counts) adds what each option brings", () => {
  const totals = blendTotals(model, [
    { option: 0, strings: 8 },
    { option: 1, strings: 4 },
  ])!;
  expect(totals).toMatchObject({ cost: 3 + 56 + 20, units: 28, types: 2 });
  expect(totals.capacity).toBeCloseTo(520e-6, 15);
  expect(totals.volume).toBeCloseTo(16e-3, 15);
  expect(totals.mass).toBeCloseTo(4.4, 12);
});

test("blendTotals is null for a count that cannot be had or an option named twice", () => {
  for (const strings of [13, -1, 0.5, Number.NaN]) expect(blendTotals(model, [{ option: 0, strings }])).toBeNull();
  expect(blendTotals(model, [{ option: 9, strings: 1 }])).toBeNull();
  expect(
    blendTotals(model, [
      { option: 0, strings: 1 },
      { option: 0, strings: 1 },
    ]),
  ).toBeNull();
});

test("isFittingBlend: ten times 50 uF is 500 uF, nine is not", () => {
  expect(isFittingBlend(model, [{ option: 0, strings: 10 }])).toBe(true);
  expect(isFittingBlend(model, [{ option: 0, strings: 9 }])).toBe(false);
});

test("isFittingBlend refuses each ceiling, too many types and a part in two ways, one at a time", () => {
  const counts = [
    { option: 0, strings: 8 },
    { option: 1, strings: 4 },
  ];
  expect(isFittingBlend(model, counts)).toBe(true);
  const under = (ceilings: object) =>
    isFittingBlend({ ...model, ceilings: { ...model.ceilings, ...ceilings } }, counts);
  expect(under({ volume: 15.9e-3 })).toBe(false);
  expect(under({ mass: 4.39 })).toBe(false);
  expect(under({ units: 27 })).toBe(false);
  expect(under({ volume: 16e-3, mass: 4.4, units: 28 })).toBe(true);
  expect(isFittingBlend({ ...model, maxTypes: 1 }, counts)).toBe(false);
  expect(
    isFittingBlend(model, [
      { option: 0, strings: 8 },
      { option: 2, strings: 4 },
    ]),
  ).toBe(false);
});

test("tidyCounts drops zeros and sorts by option", () => {
  expect(
    tidyCounts([
      { option: 2, strings: 1 },
      { option: 1, strings: 0 },
      { option: 0, strings: 4 },
    ]),
  ).toEqual([
    { option: 0, strings: 4 },
    { option: 2, strings: 1 },
  ]);
});
