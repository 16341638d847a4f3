// Strong rows: what they are said to beat is beaten, by hand and against all pairs.
import { describe, expect, test } from "vitest";
import { beats, isBeaten, strongOf } from "../../src/search/strong.ts";
import { figuresAt, newTable, noFigures, pushRow } from "../../src/search/table.ts";
import { chance } from "../support/random.ts";

const one = { cost: 10, volume: 1, mass: 1, units: 4, stress: 0.5 };

describe("beats(a, b)", () => {
  test("an equal is not beaten", () => expect(beats(one, one)).toBe(false));
  test.each(["cost", "volume", "mass", "units", "stress"] as const)(
    "better in %s alone beats, worse does not",
    (key) => {
      expect(beats({ ...one, [key]: one[key] / 2 }, one)).toBe(true);
      expect(beats({ ...one, [key]: one[key] * 2 }, one)).toBe(false);
    },
  );
  test("unknown is the worst", () => expect(beats(one, { ...one, volume: Number.POSITIVE_INFINITY })).toBe(true));
});

describe("strongOf, isBeaten", () => {
  test("2,000 random layouts: whatever is said to be beaten is, by one of the rows; most are", () => {
    const c = chance(5);
    const table = newTable();
    for (let i = 0; i < 2000; i++) {
      const [series, parallel] = [c.whole(1, 9), c.whole(1, 30)];
      const size = { volume: c.between(1, 9), mass: c.between(1, 9) };
      pushRow(table, {
        part: i,
        series,
        parallel,
        tied: false,
        family: -1,
        cost: c.between(1, 99),
        stress: c.between(0.1, 0.9),
        ...size,
      });
    }
    const rows = Array.from({ length: table.count }, (_, i) => i);
    const figures = rows.map((row) => figuresAt(table, row, noFigures()));
    const strong = strongOf(table, rows, rows);
    let said = 0;
    for (const own of figures) {
      if (!isBeaten(strong, own)) continue;
      said++;
      expect(figures.some((other) => beats(other, own))).toBe(true);
    }
    expect(said).toBeGreaterThan(300);
  });
});
