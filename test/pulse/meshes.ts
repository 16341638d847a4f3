// Meshes for the tests: one plain mesh to change, and a generator of random ones.

import type { Mesh } from "../../src/pulse/shot.ts";
import fc from "../support/property.ts";

const none = { resistance: 0, inductance: 0 };

/** 500 uF, 2 uH, 40 mohm of which 10 in the bank, 3 kV: the worked underdamped discharge. */
export const ringing: Mesh = {
  capacitance: 500e-6,
  voltage: 3000,
  bank: { resistance: 0.01, inductance: 0 },
  bus: none,
  load: { resistance: 0.03, inductance: 2e-6 },
  switch: { drop: 0, resistance: 0, oneWay: false },
  lampConstant: 0,
  clamp: null,
};

/** Sum of the parts over the stored energy, less one. */
export function imbalance(
  energy: { readonly [part in "stored" | "load" | "bank" | "bus" | "switch" | "clamp" | "left"]: number },
): number {
  const { stored, load, bank, bus, clamp, left } = energy;
  return (load + bank + bus + energy.switch + clamp + left) / stored - 1;
}

/** Random meshes over decades of impedance, time and voltage; every part with some resistance. */
export const anyMesh = (lamp: boolean, clamp: boolean): fc.Arbitrary<Mesh> => {
  const decade = (low: number, high: number) => fc.double({ min: low, max: high, noNaN: true }).map((x) => 10 ** x);
  const part = fc.double({ min: 0.01, max: 1, noNaN: true });
  return fc
    .record({
      impedance: decade(-3, 2),
      time: decade(-7, -2),
      voltage: decade(1, 4),
      damping: fc.double({ min: 0.02, max: 3, noNaN: true }),
      shares: fc.tuple(part, part, part, part),
      coil: fc.oneof(fc.constant(0), fc.double({ min: 0.01, max: 0.9, noNaN: true })),
      drop: fc.double({ min: 0, max: 0.1, noNaN: true }),
      oneWay: fc.boolean(),
      alpha: fc.double({ min: 0.3, max: 3, noNaN: true }),
      clampDrop: fc.double({ min: 0, max: 0.05, noNaN: true }),
      clampSlope: fc.double({ min: 0, max: 0.2, noNaN: true }),
    })
    .map((r) => {
      const sum = r.shares.reduce((a, b) => a + b, 0);
      const resistance = 2 * r.damping * r.impedance;
      const [bank, bus, load, inSwitch] = r.shares.map((share) => (resistance * share) / sum) as [
        number,
        number,
        number,
        number,
      ];
      const inductance = r.time * r.impedance;
      return {
        capacitance: r.time / r.impedance,
        voltage: r.voltage,
        bank: { resistance: bank, inductance: inductance * r.coil },
        bus: { resistance: bus, inductance: inductance * (1 - r.coil) * 0.4 },
        load: { resistance: load, inductance: inductance * (1 - r.coil) * 0.6 },
        switch: { drop: r.voltage * r.drop, resistance: inSwitch, oneWay: r.oneWay },
        lampConstant: lamp ? r.alpha * Math.sqrt(r.voltage * r.impedance) : 0,
        clamp: clamp ? { drop: r.voltage * r.clampDrop, resistance: r.impedance * r.clampSlope } : null,
      };
    });
};
