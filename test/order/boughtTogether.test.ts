import { describe, expect, test } from "vitest";
import type { BillLine } from "../../src/order/bill.ts";
import { boughtTogether } from "../../src/order/boughtTogether.ts";
import { toBeChosen } from "../../src/order/chosenLine.ts";
import { WITH_SPARES, WITH_UNITS } from "../../src/order/partLines.ts";

const bare = toBeChosen({ item: "k", line: "units", needed: 36, note: WITH_SPARES });
const units: BillLine = {
  ...bare,
  onHand: 13,
  toBuy: 28,
  pack: 10,
  packs: 3,
  surplus: 5,
  unitPrice: 7,
  currency: "EUR",
};
const spares: BillLine = {
  ...units,
  line: "spares",
  needed: 2,
  onHand: 0,
  toBuy: 2,
  packs: null,
  surplus: 0,
  note: WITH_UNITS,
};
const own = (ofUnits: readonly string[], ofSpares: readonly string[] = []) =>
  new Map([["units", ofUnits] as const, ["spares", ofSpares] as const]);

describe("boughtTogether(lines, owned)", () => {
  test("lines without an edit, and a bill without spares, stay as they are", () => {
    const lines = [units, spares];
    expect(boughtTogether(lines, own([]))).toBe(lines);
    expect(boughtTogether([units], own(["needed"]))).toEqual([units]);
  });
  test("a price of the units is paid for the spares; one of their own stays", () => {
    const cheap = { ...spares, unitPrice: 1, purchase: 2 };
    expect(boughtTogether([units, cheap], own(["unitPrice"]))[1]).toMatchObject({
      unitPrice: 7,
      purchase: 14,
      toBuy: 2,
    });
    expect(boughtTogether([units, cheap], own(["unitPrice"], ["unitPrice"]))[1]).toMatchObject({ unitPrice: 1 });
  });
  test("a quantity edited: the packs of both together, at 36 + 6 - 13 = 29 short three packs of ten", () => {
    const [one, two] = boughtTogether([units, { ...spares, needed: 6 }], own([], ["needed"]));
    expect(one).toMatchObject({ toBuy: 24, packs: 3, surplus: 1, purchase: 168, note: WITH_SPARES });
    expect(two).toMatchObject({ toBuy: 6, packs: null, surplus: 0, purchase: 42, note: WITH_UNITS });
  });
  test("spares of another part are another purchase, and neither note says otherwise", () => {
    const [one, two] = boughtTogether([units, { ...spares, item: "m" }], own([], ["item"]));
    expect(one).toMatchObject({ toBuy: 30, packs: 3, surplus: 7, note: "" });
    expect(two).toMatchObject({ toBuy: 10, packs: 1, surplus: 8, note: "" });
  });
});
