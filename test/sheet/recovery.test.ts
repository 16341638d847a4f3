import { expect, test } from "vitest";
import { factsOf } from "../../src/sheet/facts.ts";
import { rangeWords, recoveryOf } from "../../src/sheet/recovery.ts";
import { BARE, RATED, sheetInput } from "../support/sheet.ts";

test("recoveryOf(input, facts): a unit of unknown polarity is taken as polarised; no tolerance, nothing", () => {
  const of = (input: ReturnType<typeof sheetInput>) => recoveryOf(input, factsOf(input));
  const { polarised: _, ...unknown } = RATED;
  expect(of(sheetInput())).toMatchObject({ low: 200, high: 300 });
  expect(of(sheetInput({ unit: unknown }))).toEqual(of(sheetInput()));
  expect(of(sheetInput({ unit: { ...RATED, polarised: false } }))).toMatchObject({ low: null, high: 200 });
  expect(of(sheetInput({ unit: BARE }))).toBeNull();
});

test("rangeWords(recovery)", () => {
  expect([rangeWords({ low: 200, high: 300 }), rangeWords({ low: null, high: 200 })]).toEqual([
    "200 V to 300 V",
    "up to 200 V",
  ]);
});
