// unitDuty: the worst share by brute force over all corners, and ratings known and unknown.
import { describe, expect, test } from "vitest";
import { type Arrangement, unitDutyOf, unitFindings, worstShare, worstSlew } from "../../src/pulse/unitDuty.ts";
import { can } from "./banks.ts";
import { near } from "./near.ts";

const of = (more: Partial<Arrangement>): Arrangement => ({
  unit: can,
  series: 3,
  parallel: 3,
  ties: "cross-tied",
  ...more,
});

/** Highest current share and highest dv/dt of any unit over every corner of a small bank at 1 A. */
function brute({ unit, series, parallel, ties }: Arrangement): { share: number; slew: number } {
  const count = series * parallel;
  const worst = { share: 0, slew: 0 };
  for (let mask = 0; mask < 2 ** count; mask++) {
    const value = (s: number, p: number): number =>
      unit.capacitance * ((mask >> (s * parallel + p)) & 1 ? 1 + unit.toleranceHigh : 1 - unit.toleranceLow);
    const rows = [...Array(series).keys()];
    const columns = [...Array(parallel).keys()];
    const strings = columns.map((p) => 1 / rows.reduce((sum, s) => sum + 1 / value(s, p), 0));
    const all = strings.reduce((a, b) => a + b, 0);
    for (const s of rows) {
      const stage = columns.reduce((sum, p) => sum + value(s, p), 0);
      for (const p of columns) {
        const current = ties === "cross-tied" ? value(s, p) / stage : strings[p]! / all;
        worst.share = Math.max(worst.share, current);
        worst.slew = Math.max(worst.slew, current / value(s, p));
      }
    }
  }
  return worst;
}

describe("worstShare(arrangement), worstSlew(arrangement, current)", () => {
  test("one unit in parallel carries all", () => expect(worstShare(of({ parallel: 1 }))).toBe(1));

  for (const ties of ["cross-tied", "strings"] as const) {
    for (const [series, parallel] of [
      [1, 3],
      [3, 1],
      [2, 3],
      [3, 3],
      [4, 2],
    ] as const) {
      test(`${series}s${parallel}p ${ties}: no corner is worse, and one is as bad`, () => {
        const arrangement = of({ ties, series, parallel, unit: { ...can, toleranceLow: 0.1, toleranceHigh: 0.3 } });
        const worst = brute(arrangement);
        near(worstShare(arrangement), worst.share, 1e-12);
        near(worstSlew(arrangement, 1), worst.slew, 1e-12);
      });
    }
  }
});

describe("unitDutyOf(arrangement, duty)", () => {
  test("even units: action per unit is the bank's over m^2, heat is ESR times that", () => {
    const even = of({ parallel: 5, unit: { ...can, toleranceLow: 0, toleranceHigh: 0 } });
    const duty = unitDutyOf(even, { peakCurrent: 100, action: 56250, reversal: 0 });
    near(duty.peakCurrent, 20, 1e-14);
    near(duty.action, 2250, 1e-14);
    near(duty.heat, 45, 1e-14);
  });

  test("unknown ESR or unbounded action leaves the heat unknown", () => {
    const blank = of({ unit: { ...can, esr: null } });
    expect(unitDutyOf(blank, { peakCurrent: 1, action: 1, reversal: 0 }).heat).toBeNull();
    expect(unitDutyOf(of({}), { peakCurrent: 1, action: null, reversal: 0 })).toMatchObject({
      action: null,
      heat: null,
    });
  });
});

describe("unitFindings(duty, ratings, bounds)", () => {
  const duty = unitDutyOf(of({}), { peakCurrent: 300, action: 10, reversal: 0.2 });
  const bounds = { peakCurrent: "value", action: "value", reversal: "value" } as const;
  const verdicts = (more: object) =>
    unitFindings(duty, { ...can.ratings, ...more }, bounds).map(({ verdict }) => verdict);

  test("no ratings: nothing is assessed, nothing passes", () => {
    expect(verdicts({})).toEqual(Array(4).fill("not assessed"));
  });

  test("each rating judges its own figure", () => {
    expect(verdicts({ peakCurrent: 200, slew: 1, action: 1e9, reversal: 0.1 })).toEqual([
      "pass",
      "fail",
      "pass",
      "fail",
    ]);
  });
});
