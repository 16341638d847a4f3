// A bar against marks: exact width, and never a bar that looks on the wrong side of a mark.

import { describe, expect, test } from "vitest";
import { marksBar } from "../../src/tui/marksBar.ts";
import fc from "../support/property.ts";

const options = {
  columns: 10,
  full: 100,
  marks: [
    { at: 80, letter: "L" },
    { at: 100, letter: "R" },
  ],
  ascii: true,
};

describe("marksBar(value, options)", () => {
  test.each([
    [Number.NaN, ".......L.R"],
    [0, ".......L.R"],
    [-5, ".......L.R"],
    [5, "#......L.R"],
    [79.9, "#######L.R"],
    [80, "#######L.R"],
    [80.1, "#######L#R"],
    [100, "#######L#R"],
    [500, "#######L#R"],
    [Number.POSITIVE_INFINITY, "#######L#R"],
  ])("%d", (value, want) => {
    expect(marksBar(value, options)).toBe(want);
  });
  test("no room, and nothing to stand for", () => {
    expect(marksBar(1, { ...options, columns: 0 })).toBe("");
    expect(marksBar(1, { ...options, full: 0 })).toBe("..........");
    expect(marksBar(1, { ...options, columns: 1 })).toBe("R");
    expect(marksBar(50, { ...options, marks: [{ at: Number.NaN, letter: "L" }] })).toBe("#####.....");
  });
  test("exactly as wide as asked; one limit: cells after it are filled only by what is over it", () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 3, max: 80 }),
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.double({ min: 0.1, max: 0.9, noNaN: true }),
        (columns, value, at) => {
          const bar = marksBar(value, { columns, full: 1, marks: [{ at, letter: "L" }], ascii: true });
          expect(bar).toHaveLength(columns);
          const after = bar.slice(bar.indexOf("L") + 1);
          if (value <= at) expect(after).not.toContain("#");
          else if (after !== "") expect(after[0]).toBe("#");
        },
      ),
    );
  });
});
