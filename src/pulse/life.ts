/*
 * How life changes with voltage, reversal and temperature, as a ratio to a reference point that the user knows.
 *
 *   symbol  name                unit   factor
 *   V       voltage             1      (V/V_ref)^-p
 *   VR      reversal            1      (VR/VR_ref)^-q
 *   T       temperature         K      2^((T_ref - T)/D), D the kelvins that halve the life
 *
 * Every exponent is the user's own, from the maker or from tests; none is assumed. A missing one leaves its factor null and the
 * ratio with it, unless that quantity stays at its reference. Published exponents disagree widely, and any such law is a
 * guide, not a promise. Source: [bank-lists] the form; the film form as in [capacitor-life].
 */
import { power } from "../quantity/index.ts";

/** One stress: where it is, where the life is known, and the exponent (temperature: kelvins per halving), null if not given. */
export interface Stress {
  readonly value: number;
  readonly reference: number;
  readonly exponent: number | null;
}

/** Stresses to count; leave out what does not apply. */
export interface LifeCase {
  readonly voltage?: Stress;
  readonly reversal?: Stress;
  readonly temperature?: Stress;
}

/** Factors on life and their product; null where an exponent is missing or the law has no value. */
export interface LifeRatio {
  readonly voltage: number | null;
  readonly reversal: number | null;
  readonly temperature: number | null;
  readonly ratio: number | null;
  /** Names of stresses whose exponent is missing: not assessed. */
  readonly missing: readonly (keyof LifeCase)[];
}

function factorOf(stress: Stress | undefined, law: (stress: Stress, exponent: number) => number): number | null {
  if (stress === undefined || stress.value === stress.reference) return 1;
  if (stress.exponent === null) return null;
  const factor = law(stress, stress.exponent);
  return Number.isFinite(factor) ? factor : null;
}

const raised = ({ value, reference }: Stress, exponent: number): number => power(reference / value, exponent);
const halving = ({ value, reference }: Stress, kelvins: number): number => power(2, (reference - value) / kelvins);

/** Life over reference life. Source: file head. */
export function lifeRatio(stresses: LifeCase): LifeRatio {
  const voltage = factorOf(stresses.voltage, raised);
  const reversal = factorOf(stresses.reversal, raised);
  const temperature = factorOf(stresses.temperature, halving);
  const known = voltage !== null && reversal !== null && temperature !== null;
  const names = ["voltage", "reversal", "temperature"] as const;
  return {
    voltage,
    reversal,
    temperature,
    ratio: known ? voltage * reversal * temperature : null,
    missing: names.filter((name) => {
      const stress = stresses[name];
      return stress !== undefined && stress.exponent === null && stress.value !== stress.reference;
    }),
  };
}
