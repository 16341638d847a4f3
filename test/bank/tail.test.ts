// The tail against closed forms, counting, importance sampling, and the limits where it must be exactly 0 or 1.
import { describe, expect, test, vi } from "vitest";
import { countedRisk, monteCarloChunk } from "../../src/bank/monteCarlo.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";
import { exceedRisk, tailFaults } from "../../src/bank/tail.ts";
import { riskBound } from "../../src/bank/tailBound.ts";
import type { TailCase, UnitLaw } from "../../src/bank/tailLaw.ts";
import { type ImportanceCase, importanceTail } from "./importance.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const EVEN: UnitLaw = { kind: "uniform", low: 0.8, high: 1.2 };
const asked = (over: Partial<TailCase>): TailCase => ({
  law: EVEN,
  ties: "cross-tied",
  n: 8,
  p: 12,
  share: 0.15,
  ...over,
});
const worstShare = (n: number, low = 0.8, high = 1.2): number => high / (high + (n - 1) * low);

describe("exceedRisk(case): limits", () => {
  test("a limit at or above the worst of all corners is never exceeded: exactly 0", () => {
    for (const ties of ["cross-tied", "strings"] as const)
      for (const n of [2, 3, 8, 40]) {
        const share = worstShare(n);
        for (const limit of [share, share * 1.001, 1, 2])
          expect(exceedRisk(asked({ ties, n, share: limit }))).toMatchObject({ exceed: 0, error: 0 });
        const inside = exceedRisk(asked({ ties, n, p: 1, share: share * 0.999 }));
        expect(inside.exceed + inside.error).toBeGreaterThan(0);
        if (n < 40) expect(inside.exceed).toBeGreaterThan(0);
      }
  });

  test("a limit below the even share is always exceeded: exactly 1", () => {
    expect(exceedRisk(asked({ share: 0.124 }))).toMatchObject({ exceed: 1, error: 0 });
  });

  test("a lot of units all alike: only the even share counts", () => {
    const law: UnitLaw = { kind: "lot", values: [1, 1, 1, 1, 1] };
    expect(exceedRisk(asked({ law, share: 0.126 })).exceed).toBe(0);
    expect(exceedRisk(asked({ law, share: 0.124 })).exceed).toBe(1);
  });

  test("one stage: V itself is over any limit below it", () => {
    expect(exceedRisk(asked({ n: 1, share: 0.9 })).exceed).toBe(1);
    expect(exceedRisk(asked({ n: 1, share: 1 })).exceed).toBe(0);
  });
});

describe("exceedRisk(case): closed forms", () => {
  test("n = 2, p = 1, uniform: the triangle (hi - k lo)^2 / (k width^2), k = s/(1 - s), from 0.6 to 1e-12", () => {
    for (const share of [0.52, 0.55, 0.58, 0.599, 0.5999, 0.599999, 0.5999999]) {
      const k = share / (1 - share);
      const exact = (1.2 - k * 0.8) ** 2 / (k * 0.4 ** 2);
      const found = exceedRisk(asked({ n: 2, p: 1, share }));
      expect(found.exceed / exact).toBeCloseTo(1, 6);
      expect(Math.abs(found.exceed - exact)).toBeLessThanOrEqual(found.error + 1e-6 * exact);
    }
  });

  test("n = 3..6, p = 1, uniform: near the corner it is a simplex, volume d^n/n! over its slopes, to 1 %", () => {
    for (const n of [3, 4, 5, 6]) {
      const share = worstShare(n) * (1 - 2e-4);
      const kappa = (1 - share) / share;
      const room = kappa / 0.8 - (n - 1) / 1.2;
      let volume = 1;
      // One edge along the victim's capacitance, n - 1 along the others'.
      for (let i = 1; i <= n; i++) volume *= room / i / (i === 1 ? kappa / 0.8 ** 2 : 1 / 1.2 ** 2) / 0.4;
      expect(exceedRisk(asked({ n, p: 1, share })).exceed / (n * volume)).toBeCloseTo(1, 2);
    }
  });

  test("strings: 1 - (1 - P)^p of one string's chance", () => {
    const one = exceedRisk(asked({ ties: "strings", n: 4, p: 1, share: 0.33 })).exceed;
    for (const p of [2, 10, 1000])
      expect(exceedRisk(asked({ ties: "strings", n: 4, p, share: 0.33 })).exceed).toBeCloseTo(1 - (1 - one) ** p, 12);
  });
});

