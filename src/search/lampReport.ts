// How far the bank that can be built lands from the lamp's ideal circuit, and what that does to the pulse.

import { type Explosion, explosionOf, type LampCircuit, type LampFit, lampConstant, lampFit } from "../pulse/index.ts";
import { accepted, type Read } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { idealLampCircuit, lampOf } from "./lampDrive.ts";

/** What a bank makes of a lamp's circuit. F, H, V; `coil` is what is left to wind when the bank and bus have their part. */
export interface LampReport {
  readonly constant: number;
  readonly ideal: LampCircuit;
  readonly built: { readonly capacitance: number; readonly inductance: number; readonly voltage: number };
  /** Coil that with the bank's own inductance gives the ideal one; null when the bank's is unknown. */
  readonly coil: number | null;
  /** Voltage at which this bank stores the energy asked. */
  readonly voltageForEnergy: number;
  readonly fit: LampFit;
  readonly explosion: Explosion;
}

/** Compares the bank as built with the ideal circuit; null when the brief sizes no lamp circuit. `own`: bank and bus, H. */
export function lampReport(
  brief: Brief,
  bank: { readonly capacitance: number; readonly own: number | null },
): Read<LampReport | null> {
  const ideal = idealLampCircuit(brief);
  const { lamp: keys, inductance = 0, width = 0 } = brief.load ?? {};
  if (ideal === null || !keys) return accepted(null);
  const lamp = lampOf(keys);
  const constant = lampConstant(lamp);
  const { capacitance, own } = bank;
  const built = { capacitance, inductance: inductance + (own ?? 0), voltage: brief.voltage };
  const fit = lampFit(constant, ideal, built);
  if (!fit.ok) return fit;
  return accepted({
    constant,
    ideal,
    built,
    coil: own === null ? null : Math.max(0, ideal.inductance - own),
    voltageForEnergy: Math.sqrt((2 * brief.energy) / capacitance),
    fit: fit.value,
    explosion: explosionOf(lamp, width),
  });
}
