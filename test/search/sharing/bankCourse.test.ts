// The course shown against the worst case that the bank layer claims, and against what must add up.
import { describe, expect, test } from "vitest";
import { worstAtHold } from "../../../src/bank/index.ts";
import { type BankCourse, bankCourse } from "../../../src/search/sharing/bankCourse.ts";
import { holdCaseOf } from "../../../src/search/sharing/holdCase.ts";
import { bankOf, briefOf, UNIT } from "../../support/bank.ts";
import { chance } from "../../support/random.ts";

const courseFor = (more: Record<string, unknown> = {}, unit = UNIT): BankCourse | null => {
  const brief = briefOf(more);
  return bankCourse({ result: bankOf({ unit, brief }), unit, brief });
};
const sumOf = (course: BankCourse, volts: readonly number[]): number =>
  volts.reduce((sum, v, i) => sum + v * (course.stages[i]?.count ?? 0), 0);

describe("bankCourse(bank)", () => {
  test("not assessed without tolerance or leakage, and none for one in series", () => {
    const { tolerance: _t, ...wide } = UNIT;
    expect(courseFor({}, wide)).toBeNull();
    const result = bankOf({ layout: { part: "x", series: 1, parallel: 2, ties: "strings" } });
    expect(bankCourse({ result, unit: UNIT, brief: briefOf() })).toBeNull();
  });

  test("charging and holding add up to V, an instant dump and what follows start from nought at the ends", () => {
    const course = courseFor({ hold: "30 s" }) as BankCourse;
    expect(course.stages.reduce((sum, { count }) => sum + count, 0)).toBe(8);
    for (const { phase, volts } of course.instants)
      if (phase === "charge" || phase === "hold") expect(sumOf(course, volts)).toBeCloseTo(2000, 6);
      else if (phase === "dump") expect(sumOf(course, volts)).toBeCloseTo(0, 6);
    expect(course.instants.length).toBeLessThanOrEqual(24);
    expect(course.phases.map(({ name }) => name)).toEqual(["charge", "hold", "dump", "rest"]);
    expect(course.lowest.voltage).toBeLessThan(0);
    expect(course.dumpResistance).toBeNull();
  });

  test("the peak is the worst case that the corners claim, 60 random finite holds: 1e-9", () => {
    const c = chance(63);
    for (let i = 0; i < 60; i++) {
      const brief = briefOf({ hold: c.between(0.5, 3000) });
      const unit = {
        ...UNIT,
        leakage: c.between(0, 5e-3),
        tolerance: { low: c.between(0, 0.3), high: c.between(0, 0.5) },
      };
      const result = {
        series: c.whole(2, 9),
        parallel: c.whole(1, 4),
        ties: c.pick(["cross-tied", "strings"] as const),
        balance: c.maybe(0.2) ? null : { resistance: c.between(1e3, 1e5), tolerance: c.pick([0, 0.01, 0.05]) },
      };
      const bank = { result, unit, brief };
      const claimed = worstAtHold(holdCaseOf(bank) as NonNullable<ReturnType<typeof holdCaseOf>>).voltage;
      const { peak } = bankCourse(bank) as BankCourse;
      expect(Math.abs(peak.voltage / claimed - 1), `${i}`).toBeLessThan(1e-9);
    }
  });

  test("an endless hold is shown until it has settled: the last instant of the hold is the holding share to 0.1 %", () => {
    const result = bankOf();
    const course = courseFor() as BankCourse;
    const last = course.instants.filter(({ phase }) => phase === "hold").at(-1);
    expect(course.endlessHold).toBe(true);
    expect(Math.abs((last?.volts[0] as number) / (result.share.holding as number) - 1)).toBeLessThan(1e-3);
  });

  test("through a resistor the dump decays by e^(-t/RC) at the ends; in strings all strings share it", () => {
    const unit = { ...UNIT, tolerance: { low: 0, high: 0 }, leakage: 0 };
    for (const ties of ["cross-tied", "strings"] as const) {
      const brief = briefOf({ hold: "1 s", dumpResistance: "50 ohm" });
      const balance = { resistance: 1e9, tolerance: 0 };
      const course = bankCourse({ result: { series: 8, parallel: 2, ties, balance }, unit, brief }) as BankCourse;
      const [first] = course.instants.filter(({ phase }) => phase === "dump");
      const after = (first?.seconds as number) - 1;
      expect(sumOf(course, first?.volts ?? [])).toBeCloseTo(2000 * Math.exp(-after / (50 * (2e-3 / 8))), 3);
    }
  });

  test("nothing that conducts: still a course, of a bank that stands still", () => {
    const brief = briefOf();
    const result = { series: 4, parallel: 2, ties: "cross-tied" as const, balance: null };
    const course = bankCourse({ result, unit: { ...UNIT, leakage: 0 }, brief }) as BankCourse;
    expect(course.peak).toMatchObject({ phase: "charge", kind: 0 });
    expect(course.instants.every(({ seconds }) => Number.isFinite(seconds))).toBe(true);
  });
});
