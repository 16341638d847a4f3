// One cell at a time, by the kind of its column: the value or the refusal's code.
import { describe, expect, test } from "vitest";
import { readCell } from "../../src/catalog/cell.ts";
import { above, type ColumnKind, text } from "../../src/catalog/column.ts";

const MICRO = { exponent: -6, factor: 1 };
const ONE = { exponent: 0, factor: 1 };
const cell = (written: string, type: ColumnKind, over: object = {}): unknown => {
  const read = readCell(written, type, { bare: ONE, decimalComma: false, currency: "EUR", ...over });
  return read.ok ? read.value : read.refusals[0]?.code;
};

describe("quantity", () => {
  const farads = above("capacitance", 1e-13, 1e5);
  test.each([
    ["470", 470e-6],
    ["470 uF", 470e-6],
    ["4m7", 4.7e-3],
    ["0", "out-of-range"],
    ["-1", "out-of-range"],
    ["1e12", "out-of-range"],
    ["NaN", "not-a-number"],
    ["450 V", "wrong-unit"],
    ["470 jar", "unknown-unit"],
  ])("%s below [uF]: %s", (written, value) => expect(cell(written, farads, { bare: MICRO })).toBe(value));
  test("a bare number below a heading without a unit is refused", () =>
    expect(cell("470", farads, { bare: null })).toBe("missing-unit"));
  test("the range is said in the units of the trade", () => {
    const read = readCell("1e300", above("voltage", 0.1, 1e7), { bare: ONE, decimalComma: false, currency: "EUR" });
    expect(!read.ok && read.refusals[0]?.want).toBe("from 100 mV to 10 MV");
  });
});

describe("whole", () => {
  const whole: ColumnKind = { kind: "whole", least: 1, most: 100 };
  test.each([
    ["1", 1],
    ["100", 100],
    ["0", "bad-count"],
    ["101", "bad-count"],
    ["1.5", "bad-count"],
    ["-3", "bad-count"],
    ["1e1", "bad-count"],
    ["plenty", "bad-count"],
    ["7 pcs", "bad-count"],
  ])("%s: %s", (written, value) => expect(cell(written, whole)).toBe(value));
});

describe("yes-no", () => {
  test.each([
    ["yes", true],
    ["Y", true],
    ["polarised", true],
    ["no", false],
    ["non-polarized", false],
    ["bipolar", false],
    ["perhaps", "bad-yes-no"],
    ["2", "bad-yes-no"],
  ])("%s: %s", (written, value) => expect(cell(written, { kind: "yes-no" })).toBe(value));
});

describe("text", () => {
  test("as long as allowed, and one more", () => {
    expect(cell("12345", text(5))).toBe("12345");
    expect(cell("123456", text(5))).toBe("too-long");
  });
  test("what is shown of a long cell is short", () => {
    const read = readCell("x".repeat(1e5), text(5), { bare: ONE, decimalComma: false, currency: "EUR" });
    expect(!read.ok && (read.refusals[0]?.read.length ?? 0)).toBeLessThan(100);
  });
});

describe("currency and choice", () => {
  test.each([
    ["EUR", "EUR"],
    ["eur", "bad-currency"],
    ["EURO", "bad-currency"],
    ["€", "bad-currency"],
  ])("%s: %s", (written, value) => expect(cell(written, { kind: "currency" })).toBe(value));
  test("a choice is one of its words", () => {
    expect(cell("E24", { kind: "choice", among: ["E12", "E24"] })).toBe("E24");
    expect(cell("E25", { kind: "choice", among: ["E12", "E24"] })).toBe("bad-choice");
  });
});

describe("price and price breaks", () => {
  test("3.90 in EUR is 390 minor units, in JPY 3.9, in KWD 3900", () => {
    expect(cell("3.90", { kind: "price" })).toBe(390);
    expect(cell("3.90", { kind: "price" }, { currency: "JPY" })).toBe(3.9);
    expect(cell("3.90", { kind: "price" }, { currency: "KWD" })).toBe(3900);
  });
  test.each([
    [
      "10: 3.90; 100: 3.10",
      [
        { from: 10, price: 390 },
        { from: 100, price: 310 },
      ],
    ],
    ["10+: 3.90", [{ from: 10, price: 390 }]],
    [
      "10=3.90|100=3.10;",
      [
        { from: 10, price: 390 },
        { from: 100, price: 310 },
      ],
    ],
    ["100: 3.10; 10: 3.90", "bad-breaks"],
    ["10: 3.90; 10: 3.10", "bad-breaks"],
    ["0: 3.90", "bad-breaks"],
    ["10: -3", "bad-breaks"],
    ["10 for 5.50", "bad-breaks"],
    [";", "bad-breaks"],
  ])("%s: %j", (written, value) => expect(cell(written, { kind: "price-breaks" })).toEqual(value));
});
