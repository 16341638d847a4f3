// Source: [methods-derived] A15: m = 5, 3300 uF, 400 V, 0.05 ohm: 1056 J, of which 844.8 J in the faulted leg and 52.8 J in each other.
import { describe, expect, test } from "vitest";
import type { FaultBank } from "../../src/pulse/faultBank.ts";
import { unitShortLoop } from "../../src/pulse/faultCurrents.ts";
import { faultEnergy } from "../../src/pulse/faultEnergy.ts";
import { near } from "./near.ts";

const BANK: FaultBank = {
  series: 4,
  parallel: 5,
  ties: "cross-tied",
  unit: { capacitance: 3300e-6, ratedVoltage: 450, esr: 0, esl: 0 },
  voltage: 1600,
  worstCharging: 400,
  worstHolding: null,
  isolatingResistance: 0.05,
};
const split = (more: Partial<FaultBank>) => {
  const bank = { ...BANK, ...more };
  return faultEnergy(bank, unitShortLoop(bank), 1056);
};

describe("faultEnergy(bank, loop, neighbours)", () => {
  test("Source: methods A15: an ideal short takes nothing, its leg 844.8 J, the four others 52.8 J each", () => {
    const { unit, isolating } = split({ shortResistance: 0 });
    expect(unit).toBe(0);
    near(isolating?.faulted as number, 844.8, 1e-9);
    near(isolating?.others as number, 4 * 52.8, 1e-9);
  });

  test("the parts add up to what the neighbours have, their ESR counted with them", () => {
    const bank = { shortResistance: 0.02, unit: { ...BANK.unit, esr: 0.01 } };
    const { unit, isolating } = split(bank);
    const esr = (isolating?.others as number) * (0.01 / 0.05);
    near(unit + (isolating?.faulted as number) + (isolating?.others as number) + esr, 1056, 1e-9);
    near(unit / (isolating?.faulted as number), 0.02 / 0.05, 1e-9);
  });

  test("strings: the rest of the faulted string has its resistors in the loop too", () => {
    const { unit, isolating } = split({ ties: "strings", shortResistance: 0.05 });
    near((isolating?.others as number) / (isolating?.faulted as number), 4 / 4 + 3, 1e-9);
    near(unit + (isolating?.faulted as number) + (isolating?.others as number), 1056, 1e-9);
  });

  test("the short's own resistance not told: the unit is counted with all of it, whatever the resistors", () => {
    expect(split({})).toEqual({ unit: 1056, isolating: null });
    expect(split({ parallel: 1, shortResistance: 0.1 })).toEqual({ unit: 1056, isolating: null });
  });

  test("without isolating resistors none are told; the short shares with the neighbours' ESR alone", () => {
    const { unit, isolating } = split({
      isolatingResistance: null,
      shortResistance: 0.01,
      unit: { ...BANK.unit, esr: 0.04 },
    });
    expect(isolating).toBeNull();
    near(unit, 1056 / 2, 1e-9);
  });
});
