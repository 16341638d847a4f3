// circuitFaults: faults outside the chain, unknowns first.
import { describe, expect, test } from "vitest";
import type { HoldCase } from "../../src/bank/index.ts";
import { bleederOpen, chargerRunning, dumpStuck, earlyFire, loadShort } from "../../src/pulse/circuitFaults.ts";
import { strings, tied } from "./faultBanks.ts";
import { near } from "./near.ts";

describe("loadShort(bank), earlyFire(bank)", () => {
  test("amperes are null when nothing limits them", () => {
    expect(loadShort(tied).peakCurrent).toBeNull();
    expect(earlyFire(tied)).toMatchObject({ peakCurrent: null, energyIntoUnit: null });
  });

  test("with ESR and bus they are the closed form's, and early fire is the shot at its highest, a bound only if one is told", () => {
    const unit = { ...tied.unit, esr: 0.02, esl: 0 };
    near(loadShort({ ...tied, unit, bus: { resistance: 0.004, inductance: 0 } }).peakCurrent, 1600 / 0.02, 1e-12);
    const shot = { peakCurrent: 9000, unitAction: null, unitHeat: 12 };
    const alone = { peakCurrent: 9000, peakIs: "side unknown", energyIntoUnit: 12, energyWorst: null };
    expect(earlyFire({ ...tied, shot })).toMatchObject(alone);
    const highest = { peakCurrent: 11000, unitHeat: 20, bound: "upper bound" } as const;
    const told = { peakCurrent: 11000, peakIs: "upper bound", energyIntoUnit: 12, energyWorst: 20 };
    expect(earlyFire({ ...tied, shot: { ...shot, highest } })).toMatchObject(told);
  });
});

describe("loadShort(bank): joules", () => {
  test("at most each unit's own, at its worst voltage", () => {
    const fault = loadShort({ ...tied, worstHolding: 440 });
    near(fault.energyIntoUnit, (3300e-6 * 440 ** 2) / 2, 1e-12);
    expect(fault).toMatchObject({ id: "load-short", worstVoltage: 440, verdict: "pass" });
  });
});

describe("what stops it, and what it means, in words", () => {
  const balance = { resistance: 24e3, hold: null };
  test.each([
    ["load-short", loadShort(tied), /until the bank is empty/, /ring may reverse/],
    ["early-fire", earlyFire(tied), /charger must stand the short/, /charger still feeding/],
    ["bleeder-open", bleederOpen(tied), /meter on every stage/, /were not told/],
    ["bleeder-open", bleederOpen({ ...tied, balance: null }), /meter on every stage/, /No balancing resistor/],
    ["bleeder-open", bleederOpen({ ...tied, series: 1, balance }), /meter/, /No balancing resistor/],
    [
      "bleeder-open",
      bleederOpen({ ...tied, balance }),
      /short each unit by hand/,
      /climbs.*After the dump its units keep/,
    ],
    ["dump-stuck", dumpStuck(tied), /stays charged/, /Open: .* Closed: /],
    ["dump-stuck", dumpStuck({ ...tied, balance: null }), /stays charged/, /Open: .* Closed: /],
    ["charger-running", chargerRunning(tied), /second, independent trip/, /highest voltage is unknown/],
    ["charger-running", chargerRunning({ ...tied, chargerHighest: 2000 }), /trip on voltage/, /Every unit rises/],
  ] as const)("%s", (id, fault, stops, note) => {
    expect(fault.id).toBe(id);
    expect(fault.stops).toMatch(stops);
    expect(fault.note).toMatch(note);
  });

  test("where nothing flows the amperes and joules are zero, known", () => {
    for (const fault of [bleederOpen({ ...tied, balance }), dumpStuck(tied), chargerRunning(tied)])
      expect(fault).toMatchObject({ peakCurrent: 0, peakIs: "value", energyIntoUnit: 0 });
    expect(dumpStuck({ ...tied, worstHolding: 440 }).worstVoltage).toBe(440);
  });

  test("a shot whose amperes are unknown gives none, not zero", () => {
    const shot = { peakCurrent: null, unitAction: null, unitHeat: 12 };
    expect(earlyFire({ ...tied, shot })).toMatchObject({ peakCurrent: null, energyIntoUnit: 12, worstVoltage: 400 });
  });
});

