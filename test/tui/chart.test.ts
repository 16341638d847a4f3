// Charts: exact size, curves told apart without colour, marks and levels where their values are.
import { describe, expect, test } from "vitest";
import { type ChartOptions, chartRows } from "../../src/tui/chart.ts";
import type { Row } from "../../src/tui/row.ts";
import { textWidth } from "../../src/tui/width.ts";

const text = (rows: readonly Row[]): readonly string[] =>
  rows.map(({ left }) => left.map((piece) => piece.text).join(""));
const chart = (changes: Partial<ChartOptions> = {}): readonly string[] =>
  text(
    chartRows({
      columns: 26,
      rows: 5,
      x: { low: 0, high: 10 },
      y: { low: 0, high: 10 },
      curves: [
        {
          points: [
            { x: 0, y: 0 },
            { x: 10, y: 10 },
          ],
          joined: true,
          glyph: "*",
        },
      ],
      top: "10 V",
      bottom: "0 V",
      under: ["0 s", "time", "10 s"],
      ascii: true,
      ...changes,
    }),
  );

describe("chartRows(options)", () => {
  test("a rising line in ASCII, ends of the axes named", () => {
    expect(chart()).toEqual([
      "10 V │                ****",
      "     │            **** ".padEnd(26),
      "     │        ****".padEnd(26),
      "     │    ****".padEnd(26),
      " 0 V │****".padEnd(26),
      "      0 s    time     10 s",
    ]);
  });
  test("braille: as wide as asked, dots only where the curve is", () => {
    const rows = chart({ ascii: false });
    expect(rows.map(textWidth)).toEqual([26, 26, 26, 26, 26, 26]);
    expect(rows[0]).toMatch(/^10 V │ {16}[\u2801-\u28ff]{4}$/);
  });
  test("a mark lies over the curve, at its value; outside the ranges it is left off", () => {
    const marks = [
      { at: { x: 10, y: 10 }, letter: "P" },
      { at: { x: 0, y: 0 }, letter: "N" },
      { at: { x: 11, y: 5 }, letter: "X" },
      { at: { x: Number.NaN, y: 5 }, letter: "Y" },
    ];
    const rows = chart({ marks });
    expect(rows[0]).toBe("10 V │                ***P");
    expect(rows[4]).toBe(" 0 V │N***".padEnd(26));
    expect(rows.join("")).not.toMatch(/[XY]/);
  });
  test("a level has its words at its height, beneath the curves; at the ends it moves to a free row", () => {
    const rows = chart({
      levels: [
        { y: 5, words: "half" },
        { y: 9.9, words: "near" },
      ],
    });
    expect(rows[2]).toBe("half │--------****--------");
    expect(rows[0]).toContain("10 V │----------------****");
    expect(rows[1]).toContain("near │");
  });
  test("a level outside the range is not drawn", () => {
    expect(chart({ levels: [{ y: 11, words: "over" }] }).join("")).not.toMatch(/over|-/);
  });
  test("the first curve lies on top of the others", () => {
    const points = [
      { x: 0, y: 10 },
      { x: 10, y: 10 },
    ];
    const curve = { points, joined: true };
    expect(
      chart({
        curves: [
          { ...curve, glyph: "a" },
          { ...curve, glyph: "b" },
        ],
      })[0],
    ).toBe(`10 V │${"a".repeat(20)}`);
  });
  test("no rows, no points, an empty range: nothing thrown, nothing wider", () => {
    expect(chart({ rows: 0 })).toEqual([]);
    expect(chart({ curves: [] })[2]).toBe("     │".padEnd(26));
    expect(chart({ y: { low: 3, high: 3 } })).toHaveLength(6);
    expect(chart({ columns: 4, ascii: false }).length).toBe(6);
  });
});
