// The finite hold against a fine numerical integration of the pair of lumps, and against every corner of a whole chain in time.
import { EigenvalueDecomposition, Matrix, solve } from "ml-matrix";
import { describe, expect, test, vi } from "vitest";
import { worstAtHold } from "../../src/bank/cornersHold.ts";
import { type FiniteHold, holdHighest, holdWorst, largestBalanceForHold } from "../../src/bank/finiteHold.ts";
import { chargingWorst, holdingWorst, largestBalance } from "../../src/bank/share.ts";
import { chance } from "../support/random.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const EVER = Number.POSITIVE_INFINITY;
const bank = (over: Partial<FiniteHold> = {}): FiniteHold => ({
  voltage: 1600,
  series: 4,
  sharing: 5,
  spread: 0.05,
  leak: { kind: "current", amperes: 1e-4 },
  capacitance: 3300e-6,
  tolerance: { low: 0.2, high: 0.2 },
  hold: 60,
  ...over,
});
const near = (a: number, b: number, relative = 1e-9): void =>
  expect(Math.abs(a - b), `${a} for ${b}`).toBeLessThanOrEqual(relative * Math.abs(b));

interface Stage {
  readonly c: number;
  readonly g: number;
  readonly drawn: number;
}

/** Stage voltages of a chain held at V, fourth order Runge-Kutta: C dV/dt = I - g V - drawn, and the voltages add up to V. */
function integrate(volts: number, stages: readonly Stage[], seconds: number, steps: number): readonly number[] {
  const elastance = stages.reduce((sum, s) => sum + 1 / s.c, 0);
  let v = stages.map((s) => volts / s.c / elastance);
  const slope = (u: readonly number[]): number[] => {
    const pull = stages.map((s, k) => (s.g * u[k]! + s.drawn) / s.c);
    const current = pull.reduce((a, b) => a + b, 0) / elastance;
    return stages.map((s, k) => current / s.c - pull[k]!);
  };
  const h = seconds / steps;
  const add = (u: readonly number[], d: readonly number[], f: number): number[] => u.map((x, k) => x + f * d[k]!);
  for (let i = 0; i < steps; i++) {
    const a = slope(v);
    const b = slope(add(v, a, h / 2));
    const c = slope(add(v, b, h / 2));
    const d = slope(add(v, c, h));
    v = v.map((x, k) => x + (h / 6) * (a[k]! + 2 * b[k]! + 2 * c[k]! + d[k]!));
  }
  return v;
}

describe("holdWorst(bank, resistance)", () => {
  test("for ever: the endless holding share", () =>
    expect(holdWorst(bank({ hold: EVER }), 24000)).toBe(holdingWorst(bank(), 24000)));
  test("one in series: all of it", () => expect(holdWorst(bank({ series: 1 }), 24000)).toBe(1600));
  test("no time at all: the charging share", () =>
    near(holdWorst(bank({ hold: 0 }), 24000), chargingWorst(1600, 4, { low: 0.2, high: 0.2 })));
  test("a very long hold ends at the endless share", () =>
    near(holdWorst(bank({ hold: 1e9 }), 24000), holdingWorst(bank(), 24000)));
  test("without a resistor the tight stage rises in a straight line: m I T/(C_1 + C_2/(n - 1)) above its start", () => {
    const one = bank({ hold: 10, tolerance: { low: 0, high: 0 } });
    near(holdWorst(one, EVER), 400 + (5 * 1e-4 * 10) / (5 * 3300e-6 * (1 + 1 / 3)));
  });
  test("never more than all the volts", () => expect(holdWorst(bank({ hold: 1e9 }), EVER)).toBe(1600));
  test("insulation without a resistor: the exponential of m C_1 + m C_2/(n - 1) through the others' leak, to all the volts", () => {
    const one = bank({ hold: 500, tolerance: { low: 0, high: 0 }, leak: { kind: "insulation", ohms: 1e6 } });
    const tau = (3300e-6 * (1 + 1 / 3)) / (1 / 1e6 / 3);
    near(holdWorst(one, EVER), 1600 - 1200 * Math.exp(-500 / tau), 1e-12);
  });
  test("nothing leaks and no resistor: the charging share, however long", () =>
    near(
      holdWorst(bank({ hold: 1e9, leak: { kind: "current", amperes: 0 } }), EVER),
      chargingWorst(1600, 4, { low: 0.2, high: 0.2 }),
    ));

  test("against Runge-Kutta of the two lumps, 30 random banks, both kinds of leak: 1e-6", () => {
    // 2000 steps over at most a few time constants: the integration is good to about 1e-9; 1e-6 leaves room for the longest.
    const c = chance(21);
    for (let i = 0; i < 30; i++) {
      const leak = c.maybe(0.5)
        ? ({ kind: "current", amperes: c.between(0, 3e-4) } as const)
        : ({ kind: "insulation", ohms: c.between(1e6, 1e8) } as const);
      const one = bank({
        series: c.whole(2, 7),
        sharing: c.whole(1, 6),
        leak,
        hold: c.between(1, 300),
        capacitance: c.between(2e-4, 4e-3),
      });
      const resistance = c.between(5e3, 2e5);
      const m = one.sharing;
      let most = 0;
      for (const c1 of [0.8, 1.2]) {
        for (const c2 of [0.8, 1.2]) {
          const leaky = leak.kind === "insulation" ? m / leak.ohms : 0;
          const drawn = leak.kind === "current" ? m * leak.amperes : 0;
          const victim = { c: m * one.capacitance * c1, g: 1 / (resistance * 1.05), drawn: 0 };
          const rest = { c: m * one.capacitance * c2, g: 1 / (resistance * 0.95) + leaky, drawn };
          const all = [victim, ...Array.from({ length: one.series - 1 }, () => rest)];
          most = Math.max(most, integrate(one.voltage, all, one.hold, 2000)[0]!);
        }
      }
      near(holdWorst(one, resistance), Math.min(most, one.voltage), 1e-6);
    }
  });

  test("every corner of C, R and leak of whole chains of 2 to 4, at every moment of the hold: no stage above the larger of charging and holding share", () => {
    const worst = { over: 0 };
    const c = chance(22);
    for (const n of [2, 3, 4]) {
      for (let i = 0; i < (n === 4 ? 1 : 8); i++) {
        const one = bank({
          series: n,
          sharing: 1,
          spread: c.pick([0.01, 0.05]),
          leak: { kind: "current", amperes: c.between(0, 1e-4) },
          tolerance: { low: c.between(0, 0.2), high: c.between(0, 0.3) },
          hold: c.between(10, 6000),
        });
        const resistance = c.between(5e4, 5e5);
        const bound = Math.max(chargingWorst(one.voltage, n, one.tolerance), holdWorst(one, resistance));
        worst.over = Math.max(worst.over, worstInTime(one, resistance) / bound - 1);
      }
    }
    // Single stages may pass their own two ends; the worst of all corners may not. 1e-9 is the arithmetic of the eigenvectors.
    expect(worst.over).toBeLessThan(1e-9);
  });
});

