// A small lot is exact: every combination counted by hand-written loops.
import { describe, expect, test, vi } from "vitest";
import { exceedRisk } from "../../src/bank/tail.ts";
import type { TailCase } from "../../src/bank/tailLaw.ts";
import { lotStages } from "../../src/bank/tailLot.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const LOT = [0.91, 0.96, 1, 1.02, 1.05, 1.09];
const asked = (n: number, p: number, share: number, values: readonly number[] = LOT): TailCase => ({
  law: { kind: "lot", values },
  ties: "cross-tied",
  n,
  p,
  share,
});

/** Share of all equally likely banks with a stage over the limit. */
function counted({ n, p, share }: TailCase): number {
  const units = n * p;
  let over = 0;
  for (let code = 0; code < 6 ** units; code++) {
    let rest = code;
    let total = 0;
    let most = 0;
    for (let stage = 0; stage < n; stage++) {
      let c = 0;
      for (let unit = 0; unit < p; unit++) {
        c += LOT[rest % 6]!;
        rest = Math.floor(rest / 6);
      }
      total += 1 / c;
      most = Math.max(most, 1 / c);
    }
    if (most > share * total * (1 + 1e-12)) over++;
  }
  return over / 6 ** units;
}

describe("exceedRisk(case) of a lot of 6", () => {
  test("2s1p, 2s2p, 3s2p: exactly the share of all 6^(np) banks, where two stages cannot be over at once", () => {
    for (const [n, p, share] of [
      [2, 1, 0.51],
      [2, 1, 0.54],
      [2, 2, 0.515],
      [2, 2, 0.54],
      [3, 2, 0.37],
      [3, 2, 0.373],
    ] as const) {
      const given = asked(n, p, share);
      const exact = counted(given);
      expect(exact).toBeGreaterThan(0);
      const found = exceedRisk(given);
      expect(Math.abs(found.exceed - exact)).toBeLessThanOrEqual(found.error + 1e-12);
      expect(found.exceed / exact).toBeCloseTo(1, n === 2 ? 10 : 2);
    }
  });

  test("3s1p, 4s1p where two can be over at once: within the error stated, and within 5 %", () => {
    for (const [n, share] of [
      [3, 0.35],
      [3, 0.36],
      [4, 0.265],
      [4, 0.28],
      [4, 0.285],
    ] as const) {
      const given = asked(n, 1, share);
      const exact = counted(given);
      const found = exceedRisk(given);
      expect(Math.abs(found.exceed / exact - 1)).toBeLessThan(0.05);
    }
  });

  test("a share exactly at the limit is within it", () => {
    // 0.91 against 1.09: 1.09/2 exactly.
    expect(exceedRisk(asked(2, 1, 1.09 / 2)).exceed).toBe(0);
    expect(exceedRisk(asked(2, 1, 1.09 / 2 - 1e-9)).exceed).toBeCloseTo(2 / 36, 12);
  });
});

describe("lotStages(case)", () => {
  test("null for a smooth law and for a lot of too many combinations; blur 0 when all are kept", () => {
    expect(lotStages({ ...asked(2, 1, 0.5), law: { kind: "uniform", low: 1, high: 2 } })).toBeNull();
    const many = Array.from({ length: 50 }, (_, k) => 1 + 0.1 * Math.sqrt(k));
    expect(lotStages(asked(4, 12, 0.3, many))).toBeNull();
    expect(lotStages(asked(4, 2, 0.3))!.blur).toBe(0);
    expect(lotStages(asked(12, 1, 0.3, many))!.blur).toBeGreaterThan(0);
  });

  test("two stages: the one other is the unit's own, and there are no two others", () => {
    const { stages } = lotStages(asked(2, 1, 0.5))!;
    expect(stages.butTwoBelow).toBeNull();
    expect([0.9, 0.95, 0.97, 1.01, 1.045, 1.11].map((x) => stages.butOneBelow(x))).toEqual(
      [0, 1, 2, 4, 5, 6].map((count) => expect.closeTo(count / 6, 12)),
    );
  });

  test("too many sums to keep apart: on a lattice, and off by no more than the blur that it states", () => {
    const values = Array.from({ length: 60 }, (_, k) => 1 + 0.1 * Math.sqrt(k));
    const { stages, blur } = lotStages(asked(4, 1, 0.3, values))!;
    expect(blur).toBeGreaterThan(0);
    expect(blur).toBeLessThan(1e-4);
    const inverse = values.map((c) => 1 / c);
    const two = inverse.flatMap((a) => inverse.map((b) => a + b));
    const three = two.flatMap((a) => inverse.map((b) => a + b));
    const share = (sums: readonly number[], x: number) => sums.filter((sum) => sum < x).length / sums.length;
    for (const [below, sums, at] of [
      [stages.butTwoBelow!, two, [1.2, 1.3, 1.5, 1.8]],
      [stages.butOneBelow, three, [1.8, 2, 2.2, 2.6]],
    ] as const)
      for (const x of at) {
        expect(below(x)).toBeGreaterThanOrEqual(share(sums, x - 4 * blur) - 1e-9);
        expect(below(x)).toBeLessThanOrEqual(share(sums, x + 4 * blur) + 1e-9);
      }
    // One other on its rough lattice: the mass of one, and the mean of 1/C.
    const { first, step, masses } = stages.other;
    expect(masses.reduce((sum, mass) => sum + mass, 0)).toBeCloseTo(1, 12);
    const mean = masses.reduce((sum, mass, k) => sum + mass * (first + k * step), 0);
    expect(mean).toBeCloseTo(inverse.reduce((sum, x) => sum + x, 0) / 60, 12);
  });

  test("the stage that is over: descending 1/C, chances summing to 1", () => {
    const { victim } = lotStages(asked(3, 2, 0.35))!.stages;
    expect(victim.values[0]).toBeCloseTo(1 / (2 * 0.91), 14);
    expect(victim.values.every((value, k) => k === 0 || value < victim.values[k - 1]!)).toBe(true);
    expect(victim.masses.reduce((sum, mass) => sum + mass, 0)).toBeCloseTo(1, 12);
  });
});
