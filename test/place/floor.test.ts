import { describe, expect, test } from "vitest";
import { expectedLargest, gapFloor, honestDigits, voltageUncertainty } from "../../src/place/floor.ts";
import { stageGap } from "../../src/place/gap.ts";
import { seeded } from "../../src/place/random.ts";
import { normal } from "./lots.ts";

describe("expectedLargest(count)", () => {
  // Harter 1961, expected values of normal order statistics: n = 2, 3, 4, 5, 6, 8, 10, 20, 50.
  test.each([
    [1, 0],
    [2, 0.56419],
    [3, 0.84628],
    [4, 1.02938],
    [5, 1.16296],
    [6, 1.26721],
    [8, 1.4236],
    [10, 1.53875],
    [20, 1.86748],
    [50, 2.24907],
  ])("e(%i) is %f by Harter's table", (n, e) => expect(expectedLargest(n)).toBeCloseTo(e, 4));
});

describe("gapFloor(shape)", () => {
  const shape = { series: 4, parallel: 4, ties: "cross-tied", uncertainty: 0.001 } as const;
  test("u = 0.1 % at 4 x 4 gives 515 ppm, at 10 x 40 243 ppm", () => {
    expect(gapFloor(shape) * 1e6).toBeCloseTo(515, 0);
    expect(gapFloor({ ...shape, series: 10, parallel: 40 }) * 1e6).toBeCloseTo(243, 0);
  });
  test("one stage has nothing to share, and no uncertainty leaves no floor", () => {
    expect(gapFloor({ ...shape, series: 1 })).toBe(0);
    expect(gapFloor({ ...shape, uncertainty: 0 })).toBe(0);
  });
  test.each(["cross-tied", "strings"] as const)("%s: near the mean gap of perfect units misread by u", (ties) => {
    const random = seeded(3);
    const draw = (count: number) => Array.from({ length: count }, () => 1 + 0.01 * normal(random));
    let sum = 0;
    const tries = 2000;
    for (let k = 0; k < tries; k++) {
      const groups = Array.from({ length: 4 }, () => draw(4));
      if (ties === "cross-tied")
        sum += stageGap(
          groups.map((g) => g.reduce((s, v) => s + v, 0)),
          4,
        );
      else sum += Math.max(...groups.map((g) => stageGap(g, 4)));
    }
    const floor = gapFloor({ ...shape, ties, uncertainty: 0.01 });
    expect(floor / (sum / tries)).toBeGreaterThan(0.95);
    expect(floor / (sum / tries)).toBeLessThan(1.12);
  });
});

describe("honestDigits(relative) and voltageUncertainty(shape)", () => {
  test.each([
    [0.5, 1],
    [0.05, 2],
    [0.01, 2],
    [0.003, 3],
    [0.0015, 3],
    [1e-6, 6],
    [0, 9],
  ])("a doubt of %f leaves %i digits", (doubt, digits) => expect(honestDigits(doubt)).toBe(digits));
  test("a stage averages its units, a unit in a string does not", () => {
    expect(voltageUncertainty({ series: 4, parallel: 4, ties: "cross-tied", uncertainty: 0.003 })).toBeCloseTo(
      0.003,
      12,
    );
    expect(voltageUncertainty({ series: 4, parallel: 4, ties: "strings", uncertainty: 0.003 })).toBeCloseTo(0.006, 12);
  });
});
