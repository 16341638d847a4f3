import { describe, expect, test } from "vitest";
import { capacitorValues, purchaseValues, valueText } from "../../src/cli/valueWords.ts";
import { UNIT } from "../support/bank.ts";

describe("capacitorValues(unit)", () => {
  test("each value with its state: datasheet, measured, assumed with its rule, unknown", () => {
    const unit = {
      ...UNIT,
      states: { leakage: { state: "assumed", rule: "the rule" }, diameter: { state: "measured" } } as const,
    };
    const by = Object.fromEntries(capacitorValues(unit).map((value) => [value.key, value]));
    expect(by.capacitance).toMatchObject({ state: "datasheet", text: "1 mF" });
    expect(by.leakage).toMatchObject({ state: "assumed", rule: "the rule", text: "100 µA" });
    expect(by.diameter).toMatchObject({ state: "measured" });
    expect(by.esr).toEqual({ heading: "esr", key: "esr", text: "unknown", state: "unknown" });
    expect(by.price).toBeUndefined();
  });
});

test("valueText(value, column): by kind", () => {
  expect(valueText(undefined, { type: { kind: "yes-no" } })).toBe("unknown");
  expect(valueText(false, { type: { kind: "yes-no" } })).toBe("no");
  expect(valueText({ low: 0.1, high: 0.5 }, { type: { kind: "tolerance" } })).toBe("-10/+50 %");
  expect(valueText(250, { type: { kind: "price" } }, "EUR")).toBe("2.50 EUR");
  const breaks = [
    { from: 10, price: 390 },
    { from: 100, price: 310 },
  ];
  expect(valueText(breaks, { type: { kind: "price-breaks" } })).toBe("10: 3.90; 100: 3.10");
  expect(valueText("x", { type: { kind: "text", longest: 9 } })).toBe("x");
});

test("purchaseValues(terms): every term, blank ones unknown, money in words alone", () => {
  const told = purchaseValues({ currency: "EUR", price: 640, pack: 10, onHand: 0 });
  expect(told.map(({ heading, text }) => `${heading} ${text}`)).toEqual([
    "currency EUR",
    "price 6.40 EUR",
    "price breaks unknown",
    "pack 10",
    "minimum order unknown",
    "on hand 0",
    "available unknown",
    "supplier unknown",
    "order code unknown",
  ]);
  expect(told.find(({ key }) => key === "price")).not.toHaveProperty("value");
});
