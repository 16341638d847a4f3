// What a dump leaves reversed after a hold: against the exact course of every corner, and figures integrated elsewhere.
import { describe, expect, test } from "vitest";
import { chargingShares, type Stage } from "../../src/bank/chain.ts";
import type { HoldCase } from "../../src/bank/cornersHold.ts";
import { courseOf } from "../../src/bank/course.ts";
import { reversedByHold, reversedMix } from "../../src/bank/reversedHold.ts";

const NONE = Number.POSITIVE_INFINITY;
/** 900 V on three stages of four units, 1 mF +-2 %, 3 mA at worst, 8.8 kohm +-5 %: a bank whose leakage is unequal. */
const LEAKY: HoldCase = {
  n: 3,
  m: 4,
  C: 1e-3,
  tLow: 0.02,
  tHigh: 0.02,
  leakage: 3e-3,
  insulation: NONE,
  R: 8800,
  q: 0.05,
  V: 900,
  hold: NONE,
};

const lowest = (chain: readonly Stage[], V: number, hold: number): number => {
  const course = courseOf(chain, {
    charge: { kind: "instant" },
    voltage: V,
    hold,
    dump: { resistance: 0, seconds: 0 },
    rest: 0,
  });
  return Math.min(...(course.phases.at(-1)!.end as readonly number[]));
};

/** Most reverse of all corners at some moments of the hold. */
function bruteForce(given: HoldCase): number {
  const { n, m, C, tLow, tHigh, leakage, insulation, R, q, V, hold } = given;
  const kinds: Stage[] = [];
  for (const capacitance of [m * C * (1 - tLow), m * C * (1 + tHigh)])
    for (const leakageCurrent of leakage > 0 ? [0, m * leakage] : [0])
      for (const conductance of insulation < NONE ? [0, m / insulation] : [0])
        for (const resistance of R === null ? [NONE] : [R * (1 - q), R * (1 + q)])
          kinds.push({ capacitance, leakageCurrent, conductance, resistance });
  let best = 0;
  const chain: Stage[] = [];
  const fill = (place: number, from: number): void => {
    if (place === n) {
      for (const part of hold === NONE ? [1] : [0.3, 1]) best = Math.min(best, lowest(chain, V, hold * part));
      return;
    }
    for (let k = from; k < kinds.length; k++) {
      chain[place] = kinds[k]!;
      fill(place + 1, k);
    }
  };
  fill(0, 0);
  return best;
}

describe("reversedByHold(case)", () => {
  test("one in series and no hold: a dump right after the charge leaves nothing", () => {
    expect(reversedByHold({ ...LEAKY, n: 1 }).voltage).toBe(0);
    expect(reversedByHold({ ...LEAKY, hold: 0 }).voltage).toBe(0);
  });

  test("endless, by hand: v = (V/(2 R_hi) - 4 I_L)/(1/R_lo + 1/(2 R_hi)), less V share: -96.8 V, twelve times equal sharing", () => {
    const [rLow, rHigh] = [8800 * 0.95, 8800 * 1.05];
    const v = (900 / (2 * rHigh) - 0.012) / (1 / rLow + 1 / (2 * rHigh));
    const share = 1.02 / (1.02 + 2 * 0.98);
    const found = reversedByHold(LEAKY);
    expect(found.voltage).toBeCloseTo(v - 900 * share, 9);
    expect(found.voltage).toBeCloseTo(-96.8, 1);
    expect(found.seconds).toBe(NONE);
  });

  test("finite and endless, with and without resistors: no corner's exact course is left lower, and one is left as low", () => {
    const holds = [1, 30, 300, 3000, NONE];
    const cases: HoldCase[] = [
      LEAKY,
      { ...LEAKY, tLow: 0.1, tHigh: 0.5, m: 1 },
      { ...LEAKY, tLow: 0.2, tHigh: 0.2, q: 0.2, leakage: 1e-4 },
      { ...LEAKY, leakage: 0, insulation: 2e5, tHigh: 0.3 },
      { ...LEAKY, leakage: 0, insulation: 2e5, R: null },
      { ...LEAKY, R: null, leakage: 1e-3, tHigh: 0.4 },
      { ...LEAKY, n: 2, tLow: 0.1, tHigh: 0.5 },
      { ...LEAKY, n: 2, leakage: 0, q: 0.1, tLow: 0.3, tHigh: 0.5 },
    ];
    for (const one of cases)
      for (const hold of holds) {
        const given = { ...one, hold };
        // Nothing tells where an endless hold of several stages that conduct nothing ends but the course, which takes its time.
        if (hold === NONE && one.R === null) continue;
        const { voltage } = reversedByHold(given);
        const brute = bruteForce(given);
        expect(voltage).toBeGreaterThan(brute - 1e-6 * given.V);
        expect(voltage).toBeLessThan(brute + 1e-6 * given.V);
      }
  });

  test("a leaky stage without a resistor empties and stays empty: it is left with all it was charged to, reversed", () => {
    const given = { ...LEAKY, R: null };
    const share = chargingShares([{ capacitance: 0.98 }, { capacitance: 1.02 }, { capacitance: 1.02 }] as Stage[])[0]!;
    for (const hold of [1e6, NONE]) expect(reversedByHold({ ...given, hold }).voltage).toBeCloseTo(-900 * share, 6);
  });
});

describe("reversedMix(case, lowOthers)", () => {
  test("the named mix alone, at the named time, is the course's", () => {
    const given = { ...LEAKY, hold: 40, tHigh: 0.5, leakage: 5e-4 };
    const { voltage, seconds, before } = reversedMix(given, 1);
    const tight = (capacitance: number): Stage => ({
      capacitance,
      leakageCurrent: 0,
      conductance: 0,
      resistance: 8800 * 1.05,
    });
    const chain: Stage[] = [
      { capacitance: 4e-3 * 0.98, leakageCurrent: 2e-3, conductance: 0, resistance: 8800 * 0.95 },
      tight(4e-3 * 1.5),
      tight(4e-3 * 0.98),
    ];
    expect(seconds).toBe(40);
    expect(voltage).toBeCloseTo(lowest(chain, 900, 40), 6);
    expect(before).toBeCloseTo(voltage + 900 * chargingShares(chain)[0]!, 6);
  });
});
