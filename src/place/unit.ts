// One measured unit capacitor as placing sees it, and how well a lot of them was measured.
import type { MeasuredUnit as Reading } from "../catalog/index.ts";

export type { Ties } from "../bank/index.ts";

/** A unit as measured, before it is fitted. What was not measured is absent, never zero; a `leakage` is read at the voltage that the request names. */
export type MeasuredUnit = Reading;

/** The relative uncertainty of the lot from the rows' own, as a root mean square; undefined when no row has one. */
export function lotUncertainty(units: readonly MeasuredUnit[]): number | undefined {
  const known = units.flatMap((unit) => (unit.uncertainty === undefined ? [] : [unit.uncertainty]));
  if (known.length === 0) return undefined;
  return Math.sqrt(known.reduce((sum, u) => sum + u * u, 0) / known.length);
}
