import { describe, expect, test } from "vitest";
import { toBeChosen } from "../../src/order/chosenLine.ts";
import { reckoned } from "../../src/order/reckon.ts";
import fc from "../support/property.ts";

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

describe("reckoned(line), for any line", () => {
  const lines = fc.record({
    needed: fc.integer({ min: 0, max: 100_000 }),
    onHand: fc.option(fc.integer({ min: 0, max: 100_000 })),
    pack: fc.option(fc.integer({ min: 1, max: 1000 })),
    cents: fc.integer({ min: 0, max: 1_000_000 }),
  });

  test("what is bought covers what is short in whole packs, with less than a pack over; the cost is that many cents", () => {
    fc.assert(
      fc.property(lines, ({ needed, onHand, pack, cents }) => {
        const short = Math.max(0, needed - (onHand ?? 0));
        const line = reckoned({ ...lug, needed, onHand, pack, unitPrice: Number(`${cents}e-2`) });
        const bought = line.toBuy ?? Number.NaN;
        expect(bought % (pack ?? 1)).toBe(0);
        expect(line.surplus).toBe(bought - short);
        expect(bought - short).toBeGreaterThanOrEqual(0);
        expect(bought - short).toBeLessThan(pack ?? 1);
        // Whole numbers below 2^53: exact.
        expect(Math.round((line.purchase ?? Number.NaN) * 100)).toBe(bought * cents);
        expect(Math.round((line.consumed ?? Number.NaN) * 100)).toBe(short * cents);
      }),
    );
  });
});
