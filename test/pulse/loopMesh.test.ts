// loopMesh: totals of a bank, and that each named bound errs the way it says.

import { describe, expect, test } from "vitest";
import { boundsOf, meshOf, pulseBankOf, unknownNotes, unknownsOf } from "../../src/pulse/loopMesh.ts";
import { dischargeOf } from "../../src/pulse/pulse.ts";
import fc from "../support/property.ts";
import { bank, can, coil } from "./banks.ts";
import { got, near } from "./near.ts";

describe("pulseBankOf(arrangement)", () => {
  test("worked: 4s5p of 3300 uF and 25 nH is 4.125 mF and 20 nH; with a 60 nH bus 80 nH", () => {
    near(bank.capacitance, 4.125e-3, 1e-14);
    near(bank.esl, 20e-9, 1e-14);
    near((bank.esl ?? 0) + 60e-9, 80e-9, 1e-14);
    near(bank.esr, 0.016, 1e-14);
  });

  test("unknown stays unknown, never zero", () => {
    const blank = pulseBankOf({ unit: { ...can, esr: null, esl: null }, series: 4, parallel: 5, ties: "strings" });
    expect(blank).toMatchObject({ esr: null, esl: null });
  });
});

describe("meshOf(bank, circuit, voltage), unknownsOf, unknownNotes", () => {
  test("leaves unknown parts out and tells each by name", () => {
    const unknown = unknownsOf({ ...bank, esr: null, esl: null }, { ...coil, bus: null });
    expect(unknown).toEqual({ esr: true, esl: true, bus: true });
    expect(unknownNotes(unknown)).toHaveLength(3);
    expect(unknownNotes(unknown)[0]).toBe("upper bound: ESR unknown, left out of the loop");
    expect(meshOf({ ...bank, esr: null }, coil, 1600).bank).toEqual({ resistance: 0, inductance: bank.esl });
  });
});

describe("boundsOf(unknown, given)", () => {
  // For each way of not knowing, the true figure (with any ESR, ESL) must lie on the side the bound names.
  test("errs the way it says, for any true ESR and ESL", () => {
    const decade = (low: number, high: number) => fc.double({ min: low, max: high, noNaN: true }).map((x) => 10 ** x);
    fc.assert(
      fc.property(
        decade(-4, 0),
        decade(-8, -5),
        fc.boolean(),
        fc.boolean(),
        fc.boolean(),
        (esr, esl, noEsr, noEsl, oneWay) => {
          const circuit = { ...coil, switch: { ...coil.switch, oneWay } };
          const whole = got(dischargeOf({ ...bank, esr, esl }, circuit, 1000));
          const told = got(dischargeOf({ ...bank, esr: noEsr ? null : esr, esl: noEsl ? null : esl }, circuit, 1000));
          const holds = (bound: string, bounded: number, actual: number): void => {
            if (bound === "upper bound") expect(actual).toBeLessThanOrEqual(bounded * (1 + 1e-9));
            if (bound === "lower bound") expect(actual).toBeGreaterThanOrEqual(bounded * (1 - 1e-9));
            if (bound === "value") expect(Math.abs(actual - bounded)).toBeLessThanOrEqual(1e-9 * Math.abs(bounded));
          };
          holds(told.bounds.peakCurrent, told.peakCurrent, whole.peakCurrent);
          holds(told.bounds.reversal, told.reversal, whole.reversal);
          holds(told.bounds.action, told.action ?? 0, whole.action ?? 0);
          holds(told.bounds.damping, told.damping ?? 0, whole.damping ?? 0);
          holds(told.bounds.loadEnergy, told.energy.load, whole.energy.load);
        },
      ),
    );
  });

  test("a given current cannot err; only the energies can", () => {
    expect(boundsOf({ esr: true, esl: true, bus: false }, true)).toMatchObject({
      peakCurrent: "value",
      reversal: "value",
      loadEnergy: "upper bound",
    });
  });
});
