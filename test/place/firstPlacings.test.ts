import { describe, expect, test } from "vitest";
import { firstPlacing, largestFirst, snake } from "../../src/place/firstPlacings.ts";
import { stagesGap } from "./brute.ts";
import { capacitances, KINDS } from "./lots.ts";
import { differencingRival, largestFirstRival, snakeRival } from "./rivals.ts";

describe("snake, largestFirst, firstPlacing (values, stages)", () => {
  test("by hand: 6,5,4,3,2,1 in 3 stages by snake is 7,7,7", () => {
    expect(snake([6, 5, 4, 3, 2, 1], 3).map((g) => g.map((i) => 6 - i))).toEqual([
      [6, 1],
      [5, 2],
      [4, 3],
    ]);
  });
  test("never worse than the rules written out again, 80 lots; every stage gets the same count", () => {
    for (const kind of KINDS) {
      for (let seed = 1; seed <= 20; seed++) {
        const lot = capacitances(kind, 60, seed);
        const rivals = [snakeRival, largestFirstRival, differencingRival].map((rule) => stagesGap(lot, rule(lot, 6)));
        const made = firstPlacing(lot, 6);
        expect(made.every((group) => group.length === 10)).toBe(true);
        expect(new Set(made.flat()).size).toBe(60);
        expect(stagesGap(lot, made)).toBeLessThanOrEqual(Math.min(...rivals) + 1e-12);
        expect(stagesGap(lot, largestFirst(lot, 6))).toBeCloseTo(rivals[1]!, 12);
      }
    }
  });
});
