/*
 * The resistor that empties the bank on purpose: what it must stand in one go, and which values can do.
 *
 *   symbol  name             unit    range
 *   C       capacitance      F       > 0, high end
 *   V       voltage          V       > 0, highest
 *   R       resistance       ohm     > 0
 *   m       mass             kg      > 0, of the resistor's active body
 *   c       specificHeat     J/(kg K) > 0
 *
 *   E = C V^2/2 all of it; peak I = V/R; peak P = V^2/R; rise dT = E/(m c), nothing lost to the air while it lasts
 * Sized by joules, peak volts and peak amperes, never by average watts. The rise holds where R C is well under the body's
 * own cooling time (minutes). Inductance and the spark of the switch are not in it. Source: [textbook]; [methods-derived] 3.1.
 */

/** J/(kg K), for a first try. From memory; common practice, no source. */
export const SPECIFIC_HEATS = { "bulk ceramic": 800, steel: 490, water: 4180 } as const;

export interface DumpDuty {
  readonly energy: number;
  readonly peakCurrent: number;
  readonly peakVoltage: number;
  readonly peakPower: number;
  readonly timeConstant: number;
  /** K; null when the mass or the specific heat is not known. */
  readonly rise: number | null;
}

/** What one dump does to its resistor. Range: all > 0. Source: [methods-derived] 3.1. */
export function dumpDuty(dump: {
  readonly capacitance: number;
  readonly voltage: number;
  readonly resistance: number;
  readonly mass?: number;
  readonly specificHeat?: number;
}): DumpDuty {
  const energy = (dump.capacitance * dump.voltage ** 2) / 2;
  return {
    energy,
    peakCurrent: dump.voltage / dump.resistance,
    peakVoltage: dump.voltage,
    peakPower: dump.voltage ** 2 / dump.resistance,
    timeConstant: dump.resistance * dump.capacitance,
    rise: dump.mass && dump.specificHeat ? energy / (dump.mass * dump.specificHeat) : null,
  };
}

export interface DumpUse {
  /** Share of each rating used by one element; null when that rating is not known: not assessed, not passed. */
  readonly energy: number | null;
  readonly voltage: number | null;
}

/** How much of its ratings each of `series` x `parallel` equal elements uses. Range: series, parallel >= 1. */
export function dumpUse(
  duty: DumpDuty,
  element: {
    readonly pulseEnergy?: number | undefined;
    readonly voltage?: number | undefined;
    readonly series: number;
    readonly parallel: number;
  },
): DumpUse {
  const share = (value: number, rating: number | undefined): number | null => (rating ? value / rating : null);
  return {
    energy: share(duty.energy / (element.series * element.parallel), element.pulseEnergy),
    voltage: share(duty.peakVoltage / element.series, element.voltage),
  };
}

/**
 * The values that keep the peak within `peakCurrent` and reach `safeVoltage` in `seconds`; null when no value does both.
 * Range: all > 0. Source: [methods-derived] 3.1.
 */
export function dumpWindow(want: {
  readonly capacitance: number;
  readonly voltage: number;
  readonly safeVoltage: number;
  readonly seconds: number;
  readonly peakCurrent: number;
}): { readonly least: number; readonly most: number } | null {
  const least = want.voltage / want.peakCurrent;
  const decay = want.voltage > want.safeVoltage ? Math.log(want.voltage / want.safeVoltage) : 0;
  const most = decay === 0 ? Number.POSITIVE_INFINITY : want.seconds / (want.capacitance * decay);
  return least <= most ? { least, most } : null;
}
