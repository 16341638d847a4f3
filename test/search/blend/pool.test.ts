// Columns for the bound: counts of use, and hulls that never lie above the table.
import { expect, test } from "vitest";
import { buildPool, lowerHull, stringsToReach, usefulStrings } from "../../../src/search/blend/pool.ts";
import { plainModel, plainOption, tinyModel } from "../../support/blendModels.ts";

test("stringsToReach(need, each) is settled by multiplication: 0.3 of 0.1 is three, a hair more is four", () => {
  expect(stringsToReach(0.1 * 3, 0.1)).toBe(3);
  expect(stringsToReach(0.30000000000000016, 0.1)).toBe(4);
  expect(stringsToReach(0, 1)).toBe(0);
  expect(stringsToReach(-1, 1)).toBe(0);
  expect(stringsToReach(1, 1e-300)).toBeGreaterThan(2 ** 31);
});

test("usefulStrings: the least of stock, need, and each ceiling", () => {
  const option = { capacity: 1e-4, most: 50, price: 1, volume: 1e-3, mass: 0.2, units: 4 };
  const count = (limits: object) => usefulStrings(plainModel(1e-3, [option], limits), plainOption(option));
  expect(count({})).toBe(10);
  expect(count({ volume: 7e-3 })).toBe(7);
  expect(count({ mass: 1.2 })).toBe(6);
  expect(count({ units: 23 })).toBe(5);
  expect(count({ volume: 7e-3, mass: 1.2, units: 23 })).toBe(5);
  expect(count({ volume: 0 })).toBe(0);
  expect(usefulStrings(plainModel(1, [option]), plainOption(option))).toBe(50);
});

test("lowerHull: on or below every cost, touching it at its corners", () => {
  const hull = lowerHull(Float64Array.of(0, 10, 24, 25, 60, 61, 62), 6);
  expect(hull).toEqual({ x: [1, 3, 6], cost: [10, 25, 62] });
  for (let seed = 0; seed < 200; seed += 1) {
    for (const { costs, maxStrings } of tinyModel(seed).options) {
      if (maxStrings < 1) continue;
      const { x, cost } = lowerHull(costs, maxStrings);
      expect([x[0], x.at(-1)]).toEqual([1, maxStrings]);
      for (let at = 1; at < x.length; at += 1) {
        for (let s = x[at - 1]!; s <= x[at]!; s += 1) {
          const line = cost[at - 1]! + ((cost[at]! - cost[at - 1]!) * (s - x[at - 1]!)) / (x[at]! - x[at - 1]!);
          expect(costs[s]!).toBeGreaterThanOrEqual(line - 1e-9);
        }
      }
    }
  }
});

test("buildPool leaves out what cannot be used, and takes floors only when not exact", () => {
  const model = plainModel(1e-3, [
    { capacity: 1e-4, most: 0, price: 1 },
    { capacity: 1e-4, most: 5, price: [9, 10, 30, 31, 32] },
  ]);
  const lazy = { ...model, options: [model.options[0]!, { ...model.options[1]!, floor: { fixed: 0, perString: 5 } }] };
  const pool = buildPool(lazy, null, false);
  expect(pool.size).toBe(1);
  expect(pool.option[0]).toBe(1);
  expect([...pool.hullX.subarray(0, 2)]).toEqual([1, 5]);
  expect([...pool.hullCost.subarray(0, 2)]).toEqual([5, 25]);
  expect(pool.start[1]).toBe(2);
  expect([...buildPool(lazy, null, true).hullCost.subarray(0, 3)]).toEqual([9, 10, 32]);
});

test("buildPool: a floor with a level is a hull of three corners, none above the table", () => {
  // A minimum order of 40 for up to four strings, then 10 each.
  const model = plainModel(1, [{ capacity: 0.1, most: 8, price: [40, 40, 40, 40, 50, 60, 70, 80] }]);
  const floor = { fixed: 0, perString: 10, least: 40 };
  const pool = buildPool({ ...model, options: [{ ...model.options[0]!, floor }] }, null, false);
  const used = pool.start[1]!;
  expect([...pool.hullX.subarray(0, used)]).toEqual([1, 4, 8]);
  expect([...pool.hullCost.subarray(0, used)]).toEqual([40, 40, 80]);
});
