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

  test("2s1p uniform: twice the one stage is the area of the triangle", () => {
    const given = { ...GIVEN, n: 2, p: 1, share: 0.55 };
    const k = kappa(0.55);
    const exact = (1.2 * k - 0.8) ** 2 / (k * 0.4 ** 2);
    expect((2 * singleRisk(smoothStages(given, tailWindows(given, k)!, 4), k)) / exact).toBeCloseTo(1, 3);
  });

  test("3s1p uniform: the stage that is over from 1/0.8 down, the one other and the two others below a value", () => {
    const given = { ...GIVEN, n: 3, p: 1, share: 0.34 };
    const span = tailWindows(given, kappa(0.34))!;
    const { victim, other, butTwoBelow, butOneBelow } = smoothStages(given, span, 2);
    expect(victim.values[0]).toBeCloseTo(1 / 0.8, 12);
    expect(victim.values.at(-1)).toBeCloseTo(1 / span.victim.high, 12);
    const whole = (masses: Float64Array) => masses.reduce((sum, mass) => sum + mass, 0);
    expect(whole(victim.masses)).toBeCloseTo((span.victim.high - 0.8) / 0.4, 9);
    expect(whole(other.masses)).toBeCloseTo((1.2 - span.other.low) / 0.4, 9);
    // A chance of 1/C below x is one of C above 1/x.
    for (const c of [0.9, 1, 1.1]) expect(butTwoBelow!(1 / c)).toBeCloseTo((1.2 - c) / 0.4, 3);
    // The sum of two below y, by 4000 slices of the first.
    for (const y of [1.8, 2, 2.2]) {
      let sum = 0;
      for (let k = 0; k < 4000; k++) {
        const rest = y - 1 / (0.8 + (0.4 * (k + 0.5)) / 4000);
        sum += Math.min(1, Math.max(0, (1.2 - 1 / rest) / 0.4)) / 4000;
      }
      expect(butOneBelow(y)).toBeCloseTo(sum, 3);
    }
  });

  test("a lot of which one value alone can be over still has a window to stand in", () => {
    const lot: TailCase = { ...GIVEN, law: { kind: "lot", values: [1, 2, 2, 2, 2] }, n: 2, p: 1, share: 2 / 3 - 1e-10 };
    const span = tailWindows(lot, kappa(lot.share))!;
    expect(span.victim.low).toBe(1);
    expect(span.victim.high).toBeGreaterThan(1);
    expect(span.other.low).toBeLessThan(2);
    expect(span.other.high).toBe(2);
    expect(tailWindows(lot, kappa(2 / 3))).toBeNull();
  });

  test("two stages: the sum of the one other is its own distribution", () => {
    const given = { ...GIVEN, n: 2, p: 1, share: 0.55 };
    const stages = smoothStages(given, tailWindows(given, kappa(0.55))!, 4);
    expect(stages.butTwoBelow).toBeNull();
    expect(stages.butOneBelow(10)).toBeLessThanOrEqual(1 + 1e-9);
  });
});
