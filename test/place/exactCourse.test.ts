import { expect, test } from "vitest";
import { chargerOn } from "../../src/place/diagnoseModel.ts";
import { exactCourse } from "../../src/place/exactCourse.ts";

const stages = [
  { capacitance: 9e-3, conductance: 2e-6, resistance: 47e3 },
  { capacitance: 10e-3, conductance: 5e-6, resistance: 47e3 },
  { capacitance: 11e-3, conductance: 1e-6, resistance: Number.POSITIVE_INFINITY },
];

test("exactCourse: sums to the bank voltage, agrees with the small model to 2e-4 of it, at once and after a hold", () => {
  const times = [0, 60, 600, 6000];
  const exact = exactCourse(stages, 1000, times);
  const model = chargerOn(stages, 1000, times);
  for (const [k, row] of exact.entries()) {
    expect(row.volts.reduce((sum, v) => sum + v, 0)).toBeCloseTo(1000, 8);
    for (const [i, v] of row.volts.entries()) expect(Math.abs(v - model[k]!.volts[i]!)).toBeLessThan(0.2);
    expect(row.current / model[k]!.current).toBeCloseTo(1, 2);
  }
  expect(exactCourse(stages, 1000, [0])[0]!.volts[0]).toBeCloseTo((1000 * (1 / 9)) / (1 / 9 + 1 / 10 + 1 / 11), 9);
});
