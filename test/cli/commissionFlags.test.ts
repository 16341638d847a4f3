import { expect, test } from "vitest";
import { readCommissionFlags } from "../../src/cli/commissionFlags.ts";

test("readCommissionFlags: a handheld meter is assumed and marked; faults are told together", () => {
  expect(readCommissionFlags({})).toEqual({
    choices: { meter: 0.005, resolution: 0.1, meterAssumed: true, charger: "on", next: null, life: {} },
    faults: [],
  });
  expect(readCommissionFlags({ meter: "0.1 %", balance: "none", nextVoltage: "2 kV" }).choices).toMatchObject({
    meter: expect.closeTo(0.001, 12),
    meterAssumed: false,
    resistance: "none",
    next: { bank: 2000, seconds: 0 },
  });
  expect(
    readCommissionFlags({ history: "l", capacitanceLost: "20 %", esrGrown: "200 %", leakageMost: "2 mA" }).choices.life,
  ).toEqual({
    capacitance: 0.2,
    esr: 2,
    leakage: expect.closeTo(2e-3, 12),
  });
  const { faults } = readCommissionFlags({ meter: "0", charger: "maybe", nextHold: "5 min" });
  expect(faults.map((fault) => fault.place.field)).toEqual(["--meter", "--charger", "--next-hold"]);
});
