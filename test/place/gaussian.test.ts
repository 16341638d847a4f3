import { describe, expect, test } from "vitest";
import { cholesky, excess, logDensity, whiten } from "../../src/place/gaussian.ts";
import { seeded } from "../../src/place/random.ts";
import { normal } from "./lots.ts";

describe("cholesky, whiten, logDensity", () => {
  test("by hand: [[4, 2], [2, 5]] has the triangle [[2, 0], [1, 2]]", () => {
    expect(
      cholesky([
        [4, 2],
        [2, 5],
      ]),
    ).toEqual([
      [2, 0],
      [1, 2],
    ]);
    expect(
      whiten(
        [
          [2, 0],
          [1, 2],
        ],
        [2, 5],
      ),
    ).toEqual([1, 2]);
  });
  test("the squares of whitened residuals are r' S^-1 r, and the density has ln det S / 2", () => {
    const lower = cholesky([
      [4, 2],
      [2, 5],
    ]);
    // S^-1 = [[5, -2], [-2, 4]]/16; r = (1, 3): (5 - 12 + 36)/16 = 29/16.
    expect(logDensity(lower, [1, 3])).toBeCloseTo(-29 / 32 - Math.log(16) / 2, 12);
  });
});

describe("excess(chiSquared, freedom)", () => {
  // Chi-squared tables: the point passed once in a thousand is 10.828 (1), 29.588 (10), 59.703 (30).
  test.each([
    [10.828, 1],
    [29.588, 10],
    [59.703, 30],
  ])("%f of %i is about 3.09 standard deviations", (x, k) => {
    expect(Math.abs(excess(x, k) - 3.09)).toBeLessThan(k === 1 ? 0.2 : 0.03);
  });
  test("sums of squares of standard normal numbers exceed 2 about one time in 44", () => {
    const random = seeded(9);
    let above = 0;
    for (let k = 0; k < 5000; k++) {
      let sum = 0;
      for (let i = 0; i < 8; i++) sum += normal(random) ** 2;
      if (excess(sum, 8) > 2) above++;
    }
    expect(above / 5000).toBeGreaterThan(0.015);
    expect(above / 5000).toBeLessThan(0.032);
  });
});