/** Highest voltage of any stage at any of 24 moments of the hold, over all corners of every stage, by eigenvectors. */
function worstInTime(one: FiniteHold, resistance: number): number {
  const leak = one.leak.kind === "current" ? one.leak.amperes : 0;
  const choices = [1 - one.tolerance.low, 1 + one.tolerance.high].flatMap((c) =>
    [1 - one.spread, 1 + one.spread].flatMap((r) =>
      [0, leak].map((drawn) => ({ c: c * one.capacitance, g: 1 / (r * resistance), drawn })),
    ),
  );
  const n = one.series;
  let most = 0;
  const total = choices.length ** n;
  for (let code = 0; code < total; code++) {
    const stages = Array.from(
      { length: n },
      (_, k) => choices[Math.floor(code / choices.length ** k) % choices.length]!,
    );
    const elastance = stages.reduce((sum, s) => sum + 1 / s.c, 0);
    // dV/dt = A V + b in the n - 1 free voltages; the last is V less their sum.
    const a = Matrix.zeros(n, n);
    for (let row = 0; row < n; row++)
      for (let col = 0; col < n; col++) {
        const through = stages[col]!.g / stages[col]!.c / elastance / stages[row]!.c;
        a.set(row, col, through - (row === col ? stages[row]!.g / stages[row]!.c : 0));
      }
    const pull = stages.reduce((sum, s) => sum + s.drawn / s.c, 0) / elastance;
    const b = stages.map((s) => pull / s.c - s.drawn / s.c);
    const free = Matrix.zeros(n - 1, n - 1);
    const fixed = Matrix.zeros(n - 1, 1);
    for (let row = 0; row < n - 1; row++) {
      for (let col = 0; col < n - 1; col++) free.set(row, col, a.get(row, col) - a.get(row, n - 1));
      fixed.set(row, 0, b[row]! + a.get(row, n - 1) * one.voltage);
    }
    const end = solve(free, fixed.clone().mul(-1)).to1DArray();
    const start = stages.slice(0, n - 1).map((s) => one.voltage / s.c / elastance);
    const parts = new EigenvalueDecomposition(free);
    const vectors = parts.eigenvectorMatrix;
    const weights = solve(vectors, Matrix.columnVector(start.map((v, k) => v - end[k]!))).to1DArray();
    for (let step = 0; step <= 24; step++) {
      const t = (one.hold * step) / 24;
      const v = end.map(
        (x, k) =>
          x + weights.reduce((sum, w, j) => sum + w * vectors.get(k, j) * Math.exp(parts.realEigenvalues[j]! * t), 0),
      );
      most = Math.max(most, ...v, one.voltage - v.reduce((x, y) => x + y, 0));
    }
  }
  return most;
}

