// faultHold: one and two stages, unknowns, then the cases of the holding formula and of a circuit stepped in time.
import { describe, expect, test } from "vitest";
import type { HoldCase } from "../../src/bank/index.ts";
import { rowShort, unitOpen, unitShort } from "../../src/pulse/chainFaults.ts";
import { heldWithOpen, heldWithoutResistor, heldWithShort } from "../../src/pulse/faultHold.ts";
import { tied } from "./faultBanks.ts";

const hold: HoldCase = { ...(tied.hold as HoldCase), leakage: 2e-3, R: 24e3, q: 0.05, tLow: 0.1, tHigh: 0.1 };
const leaky = { ...tied, hold };

describe("heldWithShort(bank), heldWithOpen(bank), heldWithoutResistor(bank)", () => {
  test("one stage leaves nothing, two the whole voltage, whatever is unknown; else unknown is null", () => {
    expect(heldWithShort({ ...tied, series: 1, hold: null })).toBe(0);
    expect(heldWithShort({ ...tied, series: 2, hold: null })).toBe(1600);
    expect(heldWithShort({ ...tied, hold: null })).toBeNull();
    expect(heldWithOpen({ ...tied, parallel: 1, hold: null })).toBe(1600);
    expect(heldWithOpen({ ...tied, hold: null })).toBeNull();
    expect(heldWithoutResistor({ ...tied, hold: null, balance: { resistance: 1e4, hold: 5 } })).toBeNull();
    expect(heldWithoutResistor({ ...tied, hold: null, balance: { resistance: 1e4, hold: null } })).toBe(1600);
  });

  // c1 dv + g1 v = c2 drest + g2 rest + leak stepped in time; four low units of the stage against five high ones of the rest.
  test("a stage short of a unit: it begins higher and climbs faster, as the circuit stepped in time does", () => {
    const seconds = 30;
    const [c1, c2] = [4 * 3300e-6 * 0.9, 5 * 3300e-6 * 1.1];
    let v = (1600 * c2) / (c2 + 3 * c1);
    for (let k = 0; k < 100000; k++) {
      const rest = (1600 - v) / 3;
      v += (((rest / 24e3 / 0.95 + 5 * 2e-3 - v / 24e3 / 1.05) / (c1 + c2 / 3)) * seconds) / 100000;
    }
    expect(heldWithOpen({ ...leaky, hold: { ...hold, hold: seconds } })).toBeCloseTo(v, 1);
  });

  test("after an endless hold a missing unit makes no odds, and never less than the sound bank's worst", () => {
    const settled = (1600 / 3 / 0.95 + 5 * 2e-3 * 24e3) / (1 / 1.05 + 1 / 3 / 0.95);
    expect(heldWithOpen(leaky)).toBeCloseTo(settled, 6);
    expect(heldWithOpen({ ...leaky, worstHolding: 900 })).toBe(900);
  });
});

describe("faults with the charger on are judged after the hold", () => {
  // 450 V units, 3s2p at 840 V, 60 s, 15 kohm 5 %: 428.4 V by the charge alone, 478.1 V by the end of the hold.
  test("a pass at 428.4 V is a fail at 478.1 V", () => {
    const held = { ...hold, n: 3, m: 2, C: 1e-3, tLow: 0.02, tHigh: 0.02, leakage: 3e-3, R: 15e3, V: 840, hold: 60 };
    const unit = { ...tied.unit, capacitance: 1e-3, toleranceLow: 0.02, toleranceHigh: 0.02, ruptureEnergy: 1e6 };
    const bank = { ...tied, series: 3, parallel: 2, voltage: 840, worstCharging: 287, unit, hold: held };
    for (const fault of [unitShort(bank), rowShort(bank)]) {
      expect(fault.worstVoltageSpread).toBeCloseTo(428.4, 1);
      expect(fault.worstHeld).toBeCloseTo(478.1, 1);
      expect(fault.verdict).toBe("fail");
    }
  });

  test("unknown leakage does not pass on the charge alone; over at once is over all the same", () => {
    const unit = { ...tied.unit, ratedVoltage: 600, ruptureEnergy: 1e6 };
    expect(unitShort({ ...tied, unit, hold: null })).toMatchObject({ worstHeld: null, verdict: "not assessed" });
    expect(unitOpen({ ...tied, hold: null }).verdict).toBe("fail");
    expect(unitShort({ ...tied, hold: null }).verdict).toBe("fail");
  });

  test("no figure is below the sound bank's worst, whatever the fault", () => {
    const high = { ...leaky, worstHolding: 1100 };
    for (const fault of [unitShort(high), unitOpen(high), rowShort(high)]) expect(fault.worstHeld).toBe(1100);
  });
});
