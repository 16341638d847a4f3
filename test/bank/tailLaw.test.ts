// The laws of a unit: ranges, masses on a lattice, draws.
import { describe, expect, test } from "vitest";
import { lawMasses, lawRange, lawSteps, type UnitLaw } from "../../src/bank/tailLaw.ts";

const EVEN: UnitLaw = { kind: "uniform", low: 2, high: 6 };
const BELL: UnitLaw = { kind: "normal", nominal: 10, tLow: 0.3, tHigh: 0.3 };
const LOPSIDED: UnitLaw = { kind: "normal", nominal: 10, tLow: 0.1, tHigh: 0.5 };
const LOT: UnitLaw = { kind: "lot", values: [3, 5, 4, 4, 7] };

const mean = (masses: Float64Array, from: number, step: number): number =>
  masses.reduce((sum, mass, k) => sum + mass * (from + k * step), 0);
const whole = (masses: Float64Array): number => masses.reduce((sum, mass) => sum + mass, 0);

describe("lawRange(law)", () => {
  test("the limits of the tolerance, or the lot's own", () => {
    expect(lawRange(EVEN)).toEqual({ low: 2, high: 6 });
    expect(lawRange(LOPSIDED)).toEqual({ low: 9, high: 15 });
    expect(lawRange(LOT)).toEqual({ low: 3, high: 7 });
  });
});

describe("lawMasses(law, from, to, cells)", () => {
  test("all of every law is 1, and its mean is right", () => {
    for (const [law, average] of [
      [EVEN, 4],
      [BELL, 10],
      [LOT, 4.6],
    ] as const) {
      const { low, high } = lawRange(law);
      const masses = lawMasses(law, low, high, 40);
      expect(whole(masses)).toBeCloseTo(1, 9);
      expect(mean(masses, low, (high - low) / 40)).toBeCloseTo(average, 9);
      expect(Math.min(...masses)).toBeGreaterThanOrEqual(0);
    }
  });

  test("a window keeps only its own share", () => {
    expect(whole(lawMasses(EVEN, 2, 3, 16))).toBeCloseTo(0.25, 12);
    // One sigma on each side of the nominal, of three: erf(1/sqrt 2)/erf(3/sqrt 2) [Abramowitz and Stegun table 26.1]
    expect(whole(lawMasses(BELL, 9, 11, 60))).toBeCloseTo(0.6826894921 / 0.9973002039, 8);
    expect(whole(lawMasses(LOT, 3.5, 5.5, 16))).toBeCloseTo(0.6, 12);
  });

  test("lopsided: the side of five times the tolerance holds five times the units", () => {
    const below = whole(lawMasses(LOPSIDED, 9, 10, 60));
    const above = whole(lawMasses(LOPSIDED, 10, 15, 60));
    expect(above / below).toBeCloseTo(5, 9);
    expect(above + below).toBeCloseTo(1, 9);
  });

  test("uniform masses integrate a cubic exactly", () => {
    const masses = lawMasses(EVEN, 2, 6, 8);
    let sum = 0;
    for (const [k, mass] of masses.entries()) sum += mass * (2 + k / 2) ** 3;
    expect(sum).toBeCloseTo((6 ** 4 - 2 ** 4) / 16, 10);
  });
});

describe("lawSteps(law)", () => {
  test("even places give the law's mean and spread", () => {
    for (const [law, average, variance] of [
      [EVEN, 4, 16 / 12],
      // Variance of a normal cut at three sigma: 1 - 2 x 3 phi(3)/erf(3/sqrt 2) = 0.973337 of sigma^2.
      [BELL, 10, 0.9733368],
      [LOT, 4.6, 1.84],
    ] as const) {
      const { bases, slopes } = lawSteps(law);
      let sum = 0;
      let square = 0;
      for (const [k, base] of bases.entries()) {
        const middle = base + slopes[k]! / 2;
        sum += middle / bases.length;
        square += (middle ** 2 + slopes[k]! ** 2 / 12) / bases.length;
      }
      expect(sum).toBeCloseTo(average, 6);
      expect(square - sum ** 2).toBeCloseTo(variance, 4);
    }
  });

  test("nothing beyond the limits", () => {
    const { bases, slopes } = lawSteps(LOPSIDED);
    expect(bases[0]).toBeCloseTo(9, 9);
    expect(bases.at(-1)! + slopes.at(-1)!).toBeCloseTo(15, 9);
    expect(Math.min(...slopes)).toBeGreaterThan(0);
  });
});
