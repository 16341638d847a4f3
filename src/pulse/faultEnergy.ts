/*
 * Where the joules go that the others pour at a shorted unit.
 *
 *   symbol  name              unit    meaning
 *   E_n     neighbours        J       what they have to give (shortedUnit.ts)
 *   R_f     short             ohm     what the shorted unit itself still resists with
 *   R       loop              ohm     the whole fault loop, R_f in it (faultCurrents.ts)
 *   R_i     isolating         ohm     resistor of each unit; m units in parallel
 *   A       action            A^2 s   E_n/R: one current passes all of the loop
 *
 * Into the unit A R_f; into its own isolating resistor A R_i; into those of the neighbours together the isolating part of the
 * rest of the loop. Without R_f nothing says how the two share: the unit is then counted with all of E_n, and the resistors
 * are not told. With R_f told and ESR unknown, what goes into the unit is an upper bound. Source: [methods-derived].
 */
import type { FaultBank } from "./faultBank.ts";
import type { FaultLoop } from "./faultCurrents.ts";

/** J. `unit` is a part of the neighbours' energy only where the short's own resistance is told. */
export interface FaultEnergy {
  readonly unit: number;
  readonly isolating: { readonly faulted: number; readonly others: number } | null;
}

/** The split of `neighbours` [J] over the loop of a shorted unit. Source: [methods-derived] file head. */
export function faultEnergy(bank: FaultBank, loop: FaultLoop | null, neighbours: number): FaultEnergy {
  const { shortResistance = null, isolatingResistance = null, series: n, parallel: m, ties } = bank;
  if (loop === null || shortResistance === null || loop.resistance === 0) return { unit: neighbours, isolating: null };
  const action = neighbours / loop.resistance;
  const isolating = isolatingResistance ?? 0;
  const sound = ties === "cross-tied" || n === 1 ? 1 / (m - 1) : n / (m - 1) + n - 1;
  return {
    unit: action * shortResistance,
    isolating: isolating === 0 ? null : { faulted: action * isolating, others: action * isolating * sound },
  };
}
