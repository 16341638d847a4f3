// Braille plots, dot by dot (bits of the braille cell by Unicode block 2800: dots 1 2 3 7 left, 4 5 6 8 right).
import { describe, expect, test } from "vitest";
import { plotBraille } from "../../src/tui/plot.ts";

const unit = { low: 0, high: 1 };

describe("plotBraille(points, options)", () => {
  const one = (x: number, y: number) =>
    plotBraille([{ x, y }], { columns: 1, rows: 1, x: unit, y: unit, joined: false })[0];
  test.each([
    [0, 1, "\u2801"],
    [0, 0.67, "\u2802"],
    [0, 0.33, "\u2804"],
    [0, 0, "\u2840"],
    [1, 1, "\u2808"],
    [1, 0, "\u2880"],
    // outside, and no number
    [1.1, 0, "\u2800"],
    [0, -0.1, "\u2800"],
    [Number.NaN, 0, "\u2800"],
    [0, Number.POSITIVE_INFINITY, "\u2800"],
  ])("point (%d, %d) in one cell is %j", (x, y, want) => {
    expect(one(x, y)).toBe(want);
  });

  test("no room draws nothing, no points draws blanks of the size asked for", () => {
    expect(plotBraille([], { columns: 0, rows: 3, x: unit, y: unit, joined: false })).toEqual([]);
    expect(plotBraille([], { columns: 2, rows: 2, x: unit, y: unit, joined: false })).toEqual([
      "\u2800\u2800",
      "\u2800\u2800",
    ]);
  });
  test("a range with no width puts its one value in the middle", () => {
    const flat = { low: 5, high: 5 };
    expect(plotBraille([{ x: 5, y: 5 }], { columns: 1, rows: 1, x: flat, y: flat, joined: false })[0]).not.toBe(
      "\u2800",
    );
  });
  test("joined: a diagonal touches every cell on its way, apart: only the ends", () => {
    const ends = [
      { x: 0, y: 0 },
      { x: 1, y: 1 },
    ];
    const options = { columns: 3, rows: 3, x: unit, y: unit };
    expect(
      plotBraille(ends, { ...options, joined: true }).map((line) => [...line].filter((c) => c !== "\u2800").length),
    ).toEqual(
      [2, 1, 2].map((n) => expect.any(Number) && n).map((n) => expect.toSatisfy((got: number) => got >= 1 && got <= n)),
    );
    expect(plotBraille(ends, { ...options, joined: false })).toEqual([
      "\u2800\u2800\u2808",
      "\u2800\u2800\u2800",
      "\u2840\u2800\u2800",
    ]);
  });
  test("a gap in the numbers is a gap in the line", () => {
    const points = [0, 0.5, 1].map((x) => ({ x, y: x === 0.5 ? Number.NaN : 0 }));
    expect(plotBraille(points, { columns: 4, rows: 1, x: unit, y: unit, joined: true })).toEqual([
      "\u2840\u2800\u2800\u2880",
    ]);
  });
});
