import { describe, expect, test } from "vitest";
import { finish } from "../../src/place/charging.ts";
import { effort } from "../../src/place/effort.ts";
import { seeded } from "../../src/place/random.ts";
import { descendStrings } from "../../src/place/stringsDescent.ts";
import { bestGap, stringsGap } from "./brute.ts";
import { capacitances, wholes } from "./lots.ts";
import { cutRival } from "./rivals.ts";

const run = (values: readonly number[], series: number, groups: readonly (readonly number[])[], moves: number) => {
  const placed = new Set(groups.flat());
  const slots = Int32Array.from([...groups.flat(), ...values.map((_, i) => i).filter((i) => !placed.has(i))]);
  const elastances = Float64Array.from(values, (c) => 1 / c);
  const strings = groups.length;
  finish(descendStrings({ series, strings, elastances, slots }, series, seeded(1), effort(moves)));
  return Array.from({ length: strings }, (_, s) => Array.from(slots.subarray(s * series, (s + 1) * series)));
};

describe("descendStrings(state, wanted, random, work)", () => {
  test("reaches the enumerated optimum of 3 strings of 3 in 40 of 40 lots", () => {
    for (let seed = 1; seed <= 40; seed++) {
      const values = wholes(9, seed);
      const made = run(
        values,
        3,
        [
          [0, 1, 2],
          [3, 4, 5],
          [6, 7, 8],
        ],
        100_000,
      );
      expect(stringsGap(values, made)).toBeCloseTo(bestGap(values, { groups: 3, size: 3 }, stringsGap), 12);
    }
  });
  test("6 x 10 of unequal lots: never worse than sort-and-cut, and better in most", () => {
    let better = 0;
    for (let seed = 1; seed <= 10; seed++) {
      const values = capacitances("lots", 60, seed);
      const cut = cutRival(values, 6);
      const after = stringsGap(values, run(values, 6, cut, 200_000));
      expect(after).toBeLessThanOrEqual(stringsGap(values, cut) + 1e-12);
      if (after < stringsGap(values, cut) - 1e-6) better++;
    }
    expect(better).toBeGreaterThan(6);
  });
});
