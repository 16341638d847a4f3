// The bound on a chance: never below the exact tail, sharp enough to be of use, and sane at its edges.
import { describe, expect, test } from "vitest";
import { exceedRisk } from "../../src/bank/tail.ts";
import { riskBound } from "../../src/bank/tailBound.ts";
import type { TailCase, UnitLaw } from "../../src/bank/tailLaw.ts";

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
