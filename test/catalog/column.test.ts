// The three ways to write a column's range.
import { describe, expect, test } from "vitest";
import { above, fromZero, PURCHASE_COLUMNS, text } from "../../src/catalog/column.ts";

describe("above, fromZero, text", () => {
  test("above(dimension, least, most) keeps its least", () =>
    expect(above("voltage", 0.1, 10)).toEqual({ kind: "quantity", dimension: "voltage", least: 0.1, most: 10 }));
  test("fromZero(dimension, most) starts at nought", () =>
    expect(fromZero("current", 10)).toEqual({ kind: "quantity", dimension: "current", least: 0, most: 10 }));
  test("text(longest) is 200 unless said", () => {
    expect(text()).toEqual({ kind: "text", longest: 200 });
    expect(text(5)).toEqual({ kind: "text", longest: 5 });
  });
});

describe("PURCHASE_COLUMNS", () => {
  test("currency comes before every price, because it says how many digits a price has", () => {
    const keys = PURCHASE_COLUMNS.map((c) => c.key);
    expect(keys.indexOf("currency")).toBeLessThan(Math.min(keys.indexOf("price"), keys.indexOf("priceBreaks")));
  });
  test("a pack holds at least one, a hand may hold none", () => {
    const least = (key: string): unknown => PURCHASE_COLUMNS.find((c) => c.key === key)?.type;
    expect(least("pack")).toMatchObject({ kind: "whole", least: 1 });
    expect(least("onHand")).toMatchObject({ kind: "whole", least: 0 });
    expect(least("available")).toMatchObject({ kind: "whole", least: 0 });
  });
});
