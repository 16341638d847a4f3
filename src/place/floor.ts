/*
 * What the meter can still tell: below this gap a better placing is for show.
 *
 *   symbol  unit  range   meaning
 *   u       1     >= 0    relative unit-to-unit uncertainty of one reading (a common scale error cancels)
 *   e(n)    1     >= 0    mean of the largest of n standard normal numbers
 *   n_s,n_p 1     >= 1    stages in series, units per stage
 *
 *   cross-tied   floor = e(n_s) u / sqrt(n_p)
 *   strings      floor = e(n_s n_p) u sqrt(1 - 1/n_s), treating units of one string as independent (slightly high)
 *
 * Holds for independent errors of equal spread. A gap is printed to no more digits than +-2 u/sqrt(n_p) supports.
 * Source: [Harter1961] e(n), expected values of normal order statistics; [methods-derived] the rest.
 */
import { power } from "../quantity/index.ts";
import type { Ties } from "./unit.ts";

const REACH = 9;
const STEPS = 720;
const STEP = (2 * REACH) / STEPS;

const density = (x: number): number => Math.exp((-x * x) / 2) / Math.sqrt(2 * Math.PI);

/** The normal distribution at -REACH + (i + 1) STEP, summed by Simpson's rule. */
const BELOW: readonly number[] = (() => {
  let below = 0;
  return Array.from({ length: STEPS }, (_, i) => {
    const x = -REACH + i * STEP;
    below += (STEP / 6) * (density(x) + 4 * density(x + STEP / 2) + density(x + STEP));
    return Math.min(1, below);
  });
})();

/** Every count is asked for again and again; there are few of them. */
const known = new Map<number, number>([[1, 0]]);

/** e(n), to about 1e-5. e(1) = 0, e(2) = 1/sqrt(pi). */
export function expectedLargest(count: number): number {
  const before = known.get(count);
  if (before !== undefined) return before;
  const made = integrated(count);
  known.set(count, made);
  return made;
}

function integrated(count: number): number {
  // e(n) = integral of x d(F^n), as a sum of midpoints.
  let integral = 0;
  let before = 0;
  for (let i = 0; i < STEPS; i++) {
    const after = power(BELOW[i]!, count);
    integral += (-REACH + (i + 0.5) * STEP) * (after - before);
    before = after;
  }
  return integral;
}

export interface FloorShape {
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  /** u, relative. */
  readonly uncertainty: number;
}

/** The gap that the measurement alone would leave, relative. */
export function gapFloor({ series, parallel, ties, uncertainty }: FloorShape): number {
  if (series === 1) return 0;
  if (ties === "cross-tied") return (expectedLargest(series) * uncertainty) / Math.sqrt(parallel);
  return expectedLargest(series * parallel) * uncertainty * Math.sqrt(1 - 1 / series);
}

/** +- of one stage (cross-tied) or unit (strings) voltage, relative, two standard deviations. */
export const voltageUncertainty = ({ parallel, ties, uncertainty }: FloorShape): number =>
  (2 * uncertainty) / Math.sqrt(ties === "cross-tied" ? parallel : 1);

/** Significant digits of a voltage that its relative uncertainty supports: the last one is about as large as the doubt. 1..9. */
export function honestDigits(relative: number): number {
  if (!(relative > 0)) return 9;
  return Math.min(9, Math.max(1, Math.ceil(-Math.log10(relative))));
}
