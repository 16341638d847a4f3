import { describe, expect, test } from "vitest";
import { toBeChosen } from "../../src/order/chosenLine.ts";
import type { BillLine } from "../../src/order/index.ts";
import { totalsOf } from "../../src/order/totals.ts";

const open = toBeChosen({ item: "lug", line: "lugs", needed: 2, note: "" });
const priced = (purchase: number, currency = "EUR", consumed = purchase): BillLine => ({
  ...open,
  item: `part ${purchase}`,
  purchase,
  consumed,
  currency,
  state: "priced",
});

describe("totalsOf({ lines, currency, exchange })", () => {
  test("no priced line: null, not zero", () => {
    expect(totalsOf({ lines: [open], currency: "EUR" })).toEqual({
      purchase: null,
      consumed: null,
      currency: null,
      pricedLines: 0,
      unpriced: ["lug"],
    });
    expect(totalsOf({ lines: [], currency: null }).purchase).toBeNull();
  });

  test("sums in minor units: ten times 0.10 is 1", () => {
    const lines = Array.from({ length: 10 }, () => priced(0.1));
    expect(totalsOf({ lines, currency: "EUR" })).toMatchObject({ purchase: 1, consumed: 1, pricedLines: 10 });
  });

  test("yen have no minor unit", () => {
    expect(totalsOf({ lines: [priced(120, "JPY"), priced(3, "JPY")], currency: "JPY" }).purchase).toBe(123);
  });

  test("another currency goes in at its rate, or is left out and listed", () => {
    const lines = [priced(10), priced(20, "USD")];
    expect(totalsOf({ lines, currency: "EUR", exchange: { USD: 0.5 } }).purchase).toBe(20);
    expect(totalsOf({ lines, currency: "EUR" })).toMatchObject({ purchase: 10, unpriced: ["part 20"] });
  });
});
