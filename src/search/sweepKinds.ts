// What the two ways of searching a part share: what goes in, why a part gives nothing, and the least series count.

import { chargingWorst, FIT } from "../bank/index.ts";
import type { Capacitor, Fuse, ResistorFamily } from "../catalog/index.ts";
import type { Brief } from "./brief.ts";
import type { RiskCase } from "./risk.ts";

export interface SweepInput {
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  readonly brief: Brief;
  readonly required: number;
  readonly currency: string | null;
  /** Fuses to choose from, in the plan's currency; null or left out: no fuse catalogue. */
  readonly fuses?: readonly Fuse[] | null;
  /** Judges sharing while charging in place of the brief's risk. */
  readonly judge?: Judge;
  /** Called after each part: how many are done, of how many. */
  readonly progress?: ((done: number, total: number) => void) | undefined;
  /** F: the measured lot of the only part, which the statistical basis draws its units from. */
  readonly lot?: readonly number[] | undefined;
}

/** Why a part gives no layout: the first limit met, or for ceilings the least value seen. */
export interface Reason {
  reason: string;
  value: number | null;
  limit: number | null;
}

/** Least n whose worst charging share is within the limit (1e-9 relative). Unknown tolerance: by the even share. */
export function leastSeries(voltage: number, limit: number, tolerance: { low: number; high: number } | null): number {
  const { low, high } = tolerance ?? { low: 0, high: 0 };
  const bound = limit * (1 + FIT);
  if (voltage <= bound) return 1;
  const guess = Math.max(2, Math.floor(1 + ((voltage / bound - 1) * (1 + high)) / (1 - low)));
  // The guess is the closed form rounded down: one or two steps find the least. An absurd count is returned as it is, above any limit.
  if (guess > 1e9) return guess;
  let n = guess;
  while (chargingWorst(voltage, n, { low, high }) > bound) n++;
  return n;
}

/** Whether a shape shares safely while charging although its worst case does not; null when only the worst case counts. */
export type Judge = ((given: RiskCase) => boolean) | null;
