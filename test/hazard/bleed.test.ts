// Bleed times against the worked example, an integration of the circuit's equation, and three published banks.
import { readFileSync } from "node:fs";
import { describe, expect, test } from "vitest";
import {
  bleedPaths,
  bleedTime,
  energyAtSafe,
  largestBleed,
  timeToEnergy,
  voltageAfter,
} from "../../src/hazard/bleed.ts";

const A5 = { capacitance: 825e-6, resistance: 82000, voltage: 1600, safeVoltage: 60 };
const WORST = { ...A5, capacitanceHigh: 0.2, resistanceHigh: 0.05 };
const near = (value: number, want: number) => expect(value / want).toBeCloseTo(1, 8);

describe("bleedTime(bleed)", () => {
  test("already safe: 0, also with an open path; open path: Infinity", () => {
    expect(bleedTime({ ...A5, voltage: 60 })).toBe(0);
    expect(bleedTime({ ...A5, voltage: 12, resistance: Number.POSITIVE_INFINITY })).toBe(0);
    expect(bleedTime({ ...A5, resistance: Number.POSITIVE_INFINITY })).toBe(Number.POSITIVE_INFINITY);
  });

  test("A5 of the methods page: 222.122981 s nominal, 279.874955 s at +20 % and +5 %", () => {
    near(bleedTime(A5), 222.122981);
    near(bleedTime(WORST), 279.874955);
  });

  test("agrees with dV/dt = -V/(R C) integrated in 20 000 Runge-Kutta steps", () => {
    const steps = 20000;
    const step = bleedTime(A5) / steps;
    let volts = A5.voltage;
    const slope = (v: number) => -v / (A5.resistance * A5.capacitance);
    for (let k = 0; k < steps; k++) {
      const a = slope(volts);
      const b = slope(volts + (step * a) / 2);
      const c = slope(volts + (step * b) / 2);
      volts += (step * (a + 2 * b + 2 * c + slope(volts + step * c))) / 6;
    }
    expect(volts).toBeCloseTo(60, 8);
  });
});

describe("timeToEnergy, voltageAfter, energyAtSafe, largestBleed", () => {
  test("A5: 282.389292 s to 0.25 J, then 24.6182982 V; 1.485 J at 60 V", () => {
    near(timeToEnergy(A5, 0.25), 282.389292);
    near(voltageAfter(A5, 282.389292), 24.6182982);
    near(energyAtSafe(A5), 1.485);
    expect(timeToEnergy(A5, 2000)).toBe(0);
  });

  test("the plus tolerance of C counts in the joules too: A5 at +20 % holds 1267.2 J full and 1.782 J at 60 V", () => {
    near(energyAtSafe(WORST), 1.782);
    near(timeToEnergy(WORST, 0.25), ((82000 * 1.05 * 825e-6 * 1.2) / 2) * Math.log(1267.2 / 0.25));
    expect(timeToEnergy(WORST, 1267.3)).toBe(0);
    expect(timeToEnergy({ ...WORST, resistance: Number.POSITIVE_INFINITY }, 2000)).toBe(0);
  });

  test("at the very limit it is there: 0 s, also through an open path", () => {
    const open = { ...A5, resistance: Number.POSITIVE_INFINITY };
    expect(bleedTime({ ...open, voltage: 60 })).toBe(0);
    expect(timeToEnergy(open, (825e-6 * 1600 ** 2) / 2)).toBe(0);
  });

  test("A5: at most 110749.459 ohm for 300 s, 87896.3963 ohm with tolerances", () => {
    near(largestBleed(A5, 300), 110749.459);
    near(largestBleed(WORST, 300), 87896.3963);
    expect(largestBleed({ ...A5, voltage: 50 }, 300)).toBe(Number.POSITIVE_INFINITY);
  });

  test("the largest bleed just takes the time allowed", () =>
    near(bleedTime({ ...WORST, resistance: largestBleed(WORST, 300) }), 300));

  test("energyAtSafe never counts more than is there", () =>
    near(energyAtSafe({ ...A5, voltage: 10 }), (825e-6 * 100) / 2));
});

describe("bleedPaths(bank)", () => {
  const bank = { capacitance: 1e-3, voltage: 2200, safeVoltage: 60, chainResistance: 300e3 };
  test("one chain (cross-tied): nothing is left when it opens; dump null when there is none", () => {
    const paths = bleedPaths({ ...bank, chains: 1 });
    near(paths.chains, 300 * Math.log(2200 / 60));
    expect([paths.oneOpen, paths.dump]).toEqual([Number.POSITIVE_INFINITY, null]);
  });
  test("no chain at all: Infinity both ways", () =>
    expect(bleedPaths({ ...bank, chains: 0 })).toMatchObject({ chains: Infinity, oneOpen: Infinity }));
  test("four chains (strings): a third slower with one open; the dump alone", () => {
    const paths = bleedPaths({ ...bank, chains: 4, dump: 1000 });
    near(paths.oneOpen / paths.chains, 4 / 3);
    near(paths.dump!, Math.log(2200 / 60));
  });
});

describe("published banks", () => {
  const { banks } = JSON.parse(readFileSync(new URL("../../fixtures/published-banks.json", import.meta.url), "utf8"));
  const bank = (id: string) => banks.find((one: { id: string }) => one.id === id);
  test("thruster-surplus: 20 kohm on each 3 600 uF can, 127 s to 60 V, 140 s to 50 V", () => {
    const { expect: want, unit, bleed } = bank("thruster-surplus");
    const can = { capacitance: unit.capacitance, resistance: bleed.resistanceEach, voltage: 350 };
    near(bleedTime({ ...can, safeVoltage: 60 }), want.bleedTo60V);
    near(bleedTime({ ...can, safeVoltage: 50 }), want.bleedTo50V);
  });
  test("four-can-bipolar: one time constant, as the page has it, leaves 312 V; 934 s to 50 V, 12.4 s by the quick one", () => {
    const { expect: want, bleed } = bank("four-can-bipolar");
    const slow = { capacitance: 330e-6, resistance: bleed.resistanceTotal, voltage: 848 };
    near(bleedTime({ ...slow, safeVoltage: 50 }), want.bleedTo50V);
    near(bleedTime({ ...slow, resistance: bleed.quick, safeVoltage: 50 }), want.quickTo50V);
    expect(voltageAfter(slow, 330)).toBeCloseTo(848 / Math.E, 6);
  });
  test("tank-trays: the whole chain of 18 from 36 kV takes 9.6 s, a single unit from 2 kV 5.3 s", () => {
    const { expect: want, bleed } = bank("tank-trays");
    const chain = { capacitance: 0.15e-6 / 18, resistance: 18 * bleed.resistanceEach, voltage: 36000, safeVoltage: 60 };
    near(bleedTime(chain), want.bleedTo60V);
    near(bleedTime({ ...chain, capacitance: 0.15e-6, resistance: 1e7, voltage: 2000 }), 1.5 * Math.log(2000 / 60));
  });
});
