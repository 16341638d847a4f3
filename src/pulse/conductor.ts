/*
 * How hot an action leaves a conductor that has no time to lose heat, and how thick it must be.
 *
 *   symbol  name      unit      meaning
 *   W       action    A^2 s     integral of i^2 dt
 *   S       area      m^2
 *   T_i T_f from, to  K         before and after; the melting point of copper is 1356 K
 *   IEC     W/S^2 = K^2 ln((T_f + beta)/(T_i + beta)), temperatures in degC: copper K = 226 A s^0.5/mm2, beta = 234.5;
 *           aluminium K = 148, beta = 228 (from memory)
 *   Onderdonk  W/S^2 = (1/33) log10(1 + (T_m - T_a)/(234 + T_a)), S in circular mil, copper
 *
 * Solid metal only, no latent heat; even current (thickness below two skin depths each side); up to a few seconds.
 * Source: [IEC60949] constants as quoted; [Onderdonk] as quoted by Adam and Brooks.
 */
import type { Finding } from "../quantity/index.ts";
import { atMost } from "./verdict.ts";

const CELSIUS_ZERO = 273.15;
/** One circular mil [m^2]. */
const CIRCULAR_MIL = (Math.PI / 4) * 25.4e-6 ** 2;

/** K [A s^0.5/m^2] and beta [K above the Celsius zero]. Source: [IEC60949]. */
export const METALS = {
  copper: { constant: 226e6, beta: 234.5 },
  aluminium: { constant: 148e6, beta: 228 },
} as const;

export type Metal = keyof typeof METALS;

/** Temperatures before and after [K]. */
export interface Rise {
  readonly from: number;
  readonly to: number;
}

/** Action over area squared [A^2 s/m^4] that heats a metal from one temperature to the other. Source: [IEC60949]. */
export function actionDensity(metal: Metal, { from, to }: Rise): number {
  const { constant, beta } = METALS[metal];
  return constant ** 2 * Math.log((to - CELSIUS_ZERO + beta) / (from - CELSIUS_ZERO + beta));
}

/** The same for copper by Onderdonk's formula [A^2 s/m^4]. Source: [Onderdonk]. */
export const onderdonkDensity = ({ from, to }: Rise): number =>
  Math.log10(1 + (to - from) / (234 + from - CELSIUS_ZERO)) / 33 / CIRCULAR_MIL ** 2;

/** Least area [m^2] that stays at or below `to`. Source: [IEC60949]. */
export const leastArea = (metal: Metal, action: number, rise: Rise): number =>
  Math.sqrt(action / actionDensity(metal, rise));

/** Temperature [K] after an action through an area, from `from` [K]. Source: [IEC60949]. */
export function temperatureAfter(
  metal: Metal,
  use: { readonly action: number; readonly area: number; readonly from: number },
): number {
  const { constant, beta } = METALS[metal];
  const grows = Math.exp(use.action / (constant * use.area) ** 2);
  return (use.from - CELSIUS_ZERO + beta) * grows - beta + CELSIUS_ZERO;
}

/** Action of a shot against what a conductor may take; action null (no bound) is not assessed. */
export const conductorFinding = (
  metal: Metal,
  use: { readonly action: number | null; readonly area: number; readonly rise: Rise },
): Finding =>
  atMost({
    id: "pulse.conductor",
    value: use.action,
    limit: actionDensity(metal, use.rise) * use.area ** 2,
    unit: "A2s",
    source: "IEC60949",
    note: `Action of one shot against what heats this ${metal} to ${use.rise.to} K with no time to cool; thicken it if over.`,
  });
