import { describe, expect, test } from "vitest";
import { chargingWorst } from "../../../src/bank/index.ts";
import { mendWords, widestTolerance } from "../../../src/search/sharing/mendWords.ts";

describe("mendWords(mends, series)", () => {
  test("tells each by how much", () =>
    expect(mendWords({ series: 9, tolerance: 0.012, voltage: 1912 }, 8)).toMatch(
      /9 in series instead of 8; resistors of 1\.2 % or tighter; a charge voltage of at most 1\.912 kV/,
    ));
  test("nothing helps: said", () =>
    expect(mendWords({ series: null, tolerance: null, voltage: null }, 8)).toMatch(/No more stages/));
});

describe("widestTolerance(voltage, series, limit)", () => {
  test("at it the worst share is the limit", () => {
    const t = widestTolerance(1600, 4, 450) as number;
    expect(chargingWorst(1600, 4, { low: t, high: t })).toBeCloseTo(450, 9);
  });
  test("null when even no tolerance is enough, and for one in series; at most all", () => {
    expect(widestTolerance(1600, 3, 450)).toBeNull();
    expect(widestTolerance(400, 1, 450)).toBeNull();
    expect(widestTolerance(100, 2, 450)).toBe(1);
  });
});
