// Cost tables from a price list.
import { expect, test } from "vitest";
import { lazyOption, tabulateCosts } from "../../../src/search/blend/tabulate.ts";

/** 100 cents each, 80 from ten on (all units), in packs of 5, 40 to be had. */
const purchase = (units: number): number | null => {
  const dear = Math.ceil(units / 5) * 5;
  const cheap = Math.ceil(Math.max(units, 10) / 5) * 5;
  return cheap > 40 ? null : Math.min(dear < 10 ? dear * 100 : Number.POSITIVE_INFINITY, cheap * 80);
};

test("tabulateCosts: three units a string, packs and a price break, worked by hand", () => {
  const costs = tabulateCosts({
    purchase,
    unitsPerString: 3,
    resistorsPerString: 3,
    resistorPurchase: (n) => 10 * n,
    fixed: 50,
    mostStrings: 99,
  });
  // 3 units: a pack of 5 at 100. 6 units: 10 at 80 = 800 beats 10 at 100. 9: 800. 12: 15 at 80.
  expect([...costs.slice(0, 5)]).toEqual([0, 50 + 500 + 30, 50 + 800 + 60, 50 + 800 + 90, 50 + 1200 + 120]);
  expect(costs).toHaveLength(14);
});

test("tabulateCosts ends where units or resistors end, and is [0] when nothing can be had", () => {
  const all = {
    purchase,
    unitsPerString: 1,
    resistorsPerString: 1,
    resistorPurchase: (n: number) => (n > 4 ? null : n),
    fixed: 0,
    mostStrings: 99,
  };
  expect(tabulateCosts(all)).toHaveLength(5);
  expect([...tabulateCosts({ ...all, purchase: () => null })]).toEqual([0]);
});

test("tabulateCosts levels a list under which more cost less", () => {
  const list = [0, 100, 90, 95];
  const costs = tabulateCosts({
    purchase: (n) => list[n] ?? null,
    unitsPerString: 1,
    resistorsPerString: 0,
    resistorPurchase: () => null,
    fixed: 0,
    mostStrings: 3,
  });
  expect([...costs]).toEqual([0, 90, 90, 95]);
});

test("lazyOption builds its table once, when first read", () => {
  let built = 0;
  const option = lazyOption(
    { capacity: 1, volume: 0, mass: 0, units: 1, maxStrings: 1, partIndex: 0 },
    { fixed: 0, perString: 1 },
    () => {
      built += 1;
      return Float64Array.of(0, 2);
    },
  );
  expect(built).toBe(0);
  expect(option.costs[1]).toBe(2);
  expect(option.costs[1]).toBe(2);
  expect(built).toBe(1);
});
