// One part made ready for the search: the numbers of it that every layout needs, under one brief.

import type { Leak } from "../bank/index.ts";
import { type Capacitor, unitVolume } from "../catalog/index.ts";
import type { Tolerance } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";

export interface Candidate {
  readonly unit: Capacitor;
  /** Highest voltage a unit may see, derating applied, V. */
  readonly limit: number;
  /** null when the catalogue does not say: then sharing is not assessed. */
  readonly tolerance: Tolerance | null;
  /** Capacitance of one unit that energy is reckoned with, F. */
  readonly basis: number;
  readonly leak: Leak | null;
  /** m^3 and kg of one unit; null when unknown. */
  readonly volume: number | null;
  readonly mass: number | null;
}

/** The lower of the brief's derating and the part's own holds. */
export const unitLimit = (unit: Pick<Capacitor, "voltage" | "derating">, brief: Pick<Brief, "derating">): number =>
  Math.min(brief.derating, unit.derating ?? 1) * unit.voltage;

export function leakOf(unit: Capacitor): Leak | null {
  if (unit.leakage !== undefined) return { kind: "current", amperes: unit.leakage };
  return unit.insulation !== undefined ? { kind: "insulation", ohms: unit.insulation } : null;
}

/** Capacitance of one unit by the brief's basis; statistical counts the low end too, because a lot may lie low as a whole. */
function basisCapacitance(unit: Capacitor, { basis, ageing }: Brief): number {
  if (basis === "nominal") return unit.capacitance;
  // The part is then the measured lot: its mean, which a placing meets.
  if (basis === "measured") return unit.capacitance * (1 - ageing);
  return unit.capacitance * (1 - (unit.tolerance?.low ?? 0)) * (1 - ageing);
}

export function prepare(unit: Capacitor, brief: Brief): Candidate {
  return {
    unit,
    limit: unitLimit(unit, brief),
    tolerance: unit.tolerance ?? null,
    basis: basisCapacitance(unit, brief),
    leak: leakOf(unit),
    volume: unitVolume(unit),
    mass: unit.mass ?? null,
  };
}
