import { describe, expect, test } from "vitest";
import { attainableGap, relativeSpread } from "../../src/place/attainable.ts";
import { bestGap, stagesGap } from "./brute.ts";
import { capacitances } from "./lots.ts";

const UNIFORM = 0.1 / Math.sqrt(3);

describe("attainableGap(shape)", () => {
  // Bovier-Kurkova asymptotics against exact optima that were found by enumeration.
  test.each([
    [4, 4, 16, 173],
    [4, 4, 24, 1.91],
    [4, 6, 24, 4.2],
    [5, 5, 25, 15],
    [5, 6, 30, 1.92],
    [3, 8, 24, 0.39],
  ])("%i x %i of %i uniform units: %f ppm", (series, parallel, measured, ppm) => {
    const gap = attainableGap({ series, parallel, measured, spread: UNIFORM }) * 1e6;
    expect(Math.abs(gap / ppm - 1)).toBeLessThan(0.05);
  });

  test("within a factor of 2.5 of the median of enumerated optima at 2 x 4", () => {
    const gaps = Array.from({ length: 41 }, (_, s) =>
      bestGap(capacitances("uniform", 8, s + 1), { groups: 2, size: 4 }, stagesGap),
    ).sort((a, b) => a - b);
    const ratio = attainableGap({ series: 2, parallel: 4, measured: 8, spread: UNIFORM }) / gaps[20]!;
    expect(ratio).toBeGreaterThan(0.4);
    expect(ratio).toBeLessThan(2.5);
  });

  test("nothing to balance: 0", () => {
    expect(attainableGap({ series: 1, parallel: 4, measured: 4, spread: 0.05 })).toBe(0);
    expect(attainableGap({ series: 4, parallel: 4, measured: 16, spread: 0 })).toBe(0);
  });
});

describe("relativeSpread(values)", () => {
  test("of 9 and 11 is sqrt(2)/10", () => expect(relativeSpread([9, 11])).toBeCloseTo(Math.SQRT2 / 10, 12));
});
