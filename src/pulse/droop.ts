/*
 * How far the bank's voltage falls: in a pulse, from shot to shot, while waiting, and between charger ticks.
 *
 *   symbol  name            unit  formula
 *   droop   steadyDroop     V     I t/C, and I ESR on top at the terminals
 *   V_1     voltageAfter    V     sqrt(V^2 - 2 W/C), W the energy taken
 *   V(t)    drift           V     (V + I_L R) exp(-t/RC) - I_L R, steady leakage I_L and a bleeder R; I_L alone: V - I_L t/C
 *   ripple  chargerRipple   V     I/(f C), recharged f times a second; full-wave rectified: f is twice the line's
 *
 * Constant C. The rectified ripple takes the conduction as short, so it errs high. Source: [textbook-charging].
 */

/** Fall of the bank [V], and at its terminals with the ESR [V] (null when unknown), in a steady current. */
export function steadyDroop(use: {
  readonly current: number;
  readonly seconds: number;
  readonly capacitance: number;
  readonly esr: number | null;
}): { readonly bank: number; readonly terminals: number | null } {
  const bank = (use.current * use.seconds) / use.capacitance;
  return { bank, terminals: use.esr === null ? null : bank + use.current * use.esr };
}

/** Voltage after giving up `energy` [J]; null when there is not so much. */
export function voltageAfter(use: {
  readonly capacitance: number;
  readonly voltage: number;
  readonly energy: number;
}): number | null {
  const square = use.voltage ** 2 - (2 * use.energy) / use.capacitance;
  return square >= 0 ? Math.sqrt(square) : null;
}

/** Seconds for which a constant-power load can be fed while the voltage falls from one value to another. */
export const constantPowerSeconds = (use: {
  readonly capacitance: number;
  readonly from: number;
  readonly to: number;
  readonly power: number;
}): number => (use.capacitance * (use.from - use.to) * (use.from + use.to)) / (2 * use.power);

/** Where a waiting bank stands after some seconds, and the part of its energy it has lost. */
export interface Drift {
  readonly voltage: number;
  readonly energyLost: number;
}

/** Drift with leakage [A] and a bleeder [ohm], null for none; never below zero. Source: [textbook-charging]. */
export function driftOf(use: {
  readonly voltage: number;
  readonly capacitance: number;
  readonly leakage: number;
  readonly bleeder: number | null;
  readonly seconds: number;
}): Drift {
  const { capacitance, leakage, bleeder, seconds } = use;
  // expm1 keeps a slow drift exact: the fall is the small difference of near equals otherwise
  const fall =
    bleeder === null
      ? (leakage * seconds) / capacitance
      : -(use.voltage + leakage * bleeder) * Math.expm1(-seconds / (bleeder * capacitance));
  const voltage = Math.max(0, use.voltage - fall);
  return { voltage, energyLost: ((use.voltage - voltage) * (use.voltage + voltage)) / use.voltage ** 2 };
}

/** Ripple [V] under a steady current [A] recharged `frequency` times a second [Hz]. Source: [textbook-charging]. */
export const chargerRipple = (use: {
  readonly current: number;
  readonly frequency: number;
  readonly capacitance: number;
}): number => use.current / (use.frequency * use.capacitance);
