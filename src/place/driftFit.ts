/*
 * A straight line through the readings of one unit over shots or days.
 *
 *   symbol      unit        range  meaning
 *   x_k         shots, d    any    when reading k was taken; d_k = x_k - x_0 from the first
 *   y_k         F, ohm, A   >= 0   the reading
 *   s_k         as y        > 0    its standard uncertainty
 *   a, b        y, y/x             start and slope: least sum of ((y_k - a - b d_k)/s_k)^2
 *   chi2/f                         Birge ratio squared, f = readings - 2; above 1 the variances are raised by it
 *
 * Holds while the unit ages in proportion to shots or time, and readings err independently.
 * Source: [JCGM100] annex H.3 the line and its covariance; [Birge1932] raising by the ratio.
 */

export interface DriftReading {
  /** Shots or days. */
  readonly at: number;
  readonly value: number;
  /** Standard uncertainty, in the unit of `value`. */
  readonly sigma: number;
}

export interface DriftLine {
  /** Where the line starts: the first reading. */
  readonly from: number;
  readonly start: number;
  readonly slope: number;
  readonly startVariance: number;
  readonly slopeVariance: number;
  readonly covariance: number;
  /** How much wider the readings scatter about the line than their uncertainty; 1 with two readings. */
  readonly scatter: number;
}

/** Null with fewer than two readings apart in time. */
export function driftLine(readings: readonly DriftReading[]): DriftLine | null {
  const from = Math.min(...readings.map(({ at }) => at));
  if (readings.length < 2 || readings.every(({ at }) => at === from)) return null;
  let [w, wd, wdd, wy, wdy] = [0, 0, 0, 0, 0];
  for (const { at, value, sigma } of readings) {
    const weight = 1 / sigma ** 2;
    const d = at - from;
    w += weight;
    wd += weight * d;
    wdd += weight * d * d;
    wy += weight * value;
    wdy += weight * d * value;
  }
  const determinant = w * wdd - wd * wd;
  const start = (wdd * wy - wd * wdy) / determinant;
  const slope = (w * wdy - wd * wy) / determinant;
  const chi2 = readings.reduce(
    (sum, { at, value, sigma }) => sum + ((value - start - slope * (at - from)) / sigma) ** 2,
    0,
  );
  const freedom = readings.length - 2;
  const scatter = freedom > 0 ? Math.sqrt(chi2 / freedom) : 1;
  const raised = Math.max(1, scatter) ** 2;
  return {
    from,
    start,
    slope,
    startVariance: (raised * wdd) / determinant,
    slopeVariance: (raised * w) / determinant,
    covariance: (-raised * wd) / determinant,
    scatter,
  };
}
