// The dump resistor: joules, peak, rise and the window of values, against hand-worked numbers and an integration.
import { describe, expect, test } from "vitest";
import { dumpDuty, dumpUse, dumpWindow, SPECIFIC_HEATS } from "../../src/hazard/dump.ts";

describe("dumpDuty({ capacitance, voltage, resistance, mass, specificHeat })", () => {
  const duty = dumpDuty({ capacitance: 825e-6, voltage: 1600, resistance: 82000 });

  test("A5 of the methods page: 1056 J, 31.2195122 W at the start, 67.65 s", () => {
    expect(duty.energy).toBeCloseTo(1056, 9);
    expect(duty.peakPower).toBeCloseTo(31.2195122, 7);
    expect(duty.timeConstant).toBeCloseTo(67.65, 9);
    expect(duty.peakCurrent).toBeCloseTo(1600 / 82000, 12);
  });

  test("without a mass or a specific heat the rise is not known, not zero", () => {
    expect(duty.rise).toBeNull();
    expect(dumpDuty({ capacitance: 1e-3, voltage: 1e3, resistance: 10, mass: 0.1 }).rise).toBeNull();
  });

  test("2.4 kJ into 50 g of bulk ceramic: 60 K", () => {
    const warm = dumpDuty({
      capacitance: (2 * 2400) / 2200 ** 2,
      voltage: 2200,
      resistance: 100,
      mass: 0.05,
      specificHeat: SPECIFIC_HEATS["bulk ceramic"],
    });
    expect(warm.rise).toBeCloseTo(60, 9);
    expect(warm.peakCurrent).toBe(22);
  });

  test("the joules are the integral of V^2/R over the whole decay (trapezoids)", () => {
    const [capacitance, voltage, resistance] = [825e-6, 1600, 50];
    const steps = 200000;
    const step = (20 * resistance * capacitance) / steps;
    const power = (k: number) => (voltage * Math.exp((-k * step) / (resistance * capacitance))) ** 2 / resistance;
    let joules = (power(0) + power(steps)) / 2;
    for (let k = 1; k < steps; k++) joules += power(k);
    expect((joules * step) / dumpDuty({ capacitance, voltage, resistance }).energy).toBeCloseTo(1, 7);
  });
});

describe("dumpUse(duty, element)", () => {
  const duty = dumpDuty({ capacitance: 1e-3, voltage: 2000, resistance: 100 });
  test("two in series share joules and volts; an unknown rating is null", () => {
    expect(dumpUse(duty, { pulseEnergy: 2000, voltage: 4000, series: 2, parallel: 1 })).toEqual({
      energy: 0.5,
      voltage: 0.25,
    });
    expect(dumpUse(duty, { series: 2, parallel: 1 })).toEqual({ energy: null, voltage: null });
  });
  test("in parallel the joules are shared, the volts are not", () =>
    expect(dumpUse(duty, { pulseEnergy: 1000, voltage: 4000, series: 1, parallel: 4 })).toEqual({
      energy: 0.5,
      voltage: 0.5,
    }));
});

describe("dumpWindow(want)", () => {
  const want = { capacitance: 1e-3, voltage: 2000, safeVoltage: 60, seconds: 5, peakCurrent: 20 };
  test("from V/I to t/(C ln(V/Vs))", () => {
    const window = dumpWindow(want)!;
    expect(window.least).toBe(100);
    expect(window.most).toBeCloseTo(5 / (1e-3 * Math.log(2000 / 60)), 9);
  });
  test("one single value does both: the window is that value", () => {
    const seconds = 0.1 * Math.log(2000 / 60);
    expect(dumpWindow({ ...want, seconds, peakCurrent: 20 })).toEqual({ least: 100, most: 100 });
  });
  test("touch-safe already, and no time to do it in: any value that is gentle enough", () =>
    expect(dumpWindow({ ...want, voltage: 60, seconds: 0 })?.most).toBe(Number.POSITIVE_INFINITY));
  test("null when no value is both gentle and quick", () => expect(dumpWindow({ ...want, peakCurrent: 1 })).toBeNull());
  test("already safe: any value that is gentle enough", () =>
    expect(dumpWindow({ ...want, voltage: 50 })).toEqual({ least: 2.5, most: Number.POSITIVE_INFINITY }));
});
