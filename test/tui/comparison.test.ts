// Side by side: the best and the worst found by the right end, unknown never the best, agreement seen.
import { describe, expect, test } from "vitest";
import type { LayoutResult } from "../../src/search/index.ts";
import { compareLayouts, foldedRows } from "../../src/tui/comparison.ts";
import { BRIEF, engine } from "../support/stock.ts";

const read = engine.readBrief(BRIEF);
if (!read.ok) throw new Error("brief");
const base = engine.check(read.value, { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" }) as LayoutResult;
const made = (changes: Partial<LayoutResult>): LayoutResult => ({ ...base, ...changes });
const row = (layouts: readonly (LayoutResult | null)[], label: string) => {
  const found = compareLayouts(layouts).find((one) => one.label === label);
  if (found === undefined) throw new Error(label);
  return found;
};
const standings = (layouts: readonly (LayoutResult | null)[], label: string) =>
  row(layouts, label).cells.map((cell) => cell.standing);

describe("compareLayouts(layouts)", () => {
  test("of none and of one: nothing is best or worst", () => {
    expect(compareLayouts([]).every((r) => r.cells.length === 0 && !r.agrees)).toBe(true);
    expect(compareLayouts([base]).every((r) => r.cells.every((c) => c.standing === null))).toBe(true);
  });
  test("of two that are alike: every row agrees", () => {
    expect(compareLayouts([base, made({})]).every((r) => r.agrees)).toBe(true);
  });
  test("less mass is better, more energy is better, and capacitance is neither", () => {
    const light = made({
      mass: 1,
      energy: { low: 9e3, nominal: 9.5e3, high: 1e4 },
      capacitance: { low: 1, nominal: 2, high: 3 },
    });
    expect(standings([base, light], "mass")).toEqual(["worst", "best"]);
    expect(standings([base, light], "energy, least")).toEqual(["worst", "best"]);
    expect(standings([base, light], "C, least")).toEqual([null, null]);
  });
  test("of four: one best, one worst, the middle ones neither; ties share", () => {
    const masses = [3, 1, 2, 1].map((mass) => made({ mass }));
    expect(standings(masses, "mass")).toEqual(["worst", "best", null, "best"]);
    expect(row(masses, "mass").cells.map((c) => c.beyondBest)).toEqual([2, null, 1, null]);
  });
  test("unknown is neither best nor worst, and does not agree with a number", () => {
    const unknown = made({ mass: null });
    expect(standings([base, unknown], "mass")).toEqual([null, null]);
    expect(standings([base, unknown, made({ mass: 1e9 })], "mass")).toEqual(["best", null, "worst"]);
    expect(row([base, unknown], "mass").agrees).toBe(false);
  });
  test("a cost that leaves lines out is not ranked: it could be any", () => {
    const cost = base.cost;
    if (cost === null) throw new Error("cost");
    const cheap = made({ cost: { ...cost, total: 0.01, unpriced: ["capacitors"] } });
    expect(standings([base, cheap], "total cost")).toEqual([null, null]);
    expect(row([base, cheap], "total cost").cells[1]?.text).toMatch(/^≥ 0\.01 /);
  });
  test("a layout that the catalogue no longer has says so in every row", () => {
    expect(row([base, null], "mass").cells[1]?.text).toBe("not in catalogue");
  });
  test("values that print alike agree, and none of them is called best", () => {
    const near = made({ mass: (base.mass ?? 1) * (1 + 1e-9) });
    expect(row([base, near], "mass").agrees).toBe(true);
    expect(standings([base, near], "mass")).toEqual([null, null]);
  });
});

describe("differences and order", () => {
  test("the difference to the best has its sign and unit, absolute and relative; the best has none", () => {
    const masses = [3, 2].map((mass) => made({ mass }));
    expect(row(masses, "mass").cells.map(({ difference, beyondBest }) => [difference, beyondBest])).toEqual([
      ["+1 kg", 0.5],
      [null, null],
    ]);
    const energies = [1e3, 2e3].map((low) => made({ energy: { low, nominal: low, high: low } }));
    expect(row(energies, "energy, least").cells[0]).toMatchObject({ difference: "-1 kJ", beyondBest: -0.5 });
  });
  test("a part of a whole differs in points, not in percent of a percent", () => {
    const cell = row([made({ stress: 0.9 }), made({ stress: 0.8 })], "worst of rating").cells[0];
    expect(cell).toMatchObject({ difference: "+10 points", beyondBest: null });
  });
  test("order: best first by its right end, unknown last, names by letter, alike as they stand", () => {
    const masses = [3, null, 1, 2].map((mass) => made({ mass }));
    expect(row(masses, "mass").order).toEqual([2, 3, 0, 1]);
    const energies = [1, 3, 2].map((low) => made({ energy: { low, nominal: low, high: low } }));
    expect(row(energies, "energy, least").order).toEqual([1, 2, 0]);
    expect(row([made({ part: "b" }), made({ part: "a" })], "part").order).toEqual([1, 0]);
    expect(row([base, base], "mass").order).toEqual([0, 1]);
  });
  test("foldedRows: what agrees is folded unless asked for; one layout has all its rows", () => {
    const pair = [base, made({ mass: 1 })];
    expect(foldedRows(pair, false).shown.map(({ label }) => label)).toEqual(["mass"]);
    expect(foldedRows(pair, false).folded.length + 1).toBe(compareLayouts(pair).length);
    expect(foldedRows(pair, true).folded).toEqual([]);
    expect(foldedRows([base], false).shown.length).toBeGreaterThan(10);
  });
});
