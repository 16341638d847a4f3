// Bars against a limit: over and under must never look alike, however few cells there are.

import { describe, expect, test } from "vitest";
import { drawBar } from "../../src/tui/bar.ts";
import fc from "../support/property.ts";

const bar = (value: number, limit: number | null, columns = 10, ascii = true) =>
  drawBar(value, { columns, full: 100, limit, ascii });

describe("drawBar(value, options)", () => {
  test.each([
    [0, null, ".........."],
    [-5, null, ".........."],
    [1, null, "#........."],
    [50, null, "#####....."],
    [100, null, "##########"],
    [1e300, null, "##########"],
    [Number.NaN, 80, ".........."],
    [50, 80, "#####..|.."],
    [80, 80, "#######|.."],
    [79.9, 80, "#######|.."],
    [80.1, 80, "#########."],
    [100, 80, "##########"],
  ])("%d with limit %s is %s", (value, limit, want) => {
    expect(bar(value, limit)).toBe(want);
  });
  test("no room is empty, and a full scale of nothing draws none", () => {
    expect(bar(50, 80, 0)).toBe("");
    expect(drawBar(1, { columns: 3, full: 0, limit: null, ascii: true })).toBe("...");
  });
  test("the limit mark is seen if and only if the value is within it", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 120, noNaN: true }),
        fc.double({ min: 1, max: 100, noNaN: true }),
        fc.integer({ min: 1, max: 60 }),
        (value, limit, columns) => {
          const drawn = bar(value, limit, columns);
          expect(drawn.length).toBe(columns);
          expect(drawn.includes("|")).toBe(value <= limit);
        },
      ),
      { numRuns: 1000, seed: 8 },
    );
  });
});
