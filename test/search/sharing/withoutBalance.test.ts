// No resistors over a finite hold: the straight line of methods 2.1, and every corner of short chains by brute force.
import { describe, expect, test } from "vitest";
import { courseOf } from "../../../src/bank/index.ts";
import { withoutBalance } from "../../../src/search/sharing/withoutBalance.ts";
import { briefOf, UNIT } from "../../support/bank.ts";
import { chance } from "../../support/random.ts";

const bank = (more: Record<string, unknown> = {}, n = 8) => ({
  result: { series: n, parallel: 2, ties: "cross-tied" as const, balance: { resistance: 1, tolerance: 0 } },
  unit: UNIT,
  brief: briefOf(more),
});

describe("withoutBalance(bank, limit)", () => {
  test("null for one in series; not assessed without leakage", () => {
    expect(withoutBalance(bank({}, 1), 360)).toBeNull();
    const { leakage: _l, ...dark } = UNIT;
    expect(withoutBalance({ ...bank(), unit: dark }, 360)).toEqual({ holding: null, safe: null });
  });

  test("for ever the whole voltage may fall on one unit", () =>
    expect(withoutBalance(bank(), 360)).toEqual({ holding: 2000, safe: false }));

  test("Source: methods 2.1: the tight stage rises by I T/(C_1 + C_2/(n - 1)); the limit decides to the volt", () => {
    const start = (2000 * 1.2) / (1.2 + 7 * 0.8);
    const rise = (1e-4 * 10) / (1e-3 * (0.8 + 1.2 / 7));
    const found = withoutBalance(bank({ hold: "10 s" }), start + rise);
    expect(found?.holding).toBeCloseTo(start + rise, 6);
    expect(found?.safe).toBe(true);
    expect(withoutBalance(bank({ hold: "10 s" }), start + rise - 0.01)?.safe).toBe(false);
  });

  test("no corner of C and leakage of a chain of 2 to 4 stands higher at any moment, 12 random banks", () => {
    const c = chance(62);
    for (let i = 0; i < 12; i++) {
      const n = c.whole(2, 4);
      const unit = {
        ...UNIT,
        leakage: c.between(1e-4, 3e-2),
        tolerance: { low: c.between(0, 0.2), high: c.between(0, 0.3) },
      };
      const hold = c.between(1, 40);
      const given = { ...bank({ hold }, n), unit, result: { ...bank({}, n).result, ties: "strings" as const } };
      const claimed = withoutBalance(given, 360)?.holding as number;
      let most = 0;
      for (let code = 0; code < 4 ** n; code++) {
        const chain = Array.from({ length: n }, (_, k) => {
          const bits = (code >> (2 * k)) & 3;
          const capacitance = 1e-3 * (bits & 1 ? 1 + unit.tolerance.high : 1 - unit.tolerance.low);
          return {
            capacitance,
            leakageCurrent: bits & 2 ? unit.leakage : 0,
            conductance: 0,
            resistance: Number.POSITIVE_INFINITY,
          };
        });
        const course = courseOf(chain, { charge: { kind: "instant" }, voltage: 2000, hold, dump: null, rest: 0 });
        for (const phase of course.phases) for (const peak of phase.peaks()) most = Math.max(most, peak.voltage);
      }
      expect(Math.abs(claimed - most)).toBeLessThan(1e-6);
    }
  });
});
