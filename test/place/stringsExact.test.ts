import { describe, expect, test } from "vitest";
import { finish } from "../../src/place/charging.ts";
import { effort } from "../../src/place/effort.ts";
import { exactStrings } from "../../src/place/stringsExact.ts";
import { bestGap, stringsGap } from "./brute.ts";
import { capacitances, wholes } from "./lots.ts";

describe("exactStrings(problem, work)", () => {
  test("equals full enumeration on 250 small lots, with and without spares and equal units", () => {
    const shapes = [
      [3, 2, 0],
      [3, 3, 0],
      [4, 2, 0],
      [2, 4, 0],
      [3, 2, 2],
      [4, 2, 1],
      [2, 3, 2],
    ] as const;
    for (let seed = 1; seed <= 250; seed++) {
      const [series, strings, spares] = shapes[seed % shapes.length]!;
      const values = wholes(series * strings + spares, seed, seed % 4 === 0 ? 95 : 50, seed % 4 === 0 ? 105 : 150);
      const order = values.map((_, i) => i).sort((a, b) => values[a]! - values[b]!);
      const falling = Float64Array.from(order, (i) => 1 / values[i]!);
      const search = exactStrings(
        { falling, series, strings, inHand: 0, target: Number.POSITIVE_INFINITY },
        effort(1e8),
      );
      const answer = finish(search);
      expect(answer.proven).toBe(true);
      const groups = answer.groups!.map((string) => string.map((k) => order[k]!));
      const best = bestGap(values, { groups: strings, size: series }, stringsGap);
      expect(stringsGap(values, groups)).toBeCloseTo(best, 11);
      expect(series / answer.least - 1).toBeCloseTo(best, 11);
    }
  });
  test("out of effort: not proven", () => {
    const falling = Float64Array.from(capacitances("lots", 60, 2), (c) => 1 / c)
      .sort()
      .reverse();
    const search = exactStrings({ falling, series: 6, strings: 10, inHand: 5, target: 6 }, effort(5000));
    expect(finish(search).proven).toBe(false);
  });
});
