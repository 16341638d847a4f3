// The order of layouts, and the first few of many without sorting all.
import { describe, expect, test } from "vitest";
import type { Capacitor } from "../../src/catalog/index.ts";
import { comparison, firstRows, idOf, RANKINGS, tiesOf } from "../../src/search/rank.ts";
import { newTable, pushRow } from "../../src/search/table.ts";
import { chance } from "../support/random.ts";

const parts = ["b", "a", "C"].map(
  (part): Capacitor => ({ part, capacitance: 1, voltage: 1, states: {}, file: "", line: 2 }),
);
const INF = Number.POSITIVE_INFINITY;
interface Row {
  part?: number;
  series?: number;
  parallel?: number;
  tied?: boolean;
  cost?: number;
  volume?: number;
  mass?: number;
  stress?: number;
}
const table = (rows: readonly Row[]) => {
  const made = newTable(Math.max(1, rows.length));
  for (const row of rows)
    pushRow(made, {
      part: 0,
      series: 2,
      parallel: 2,
      tied: false,
      family: -1,
      cost: 1,
      volume: 1,
      mass: 1,
      stress: 0.5,
      ...row,
    });
  return made;
};
const order = (rows: readonly Row[], by: (typeof RANKINGS)[number] = "cost"): readonly number[] => {
  const made = table(rows);
  return firstRows(made.count, 0, comparison(made, parts, by));
};

describe("comparison(table, parts, by)", () => {
  test("cost, then units, then volume, then name by character code", () => {
    expect(order([{ cost: 2 }, { cost: 1 }])).toEqual([1, 0]);
    expect(order([{ series: 3 }, { series: 2 }])).toEqual([1, 0]);
    expect(order([{ volume: 2 }, { volume: 1 }])).toEqual([1, 0]);
    expect(order([{ part: 0 }, { part: 1 }, { part: 2 }])).toEqual([2, 1, 0]);
    expect(order([{ tied: false }, { tied: true }])).toEqual([1, 0]);
  });
  test("no price, no size: after all that are known; not assessed: after all that are", () => {
    expect(order([{ cost: INF }, { cost: 1e9 }])).toEqual([1, 0]);
    expect(order([{ volume: INF }, { volume: 1e9 }])).toEqual([1, 0]);
    expect(
      order([
        { stress: INF, cost: 1 },
        { stress: 0.9, cost: 1e9 },
      ]),
    ).toEqual([1, 0]);
    expect(
      order([
        { stress: INF, cost: 1 },
        { stress: 0.9, cost: INF },
      ]),
    ).toEqual([1, 0]);
  });
  test.each(RANKINGS)("by %s first, the standing order after", (by) => {
    const low = { [by === "units" ? "series" : by]: by === "units" ? 1 : 0.1 };
    const high = { [by === "units" ? "series" : by]: by === "units" ? 3 : 0.9 };
    expect(
      order(
        [
          { ...high, cost: by === "cost" ? 0.9 : 1 },
          { ...low, cost: by === "cost" ? 0.1 : 2 },
        ],
        by,
      ),
    ).toEqual([1, 0]);
    expect(order([{ part: 0 }, { part: 1 }], by)).toEqual([1, 0]);
  });
});

describe("idOf, tiesOf", () => {
  test("the layout's own name", () => {
    const made = table([{ part: 1, series: 6, parallel: 10, tied: true }]);
    expect(idOf(made, parts, 0)).toBe("a 6s10p cross-tied");
    expect(tiesOf(made, 0)).toBe("cross-tied");
  });
});

describe("firstRows(count, limit, compare)", () => {
  test("none of none, all when the limit is 0 or more than there are", () => {
    const up = (a: number, b: number): number => a - b;
    expect(firstRows(0, 5, up)).toEqual([]);
    expect(firstRows(3, 0, up)).toEqual([0, 1, 2]);
    expect(firstRows(3, 3, up)).toEqual([0, 1, 2]);
    expect(firstRows(3, 99, (a, b) => b - a)).toEqual([2, 1, 0]);
  });
  test("the first k are those of the whole sort, 200 random cases with ties", () => {
    const c = chance(71);
    for (let i = 0; i < 200; i++) {
      const keys = Array.from({ length: c.whole(1, 200) }, () => c.whole(0, 20));
      const compare = (a: number, b: number): number => keys[a]! - keys[b]! || a - b;
      const all = keys.map((_, k) => k).sort(compare);
      const limit = c.whole(1, keys.length);
      expect(firstRows(keys.length, limit, compare)).toEqual(all.slice(0, limit));
    }
  });
});
