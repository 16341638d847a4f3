// The same arrangement with no balancing resistors: its worst unit over the whole hold, and whether that is proven within the limit.

import { FIT, worstAtHold } from "../../bank/index.ts";
import { holdCaseOf, type RestingBank } from "./holdCase.ts";

export interface WithoutBalance {
  /** Highest voltage of any unit at any moment of charge and hold, over all corners of tolerance and leakage, V; null: not assessed. */
  readonly holding: number | null;
  /** Within the unit limit; null when not assessed. */
  readonly safe: boolean | null;
}

/** What leaving the resistors out would mean; null for one in series, where there is nothing to balance. `limit` is the unit's, V. */
export function withoutBalance(bank: RestingBank, limit: number): WithoutBalance | null {
  if (bank.result.series === 1) return null;
  const given = holdCaseOf({ ...bank, result: { ...bank.result, balance: null } });
  if (given === null) return { holding: null, safe: null };
  const holding = worstAtHold(given).voltage;
  return { holding, safe: holding <= limit * (1 + FIT) };
}
