// highestShot: no overshoot changes nothing; with it amperes and slew go as V, action and heat as V^2, by the closed form of a ring.
import { describe, expect, test } from "vitest";
import { circuitOf, pulseBankFor } from "../../src/search/circuit.ts";
import { atHighest, highestShot } from "../../src/search/highestShot.ts";
import { shotOf } from "../../src/search/index.ts";
import { FILM, shotBrief, shotLayout } from "../support/shotBank.ts";

// Source: [methods-derived] A7: 500 uF, 2 uH, 40 mohm from 3 kV rings with 31280.4767 A.
const unit = { ...FILM, capacitance: 5e-4, voltage: 4000, esr: 0.01, esl: 1e-15, tolerance: { low: 0, high: 0.1 } };
const shape = { series: 1, parallel: 1, ties: "strings" as const };
const ring = (more: object = {}) =>
  shotBrief({ voltage: "3 kV", load: { resistance: "30 mohm", inductance: "2 uH" }, ...more });
const top = (brief: ReturnType<typeof ring>, of: typeof unit | Omit<typeof unit, "tolerance"> = unit) => {
  const bank = pulseBankFor(of as typeof unit, shape);
  const circuit = circuitOf(brief, bank);
  if (!circuit.ok) throw new Error(JSON.stringify(circuit));
  const read = highestShot({ brief, unit: of as typeof unit, shape, circuit: circuit.value.circuit, bank });
  if (!read.ok) throw new Error(JSON.stringify(read));
  return read.value;
};
/** I = (V/Z0) exp(-zeta acos(zeta)/sqrt(1 - zeta^2)). */
const peak = (volts: number, farads: number): number => {
  const impedance = Math.sqrt(2e-6 / farads);
  const zeta = 0.04 / 2 / impedance;
  return (volts / impedance) * Math.exp((-zeta * Math.acos(zeta)) / Math.sqrt(1 - zeta * zeta));
};

describe("highestShot(input), atHighest(brief)", () => {
  test("the overshoot becomes part of the voltage, once", () => {
    const brief = atHighest(ring({ overshoot: 0.1 }));
    expect([brief.voltage, brief.overshoot]).toEqual([3300.0000000000005, 0]);
    expect(peak(3000, 5e-4)).toBeCloseTo(31280.4767, 3);
  });

  test("without overshoot the high capacitance alone raises it; the action is E/R", () => {
    const { peakCurrent, unitHeat, bound } = top(ring());
    expect(peakCurrent! / peak(3000, 5.5e-4)).toBeCloseTo(1, 9);
    expect(unitHeat).toBeCloseTo(((5.5e-4 * 3000 ** 2) / 2 / 0.04) * 0.01, 6);
    expect(bound).toBe("upper bound");
  });

  test("with 10 % overshoot both rise, and of an unknown tolerance no bound is claimed", () => {
    const { peakCurrent, unitHeat } = top(ring({ overshoot: 0.1 }));
    expect(peakCurrent! / peak(3300, 5.5e-4)).toBeCloseTo(1, 9);
    expect(unitHeat).toBeCloseTo(((5.5e-4 * 3300 ** 2) / 2 / 0.04) * 0.01, 6);
    const { tolerance: _unknown, ...bare } = unit;
    expect(top(ring(), bare)).toMatchObject({ unitHeat: null, bound: "side unknown" });
  });
});

describe("shotOf with overshoot", () => {
  test("the shot is told at the charge voltage, ratings and an early fire at the highest", () => {
    const brief = ring({ overshoot: 0.1, maxPeakCurrent: "33 kA" });
    const rated = { ...unit, peakCurrent: 33e3, action: 65e3 };
    const read = shotOf({ layout: shotLayout(brief, shape, rated), unit: rated, brief });
    if (!read.ok) throw new Error(JSON.stringify(read));
    const { discharge, faults, findings } = read.value;
    expect(discharge.peakCurrent).toBeCloseTo(31280.4767, 3);
    const found = (id: string) => findings.find((one) => one.id === id);
    expect((found("pulse.unit.current")?.value ?? 0) / peak(3300, 5.5e-4)).toBeCloseTo(1, 9);
    expect(found("pulse.unit.action")?.value).toBeCloseTo((5.5e-4 * 3300 ** 2) / 2 / 0.04, 3);
    expect(["pulse.unit.current", "pulse.unit.action", "limit-peak-current"].map((id) => found(id)?.verdict)).toEqual(
      Array(3).fill("fail"),
    );
    const early = faults.find(({ id }) => id === "early-fire");
    expect(early!.peakCurrent! / peak(3300, 5.5e-4)).toBeCloseTo(1, 9);
    expect(early?.peakIs).toBe("upper bound");
  });
});
