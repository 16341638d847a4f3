// Leakage readings and balancing resistors as conductances, or the reason why holding cannot be judged.
import type { PlaceRequest } from "./request.ts";
import type { MeasuredUnit } from "./unit.ts";

export type Conductances =
  | {
      readonly known: true;
      /** Of each unit, by leakage (and its own resistor, in strings); S, or any common scale when there is no resistor. */
      readonly perUnit: Float64Array;
      /** Of each stage's resistor, S; 0 in strings. */
      readonly perStage: number;
    }
  | {
      readonly known: false;
      readonly why: "missing" | "no test voltage" | "zero";
      readonly serials: readonly string[];
    };

/** Leakage is taken in proportion to voltage: G = I_leak / V_meas. Without a resistor the share does not depend on V_meas. */
export function conductancesOf(units: readonly MeasuredUnit[], request: PlaceRequest): Conductances {
  const missing = units.filter((unit) => unit.leakage === undefined).map((unit) => unit.serial);
  if (missing.length > 0) return { known: false, why: "missing", serials: missing };
  const resistor = request.balanceConductance ?? 0;
  if (resistor > 0 && request.leakageVoltage === undefined)
    return { known: false, why: "no test voltage", serials: [] };
  const volts = request.leakageVoltage ?? 1;
  const cross = request.ties === "cross-tied";
  const perUnit = Float64Array.from(units, (unit) => unit.leakage! / volts + (cross ? 0 : resistor));
  const perStage = cross ? resistor : 0;
  // A unit that leaks nothing at all next to one that leaks takes the whole voltage: a reading of 0 is the meter's floor.
  const zero = units.filter((_, i) => perUnit[i]! + perStage === 0).map((unit) => unit.serial);
  if (zero.length > 0) return { known: false, why: "zero", serials: zero };
  return { known: true, perUnit, perStage };
}
