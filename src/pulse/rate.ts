/*
 * Firing again and again: the highest rate, the rms current, the heat of the ESR and how warm it gets.
 *
 *   symbol  name        unit     meaning
 *   f       rate        Hz       shots per second
 *   I_rms   rms         A        sqrt(f (A_charge + A_shot)), actions per shot in A^2 s
 *   P       power       W        I_rms^2 ESR
 *   dT      rise        K        P R_th, R_th the user's own thermal resistance of a unit [K/W]
 *
 * Needs charge + wait + pulse <= 1/f. ESR at the pulse's frequency and the unit's temperature. Steady state, so for long
 * bursts only. Source: [textbook-charging]; [methods-derived] the sum of actions.
 */
import type { Finding } from "../quantity/index.ts";
import { atMost } from "./verdict.ts";

/** Shots per second that the charger can keep up with [Hz]: 1/(charge + wait + pulse), all in s. */
export const highestRate = (cycle: {
  readonly charge: number;
  readonly wait: number;
  readonly pulse: number;
}): number => 1 / (cycle.charge + cycle.wait + cycle.pulse);

/** One firing cycle of a bank. Actions [A^2 s]; `unitShare` the worst unit's part of the bank's current. */
export interface Duty {
  readonly rate: number;
  readonly chargeAction: number;
  readonly shotAction: number;
  readonly esr: number | null;
  readonly unitShare: number;
  readonly unitEsr: number | null;
  /** K/W from the inside of one unit to the room; null when the user has not given it. */
  readonly thermalResistance: number | null;
}

/** A, W, K; null when ESR or the thermal resistance is unknown. */
export interface Heating {
  readonly rms: number;
  readonly power: number | null;
  readonly unitRms: number;
  readonly unitPower: number | null;
  readonly unitRise: number | null;
}

/** Rms current and heat. Source: [textbook-charging]. */
export function heatingOf(duty: Duty): Heating {
  const square = duty.rate * (duty.chargeAction + duty.shotAction);
  const rms = Math.sqrt(square);
  const unitSquare = square * duty.unitShare ** 2;
  const unitPower = duty.unitEsr === null ? null : unitSquare * duty.unitEsr;
  return {
    rms,
    power: duty.esr === null ? null : square * duty.esr,
    unitRms: rms * duty.unitShare,
    unitPower,
    unitRise: unitPower === null || duty.thermalResistance === null ? null : unitPower * duty.thermalResistance,
  };
}

/** Wanted rate against the charger's highest, the unit's rms against its ripple rating, its rise against the allowed one. */
export function rateFindings(
  heating: Heating,
  wanted: { readonly rate: number; readonly highest: number | null },
  limits: { readonly rippleCurrent: number | null; readonly temperatureRise: number | null },
): readonly Finding[] {
  const claim = { state: "pulse", source: "textbook-charging" } as const;
  return [
    atMost({
      ...claim,
      id: "pulse.rate",
      value: wanted.rate,
      limit: wanted.highest,
      unit: "Hz",
      note: "Shots per second against what the charger can refill; take a stronger charger or fire less often.",
    }),
    atMost({
      ...claim,
      id: "pulse.unit.rms",
      value: heating.unitRms,
      limit: limits.rippleCurrent,
      unit: "A",
      note: "Rms current of the worst unit; ripple ratings hold at their own frequency and temperature, convert them first.",
    }),
    atMost({
      ...claim,
      id: "pulse.unit.rise",
      value: heating.unitRise,
      limit: limits.temperatureRise,
      unit: "K",
      note: "Temperature rise of the worst unit from its ESR and the thermal resistance given.",
    }),
  ];
}
