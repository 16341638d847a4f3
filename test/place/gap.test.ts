import { describe, expect, test } from "vitest";
import { stageGap, stringGap, worstShare } from "../../src/place/gap.ts";

describe("stageGap(sums, count)", () => {
  test("equal sums give exactly 0", () => expect(stageGap([3, 3, 3], 3)).toBe(0));
  test("rationals of the reference cases: sums 24,24,27 give 1/26 and 24,25,26 give 38/937", () => {
    expect(stageGap([24, 24, 27], 3)).toBeCloseTo(1 / 26, 15);
    expect(stageGap([24, 25, 26], 3)).toBeCloseTo(38 / 937, 15);
  });
  test("a difference of 1e-12 keeps its digits", () => {
    const gap = stageGap([1e12, 1e12 + 1], 2);
    expect(gap / 5e-13).toBeCloseTo(1, 6);
  });
  test("scale does not matter, and only the first `count` sums do", () => {
    expect(stageGap([1, 2, 3], 3)).toBeCloseTo(stageGap([1e-6, 2e-6, 3e-6], 3), 14);
    expect(stageGap([5, 5, 1], 2)).toBe(0);
  });
});

describe("stringGap(values) and worstShare(gap, series)", () => {
  test("two units of 1 and 3 share 3 to 1", () => {
    expect(stringGap([1, 3])).toBeCloseTo(0.5, 14);
    expect(worstShare(stringGap([1, 3]), 2)).toBeCloseTo(0.75, 14);
  });
});
