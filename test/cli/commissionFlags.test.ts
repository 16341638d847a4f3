import { expect, test } from "vitest";
import { readCommissionFlags } from "../../src/cli/commissionFlags.ts";

test("readCommissionFlags: a handheld meter is assumed and marked; faults are told together", () => {
  expect(readCommissionFlags({})).toEqual({
    choices: { meter: 0.005, resolution: 0.1, meterAssumed: true, charger: "on", next: null },
    faults: [],
  });
  expect(readCommissionFlags({ meter: "0.1 %", balance: "none", nextVoltage: "2 kV" }).choices).toMatchObject({
    meter: expect.closeTo(0.001, 12),
    meterAssumed: false,
    resistance: "none",
    next: { bank: 2000, seconds: 0 },
  });
  const { faults } = readCommissionFlags({ meter: "0", charger: "maybe", nextHold: "5 min" });
  expect(faults.map((fault) => fault.place.field)).toEqual(["--meter", "--charger", "--next-hold"]);
});
