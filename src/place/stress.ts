// Whether the worst unit of a placed bank stays within its limit: while charging, at the end of a hold, and between.
import type { Finding } from "../quantity/index.ts";
import type { HoldCourse } from "./holdCourse.ts";
import type { ChargingShare } from "./placing.ts";

export interface StressCase {
  /** Charge voltage with its overshoot, V. */
  readonly voltage: number;
  /** Highest voltage of a unit, V; null when it is not known. */
  readonly limit: number | null;
  readonly charging: Pick<ChargingShare, "worst" | "plusMinus">;
  /** Null when leakage is not known. */
  readonly course: HoldCourse | null;
}

/** Comparisons allow this, so that an exact fit is a fit. */
const FIT = 1e-9;

/** The meter's doubt counts against the limit: a share is judged at its upper end. */
export function stressFindings({ voltage, limit, charging, course }: StressCase): Finding[] {
  const finding = (
    id: string,
    state: Finding["state"],
    value: number | null,
    { doubt, note }: { readonly doubt: number; readonly note: string },
  ): Finding => {
    const known = value !== null && limit !== null;
    const most = value === null ? null : value * (1 + doubt);
    return {
      id,
      state,
      verdict: !known ? "not assessed" : (most as number) <= limit * (1 + FIT) ? "pass" : "fail",
      value: most,
      limit,
      margin: known ? (limit - (most as number)) / limit : null,
      unit: "V",
      source: "methods-derived",
      note: limit === null ? "The limit of a unit is not known: give a catalogue, or the limit itself." : note,
    };
  };
  const leakage = "Leakage must be known on every unit, with the voltage at which it was read.";
  return [
    finding("place.charging-stress", "charging", voltage * charging.worst, {
      doubt: charging.plusMinus,
      note: "The worst measured stage or unit, at the upper end of the meter's doubt.",
    }),
    finding("place.holding-stress", "holding", course?.holding.voltage ?? null, {
      doubt: 0,
      note: course === null ? leakage : "The worst at the end of the hold, leakage in proportion to voltage.",
    }),
    finding("place.peak-stress", "holding", course?.peak.voltage ?? null, {
      doubt: charging.plusMinus,
      note:
        course === null
          ? leakage
          : "The highest that any stands between the end of the charge and the end of the hold.",
    }),
  ];
}
