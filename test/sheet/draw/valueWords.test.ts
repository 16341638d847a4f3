import { expect, test } from "vitest";
import { BLANK, counted, shownOrBlank, wordsOrBlank } from "../../../src/sheet/draw/valueWords.ts";

test("shownOrBlank(value, dimension): the quantity layer's words, or a blank with the unit", () => {
  expect(shownOrBlank(4.125e-3, "capacitance", { digits: 4 })).toBe("4.125 mF");
  expect(shownOrBlank(0, "voltage")).toBe("0 V");
  expect(shownOrBlank(null, "voltage")).toBe(`${BLANK} V`);
  expect(shownOrBlank(Number.NaN, "voltage")).toBe(`${BLANK} V`);
  expect(shownOrBlank(null, "count")).toBe(BLANK);
  expect(shownOrBlank(Number.POSITIVE_INFINITY, "time")).toBe("unlimited");
});

test("wordsOrBlank(words): words, or a blank for none", () => {
  expect(wordsOrBlank("x")).toBe("x");
  expect(wordsOrBlank("  ")).toBe(BLANK);
  expect(wordsOrBlank(null)).toBe(BLANK);
});

test("counted(count, one): one and more", () => {
  expect([0, 1, 2].map((count) => counted(count, "unit"))).toEqual(["0 units", "1 unit", "2 units"]);
});
