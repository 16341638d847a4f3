import { describe, expect, test } from "vitest";
import { fullVoltage, holdCaseOf } from "../../../src/search/sharing/holdCase.ts";
import { bankOf, briefOf, UNIT } from "../../support/bank.ts";

describe("holdCaseOf(bank)", () => {
  const brief = briefOf({ overshoot: "5 %", hold: "30 s" });

  test("cross-tied stages share a resistor, strings do not; the voltage has its overshoot", () => {
    const tied = holdCaseOf({ result: bankOf(), unit: UNIT, brief });
    const strings = bankOf({ layout: { part: "x", series: 8, parallel: 2, ties: "strings" } });
    expect(tied).toMatchObject({ n: 8, m: 2, C: 1e-3, tLow: 0.2, tHigh: 0.2, leakage: 1e-4, V: 2100, hold: 30 });
    expect(tied?.insulation).toBe(Number.POSITIVE_INFINITY);
    expect(holdCaseOf({ result: strings, unit: UNIT, brief })?.m).toBe(1);
    expect(fullVoltage(brief)).toBe(2100);
  });

  test("unknown tolerance or leakage: null; insulation stands in for a leakage current", () => {
    const { tolerance: _t, ...wide } = UNIT;
    const { leakage: _l, ...dark } = UNIT;
    expect(holdCaseOf({ result: bankOf(), unit: wide, brief })).toBeNull();
    expect(holdCaseOf({ result: bankOf(), unit: dark, brief })).toBeNull();
    const film = holdCaseOf({ result: bankOf(), unit: { ...dark, insulation: 1e9 }, brief });
    expect(film).toMatchObject({ leakage: 0, insulation: 1e9 });
  });
});
