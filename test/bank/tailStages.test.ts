// Windows and lattices of a chain's stages.
import { describe, expect, test } from "vitest";
import type { TailCase } from "../../src/bank/tailLaw.ts";
import { singleRisk, smoothStages, tailWindows } from "../../src/bank/tailStages.ts";

const GIVEN: TailCase = { law: { kind: "uniform", low: 0.8, high: 1.2 }, ties: "cross-tied", n: 3, p: 2, share: 0.42 };
const kappa = (share: number): number => (1 - share) / share;

describe("tailWindows(case, kappa)", () => {
  test("null when no bank can be over", () => {
    expect(tailWindows({ ...GIVEN, share: 0.4286 }, kappa(0.4286))).toBeNull();
  });

  test("edges: a unit just inside can still make an excess with all others at their best, one just outside cannot", () => {
    const { victim, other } = tailWindows(GIVEN, kappa(GIVEN.share))!;
    const share = (victimUnit: number, otherUnit: number): number => {
      const over = 1 / (victimUnit + 0.8);
      return over / (over + 1 / (otherUnit + 1.2) + 1 / 2.4);
    };
    expect(victim.low).toBe(0.8);
    expect(share(victim.high - 1e-9, 1.2)).toBeGreaterThan(GIVEN.share);
    expect(share(victim.high + 1e-9, 1.2)).toBeLessThan(GIVEN.share);
    expect(other.high).toBe(1.2);
    expect(share(0.8, other.low + 1e-9)).toBeGreaterThan(GIVEN.share);
    expect(share(0.8, other.low - 1e-9)).toBeLessThan(GIVEN.share);
  });
});

describe("smoothStages(case, windows, scale), singleRisk(stages, kappa)", () => {
  test("halving the step divides the change by about four: right to the square of the step", () => {
    const given = { ...GIVEN, n: 5, p: 4, share: 1.15 / 5 };
    const span = tailWindows(given, kappa(given.share))!;
    const [a, b, c] = [1, 2, 4].map((scale) => singleRisk(smoothStages(given, span, scale), kappa(given.share)));
    const ratio = (a! - b!) / (b! - c!);
    expect(ratio).toBeGreaterThan(2.5);
    expect(ratio).toBeLessThan(8);
  });

  test("two stages: the sum of the one other is its own distribution", () => {
    const given = { ...GIVEN, n: 2, p: 1, share: 0.55 };
    const stages = smoothStages(given, tailWindows(given, kappa(0.55))!, 4);
    expect(stages.butTwoBelow).toBeNull();
    expect(stages.butOneBelow(10)).toBeLessThanOrEqual(1 + 1e-9);
  });
});
