// How the worst unit's voltage is spread over many banks of one arrangement: drawn from a seed, with the reckoned chance beside it.

import { monteCarlo } from "../../bank/index.ts";
import type { Capacitor } from "../../catalog/index.ts";
import type { Brief } from "../brief.ts";
import type { LayoutResult } from "../result.ts";
import { riskOf, tailCaseOf } from "../risk.ts";
import { fullVoltage } from "./holdCase.ts";

export interface SpreadBank {
  readonly result: Pick<LayoutResult, "series" | "parallel" | "ties" | "share">;
  readonly unit: Capacitor;
  readonly brief: Brief;
  /** Measured capacitances, F, that stand in for the tolerance. */
  readonly lot?: readonly number[];
}

export interface ShareSpread {
  /** V at the lower edge of the first bin and the upper edge of the last: the even share, and the most that any bank can have. */
  readonly from: number;
  readonly to: number;
  /** Banks by the voltage of their worst unit while charging, in even bins from `from` to `to`. */
  readonly bins: readonly number[];
  readonly banks: number;
  readonly seed: number;
  /** V that the worst unit of half the banks stays below. */
  readonly median: number;
  /** Unit limit, V; chance that any unit of a bank exceeds it, reckoned and not counted, and what that may be off by. */
  readonly limit: number;
  readonly exceed: number;
  readonly error: number;
  readonly law: string;
}

/** Value in volts below which `part` of the banks lie, along a straight line within its bin. */
function quantile(bins: readonly number[], part: number, { from, width }: { from: number; width: number }): number {
  const wanted = part * bins.reduce((sum, count) => sum + count, 0);
  let below = 0;
  for (const [bin, count] of bins.entries()) {
    if (below + count >= wanted && count > 0) return from + width * (bin + (wanted - below) / count);
    below += count;
  }
  return from + width * bins.length;
}

/**
 * The spread of `banks` banks drawn from `seed`, each unit by the brief's distribution. Null for one in series, an unknown
 * tolerance, or none at all: nothing is spread then. Source: [methods-derived] 1.3.
 */
export function shareSpread(
  { result, unit, brief, lot }: SpreadBank,
  draw: { readonly banks: number; readonly seed: number },
): ShareSpread | null {
  const { series, parallel, ties, share } = result;
  const { tolerance = lot && { low: 0, high: 0 } } = unit;
  if (series === 1 || tolerance === undefined) return null;
  const low = lot === undefined ? 1 - tolerance.low : Math.min(...lot);
  const high = lot === undefined ? 1 + tolerance.high : Math.max(...lot);
  if (!(high > low)) return null;
  const volts = fullVoltage(brief);
  const given = {
    tolerance,
    series,
    parallel,
    ties,
    share: share.limit / volts,
    ...(lot === undefined ? {} : { lot }),
  };
  const drawn = monteCarlo(tailCaseOf(given, brief), draw);
  let step = drawn.next();
  while (!step.done) step = drawn.next();
  const bins = [...step.value.bins];
  const from = volts / series;
  const to = (volts * high) / (high + (series - 1) * low);
  const { exceed, error, law = "" } = riskOf(given, brief);
  const width = (to - from) / bins.length;
  const median = quantile(bins, 0.5, { from, width });
  return { from, to, bins, ...draw, median, limit: share.limit, exceed, error, law };
}
