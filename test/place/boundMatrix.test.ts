import { describe, expect, test } from "vitest";
import {
  gapFromLeast,
  leastShortfall,
  matrixBound,
  pigeonholeLeast,
  sharedTops,
  topsOf,
} from "../../src/place/boundMatrix.ts";
import { bestGap, stagesGap } from "./brute.ts";
import { wholes } from "./lots.ts";

const bound = (values: readonly number[], stages: number, size: number, whole = true) =>
  matrixBound(Float64Array.from(values), { stages, size, whole });

describe("leastShortfall(tops, stages, total, least), gapFromLeast(tops, stages, most)", () => {
  const open = [1e9, 1e9, 75];
  test("an even division gives 0; the whole-number case is attained by (q, ..., q, q + r)", () => {
    expect(gapFromLeast(open, 3, 25)).toBe(0);
    expect(gapFromLeast(open, 3, 24)).toBeCloseTo(1 / 26, 15);
  });
  test("the fullest stage holds no more than its largest units: 24, 25, 26 in place of 24, 24, 27", () => {
    expect(leastShortfall([26, 1e9, 75], 3, 75, 24)).toBeCloseTo(1 / 25 + 2 / 26, 15);
  });
  test("sums that cannot be, because the fullest cannot hold enough, are told by infinity", () => {
    expect(leastShortfall([26, 49, 75], 3, 75, 26)).toBe(Number.POSITIVE_INFINITY);
  });
});

describe("topsOf and sharedTops", () => {
  const falling = [13, 12, 11, 10, 3, 2, 2, 1, 1];
  test("the k fullest of three stages of three hold at most the 3 k largest", () => {
    expect([...topsOf(falling, 3, 3, new Float64Array(3))]).toEqual([36, 51, 55]);
  });
  test("when every stage must hold one of the four large units, the fullest holds two of them, the two fullest three", () => {
    const tops = topsOf(falling, 3, 3, new Float64Array(3));
    sharedTops(falling, { stages: 3, size: 3, least: 12 }, tops);
    expect([...tops]).toEqual([13 + 12 + 3, 13 + 12 + 11 + 3 + 2 + 2, 55]);
  });
  test("no stage needs a large unit: nothing is lowered", () => {
    const tops = topsOf(falling, 3, 3, new Float64Array(3));
    sharedTops(falling, { stages: 3, size: 3, least: 4 }, tops);
    expect([...tops]).toEqual([36, 51, 55]);
  });
});

describe("pigeonholeLeast(descending, stages, size)", () => {
  test("one outlier: the two other stages share at most the six largest ordinary units, 6005/2 by hand", () => {
    const values = Float64Array.from([1600, 1003, 1002, 1001, 1000, 1000, 999, 998, 997]);
    expect(pigeonholeLeast(values, 3, 3)).toBe(3002.5);
  });
  test("one unit a stage: the smallest unit is the bound", () => {
    expect(pigeonholeLeast(Float64Array.from([9, 7, 4]), 3, 1)).toBe(4);
  });
});

describe("matrixBound(values, shape)", () => {
  test("with spares, or one stage, nothing but 0 is claimed", () => {
    expect(bound([1, 2, 3, 4, 5], 2, 2)).toEqual({ gap: 0, kind: "even share" });
    expect(bound([1, 2, 3, 4], 1, 4)).toEqual({ gap: 0, kind: "even share" });
  });

  test("never above the optimum of full enumeration, 600 small lots with outliers and two-valued lots", () => {
    const shapes = [
      [2, 3],
      [3, 2],
      [3, 3],
      [4, 2],
      [2, 4],
    ] as const;
    let tight = 0;
    for (let seed = 1; seed <= 600; seed++) {
      const [stages, size] = shapes[seed % shapes.length]!;
      const values = wholes(stages * size, seed).map((v, i) =>
        seed % 3 === 0 ? (v > 100 ? 120 : 100) : seed % 3 === 1 && i === 0 ? 3 * v : v,
      );
      const best = bestGap(values, { groups: stages, size }, stagesGap);
      const { gap } = bound(values, stages, size);
      expect(gap).toBeLessThanOrEqual(best + 1e-12);
      if (best - gap < 1e-12) tight++;
    }
    expect(tight).toBeGreaterThan(200);
  });
});
