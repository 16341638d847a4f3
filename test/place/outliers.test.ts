import { describe, expect, test } from "vitest";
import { outerFences, outliersOf } from "../../src/place/outliers.ts";
import { KINDS, units } from "./lots.ts";

describe("outerFences(values, slack)", () => {
  test("by hand: quartiles of 1..9 are 3 and 7, so the fences are -9 and 19", () => {
    expect(outerFences([9, 1, 8, 2, 7, 3, 6, 4, 5], 0)).toEqual({ low: -9, high: 19 });
  });
  test("equal values: only the slack counts; fewer than five: nothing is out", () => {
    expect(outerFences([5, 5, 5, 5, 5], 0.5)).toEqual({ low: 4.5, high: 5.5 });
    expect(outerFences([1, 1, 1, 100], 0).high).toBe(Number.POSITIVE_INFINITY);
  });
});

describe("outliersOf(units, uncertainty)", () => {
  test("a wild capacitance, a wild leakage and a wild ESR are each named; a low ESR is not", () => {
    const lot = units("normal", 20, 1, 0.3).map((unit, i) => ({ ...unit, esr: i === 3 ? 0.8 : i === 4 ? 1e-4 : 0.08 }));
    const wild = lot.map((unit, i) =>
      i === 1 ? { ...unit, capacitance: 1.6e-3 } : i === 2 ? { ...unit, leakage: 0.1 } : unit,
    );
    expect(outliersOf(wild, 0.003).map((o) => [o.serial, o.quantity])).toEqual([
      ["U002", "capacitance"],
      ["U003", "leakage"],
      ["U004", "esr"],
    ]);
  });
  test("lots cut at +-10 %, and two lots 8 % apart, hold no outlier: 200 lots", () => {
    for (const kind of KINDS) {
      for (let seed = 1; seed <= 50; seed++) expect(outliersOf(units(kind, 24, seed), 0.003)).toEqual([]);
    }
  });
});
