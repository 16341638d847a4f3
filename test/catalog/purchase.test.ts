// The cheapest purchase against every quantity there is, on random terms.

import { describe, expect, test } from "vitest";
import type { PurchaseTerms } from "../../src/catalog/capacitor.ts";
import { breaksRise, cheapest, isPriced, leastBuyable, purchase, unitPriceAt } from "../../src/catalog/purchase.ts";
import fc from "../support/property.ts";
import { slowPurchase } from "../support/slowBank.ts";

describe("unitPriceAt(terms, quantity)", () => {
  const terms: PurchaseTerms = {
    price: 410,
    priceBreaks: [
      { from: 10, price: 390 },
      { from: 100, price: 310 },
    ],
  };
  test.each([
    [1, 410],
    [9, 410],
    [10, 390],
    [99, 390],
    [100, 310],
    [1e6, 310],
  ])("%d at %d", (quantity, price) => expect(unitPriceAt(terms, quantity)).toBe(price));
  test("no price at all is unknown, not zero", () => expect(unitPriceAt({}, 5)).toBe(null));
  test("below the first break without a price: unknown", () =>
    expect(unitPriceAt({ priceBreaks: [{ from: 10, price: 1 }] }, 9)).toBe(null));
});

describe("isPriced(terms)", () => {
  test("by a price, by a break, by neither", () => {
    expect(isPriced({ price: 0 })).toBe(true);
    expect(isPriced({ priceBreaks: [{ from: 1, price: 5 }] })).toBe(true);
    expect(isPriced({ priceBreaks: [] })).toBe(false);
    expect(isPriced({})).toBe(false);
  });
});

describe("leastBuyable(terms, needed)", () => {
  test.each([
    [{ onHand: 10 }, 10, 0],
    [{ onHand: 10 }, 11, 1],
    [{ onHand: 10, pack: 4 }, 11, 4],
    [{ minimumOrder: 10, pack: 4 }, 1, 12],
    [{ available: 0 }, 1, null],
    [{ available: 0, onHand: 1 }, 1, 0],
    // Packs count: four are enough, but they come in fours and only seven are there for five.
    [{ available: 7, pack: 4 }, 5, null],
    [{ available: 11, minimumOrder: 12 }, 1, null],
    [{ available: 12, minimumOrder: 12 }, 1, 12],
  ])("%o, %d: %s", (terms, needed, least) => expect(leastBuyable(terms, needed)).toBe(least));
});

describe("purchase(terms, needed)", () => {
  test("more than is needed when a break makes it cheaper: 95 at 4.10 or 100 at 3.10", () => {
    const made = purchase({ price: 410, priceBreaks: [{ from: 100, price: 310 }] }, 95);
    expect(made).toEqual({
      needed: 95,
      fromHand: 0,
      bought: 100,
      packs: 100,
      surplus: 5,
      unitPrice: 310,
      cost: 31000,
      consumed: 29450,
    });
  });
  test("but not when more is not to be had", () =>
    expect(purchase({ price: 410, available: 99, priceBreaks: [{ from: 100, price: 310 }] }, 95)?.bought).toBe(95));
  test("on hand first, free: nothing bought, nothing spent", () =>
    expect(purchase({ onHand: 20, price: 410 }, 20)).toEqual({
      needed: 20,
      fromHand: 20,
      bought: 0,
      packs: 0,
      surplus: 0,
      unitPrice: null,
      cost: 0,
      consumed: 0,
    }));
  test("no price: the cost is unknown, the quantity is not", () =>
    expect(purchase({ pack: 10 }, 11)).toMatchObject({
      bought: 20,
      packs: 2,
      surplus: 9,
      cost: null,
      unitPrice: null,
    }));
  test("not enough to be had: null", () => expect(purchase({ available: 3, onHand: 1 }, 5)).toBe(null));
  test("the published surplus bank: 128 cans in packs of eight at 25 a pack is 16 packs and 400", () =>
    expect(purchase({ price: 312.5, pack: 8 }, 128)).toMatchObject({ packs: 16, surplus: 0, cost: 40000 }));

  const maybe = <T>(value: fc.Arbitrary<T>) => fc.option(value, { nil: undefined });
  const terms = fc
    .record({
      price: maybe(fc.integer({ min: 0, max: 500 })),
      steps: fc.uniqueArray(fc.tuple(fc.integer({ min: 2, max: 70 }), fc.integer({ min: 0, max: 500 })), {
        maxLength: 3,
        selector: ([from]) => from,
      }),
      pack: maybe(fc.integer({ min: 1, max: 13 })),
      minimumOrder: maybe(fc.integer({ min: 1, max: 30 })),
      onHand: maybe(fc.integer({ min: 0, max: 25 })),
      available: maybe(fc.integer({ min: 0, max: 90 })),
      scale: fc.constantFrom(1, 0.25, 0.01),
    })
    .map(({ price, steps, scale, ...rest }): PurchaseTerms => {
      const priceBreaks = [...steps].sort((a, b) => a[0] - b[0]).map(([from, p]) => ({ from, price: p * scale }));
      const given = {
        ...rest,
        price: price === undefined ? undefined : price * scale,
        ...(priceBreaks.length > 0 ? { priceBreaks } : {}),
      };
      return Object.fromEntries(Object.entries(given).filter(([, v]) => v !== undefined));
    });

  test("1500 random terms against every quantity up to 400: the same cost and quantity, or both not to be had", () => {
    let [found, none] = [0, 0];
    fc.assert(
      fc.property(terms, fc.integer({ min: 1, max: 90 }), (one, needed) => {
        const best = { quantity: 0, cost: 0 };
        const quick = cheapest(one, needed, best);
        const slow = slowPurchase(one, needed, 400);
        if (slow === null) none++;
        else found++;
        expect(quick).toBe(slow !== null);
        if (slow !== null) expect({ bought: best.quantity, cost: best.cost }).toEqual(slow);
      }),
      { numRuns: 1500, seed: 5 },
    );
    expect(Math.min(found, none)).toBeGreaterThan(100);
  });

  test("the parts add up: hand and bought cover the need, packs are whole, surplus and consumed follow", () => {
    fc.assert(
      fc.property(terms, fc.integer({ min: 1, max: 90 }), (one, needed) => {
        const made = purchase(one, needed);
        if (made === null) return;
        expect(made.fromHand + made.bought - made.surplus).toBe(needed);
        expect(Number.isInteger(made.packs)).toBe(true);
        expect(made.bought).toBeLessThanOrEqual(one.available ?? Number.POSITIVE_INFINITY);
        if (made.cost !== null && made.consumed !== null) expect(made.consumed).toBeLessThanOrEqual(made.cost);
      }),
      { numRuns: 500, seed: 6 },
    );
  });
});

test("breaksRise(terms): true where a larger quantity costs more a unit, from the price or from a break", () => {
  const breaks = [
    { from: 10, price: 90 },
    { from: 50, price: 95 },
  ];
  expect(breaksRise({ price: 100, priceBreaks: breaks })).toBe(true);
  expect(breaksRise({ price: 80, priceBreaks: breaks.slice(0, 1) })).toBe(true);
  expect(breaksRise({ price: 100, priceBreaks: breaks.slice(0, 1) })).toBe(false);
  expect(breaksRise({ priceBreaks: breaks.slice(1) })).toBe(false);
  expect(breaksRise({})).toBe(false);
});
