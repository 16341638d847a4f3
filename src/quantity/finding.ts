// What a check found about a bank: the verdict, the value, its limit, and where the rule comes from.

export type Verdict = "pass" | "warn" | "fail" | "not assessed";

/** The state of the bank that a finding is about. */
export type BankState = "charging" | "holding" | "dumped" | "pulse" | "faulted" | "stored";

/**
 * One finding. `value` and `limit` are in `unit` (SI); null means unknown, never zero.
 * A finding whose value or limit is unknown is `not assessed`, never `pass`.
 */
export interface Finding {
  readonly id: string;
  readonly state: BankState;
  readonly verdict: Verdict;
  readonly value: number | null;
  readonly limit: number | null;
  /** Fraction of the limit still free, (limit - value)/limit; null when either is unknown. */
  readonly margin: number | null;
  readonly unit: string;
  /** Key of the source in DEVELOPERS.md. */
  readonly source: string;
  /** What it means and what would mend it, one plain sentence. */
  readonly note: string;
}
