// The worst of a finite hold against the exact time course at every corner of C, leakage, insulation and resistor.
import { describe, expect, test, vi } from "vitest";
import { chargingShares, type Stage } from "../../src/bank/chain.ts";
import { type HoldCase, worstAtHold } from "../../src/bank/cornersHold.ts";
import { phaseFrom } from "../../src/bank/coursePhase.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const NONE = Number.POSITIVE_INFINITY;
const BASE: HoldCase = {
  n: 4,
  m: 1,
  C: 3300e-6,
  tLow: 0.2,
  tHigh: 0.2,
  leakage: 1e-3,
  insulation: NONE,
  R: 24e3,
  q: 0.05,
  V: 1600,
  hold: NONE,
};

const peakOf = (chain: readonly Stage[], V: number, hold: number): number =>
  phaseFrom({
    name: "hold",
    chain,
    drive: { kind: "source", voltage: V, resistance: 0 },
    start: chargingShares(chain).map((share) => share * V),
    seconds: hold,
  }).peaks()[0]!.voltage;

/** All corners of stage 1 against all of the others; the others' order does not matter. */
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
      best = Math.max(best, peakOf(chain, V, hold));
      return;
    }
    for (let k = place === 1 ? 0 : from; k < kinds.length; k++) {
      chain[place] = kinds[k]!;
      fill(place + 1, k);
    }
  };
  fill(0, 0);
  return best;
}

/** The worst of a hold, held to the exact course of the corner that it names: that voltage at that time, and none higher. */
function asNamed(given: HoldCase) {
  const { n, R } = given;
  const { voltage, seconds, lowOthers } = worstAtHold(given);
  const { m, C, tLow, tHigh, leakage, insulation, q, V, hold } = given;
  const other = (capacitance: number): Stage => ({
    capacitance,
    leakageCurrent: m * leakage,
    conductance: m / insulation,
    resistance: R === null ? NONE : R * (1 - q),
  });
  const chain: readonly Stage[] = [
    {
      capacitance: m * C * (1 - tLow),
      leakageCurrent: 0,
      conductance: 0,
      resistance: R === null ? NONE : R * (1 + q),
    },
    ...Array.from({ length: n - 1 }, (_, i) => other(m * C * (i < lowOthers ? 1 - tLow : 1 + tHigh))),
  ];
  const phase = phaseFrom({
    name: "hold",
    chain,
    drive: { kind: "source", voltage: V, resistance: 0 },
    start: chargingShares(chain).map((share) => share * V),
    seconds: hold,
  });
  expect(voltage / phase.peaks()[0]!.voltage).toBeCloseTo(1, 10);
  expect(voltage / phase.voltagesAt(seconds)[0]!).toBeCloseTo(1, 10);
  return { phase, seconds, lowOthers };
}

