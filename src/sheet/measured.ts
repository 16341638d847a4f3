/*
 * The bank as it stands of measured units: the capacitance of each stage or string, and of the whole.
 *
 *   symbol  unit  meaning
 *   C_g     F     of a group: the sum of a stage's units; 1/sum(1/C) of a string's
 *   C       F     of the bank: 1/sum(1/C_g) of stages, the sum of strings
 *   u       1     two standard deviations from unit to unit, as placed
 *   g       1     two of the gain of one meter: 0.6 %, for a standard uncertainty of 0.3 % (assumed: a handheld one; common practice, no source)
 *
 * A capacitance is read again by another meter than the list's, so both gains doubt it: +- (u + sqrt(2) g). In a share of voltage
 * the list's gain cancels. Source: [methods-derived] 1.1.
 */

import type { SheetInput } from "./input.ts";

const GAIN = 0.006;

export interface Measured {
  /** F, group by group as the placing has them. */
  readonly groups: readonly number[];
  readonly bank: number;
  /** Relative doubt of a capacitance that another meter reads. */
  readonly doubt: number;
}

const sum = (values: readonly number[]): number => values.reduce((a, b) => a + b, 0);
const inSeries = (values: readonly number[]): number => 1 / sum(values.map((value) => 1 / value));

/** null: the units were not measured. Source: file head. */
export function measuredOf({ layout, placed }: Pick<SheetInput, "layout" | "placed">): Measured | null {
  if (placed === null) return null;
  const tied = layout.ties === "cross-tied";
  const bySerial = new Map(placed.positions.map((p) => [p.serial, p.capacitance]));
  const groups = placed.groups.map((group) => {
    const values = group.map((serial) => bySerial.get(serial) ?? Number.NaN);
    return tied ? sum(values) : inSeries(values);
  });
  return {
    groups,
    bank: tied ? inSeries(groups) : sum(groups),
    doubt: placed.plusMinus + Math.SQRT2 * GAIN,
  };
}
