import { describe, expect, test } from "vitest";
import { cutStrings, evenness } from "../../src/place/stringsCut.ts";
import { bestGap, stagesGap, stringsGap } from "./brute.ts";
import { wholes } from "./lots.ts";
import { cutRival } from "./rivals.ts";

describe("evenness(elastances)", () => {
  test("equal units: their count; 1 and 1/2: 3/2", () => {
    expect(evenness([2, 2, 2])).toBe(3);
    expect(evenness([1, 0.5])).toBe(1.5);
  });
});

describe("cutStrings(capacitances, series, strings)", () => {
  test("optimal for two in series, with and without spares, 120 lots", () => {
    for (let seed = 1; seed <= 120; seed++) {
      const values = wholes(6 + (seed % 3), seed);
      const best = bestGap(values, { groups: 3, size: 2 }, stringsGap);
      expect(stringsGap(values, cutStrings(values, 2, 3))).toBeCloseTo(best, 12);
    }
  });
  test("optimal for one string, which is also one unit a stage, 60 lots", () => {
    for (let seed = 1; seed <= 60; seed++) {
      const values = wholes(7, seed);
      const one = cutStrings(values, 4, 1);
      expect(stringsGap(values, one)).toBeCloseTo(bestGap(values, { groups: 1, size: 4 }, stringsGap), 12);
      const stages = one[0]!.map((i) => [i]);
      expect(stagesGap(values, stages)).toBeCloseTo(bestGap(values, { groups: 4, size: 1 }, stagesGap), 12);
    }
  });
  test("never worse than sort-and-cut without spares, and equal to it", () => {
    const values = wholes(24, 9);
    expect(stringsGap(values, cutStrings(values, 4, 6))).toBeCloseTo(stringsGap(values, cutRival(values, 4)), 12);
  });
});
