import { describe, expect, test } from "vitest";
import { toBeChosen } from "../../src/order/chosenLine.ts";
import { reckoned } from "../../src/order/reckon.ts";

const lug = { ...toBeChosen({ item: "lug", line: "lugs", needed: 32, note: "" }), currency: "EUR" };

describe("reckoned(line)", () => {
  test("an unknown quantity or price stays unknown, never nought", () => {
    expect(reckoned({ ...lug, needed: null, unitPrice: 2 })).toMatchObject({
      toBuy: null,
      purchase: null,
      consumed: null,
      surplus: null,
    });
    expect(reckoned(lug)).toMatchObject({ toBuy: 32, purchase: null, state: "to be chosen" });
    expect(reckoned({ ...lug, value: "M6" })).toMatchObject({ purchase: null, state: "no price" });
    expect(reckoned({ ...lug, unitPrice: 2, currency: null })).toMatchObject({ purchase: null });
  });

  test("all on hand costs nothing, whatever the price", () => {
    expect(reckoned({ ...lug, onHand: 40 })).toMatchObject({ toBuy: 0, purchase: 0, consumed: 0, state: "priced" });
  });

  test("packs are whole: 32 - 3 in packs of 10 at 0.125 are 30 for 3.75, of which 29 are used, 3.63 (halves up)", () => {
    expect(reckoned({ ...lug, onHand: 3, pack: 10, unitPrice: 0.125 })).toMatchObject({
      toBuy: 30,
      packs: 3,
      surplus: 1,
      purchase: 3.75,
      consumed: 3.63,
      state: "priced",
    });
  });

  test("a length without packs is bought as it is; a price far below a cent is not lost", () => {
    expect(reckoned({ ...lug, needed: 12.5, unitPrice: 1.1 })).toMatchObject({
      toBuy: 12.5,
      packs: null,
      purchase: 13.75,
    });
    expect(reckoned({ ...lug, needed: 1e6, unitPrice: 1e-7 }).purchase).toBe(0.1);
  });
});
