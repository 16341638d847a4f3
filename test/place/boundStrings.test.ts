import { describe, expect, test } from "vitest";
import { prefixLeast, stringsBound } from "../../src/place/boundStrings.ts";
import { bestGap, stringsGap } from "./brute.ts";
import { wholes } from "./lots.ts";

describe("prefixLeast(falling, series, strings)", () => {
  test("equal units: t is the number in series", () => expect(prefixLeast([2, 2, 2, 2, 2, 2], 3, 2)).toBe(3));
});

describe("stringsBound(capacitances, series, strings)", () => {
  test("never above the optimum of full enumeration, with and without spares, 300 small lots", () => {
    const shapes = [
      [2, 2, 0],
      [3, 2, 0],
      [2, 3, 1],
      [3, 2, 2],
      [4, 2, 1],
      [3, 3, 0],
    ] as const;
    for (let seed = 1; seed <= 300; seed++) {
      const [series, strings, spares] = shapes[seed % shapes.length]!;
      const values = wholes(series * strings + spares, seed);
      const best = bestGap(values, { groups: strings, size: series }, stringsGap);
      expect(stringsBound(values, series, strings).gap).toBeLessThanOrEqual(best + 1e-12);
    }
  });
});
