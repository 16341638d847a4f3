// The bound on a chance: never below the exact tail, sharp enough to be of use, and sane at its edges.
import { describe, expect, test, vi } from "vitest";
import { exceedRisk } from "../../src/bank/tail.ts";
import { riskBound } from "../../src/bank/tailBound.ts";
import { lawRange, type TailCase, type UnitLaw } from "../../src/bank/tailLaw.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const laws: readonly (readonly [string, UnitLaw])[] = [
  ["uniform", { kind: "uniform", low: 0.8, high: 1.2 }],
  ["normal", { kind: "normal", nominal: 1, tLow: 0.2, tHigh: 0.2 }],
  ["lopsided normal", { kind: "normal", nominal: 1, tLow: 0.1, tHigh: 0.3 }],
  ["lot", { kind: "lot", values: [0.9, 0.95, 1, 1.02, 1.1] }],
];

describe("riskBound(case)", () => {
  test("a limit at the even share or below is no bound at all: 1", () => {
    const law: UnitLaw = { kind: "uniform", low: 0.8, high: 1.2 };
    expect(riskBound({ n: 4, p: 2, ties: "cross-tied", share: 0.25, law })).toBe(1);
    expect(riskBound({ n: 4, p: 2, ties: "cross-tied", share: 0.2, law })).toBe(1);
  });

  /** Values of a law and their weights: Simpson over 400 cells of a smooth one, a lot as it is. */
  function weighted(law: UnitLaw): readonly (readonly [value: number, weight: number])[] {
    if (law.kind === "lot") return law.values.map((value) => [value, 1 / law.values.length] as const);
    const [low, high] =
      law.kind === "uniform" ? [law.low, law.high] : [law.nominal * (1 - law.tLow), law.nominal * (1 + law.tHigh)];
    const density = (value: number): number => {
      if (law.kind === "uniform") return 1;
      const sigma = (law.nominal * (value < law.nominal ? law.tLow : law.tHigh)) / 3;
      return Math.exp(-0.5 * ((value - law.nominal) / sigma) ** 2);
    };
    const points = Array.from({ length: 401 }, (_, k) => {
      const value = low + ((high - low) * k) / 400;
      return [value, density(value) * (k === 0 || k === 400 ? 1 : k % 2 === 1 ? 4 : 2)] as const;
    });
    const whole = points.reduce((sum, [, weight]) => sum + weight, 0);
    return points.map(([value, weight]) => [value, weight / whole] as const);
  }

  test.each(laws)(
    "%s: the least over x of n e^(p((n - 1)K(kx) + K(-(n - 1)^2 x))), K by numbers, x by small steps",
    (_, law) => {
      const points = weighted(law);
      const logMean = (x: number): number => {
        const top = Math.max(...points.map(([value]) => x * value));
        return top + Math.log(points.reduce((sum, [value, weight]) => sum + weight * Math.exp(x * value - top), 0));
      };
      const { low, high } = lawRange(law);
      for (const [n, p, ties, part] of [
        [2, 1, "cross-tied", 0.9],
        [4, 3, "cross-tied", 0.6],
        [4, 3, "strings", 0.8],
        [6, 2, "strings", 0.7],
      ] as const) {
        const share = 1 / n + part * (high / (high + (n - 1) * low) - 1 / n);
        const kappa = (1 - share) / share;
        let least = Number.POSITIVE_INFINITY;
        for (let step = 0; step <= 160; step++) {
          const x = 10 ** (-1.5 + step / 40);
          const inParallel = ties === "strings" ? 1 : p;
          const exponent = inParallel * ((n - 1) * logMean(kappa * x) + logMean(-((n - 1) ** 2) * x));
          least = Math.min(least, (ties === "strings" ? n * p : n) * Math.exp(exponent));
        }
        const bound = riskBound({ n, p, ties, share, law });
        expect(bound, `${n}s${p}p ${ties}`).toBeLessThan(1);
        // The steps of x miss the valley's floor by a little; the code's cut normal counts its two ends in full, which is to the safe side.
        expect(bound / least, `${n}s${p}p ${ties}`).toBeGreaterThan(0.99);
        expect(bound / least, `${n}s${p}p ${ties}`).toBeLessThan(law.kind === "normal" ? 1.1 : 1.0001);
      }
    },
  );

  test("units all but alike: no chance beyond the even share, and no throw", () => {
    const alike = (law: UnitLaw) => riskBound({ n: 4, p: 2, ties: "cross-tied", share: 0.26, law });
    expect(alike({ kind: "uniform", low: 1, high: 1 })).toBeLessThan(1e-9);
    expect(alike({ kind: "lot", values: [1, 1, 1, 1, 1] })).toBeLessThan(1e-9);
    // No tolerance at all on one side, as a maker may state.
    const half: UnitLaw = { kind: "normal", nominal: 1, tLow: 0, tHigh: 0.2 };
    expect(alike(half)).toBeGreaterThan(0);
    expect(alike(half)).toBeLessThan(1);
  });

  test.each(laws)("%s: never below the exact chance, both ties", (_name, law) => {
    let small = 0;
    for (const n of [2, 3, 6]) {
      for (const p of [1, 4, 12]) {
        for (const ties of ["cross-tied", "strings"] as const) {
          for (const above of [1.03, 1.1, 1.2, 1.3]) {
            const one: TailCase = { n, p, ties, share: above / n, law };
            const { exceed, error } = exceedRisk(one);
            const bound = riskBound(one);
            expect(bound, JSON.stringify(one)).toBeGreaterThanOrEqual((exceed - error) * (1 - 1e-9));
            if (bound < 1e-3) small++;
          }
        }
      }
    }
    expect(small).toBeGreaterThan(3);
  });

  test("sharp within a factor of 300 at a chance near 2e-5 (8s12p, uniform 20 %, 1.15 of the even share)", () => {
    const one: TailCase = {
      n: 8,
      p: 12,
      ties: "cross-tied",
      share: 1.15 / 8,
      law: { kind: "uniform", low: 0.8, high: 1.2 },
    };
    const { exceed } = exceedRisk(one);
    expect(exceed).toBeGreaterThan(1e-5);
    expect(riskBound(one)).toBeLessThan(300 * exceed);
  });

  test("where the lattices underflow the tail takes the bound as its error, far below 1e-20", () => {
    const one: TailCase = { n: 20, p: 2, ties: "cross-tied", share: 0, law: { kind: "uniform", low: 0.9, high: 1.1 } };
    const worst = 1.1 / (1.1 + 19 * 0.9);
    const far = { ...one, share: 0.05 + (worst - 0.05) * 0.9999 };
    const { exceed, error } = exceedRisk(far);
    expect(exceed).toBeLessThanOrEqual(error);
    expect(error).toBeLessThan(1e-20);
  });
});