describe("worstAtHold(case)", () => {
  test("one stage: V", () => {
    expect(worstAtHold({ ...BASE, n: 1 }).voltage).toBe(1600);
  });

  test("no time to leak: the charging share, 533.333 V [methods-derived A1]", () => {
    expect(worstAtHold({ ...BASE, hold: 0 }).voltage).toBeCloseTo(533.333333333, 8);
  });

  test("for ever without tolerance of C: the holding share, 449.184615 V [methods-derived A4]", () => {
    expect(worstAtHold({ ...BASE, tLow: 0, tHigh: 0 }).voltage).toBeCloseTo(449.184615, 6);
  });

  test("for ever without a resistor one stage ends with all; with nothing that leaks nothing moves", () => {
    expect(worstAtHold({ ...BASE, R: null }).voltage).toBe(1600);
    expect(worstAtHold({ ...BASE, R: null, leakage: 0 }).voltage).toBeCloseTo(533.333333333, 8);
    expect(worstAtHold({ ...BASE, R: null, leakage: 0, insulation: 1e8 }).voltage).toBe(1600);
  });

  test("no resistor, two stages: a straight drift of I/2C until one has it all", () => {
    const given = { ...BASE, n: 2, tLow: 0, tHigh: 0, R: null, V: 800, C: 1e-3, leakage: 1e-3 };
    expect(worstAtHold({ ...given, hold: 100 }).voltage).toBeCloseTo(450, 9);
    expect(worstAtHold({ ...given, hold: 1e4 }).voltage).toBe(800);
  });

  test("units that share a stage scale C and leakage alike", () => {
    const given = { ...BASE, R: null, hold: 60 };
    expect(worstAtHold({ ...given, m: 7 }).voltage).toBeCloseTo(worstAtHold(given).voltage, 9);
  });

  test("when, and in which company: at once, at the end, only approached", () => {
    expect(worstAtHold({ ...BASE, hold: 0 })).toMatchObject({ seconds: 0, lowOthers: 0 });
    expect(worstAtHold({ ...BASE, n: 1 })).toEqual({ voltage: 1600, seconds: 0, lowOthers: 0 });
    expect(worstAtHold({ ...BASE, R: null, leakage: 0 })).toMatchObject({ seconds: 0, lowOthers: 0 });
    expect(worstAtHold({ ...BASE, R: null, hold: 60 })).toMatchObject({ seconds: 60, lowOthers: 0 });
    expect(worstAtHold({ ...BASE, R: null })).toEqual({ voltage: 1600, seconds: NONE, lowOthers: 0 });
    expect(worstAtHold({ ...BASE, tLow: 0, tHigh: 0 })).toMatchObject({ seconds: NONE, lowOthers: 0 });
  });

  test("the corner that it names has just that voltage at just that time, and no higher one: 400 random cases, n = 2..8", () => {
    const draw = uniformFrom(streamState(4, 2));
    const seen = { start: 0, end: 0, dry: 0 };
    for (let k = 0; k < 400; k++) {
      const n = 2 + (k % 7);
      const R = draw() < 0.3 ? null : 10 ** (2.5 * draw() - 1.5) / n;
      const given: HoldCase = {
        n,
        m: 1 + (k % 3),
        C: 1,
        tLow: 0.3 * draw(),
        tHigh: 0.5 * draw(),
        leakage: k % 3 === 0 ? 0 : 1,
        insulation: k % 3 === 1 ? NONE : n * (0.2 + 2 * draw()),
        R,
        q: 0.1 * draw(),
        V: 1,
        hold: 10 ** (2.5 * draw() - 2) * Math.min(1, (R ?? 1) * n),
      };
      const { phase, seconds } = asNamed(given);
      if (seconds === 0) seen.start++;
      else seen.end++;
      if (phase.voltagesAt(given.hold).some((v) => v <= 0)) seen.dry++;
    }
    for (const [kind, count] of Object.entries(seen)) expect(count, kind).toBeGreaterThan(3);
  });

  // Long holds in which resistors settle a little above what charging gave: some of the others low, it is higher still on the way.
  test.each([
    { n: 7, m: 7, V: 446, leakage: 287e-6, tLow: 0.1975, tHigh: 0.1978, R: 11000, hold: 3600 },
    { n: 6, m: 2, V: 1507.5, leakage: 1.556e-3, tLow: 0.1525, tHigh: 0.2457, R: 26100, hold: 3600 },
    { n: 4, m: 7, V: 1097, leakage: 1.4463e-3, tLow: 0.1609, tHigh: 0.1083, R: 5230, hold: 300 },
  ])("highest on the way: %o", (over) => {
    const { seconds, lowOthers } = asNamed({ ...BASE, C: 1e-4, ...over });
    expect(seconds).toBeGreaterThan(0);
    expect(seconds).toBeLessThan(over.hold / 10);
    expect(lowOthers).toBeGreaterThan(0);
    expect(lowOthers).toBeLessThan(over.n - 1);
  });

  test("never below and never above every corner's exact time course: 200 random cases, n = 2..4", {
    timeout: 60_000,
  }, () => {
    const draw = uniformFrom(streamState(4, 0));
    for (let k = 0; k < 200; k++) {
      const n = k % 10 === 0 ? 4 : 2 + (k % 2);
      const R = draw() < 0.5 ? null : 10 ** (2.5 * draw() - 1.5) / n;
      const given: HoldCase = {
        n,
        m: 1 + (k % 3),
        C: 1,
        tLow: 0.3 * draw(),
        tHigh: 0.5 * draw(),
        leakage: k % 3 === 0 ? 0 : 1,
        insulation: k % 3 === 1 ? NONE : n * (0.2 + 2 * draw()),
        R,
        q: 0.1 * draw(),
        V: 1,
        hold: (10 ** (2 * draw() - 2) / n) * Math.min(1, (R ?? 1) * n),
      };
      expect(worstAtHold(given).voltage / bruteForce(given)).toBeCloseTo(1, 11);
    }
  });

  test("nothing inside the tolerances beats the corners: 100 cases x 40 chains drawn inside", () => {
    const draw = uniformFrom(streamState(4, 1));
    for (let k = 0; k < 100; k++) {
      const given: HoldCase = {
        ...BASE,
        n: 2 + (k % 5),
        R: k % 2 ? null : 2e4 * draw() + 100,
        V: 1000,
        hold: 10 ** (4 * draw() - 1),
        insulation: 1e6,
      };
      const worst = worstAtHold(given).voltage;
      for (let j = 0; j < 40; j++) {
        const chain = Array.from({ length: given.n }, (_, i) => ({
          capacitance: given.C * (i === 0 ? 0.8 : 0.8 + 0.4 * draw()),
          leakageCurrent: given.leakage * (i === 0 ? 0.1 * draw() : 1 - 0.1 * draw()),
          conductance: (1 / given.insulation) * draw(),
          resistance: given.R === null ? NONE : given.R * (1 + given.q * (i === 0 ? 1 : 2 * draw() - 1)),
        }));
        expect(peakOf(chain, given.V, given.hold)).toBeLessThanOrEqual(worst * (1 + 1e-12));
      }
    }
  });
});
