// One shot of a layout at a corner of the capacitance tolerance, by the cheapest way that gives its exact figures.

import type { Layout } from "../bank/index.ts";
import type { Capacitor } from "../catalog/index.ts";
import {
  type Bounds,
  boundsOf,
  type Circuit,
  dischargeOf,
  type PulseBank,
  peaksOf,
  type UnitDuty,
  unitDutyOf,
  unknownsOf,
} from "../pulse/index.ts";
import { accepted, type Read } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { circuitOf, pulseBankFor } from "./circuit.ts";

export type Shape = Pick<Layout, "series" | "parallel" | "ties">;
export type CornerName = "low" | "nominal" | "high";

/** Figures of one corner. `seconds` null where the quick way does not tell it. */
export interface ShotCorner {
  readonly bank: PulseBank;
  readonly reversal: number;
  readonly action: number | null;
  readonly unit: UnitDuty;
  readonly bounds: Bounds;
  /** Voltage that the shot leaves on the bank, V. */
  readonly left: number;
}

/** Every unit of the bank at one end of its tolerance. */
export function bankAt(unit: Capacitor, shape: Shape, corner: CornerName): PulseBank {
  const bank = pulseBankFor(unit, shape);
  const { toleranceLow, toleranceHigh } = bank.unit;
  const factor = corner === "low" ? 1 - toleranceLow : corner === "high" ? 1 + toleranceHigh : 1;
  return { ...bank, capacitance: bank.capacitance * factor };
}

/** Plain R, L and C, shared by capacitance alone, which the closed form has in one go. */
export const isPlain = ({ load, clamp, switch: sw, place = null }: Circuit): boolean =>
  place === null &&
  (load.kind === "resistor" || load.kind === "coil" || load.kind === "short") &&
  clamp === null &&
  sw.drop === 0;

/** The shot at a corner. Refused as by `circuitOf` and `dischargeOf`. */
export function shotCorner(brief: Brief, unit: Capacitor, shape: Shape, corner: CornerName): Read<ShotCorner> {
  const bank = bankAt(unit, shape, corner);
  const found = circuitOf(brief, bank);
  if (!found.ok) return found;
  const { circuit } = found.value;
  if (!isPlain(circuit)) {
    const shot = dischargeOf(bank, circuit, brief.voltage);
    if (!shot.ok) return shot;
    const { reversal, action, unit: duty, bounds, energy } = shot.value;
    return accepted({
      bank,
      reversal,
      action,
      unit: duty,
      bounds,
      left: Math.sqrt((2 * energy.left) / bank.capacitance),
    });
  }
  const { load, bus, isolating = 0, section = 0 } = circuit;
  const outer = {
    resistance: "resistance" in load ? (load.resistance ?? 0) : 0,
    inductance: "inductance" in load ? (load.inductance ?? 0) : 0,
  };
  const loop = {
    capacitance: bank.capacitance,
    inductance: (bank.esl ?? 0) + section + (bus?.inductance ?? 0) + outer.inductance,
    resistance: (bank.esr ?? 0) + isolating + (bus?.resistance ?? 0) + outer.resistance + circuit.switch.resistance,
  };
  const peaks = peaksOf(loop, brief.voltage);
  if (!peaks.ok) return peaks;
  const { reversal, peakCurrent, actionToZero } = peaks.value;
  const action = circuit.switch.oneWay ? actionToZero : peaks.value.action;
  return accepted({
    bank,
    reversal,
    action,
    unit: unitDutyOf(bank, { peakCurrent, action, reversal }),
    bounds: boundsOf(unknownsOf(bank, circuit), false),
    left: circuit.switch.oneWay ? brief.voltage * reversal : 0,
  });
}