describe("bleederOpen(bank)", () => {
  test("not told is not assessed; none fitted changes nothing", () => {
    expect(bleederOpen(tied)).toMatchObject({ worstVoltage: null, verdict: "not assessed" });
    expect(bleederOpen({ ...tied, balance: null })).toMatchObject({ worstVoltage: 400, verdict: "pass" });
  });

  test("held for ever the position climbs to the whole voltage; for a moment not at all", () => {
    expect(bleederOpen({ ...tied, balance: { resistance: 24e3, hold: null } })).toMatchObject({
      worstVoltage: 1600,
      verdict: "fail",
    });
    expect(bleederOpen({ ...tied, balance: { resistance: 24e3, hold: 0 }, hold: sound(0) }).worstVoltage).toBe(400);
  });

  const sound = (seconds: number) => ({ ...(tied.hold as HoldCase), R: 24e3, hold: seconds });

  test("a finite hold of unknown leakage is not known, and does not pass", () => {
    const open = bleederOpen({ ...tied, balance: { resistance: 24e3, hold: 60 }, hold: null });
    expect(open).toMatchObject({ worstVoltage: null, worstHeld: null, verdict: "not assessed" });
  });

  // Brute force over every corner of capacitance, leakage and resistor, by the matrix exponential of the whole chain.
  test.each([
    { volts: 900, tol: [0.02, 0.02], leakage: 3e-3, R: 10e3, seconds: 60, worst: 770.1 },
    { volts: 800, tol: [0.1, 0.5], leakage: 1e-3, R: 20e3, seconds: 120, worst: 686.8 },
  ])("3s2p of 1 mF at $volts V held $seconds s, the others leaking most: $worst V", (given) => {
    const { volts, tol, leakage, R, seconds, worst } = given;
    const [tLow = 0, tHigh = 0] = tol;
    const insulation = Number.POSITIVE_INFINITY;
    const hold = { n: 3, m: 2, C: 1e-3, tLow, tHigh, leakage, insulation, R, q: 0.05, V: volts, hold: seconds };
    const bank = { ...tied, series: 3, parallel: 2, voltage: volts, worstCharging: volts / 3, hold };
    const open = bleederOpen({ ...bank, balance: { resistance: R, hold: seconds } });
    expect(open.worstVoltage).toBeCloseTo(worst, 1);
    expect(open.worstHeld).toBe(open.worstVoltage);
  });

  // Kirchhoff at the open position, stepped in time: no resistor there, the others drain the chain current.
  test("for a time between, it follows the circuit: n stages, one without its resistor, held at V", () => {
    for (const [bank, units] of [
      [tied, 5],
      [strings, 1],
    ] as const) {
      const [C, R, n, hold] = [units * 3300e-6, 24e3, 4, 200];
      let first = 400;
      const count = 200000;
      for (let k = 0; k < count; k++) {
        const other = (1600 - first) / (n - 1);
        // same current through all: C dv1/dt = C dv2/dt + v2/R, and v1 + (n - 1) v2 = V
        first += ((other / R / C) * ((n - 1) / n) * hold) / count;
      }
      const held = { ...(bank.hold as HoldCase), R, hold };
      near(bleederOpen({ ...bank, balance: { resistance: R, hold }, hold: held }).worstVoltage, first, 1e-4);
    }
  });
});

describe("dumpStuck(bank), chargerRunning(bank)", () => {
  test("a stuck dump leaves the volts, and says whether anything bleeds them", () => {
    expect(dumpStuck(tied).stops).toContain("stays charged");
    expect(dumpStuck({ ...tied, balance: { resistance: 24e3, hold: null } }).stops).toContain("balancing resistors");
  });

  test("a charger of unknown reach is not assessed; one of 2000 V puts 500 V on the worst unit", () => {
    expect(chargerRunning(tied).verdict).toBe("not assessed");
    expect(chargerRunning({ ...tied, chargerHighest: 2000 })).toMatchObject({ worstVoltage: 500, verdict: "fail" });
    expect(chargerRunning({ ...tied, chargerHighest: 1000 }).worstVoltage).toBe(400);
  });
});