describe("exceedRisk(case): what a lot has in common divides out", () => {
  test("every unit 7 % higher, or in pF instead of F: the same chance", () => {
    for (const law of [EVEN, { kind: "normal", nominal: 1, tLow: 0.2, tHigh: 0.3 } as const]) {
      const scaled = (by: number): UnitLaw =>
        law.kind === "uniform" ? { ...law, low: law.low * by, high: law.high * by } : { ...law, nominal: by };
      const plain = exceedRisk(asked({ law, share: 1.12 / 8 })).exceed;
      expect(plain).toBeGreaterThan(1e-8);
      for (const by of [1.07, 1e-12])
        expect(exceedRisk(asked({ law: scaled(by), share: 1.12 / 8 })).exceed / plain).toBeCloseTo(1, 8);
    }
  });

  test("banks counted with a shift of +-10 % of their own for each bank agree with the chance without", () => {
    const draw = uniformFrom(streamState(31, 0));
    const share = 0.29;
    let over = 0;
    const banks = 200_000;
    for (let bank = 0; bank < banks; bank++) {
      const shift = 0.9 + 0.2 * draw();
      let total = 0;
      let most = 0;
      for (let stage = 0; stage < 4; stage++) {
        let c = 0;
        for (let unit = 0; unit < 3; unit++) c += shift * (0.8 + 0.4 * draw());
        total += 1 / c;
        most = Math.max(most, 1 / c);
      }
      if (most > share * total) over++;
    }
    const chance = exceedRisk(asked({ n: 4, p: 3, share })).exceed;
    expect(Math.abs(over / banks - chance)).toBeLessThan(4 * Math.sqrt(chance / banks));
  });
});

describe("exceedRisk(case) against counting 1e6 banks", () => {
  const laws: readonly (readonly [string, UnitLaw])[] = [
    ["uniform", EVEN],
    ["uniform, lopsided", { kind: "uniform", low: 0.9, high: 1.5 }],
    ["normal", { kind: "normal", nominal: 1, tLow: 0.2, tHigh: 0.2 }],
    ["normal, lopsided", { kind: "normal", nominal: 1, tLow: 0.1, tHigh: 0.5 }],
    ["a lot of 9", { kind: "lot", values: [0.9, 0.93, 0.95, 0.97, 1, 1.01, 1.03, 1.04, 1.08] }],
  ];
  for (const [name, law] of laws)
    test(`${name}, both ties, small and large chances`, () => {
      for (const [ties, n, p, over] of [
        ["cross-tied", 2, 3, 1.02],
        ["cross-tied", 4, 5, 1.04],
        ["cross-tied", 8, 3, 1.1],
        ["cross-tied", 8, 3, 1.03],
        ["cross-tied", 6, 12, 1.03],
        ["strings", 3, 2, 1.1],
        ["strings", 6, 2, 1.14],
      ] as const) {
        const given = asked({ law, ties, n, p, share: over / n });
        const found = exceedRisk(given);
        const counted = countedRisk(monteCarloChunk(given, { seed: 1, chunk: n, banks: 1e6 }));
        expect(counted.exceed).toBeGreaterThan(1e-5);
        // Five sigma of the count and what the tail says of itself: 35 comparisons in all.
        expect(Math.abs(found.exceed - counted.exceed)).toBeLessThan(5 * counted.error + found.error);
      }
    });
});

