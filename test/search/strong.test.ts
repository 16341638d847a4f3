// Strong rows: they beat what all pairs say they beat, and a few of them beat most of a table.
import { describe, expect, test } from "vitest";
import { beats, isBeaten, strongOf } from "../../src/search/strong.ts";
import { type Figures, figuresAt, type LayoutTable, newTable, noFigures, pushRow } from "../../src/search/table.ts";
import { chance } from "../support/random.ts";

const INF = Number.POSITIVE_INFINITY;
const figures = (cost: number, volume: number, mass: number, units: number, stress: number): Figures => ({
  cost,
  volume,
  mass,
  units,
  stress,
});

function randomTable(seed: number, count: number): LayoutTable {
  const c = chance(seed);
  const steps = c.pick([3, 20, 1000]);
  const value = (): number => (c.maybe(0.1) ? INF : c.whole(1, steps) / steps);
  const table = newTable(count);
  for (let part = 0; part < count; part++) {
    const row = { part, series: c.whole(1, steps), parallel: 1, tied: false, family: -1 };
    pushRow(table, { ...row, cost: value(), volume: value(), mass: value(), stress: value() });
  }
  return table;
}
const rowsOf = (table: LayoutTable): number[] => Array.from({ length: table.count }, (_, i) => i);

describe("beats(a, b)", () => {
  const one = figures(2, 2, 2, 2, 0.5);
  test("equal figures do not beat each other, unknown included", () => {
    expect(beats(one, { ...one })).toBe(false);
    expect(beats(figures(INF, INF, INF, 2, INF), figures(INF, INF, INF, 2, INF))).toBe(false);
  });
  test.each(["cost", "volume", "mass", "units", "stress"] as const)("%s alone decides, and alone prevents", (key) => {
    expect(beats({ ...one, [key]: 0.1 }, one)).toBe(true);
    expect(beats(one, { ...one, [key]: INF })).toBe(true);
    expect(beats({ ...figures(1, 1, 1, 1, 0.1), [key]: 3 }, one)).toBe(false);
  });
});

describe("strongOf(table, search), isBeaten(strong, figures)", () => {
  test("none of none: nothing is beaten", () => {
    const strong = strongOf(newTable(1), { candidates: [], tried: [], ahead: 1e6 });
    expect(strong.rows.length).toBe(0);
    expect(isBeaten(strong, figures(INF, INF, INF, INF, INF))).toBe(false);
  });
  test("60 random tables: what is called beaten is beaten by a row of the table, and so is whatever is worse", () => {
    let beaten = 0;
    for (let seed = 0; seed < 60; seed++) {
      const table = randomTable(seed, 150);
      const all = rowsOf(table);
      const strong = strongOf(table, { candidates: all, tried: all, ahead: 1e6 });
      for (const row of all) {
        const own = figuresAt(table, row, noFigures());
        if (!isBeaten(strong, own)) continue;
        beaten++;
        expect(all.some((other) => beats(figuresAt(table, other, noFigures()), own))).toBe(true);
        expect(isBeaten(strong, { ...own, cost: own.cost * 2, stress: own.stress * 1.5 })).toBe(true);
      }
    }
    expect(beaten).toBeGreaterThan(3000);
  });
  test("they leave no row of a small table that another row beats", () => {
    for (let seed = 100; seed < 130; seed++) {
      const table = randomTable(seed, 40);
      const all = rowsOf(table);
      const strong = strongOf(table, { candidates: all, tried: all, ahead: 1e6 });
      for (const row of all) {
        const own = figuresAt(table, row, noFigures());
        const slow = all.some((other) => beats(figuresAt(table, other, noFigures()), own));
        expect(isBeaten(strong, own), `table ${seed} row ${row}`).toBe(slow);
      }
    }
  });
});
