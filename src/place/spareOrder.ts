// The order in which units are set aside as spares: outliers, then the worst leakage and ESR, then the smallest capacitance.
import type { MeasuredUnit } from "./unit.ts";

export const SPARE_RULE =
  "outliers first, then the worst of leakage and ESR (each over the lot's median), then the smallest capacitance";

/** A unit is called worse than another only when its leakage or ESR is this much above the median. */
const NOTABLE = 1.5;

const medianOf = (values: readonly number[]): number => {
  const sorted = Float64Array.from(values).sort();
  return sorted.length === 0 ? Number.NaN : sorted[Math.floor(sorted.length / 2)]!;
};

/**
 * Indices of the units, those to keep first and those to set aside last. A quantity that was not measured does not count against
 * a unit: unknown is not bad, and it is flagged elsewhere.
 */
export function keepOrder(units: readonly MeasuredUnit[], outliers: ReadonlySet<string>): number[] {
  const typical = {
    leakage: medianOf(units.flatMap((unit) => (unit.leakage === undefined ? [] : [unit.leakage]))),
    esr: medianOf(units.flatMap((unit) => (unit.esr === undefined ? [] : [unit.esr]))),
  };
  const badness = units.map((unit) => {
    const leakage = unit.leakage !== undefined && typical.leakage > 0 ? unit.leakage / typical.leakage : 1;
    const esr = unit.esr !== undefined && typical.esr > 0 ? unit.esr / typical.esr : 1;
    const worst = Math.max(leakage, esr);
    return worst > NOTABLE ? worst : 1;
  });
  const wild = units.map((unit) => (outliers.has(unit.serial) ? 1 : 0));
  return units
    .map((_, i) => i)
    .sort(
      (a, b) =>
        wild[a]! - wild[b]! || badness[a]! - badness[b]! || units[b]!.capacitance - units[a]!.capacitance || a - b,
    );
}