describe("exceedRisk(case) against importance sampling where counting cannot see", () => {
  const cases: readonly (ImportanceCase & { readonly about: number })[] = [
    { n: 3, p: 1, low: 0.8, high: 1.2, share: 0.4284, about: 1e-9 },
    { n: 4, p: 2, low: 0.8, high: 1.2, share: 0.323, about: 1e-6 },
    { n: 6, p: 5, low: 0.9, high: 1.1, share: 1.115 / 6, about: 1e-7 },
    { n: 8, p: 12, low: 0.8, high: 1.2, share: 1.168 / 8, about: 1e-6 },
    { n: 8, p: 12, low: 0.8, high: 1.2, share: 1.2 / 8, about: 1e-9 },
  ];
  for (const given of cases)
    test(`${given.n}s${given.p}p at ${given.about}: within 5 % and within the errors stated`, {
      timeout: 60_000,
    }, () => {
      const found = exceedRisk(asked({ ...given, law: { kind: "uniform", low: given.low, high: given.high } }));
      const drawn = importanceTail(given, given.n * given.p < 50 ? 200_000 : 80_000, 12);
      expect(drawn.error / drawn.exceed).toBeLessThan(0.015);
      expect(Math.abs(Math.log10(found.exceed / given.about))).toBeLessThan(1.5);
      expect(found.error / found.exceed).toBeLessThan(0.05);
      expect(Math.abs(found.exceed / drawn.exceed - 1)).toBeLessThan(0.05);
      expect(Math.abs(found.exceed - drawn.exceed)).toBeLessThan(4 * drawn.error + found.error);
    });

  test("8s12p, +-20 % uniform: the quantiles measured with 2e7 to 1e8 banks [findings on Monte Carlo, section 3]", () => {
    for (const [over, measured, error] of [
      [1.09937, 1.0011e-2, 1.0e-5],
      [1.1207, 9.974e-4, 3.2e-6],
      [1.13869, 9.85e-5, 1.0e-6],
    ] as const) {
      const found = exceedRisk(asked({ share: over / 8 }));
      expect(Math.abs(found.exceed - measured)).toBeLessThan(3 * error + found.error);
    }
  });
});

describe("exceedRisk(case): what it says of itself", () => {
  test("error below 5 % from 0.5 down to 1e-9 (10 % above), laws and shapes of every kind", () => {
    const laws: readonly UnitLaw[] = [
      EVEN,
      { kind: "normal", nominal: 1, tLow: 0.2, tHigh: 0.2 },
      { kind: "normal", nominal: 1, tLow: 0.1, tHigh: 0.5 },
      { kind: "lot", values: [0.9, 0.93, 0.97, 1, 1.03, 1.04, 1.08] },
    ];
    for (const law of laws)
      for (const [n, p] of [
        [3, 2],
        [8, 3],
        [8, 12],
      ] as const)
        for (const over of [1.05, 1.1, 1.15]) {
          const { exceed, error, unionBound, unionExcess } = exceedRisk(asked({ law, n, p, share: over / n }));
          if (exceed < 1e-9) continue;
          expect(error / exceed).toBeLessThan(exceed > 0.5 ? 0.1 : 0.05);
          expect(unionBound - unionExcess).toBeCloseTo(exceed, 12);
          expect(unionExcess).toBeGreaterThanOrEqual(0);
        }
  });

  test("falls as the limit rises", () => {
    let last = 1;
    for (let over = 1.02; over < 1.25; over += 0.01) {
      const { exceed } = exceedRisk(asked({ share: over / 8 }));
      expect(exceed).toBeLessThan(last);
      last = exceed;
    }
  });
});

describe("tailFaults(case)", () => {
  test("each fault by its own words; a good case has none", () => {
    expect(tailFaults(asked({}))).toEqual([]);
    expect(tailFaults(asked({ law: { kind: "lot", values: [1, 2, 3, 4] } }))).toEqual([
      "lot too small for a distribution",
    ]);
    expect(tailFaults(asked({ law: { kind: "uniform", low: 0, high: 1 } }))).toEqual(["capacitance not above zero"]);
    expect(tailFaults(asked({ share: 0 }))).toEqual(["share not above zero"]);
    expect(tailFaults(asked({ n: 1.5 }))).toEqual(["counts not whole numbers from 1"]);
  });
});

test("a chance too small for the lattices is bounded rigorously: 8s13p at +-10 %, 1 % under the worst share, is no 2.5 %", () => {
  const given: TailCase = {
    law: { kind: "uniform", low: 0.9, high: 1.1 },
    ties: "cross-tied",
    n: 8,
    p: 13,
    share: 324 / 2200,
  };
  const { exceed, error } = exceedRisk(given);
  expect(exceed + error).toBeLessThanOrEqual(riskBound(given));
  expect(exceed + error).toBeLessThan(1e-90);
  expect(exceed + error).toBeGreaterThan(0);
});
