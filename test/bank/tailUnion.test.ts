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
