// Two stages over at once: bounded, and the two ways agree.
import { describe, expect, test } from "vitest";
import type { TailCase } from "../../src/bank/tailLaw.ts";
import { smoothStages, tailWindows } from "../../src/bank/tailStages.ts";
import { highestShare, pairShare } from "../../src/bank/tailUnion.ts";

const stagesAt = (n: number, p: number, over: number) => {
  const given: TailCase = { law: { kind: "uniform", low: 0.8, high: 1.2 }, ties: "cross-tied", n, p, share: over / n };
  const kappa = (1 - given.share) / given.share;
  return { kappa, n, stages: smoothStages(given, tailWindows(given, kappa)!, 2) };
};

describe("pairShare(stages, kappa, n), highestShare(stages, kappa, n)", () => {
  test("limits above half the voltage leave no room for two: exactly 1", () => {
    const { stages, kappa } = stagesAt(2, 3, 1.1);
    expect(pairShare(stages, kappa, 2)).toEqual({ kept: 1, error: 0 });
    expect(highestShare(stages, kappa, 2)).toEqual({ kept: 1, error: 0 });
  });

  test("a limit above half the volts, however many stages: no room for two", () => {
    const given: TailCase = {
      law: { kind: "uniform", low: 0.2, high: 2 },
      ties: "cross-tied",
      n: 4,
      p: 1,
      share: 0.55,
    };
    for (const share of [0.5, 0.55]) {
      const kappa = (1 - share) / share;
      const stages = smoothStages({ ...given, share }, tailWindows({ ...given, share }, kappa)!, 1);
      expect(pairShare(stages, kappa, 4)).toEqual({ kept: 1, error: 0 });
      expect(highestShare(stages, kappa, 4)).toEqual({ kept: 1, error: 0 });
    }
  });

  test("3s1p uniform, every place of a grid of 120 x 120 x 120 units counted: both ways keep that share", () => {
    const { stages, kappa } = stagesAt(3, 1, 1.05);
    const inverse = Array.from({ length: 120 }, (_, k) => 1 / (0.8 + (0.4 * (k + 0.5)) / 120));
    let [any, sum] = [0, 0];
    for (const a of inverse)
      for (const b of inverse)
        for (const c of inverse) {
          const limit = 0.35 * (a + b + c);
          const over = (a > limit ? 1 : 0) + (b > limit ? 1 : 0) + (c > limit ? 1 : 0);
          sum += over;
          if (over > 0) any++;
        }
    const pairs = pairShare(stages, kappa, 3);
    const highest = highestShare(stages, kappa, 3);
    expect(1 - any / sum).toBeGreaterThan(0.03);
    expect((1 - pairs.kept) / (1 - any / sum)).toBeCloseTo(1, 3);
    expect((1 - highest.kept) / (1 - any / sum)).toBeCloseTo(1, 3);
    // Bonferroni against Hunter for three: a third of what is lost; the highest of all is said to 2 % of it.
    expect(pairs.error).toBeCloseTo((1 - pairs.kept) / 3, 12);
    expect(highest.error).toBeCloseTo(0.02 * (1 - highest.kept), 12);
  });

  test("where two at once are rare both ways keep the same share, within what each says", () => {
    for (const [n, p, over] of [
      [4, 3, 1.1],
      [8, 12, 1.1],
      [8, 2, 1.2],
      [12, 4, 1.18],
    ] as const) {
      const { stages, kappa } = stagesAt(n, p, over);
      const pairs = pairShare(stages, kappa, n);
      const highest = highestShare(stages, kappa, n);
      expect(pairs.kept).toBeLessThan(1);
      expect(Math.abs(pairs.kept - highest.kept)).toBeLessThan(pairs.error + highest.error + 0.03 * (1 - pairs.kept));
    }
  });

  test("where they are common the sum over stages is far above 1 and the highest stage alone is kept", () => {
    const { stages, kappa } = stagesAt(8, 12, 1.001);
    const { kept } = highestShare(stages, kappa, 8);
    expect(kept).toBeLessThan(0.3);
    expect(kept).toBeGreaterThan(0.125);
  });
});
