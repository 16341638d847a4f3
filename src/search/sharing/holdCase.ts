// One arrangement as the hold's worst case wants it: units, tolerances, leakage and resistor of an assessed layout under its brief.

import type { HoldCase, Ties } from "../../bank/index.ts";
import type { Capacitor } from "../../catalog/index.ts";
import type { Brief } from "../brief.ts";
import { leakOf } from "../candidate.ts";

/** What of a layout its states at rest depend on. The resistor (ohm, fraction) is that of one position. */
export interface RestingBank {
  readonly result: {
    readonly series: number;
    readonly parallel: number;
    readonly ties: Ties;
    readonly balance: { readonly resistance: number; readonly tolerance: number } | null;
  };
  readonly unit: Capacitor;
  readonly brief: Brief;
}

/** V at the ends, with the charger's overshoot. */
export const fullVoltage = ({ voltage, overshoot }: Brief): number => voltage * (1 + overshoot);

/** The case; null when the tolerance or the leakage is unknown, for then no worst case can be told. */
export function holdCaseOf({ result, unit, brief }: RestingBank): HoldCase | null {
  const leak = leakOf(unit);
  if (leak === null || unit.tolerance === undefined) return null;
  const { series, parallel, ties, balance } = result;
  return {
    n: series,
    m: ties === "cross-tied" ? parallel : 1,
    C: unit.capacitance,
    tLow: unit.tolerance.low,
    tHigh: unit.tolerance.high,
    leakage: leak.kind === "current" ? leak.amperes : 0,
    insulation: leak.kind === "insulation" ? leak.ohms : Number.POSITIVE_INFINITY,
    R: balance?.resistance ?? null,
    q: balance?.tolerance ?? 0,
    V: fullVoltage(brief),
    hold: brief.hold,
  };
}