describe("holdHighest(bank, resistance)", () => {
  test("for ever, or one in series: the end is the highest", () => {
    for (const one of [bank({ hold: EVER }), bank({ series: 1 })])
      for (const resistance of [24000, EVER]) expect(holdHighest(one, resistance)).toBe(holdWorst(one, resistance));
  });

  // Most often the end or the start is the highest; now and then the way between, with some of the others low, is, by a little.
  test("never below the end, and as high as the exact course of every mix of others where that beats both ends: 300 random holds", () => {
    const c = chance(24);
    let higher = 0;
    for (let i = 0; i < 300; i++) {
      const leak = c.maybe(0.7)
        ? ({ kind: "current", amperes: c.between(1e-5, 2e-3) } as const)
        : ({ kind: "insulation", ohms: c.between(1e5, 1e7) } as const);
      const one = bank({
        series: c.whole(2, 7),
        sharing: c.whole(1, 8),
        leak,
        capacitance: c.pick([1e-4, 1e-3]),
        tolerance: { low: c.between(0, 0.2), high: c.between(0, 0.3) },
        hold: c.pick([30, 300, 3600]),
      });
      const resistance = c.maybe(0.2) ? EVER : 10 ** c.between(3, 5.5);
      const start = chargingWorst(one.voltage, one.series, one.tolerance);
      const ends = holdWorst(one, resistance);
      const exact = worstAtHold({
        n: one.series,
        m: one.sharing,
        C: one.capacitance,
        tLow: one.tolerance.low,
        tHigh: one.tolerance.high,
        leakage: leak.kind === "current" ? leak.amperes : 0,
        insulation: leak.kind === "insulation" ? leak.ohms : EVER,
        R: resistance === EVER ? null : resistance,
        q: one.spread,
        V: one.voltage,
        hold: one.hold,
      }).voltage;
      const found = holdHighest(one, resistance);
      expect(found).toBeGreaterThanOrEqual(ends);
      near(Math.max(found, start), Math.max(exact, ends, start), 2e-9);
      if (found > ends) higher++;
    }
    expect(higher).toBeGreaterThan(3);
    expect(higher).toBeLessThan(150);
  });
});

describe("largestBalanceForHold(bank, limit, endless)", () => {
  const most = (one: FiniteHold, limit: number): number =>
    largestBalanceForHold(one, limit, largestBalance(one, limit));

  test("for ever: what it was given", () => expect(largestBalanceForHold(bank({ hold: EVER }), 450, 123)).toBe(123));
  test("a limit of all the volts, or more: what it was given, a resistor that bleeds", () => {
    expect(largestBalanceForHold(bank(), 1600, 123)).toBe(123);
    expect(largestBalanceForHold(bank(), 1700, 123)).toBe(123);
  });
  test("where no resistor does for ever, none does for a while that drifts over the limit: 0", () =>
    expect(most(bank({ spread: 0.2, hold: 3600, tolerance: { low: 0.05, high: 0.05 } }), 430)).toBe(0));
  test("a limit below the charging share, which a short hold leaves standing: no more than for ever", () => {
    const one = bank({ hold: 1 });
    expect(largestBalance(one, 520)).toBeGreaterThan(0);
    expect(most(one, 520)).toBe(largestBalance(one, 520));
  });
  test("a hold too short to drift: none needed", () =>
    expect(most(bank({ hold: 1, tolerance: { low: 0.05, high: 0.05 } }), 450)).toBe(EVER));
  test("a shorter hold never asks a smaller resistor", () => {
    const at = (hold: number): number => most(bank({ hold, tolerance: { low: 0.05, high: 0.05 } }), 450);
    expect(at(300)).toBeGreaterThanOrEqual(at(3000));
    expect(at(3000)).toBeGreaterThanOrEqual(at(EVER));
  });

  test("sits on the edge, 100 random banks: safe at it, over the limit 1 % above it", () => {
    const c = chance(23);
    let edges = 0;
    for (let i = 0; i < 100; i++) {
      const one = bank({
        series: c.whole(2, 6),
        hold: c.between(100, 4000),
        tolerance: { low: 0.1, high: 0.1 },
        spread: 0.01,
        leak: { kind: "current", amperes: c.between(1e-4, 5e-3) },
      });
      const limit = chargingWorst(one.voltage, one.series, one.tolerance) * c.between(1, 1.2);
      const r = most(one, limit);
      if (!Number.isFinite(r) || r <= 0) continue;
      edges++;
      expect(holdWorst(one, r)).toBeLessThanOrEqual(limit * (1 + 1e-9));
      expect(holdWorst(one, r * 1.01)).toBeGreaterThan(limit);
    }
    expect(edges).toBeGreaterThan(50);
  });
});
