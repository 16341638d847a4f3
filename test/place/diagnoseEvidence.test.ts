import { describe, expect, test } from "vitest";
import { covariance, observed, predicted } from "../../src/place/diagnoseEvidence.ts";
import { chargerOn, type StageModel } from "../../src/place/diagnoseModel.ts";

const stages: StageModel[] = [1, 2].map(() => ({ capacitance: 1e-2, conductance: 1e-6, resistance: 50e3 }));
const meter = { relative: 0.001, absolute: 0.1, common: 0, current: 0.05 };
const row = (volts: readonly (number | null)[], more: object = {}) => ({ seconds: 0, bank: 200, volts, ...more });

describe("observed(rows) and predicted(course, stages, rows)", () => {
  test("blank readings are left out on both sides; bank and charger readings follow the stages", () => {
    const rows = [row([101, null], { total: 199 }), { ...row([null, 98], { current: 4e-4 }), seconds: 100 }];
    expect(observed(rows)).toEqual([101, 199, 98, 4e-4]);
    const f = predicted(chargerOn, stages, rows);
    expect(f.length).toBe(4);
    expect(f[0]).toBeCloseTo(100, 9);
    expect(f[3]).toBeCloseTo(100 * 21e-6, 9);
  });
  test("rows in any order of time, at two bank voltages", () => {
    const rows = [{ ...row([1, 1]), seconds: 900 }, row([1, 1]), { ...row([1, 1]), bank: 100 }];
    const f = predicted(chargerOn, stages, rows);
    for (const [k, v] of [100, 100, 100, 100, 50, 50].entries()) expect(f[k]).toBeCloseTo(v, 6);
  });
});

describe("covariance(course, question)", () => {
  test("by hand: meter noise and capacitance doubt of two equal stages, which go opposite ways", () => {
    const doubt = { capacitance: 0.01, leakage: 0, resistance: 0, bank: 0 };
    const lower = covariance(chargerOn, { stages, rows: [row([100, 100])], meter, doubt });
    const s00 = lower[0]![0]! ** 2;
    const s01 = lower[1]![0]! * lower[0]![0]!;
    // dV1/dlnC1 = -V/4 = -50 V, dV1/dlnC2 = +50 V: variance 2 (0.5 V)^2 beside 0.1^2 + 0.1^2 of the meter.
    expect(s00).toBeCloseTo(0.02 + 0.5, 2);
    expect(s01).toBeCloseTo(-0.5, 2);
  });
  test("a doubt of the bank voltage moves the readings of one row together", () => {
    const doubt = { capacitance: 0, leakage: 0, resistance: 0, bank: 0.02 };
    const lower = covariance(chargerOn, { stages, rows: [row([100, 100])], meter, doubt });
    expect(lower[1]![0]! * lower[0]![0]!).toBeCloseTo(4, 6);
  });
});
