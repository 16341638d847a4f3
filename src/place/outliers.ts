/*
 * Which measured values do not belong to the lot.
 *
 *   symbol   meaning
 *   Q1, Q3   first and third quartile, interpolated between neighbours
 *   fence    Q1 - 3 (Q3 - Q1) below, Q3 + 3 (Q3 - Q1) above
 *
 * A value is an outlier when it lies beyond the outer fence, and further from the median than three times what the meter may err.
 * Leakage and ESR are judged on their logarithm, and only when high. Fewer than 5 values: nothing is called an outlier.
 * Where more than one unit in ten (and more than two) is out, they are a second lot and not strays: none is called an outlier.
 * Source: [NIST-handbook] 7.1.6, outer fences; [Tukey1977].
 */
import type { MeasuredUnit } from "./unit.ts";

export const OUTLIER_RULE = "beyond Tukey's outer fence (3 interquartile ranges outside the quartiles)";

const LEAST_COUNT = 5;
const FENCE = 3;

function quantile(sorted: ArrayLike<number>, part: number): number {
  const at = part * (sorted.length - 1);
  const below = Math.floor(at);
  const above = Math.min(sorted.length - 1, below + 1);
  return sorted[below]! + (at - below) * (sorted[above]! - sorted[below]!);
}

export interface Fences {
  readonly low: number;
  readonly high: number;
}

/** Outer fences widened to `slack` about the median; infinite for fewer than 5 values. */
export function outerFences(values: readonly number[], slack: number): Fences {
  if (values.length < LEAST_COUNT) return { low: Number.NEGATIVE_INFINITY, high: Number.POSITIVE_INFINITY };
  const sorted = Float64Array.from(values).sort();
  const [q1, median, q3] = [quantile(sorted, 0.25), quantile(sorted, 0.5), quantile(sorted, 0.75)];
  const reach = FENCE * (q3 - q1);
  return { low: Math.min(q1 - reach, median - slack), high: Math.max(q3 + reach, median + slack) };
}

export interface Outlier {
  readonly serial: string;
  readonly quantity: "capacitance" | "leakage" | "esr";
  /** SI. */
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

/** What leakage and ESR meters may err, as a factor; three of these are never an outlier. */
const COARSE = 0.1;

const QUANTITIES = ["capacitance", "leakage", "esr"] as const;
/** Part of the lot, and count, beyond which values that stand out are a lot of their own. */
const SECOND_LOT = 0.1;
const MOST_STRAYS = 2;

/** Every outlier of the lot, in the order of the units; a unit may be named for more than one quantity. */
export function outliersOf(units: readonly MeasuredUnit[], uncertainty: number): Outlier[] {
  const capacitances = units.map((unit) => unit.capacitance);
  const median = quantile(Float64Array.from(capacitances).sort(), 0.5);
  const capacitance = outerFences(capacitances, 3 * uncertainty * median);
  const highOf = (quantity: "leakage" | "esr"): number => {
    const known = units.flatMap((unit) => ((unit[quantity] ?? 0) > 0 ? [Math.log(unit[quantity]!)] : []));
    return Math.exp(outerFences(known, 3 * COARSE).high);
  };
  const limits = { leakage: highOf("leakage"), esr: highOf("esr") };
  const all = units.flatMap((unit) => {
    const found: Outlier[] = [];
    const { serial } = unit;
    if (unit.capacitance < capacitance.low || unit.capacitance > capacitance.high) {
      found.push({ serial, quantity: "capacitance", value: unit.capacitance, ...capacitance });
    }
    for (const quantity of ["leakage", "esr"] as const) {
      const value = unit[quantity];
      if (value !== undefined && value > limits[quantity]) {
        found.push({ serial, quantity, value, low: 0, high: limits[quantity] });
      }
    }
    return found;
  });
  const common = QUANTITIES.filter((quantity) => {
    const count = all.filter((o) => o.quantity === quantity).length;
    return count > MOST_STRAYS && count > SECOND_LOT * units.length;
  });
  return all.filter((o) => !common.includes(o.quantity));
}
