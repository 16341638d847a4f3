/*
 * How long a charged bank takes to fall to a voltage or an energy through its resistors, at worst.
 *
 *   symbol  name          unit  range
 *   C       capacitance   F     > 0, the bank's
 *   R       resistance    ohm   > 0, across the bank; Infinity when open
 *   V       voltage       V     > 0
 *   Vs      safeVoltage   V     > 0
 *   tc, tr  capacitanceHigh, resistanceHigh   1   >= 0, the plus tolerances
 *
 *   V(t) = V exp(-t/RC);  t = R C ln(V/Vs);  to an energy Es: (R C/2) ln(E/Es);  R <= t/(C(1 + tc)(1 + tr) ln(V/Vs))
 * One time constant is not a bleed time. Holds for constant R and C: leakage shortens it, dielectric absorption adds a slow
 * tail (see recovery). Source: [textbook] exponential decay; [methods-derived] 3.1.
 */

export interface Bleed {
  readonly capacitance: number;
  readonly resistance: number;
  readonly voltage: number;
  readonly safeVoltage: number;
  readonly capacitanceHigh?: number;
  readonly resistanceHigh?: number;
}

const slow = ({ capacitance, resistance, capacitanceHigh = 0, resistanceHigh = 0 }: Bleed): number =>
  resistance * (1 + resistanceHigh) * capacitance * (1 + capacitanceHigh);

/** Seconds to the safe voltage, with the plus tolerances given; 0 when already there, Infinity when open. */
export const bleedTime = (bleed: Bleed): number =>
  bleed.voltage <= bleed.safeVoltage ? 0 : slow(bleed) * Math.log(bleed.voltage / bleed.safeVoltage);

/** Seconds until no more than `energy` joules are left in the capacitance as it is at its high end. */
export function timeToEnergy(bleed: Omit<Bleed, "safeVoltage">, energy: number): number {
  const stored = (bleed.capacitance * (1 + (bleed.capacitanceHigh ?? 0)) * bleed.voltage ** 2) / 2;
  return stored <= energy ? 0 : (slow({ ...bleed, safeVoltage: 0 }) / 2) * Math.log(stored / energy);
}

/** Volts left after `seconds`. */
export const voltageAfter = (bleed: Omit<Bleed, "safeVoltage">, seconds: number): number =>
  bleed.voltage * Math.exp(-seconds / slow({ ...bleed, safeVoltage: 0 }));

/** Joules left in C at the safe voltage, C at its high end. */
export const energyAtSafe = (bleed: Bleed): number =>
  (bleed.capacitance * (1 + (bleed.capacitanceHigh ?? 0)) * Math.min(bleed.voltage, bleed.safeVoltage) ** 2) / 2;

/** The largest nominal resistance that reaches the safe voltage in `seconds`, ohm; Infinity when already there. */
export function largestBleed(bleed: Omit<Bleed, "resistance">, seconds: number): number {
  const perOhm = bleedTime({ ...bleed, resistance: 1 });
  return perOhm === 0 ? Number.POSITIVE_INFINITY : seconds / perOhm;
}

export interface BleedPaths {
  /** Every balancing chain whole. */
  readonly chains: number;
  /** One chain open: Infinity where there was but one. */
  readonly oneOpen: number;
  /** The dump resistor with no help from the chains; null when there is none. */
  readonly dump: number | null;
}

/**
 * Seconds to the safe voltage AT THE ENDS of the bank by each path alone. A cross-tied bank has one chain, independent
 * strings one each. With an open resistor a unit or stage may keep its charge while the ends read zero: measure each.
 * Range: chainResistance > 0 is that of one whole chain (n R); chains >= 0, whole. Source: [textbook] exponential decay.
 */
export function bleedPaths(
  bank: Omit<Bleed, "resistance"> & {
    readonly chainResistance: number;
    readonly chains: number;
    readonly dump?: number;
  },
): BleedPaths {
  const through = (resistance: number): number => bleedTime({ ...bank, resistance });
  const parallel = (count: number): number => (count > 0 ? bank.chainResistance / count : Number.POSITIVE_INFINITY);
  return {
    chains: through(parallel(bank.chains)),
    oneOpen: through(parallel(bank.chains - 1)),
    dump: bank.dump === undefined ? null : through(bank.dump),
  };
}
