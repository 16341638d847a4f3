/*
 * When a drifting value reaches its limit, with the interval that the readings leave.
 *
 *   symbol  meaning
 *   D(d)    margin used up:  alpha a + beta b d - M;  due when D >= 0, d from the first reading
 *           capacitance lost by L:  alpha = -L, beta = -1, M = 0       (a + b d = a (1 - L))
 *           ESR grown by G:         alpha = -G, beta = +1, M = 0
 *           leakage up to I:        alpha = beta = 1, M = I
 *           against a first reading y off the line (undated): alpha = beta = -1, M = -y (1 - L); or 1, 1, y (1 + G)
 *   z       1.96: 95 %, two-sided
 *
 * The interval is where D^2 = z^2 var D: soonest, and latest where the drift is certain enough to have one.
 * Holds for normal errors, exactly (no linearising of the quotient). Source: [Fieller1954]; [JCGM100] 5.2 var D.
 */
import type { DriftLine } from "./driftFit.ts";

export const COVERAGE = 1.96;

export interface Wear {
  readonly ofStart: number;
  readonly ofSlope: number;
  readonly limit: number;
  /** Variance of the limit, where it comes from a reading that is not on the line. */
  readonly limitVariance?: number;
}

/** Shots or days from the first reading; null: never, as far as the readings tell. */
export interface DueAfter {
  readonly best: number | null;
  readonly soonest: number | null;
  readonly latest: number | null;
}

export function dueAfter(line: DriftLine, { ofStart, ofSlope, limit, limitVariance = 0 }: Wear): DueAfter {
  const zz = COVERAGE ** 2;
  const level = ofStart * line.start - limit;
  const rate = ofSlope * line.slope;
  const square = rate ** 2 - zz * ofSlope ** 2 * line.slopeVariance;
  const half = level * rate - zz * ofStart * ofSlope * line.covariance;
  const constant = level ** 2 - zz * (ofStart ** 2 * line.startVariance + limitVariance);
  const best = rate > 0 && level < 0 ? -level / rate : null;
  const root = Math.sqrt(Math.max(0, half ** 2 - square * constant));
  // Already beyond the limit at the start, or within doubt of it: nothing to look ahead to.
  if (level >= 0 || constant <= 0) return { best: 0, soonest: 0, latest: best };
  // The product form of the roots keeps the digits where the square term is small.
  const soonest = root - half > 0 ? constant / (root - half) : null;
  const latest = square > 0 && rate > 0 ? (root - half) / square : null;
  return { best, soonest, latest };
}
