import { describe, expect, test } from "vitest";
import { conductancesOf } from "../../src/place/conductance.ts";

const lot = [
  { serial: "a", capacitance: 1e-3, leakage: 4e-4 },
  { serial: "b", capacitance: 1e-3, leakage: 2e-4 },
];
const asked = { series: 2, parallel: 1, ties: "cross-tied" } as const;

describe("conductancesOf(units, request)", () => {
  test("leakage over its test voltage, the resistor beside it per stage or per unit", () => {
    const cross = conductancesOf(lot, { ...asked, balanceConductance: 1e-5, leakageVoltage: 400 });
    expect(cross).toMatchObject({ known: true, perUnit: Float64Array.from([1e-6, 5e-7]), perStage: 1e-5 });
    const strings = conductancesOf(lot, { ...asked, ties: "strings", balanceConductance: 1e-5, leakageVoltage: 400 });
    expect(strings).toMatchObject({ known: true, perUnit: Float64Array.from([1e-6 + 1e-5, 5e-7 + 1e-5]), perStage: 0 });
  });
  test("what is not known is said, never taken for zero", () => {
    expect(conductancesOf([lot[0]!, { serial: "c", capacitance: 1e-3 }], asked)).toEqual({
      known: false,
      why: "missing",
      serials: ["c"],
    });
    expect(conductancesOf(lot, { ...asked, balanceConductance: 1e-5 })).toMatchObject({ why: "no test voltage" });
    expect(conductancesOf([lot[0]!, { ...lot[1]!, leakage: 0 }], asked)).toMatchObject({ why: "zero", serials: ["b"] });
  });
});
