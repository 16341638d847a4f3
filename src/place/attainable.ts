/*
 * How well a shape can balance at all, told before any search.
 *
 *   symbol  unit  range    meaning
 *   n, n_p  1     >= 2, 1  stages, units per stage; K = n n_p units used of N measured
 *   sigma   1     > 0      relative standard deviation of the units
 *   tau^2   1     > 0      sigma^2 n/(K - 1): stage deviations are about normal(0, tau^2 (I - 11'/n))
 *   M       1     >= 1     different placings, K!/((n_p!)^n n!) times the ways to choose K of N
 *
 *   g_med = (1/n) [ (n-1)! ln 2 (2 pi tau^2)^((n-1)/2) / (M sqrt n) ]^(1/(n-1))
 *
 * The best of many placings behaves like the first point of a Poisson process. A median, good to a factor of about two;
 * blind to odd lots and to data rounded to a coarse grid. Source: [BovierKurkova2004].
 */

const logFactorials = (count: number): Float64Array => {
  const table = new Float64Array(count + 1);
  for (let i = 2; i <= count; i++) table[i] = table[i - 1]! + Math.log(i);
  return table;
};

export interface ShapeOfLot {
  readonly series: number;
  readonly parallel: number;
  /** N, units measured, >= series * parallel. */
  readonly measured: number;
  /** sigma, relative. */
  readonly spread: number;
}

/** g_med, the gap that the best placing of such a lot has in the middle case. 0 when there is nothing to balance. */
export function attainableGap({ series, parallel, measured, spread }: ShapeOfLot): number {
  const used = series * parallel;
  if (series < 2 || used < 2 || spread <= 0) return 0;
  const log = logFactorials(measured);
  const chosen = log[measured]! - log[used]! - log[measured - used]!;
  const placings = log[used]! - series * log[parallel]! - log[series]! + chosen;
  const variance = (spread * spread * series) / (used - 1);
  const volume = log[series - 1]! + Math.log(Math.LN2) + ((series - 1) / 2) * Math.log(2 * Math.PI * variance);
  return Math.exp((volume - placings - Math.log(series) / 2) / (series - 1)) / series;
}

/** Relative standard deviation of capacitances, for `spread`. */
export function relativeSpread(values: readonly number[]): number {
  const mean = values.reduce((sum, v) => sum + v, 0) / values.length;
  const square = values.reduce((sum, v) => sum + (v - mean) ** 2, 0) / Math.max(1, values.length - 1);
  return Math.sqrt(square) / mean;
}
