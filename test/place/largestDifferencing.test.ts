import { describe, expect, test } from "vitest";
import { largestDifferencing } from "../../src/place/largestDifferencing.ts";
import { stagesGap } from "./brute.ts";
import { capacitances } from "./lots.ts";

describe("largestDifferencing(values, stages)", () => {
  test("Yakir's example kind: 4,5,6,7,8 and 10 in two groups of three differ by the last difference only", () => {
    // Rows (4,5), (6,7), (8,10): the widest two fold to 13, 15 or so, and the last fold leaves 20 and 20.
    const values = [4, 5, 6, 7, 8, 10];
    const sums = largestDifferencing(values, 2).map((group) => group.reduce((s, i) => s + values[i]!, 0));
    expect(sums.sort()).toEqual([20, 20]);
  });
  test("one row and one stage pass through", () => {
    expect(largestDifferencing([3, 1, 2], 3).flat().sort()).toEqual([0, 1, 2]);
    expect(largestDifferencing([3, 1, 2], 1)[0]!.length).toBe(3);
  });
  test("the published size of its error: median 34 ppm and less than 120 ppm at 8 x 12 uniform", () => {
    const gaps = Array.from({ length: 41 }, (_, s) => {
      const lot = capacitances("uniform", 96, s + 1);
      return stagesGap(lot, largestDifferencing(lot, 8)) * 1e6;
    }).sort((a, b) => a - b);
    expect(gaps[20]!).toBeLessThan(120);
    expect(gaps[20]!).toBeGreaterThan(5);
  });
});
