// Puts a bank and a circuit together into one mesh, and says which way each figure errs when a part of it is unknown.

import { lampConstant } from "./lamp.ts";
import { type Circuit, linearPartOf } from "./load.ts";
import type { Mesh } from "./shot.ts";
import type { Arrangement } from "./unitDuty.ts";
import type { Bound } from "./verdict.ts";

/** A bank as a shot sees it: F, ohm, H of the whole bank (null: unknown), and what it is made of. */
export interface PulseBank extends Arrangement {
  readonly capacitance: number;
  readonly esr: number | null;
  readonly esl: number | null;
}

/** The bank of an arrangement at nominal values: C = m C_u/n, ESR = n ESR_u/m, ESL = n ESL_u/m. Source: [methods-derived]. */
export function pulseBankOf(arrangement: Arrangement): PulseBank {
  const { unit, series, parallel } = arrangement;
  const ratio = series / parallel;
  return {
    ...arrangement,
    capacitance: unit.capacitance / ratio,
    esr: unit.esr === null ? null : unit.esr * ratio,
    esl: unit.esl === null ? null : unit.esl * ratio,
  };
}

/** Which parts of the loop were unknown and so left out. */
export interface Unknowns {
  readonly esr: boolean;
  readonly esl: boolean;
  readonly bus: boolean;
}

export const unknownsOf = (bank: PulseBank, circuit: Circuit): Unknowns => ({
  esr: bank.esr === null,
  esl: bank.esl === null,
  bus: circuit.bus === null,
});

/** The mesh, unknown parts left out. */
export function meshOf(bank: PulseBank, circuit: Circuit, voltage: number): Mesh {
  return {
    capacitance: bank.capacitance,
    voltage,
    // inside the bank's terminals, and so behind a clamp across them
    bank: {
      resistance: (bank.esr ?? 0) + (circuit.isolating ?? 0),
      inductance: (bank.esl ?? 0) + (circuit.section ?? 0),
    },
    bus: circuit.bus ?? { resistance: 0, inductance: 0 },
    load: linearPartOf(circuit.load),
    switch: circuit.switch,
    lampConstant: circuit.load.kind === "lamp" ? lampConstant(circuit.load.lamp) : 0,
    clamp: circuit.clamp,
  };
}

/** What each figure is. */
export interface Bounds {
  readonly damping: Bound;
  readonly peakCurrent: Bound;
  readonly reversal: Bound;
  readonly action: Bound;
  readonly loadEnergy: Bound;
}

/**
 * Leaving out resistance raises current, action, reversal and the load's energy and lowers the damping; leaving out inductance
 * raises current and damping and lowers reversal, and raises the action of a switch that opens at the first zero.
 * `given` marks a load whose current is given, so that only energies can err. Source: [methods-derived], tested by perturbation.
 */
export function boundsOf(unknown: Unknowns, given: boolean): Bounds {
  const resistance = unknown.esr || unknown.bus;
  const inductance = unknown.esl || unknown.bus;
  const loadEnergy: Bound = resistance ? "upper bound" : given || !inductance ? "value" : "side unknown";
  if (given || (!resistance && !inductance)) {
    return { damping: "value", peakCurrent: "value", reversal: "value", action: "value", loadEnergy };
  }
  const both = resistance && inductance;
  return {
    damping: both ? "side unknown" : resistance ? "lower bound" : "upper bound",
    peakCurrent: "upper bound",
    reversal: both ? "side unknown" : resistance ? "upper bound" : "lower bound",
    action: "upper bound",
    loadEnergy: both ? "side unknown" : loadEnergy,
  };
}

/** One plain sentence for each part left out. */
export function unknownNotes({ esr, esl, bus }: Unknowns): readonly string[] {
  return [
    ...(esr ? ["upper bound: ESR unknown, left out of the loop"] : []),
    ...(esl ? ["upper bound on current: ESL unknown, left out of the loop; the reversal may be higher"] : []),
    ...(bus ? ["upper bound on current: bus unknown, left out of the loop; the reversal may be higher"] : []),
  ];
}
