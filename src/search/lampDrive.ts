// A lamp's own circuit: voltage and coil from lamp, energy and width, and how far the bank that can be built lands from it.

import {
  type Explosion,
  explosionOf,
  type Lamp,
  type LampCircuit,
  type LampFit,
  lampCircuit,
  lampConstant,
  lampFit,
} from "../pulse/index.ts";
import { accepted, type Read } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { quantity } from "./fields.ts";
import { type LampBriefKeys, loadSchema } from "./load.ts";

/** alpha of the fullest pulse without reversal worth the name. Source: [ME1966]. */
export const USUAL_DAMPING = 0.8;

/** The brief's lamp in the words of the pulse layer. */
export const lampOf = ({ bore, arc, gas, pressure, count }: LampBriefKeys): Lamp => ({
  bore,
  arcLength: arc,
  gas,
  pressure,
  count,
});

type Raw = Readonly<Record<string, unknown>>;
const energySchema = quantity("energy", { least: 0, most: 1e12, open: true });

/**
 * The input with what a lamp, an energy and a width settle filled in where it is not given: voltage, a full dump, and the
 * coil. Left as it is when any of them is missing or cannot be read, so that the reader tells what is wrong.
 */
export function withLampDrive(input: Raw): Raw {
  const load = loadSchema.safeParse(input.load);
  const energy = energySchema.safeParse(input.energy);
  if (!load.success || !energy.success || load.data.width === undefined || !load.data.lamp) return input;
  const ideal = circuitFor(load.data.lamp, energy.data, load.data.width, load.data.damping);
  if (!ideal.ok) return input;
  const { voltage, inductance } = ideal.value;
  return {
    ...input,
    voltage: input.voltage ?? voltage,
    ripple: input.ripple ?? 1,
    load: { ...(input.load as Raw), inductance: load.data.inductance ?? inductance },
  };
}

function circuitFor(keys: LampBriefKeys, energy: number, width: number, damping = USUAL_DAMPING): Read<LampCircuit> {
  return lampCircuit({ constant: lampConstant(lampOf(keys)), energy, width, alpha: damping, rule: "exact" });
}

/** The ideal circuit of a brief with a lamp and a width; null without them. */
export function idealLampCircuit(brief: Pick<Brief, "load" | "energy">): LampCircuit | null {
  const { lamp, width, damping } = brief.load ?? {};
  if (!lamp || width === undefined) return null;
  const read = circuitFor(lamp, brief.energy, width, damping);
  return read.ok ? read.value : null;
}

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
