// How far a lamp circuit that can be built lands from the ideal one, and what that does to the pulse.
import { accepted, type Read } from "../quantity/index.ts";
import { alphaOf, type LampCircuit, normalLampPulse } from "./lampDrive.ts";

/** What can be built: F, H, V. */
export interface BuiltLampCircuit {
  readonly capacitance: number;
  readonly inductance: number;
  readonly voltage: number;
}

/** Each ratio is built over ideal. Times in s, currents in A; a width is null when the pulse has not fallen so far. */
export interface LampFit {
  readonly alpha: number;
  readonly idealAlpha: number;
  readonly energyRatio: number;
  readonly widthRatio: number;
  readonly capacitanceRatio: number;
  readonly inductanceRatio: number;
  readonly voltageRatio: number;
  readonly peakCurrent: number;
  readonly idealPeakCurrent: number;
  readonly halfWidth: number | null;
  readonly idealHalfWidth: number | null;
  /** Lowest bank voltage as a part of the charge voltage. */
  readonly reversal: number;
}

/** Compares by integrating both pulses. Refused as by `normalLampPulse`. Source: [ME1966]. */
export function lampFit(constant: number, ideal: LampCircuit, built: BuiltLampCircuit): Read<LampFit> {
  const pulseOf = (circuit: BuiltLampCircuit) => normalLampPulse(alphaOf({ constant, ...circuit }));
  const [first, second] = [pulseOf(ideal), pulseOf(built)];
  if (!first.ok) return first;
  if (!second.ok) return second;
  const scale = ({ capacitance, inductance, voltage }: BuiltLampCircuit) => ({
    time: Math.sqrt(inductance * capacitance),
    current: voltage * Math.sqrt(capacitance / inductance),
    energy: (capacitance * voltage * voltage) / 2,
  });
  const [wanted, got] = [scale(ideal), scale(built)];
  const times = (width: number | null, time: number): number | null => (width === null ? null : width * time);
  return accepted({
    alpha: alphaOf({ constant, ...built }),
    idealAlpha: alphaOf({ constant, ...ideal }),
    energyRatio: got.energy / wanted.energy,
    widthRatio: got.time / wanted.time,
    capacitanceRatio: built.capacitance / ideal.capacitance,
    inductanceRatio: built.inductance / ideal.inductance,
    voltageRatio: built.voltage / ideal.voltage,
    peakCurrent: second.value.peakCurrent * got.current,
    idealPeakCurrent: first.value.peakCurrent * wanted.current,
    halfWidth: times(second.value.halfWidth, got.time),
    idealHalfWidth: times(first.value.halfWidth, wanted.time),
    reversal: second.value.shot.reversal,
  });
}
