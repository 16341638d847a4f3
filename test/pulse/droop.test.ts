// droop: worked falls, an energy that is not there, and slow drifts that would be lost in rounding.
import { describe, expect, test } from "vitest";
import { chargerRipple, constantPowerSeconds, driftOf, steadyDroop, voltageAfter } from "../../src/pulse/droop.ts";
import { near } from "./near.ts";

describe("steadyDroop(use)", () => {
  test("worked: 100 A for 1 ms on 825 uF is 121.212121 V, more at the terminals, unknown there without ESR", () => {
    const use = { current: 100, seconds: 1e-3, capacitance: 825e-6 };
    near(steadyDroop({ ...use, esr: 0.02 }).bank, 121.212121);
    near(steadyDroop({ ...use, esr: 0.02 }).terminals, 123.212121);
    expect(steadyDroop({ ...use, esr: null }).terminals).toBeNull();
  });
});

describe("voltageAfter(use), constantPowerSeconds(use)", () => {
  test("worked: 150 J from 825 uF at 1600 V leaves 1482.01337 V; more than is stored is null", () => {
    const use = { capacitance: 825e-6, voltage: 1600 };
    near(voltageAfter({ ...use, energy: 150 }), 1482.01337);
    expect(voltageAfter({ ...use, energy: 1057 })).toBeNull();
    near(constantPowerSeconds({ capacitance: 825e-6, from: 1600, to: 1482.01337, power: 150 }), 1, 1e-7);
  });
});

describe("driftOf(use)", () => {
  const use = { voltage: 1600, capacitance: 825e-6, leakage: 0, bleeder: 82000, seconds: 10 };

  test("a bleeder alone is e^(-t/RC), leakage alone a straight line, and never below zero", () => {
    near(driftOf(use).voltage, 1600 * Math.exp(-10 / (82000 * 825e-6)), 1e-13);
    near(driftOf({ ...use, bleeder: null, leakage: 1e-3 }).voltage, 1600 - 10e-3 / 825e-6, 1e-13);
    expect(driftOf({ ...use, bleeder: null, leakage: 1 }).voltage).toBe(0);
    expect(driftOf({ ...use, bleeder: 100, leakage: 1 }).energyLost).toBe(1);
  });

  test("a bleeder and leakage together follow C dV/dt = -V/R - I, in 100 000 small steps", () => {
    const both = { ...use, leakage: 5e-3, seconds: 60 };
    let volts = both.voltage;
    const dt = both.seconds / 100000;
    for (let k = 0; k < 100000; k++) {
      const slope = (v: number) => -(v / both.bleeder + both.leakage) / both.capacitance;
      volts += dt * slope(volts + (dt / 2) * slope(volts));
    }
    const drift = driftOf(both);
    near(drift.voltage, volts, 1e-9);
    near(drift.energyLost, 1 - (volts / 1600) ** 2, 1e-9);
  });

  test("energy falls by twice the part of the voltage when the fall is small", () => {
    const drift = driftOf({ ...use, seconds: 1e-6 });
    near(drift.energyLost, (2 * 1e-6) / (82000 * 825e-6), 1e-5);
  });
});

describe("chargerRipple(use)", () => {
  test("I/(f C): 10 A recharged 100 times a second on 10 mF is 10 V", () => {
    expect(chargerRipple({ current: 10, frequency: 100, capacitance: 10e-3 })).toBe(10);
  });
});
