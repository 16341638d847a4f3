// A lamp's own circuit: voltage and coil from lamp, energy and width, filled into a brief that leaves them out.

import { type Lamp, type LampCircuit, lampCircuit, lampConstant } from "../pulse/index.ts";
import type { Read } from "../quantity/index.ts";
import { quantity } from "./fields.ts";
import { type LampBriefKeys, type LoadBrief, loadSchema } from "./load.ts";

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
export function idealLampCircuit(brief: {
  readonly load?: LoadBrief | undefined;
  readonly energy: number;
}): LampCircuit | null {
  const { lamp, width, damping } = brief.load ?? {};
  if (!lamp || width === undefined) return null;
  const read = circuitFor(lamp, brief.energy, width, damping);
  return read.ok ? read.value : null;
}
