// What every check of an arrangement at rest is worked out from.

import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import type { Brief } from "./brief.ts";
import type { Candidate } from "./candidate.ts";
import type { LayoutResult } from "./result.ts";
import type { BankCorners } from "./sharing/corners.ts";
import type { BalanceMends } from "./sharing/mends.ts";

export interface FindingsInput {
  readonly result: Omit<LayoutResult, "findings">;
  readonly unit: Capacitor;
  readonly brief: Brief;
  readonly candidate: Candidate;
  readonly family: ResistorFamily | null;
  /** What would mend a resistor that the rule could not choose; null when there is nothing to mend. */
  readonly mends?: BalanceMends | null;
}

/** The input with the corner behind each worst case, worked out once. */
export interface Cornered extends FindingsInput {
  readonly corners: BankCorners;
}
