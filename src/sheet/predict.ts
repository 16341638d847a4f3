/*
 * What each stage (cross-tied) or unit (strings) should read in a hot test, and the band in which a reading is accepted.
 *
 *   symbol  unit  meaning
 *   V       V     voltage of the bank at this step
 *   s_i     1     share of the position: measured units by their capacitance, else 1/n
 *   u       1     two standard deviations of s_i from the meter that measured the capacitances
 *   w, d    1, V  the voltmeter's relative and absolute doubt: 0.5 % and 0.1 V, a handheld meter (common practice, no source)
 *
 *   measured      V s_i (1 +- (u + w)) +- d
 *   not measured  from one high among low to one low among high: V(1 - t_lo)/((1 - t_lo) + (n - 1)(1 + t_hi)) and the reverse, +- w, d
 * Right after the charge, before leakage has moved anything. Source: [methods-derived] 1.1, 1.2.
 */

import { chargingLeast, chargingWorst } from "../bank/index.ts";
import type { SheetInput } from "./input.ts";
import { type Spot, spotsOf } from "./names.ts";

export const METER = { relative: 0.005, absolute: 0.1 } as const;

/** Steps of a hot test, part of the charge voltage. Source: [practice-5b] section 2, step 12: common practice. */
export const STEPS = [0.1, 0.25, 0.5, 0.75, 1] as const;

export interface Predicted {
  /** A stage as a whole has no place. */
  readonly spot: Spot | { readonly group: number; readonly place: null };
  /** Share of the bank's voltage. */
  readonly share: number;
  /** V at V = 1: low and high end of what is accepted but for the meter's absolute doubt; null: the tolerance is not known. */
  readonly low: number | null;
  readonly high: number | null;
}

/** Where a voltage is read: stages when cross-tied, units in strings. */
export function predictedShares({ layout, unit, placed }: SheetInput): readonly Predicted[] {
  const { series, ties } = layout;
  const spots =
    ties === "cross-tied" ? Array.from({ length: series }, (_, i) => ({ group: i + 1, place: null })) : spotsOf(layout);
  if (placed !== null) {
    const u = placed.plusMinus + METER.relative;
    const shares = new Map(
      placed.positions.map((p) => [`${p.group}.${ties === "cross-tied" ? "" : p.place}`, p.share]),
    );
    return spots.map((spot) => {
      const share = shares.get(`${spot.group}.${spot.place ?? ""}`) ?? Number.NaN;
      return { spot, share, low: share * (1 - u), high: share * (1 + u) };
    });
  }
  const { tolerance } = unit;
  const known = tolerance !== undefined || series === 1;
  const t = tolerance ?? { low: 0, high: 0 };
  const low = known ? chargingLeast(1, series, t) * (1 - METER.relative) : null;
  const high = known ? chargingWorst(1, series, t) * (1 + METER.relative) : null;
  return spots.map((spot) => ({ spot, share: 1 / series, low, high }));
}
