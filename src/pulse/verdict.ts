// Turns a value against its limit into a finding, minding that a bound can only prove one side.
import type { BankState, Finding } from "../quantity/index.ts";

/** What a computed number is, when parts of the circuit were unknown and left out. */
export type Bound = "value" | "upper bound" | "lower bound" | "side unknown";

/** A claim that a value stays within a limit. */
export interface Claim {
  readonly id: string;
  readonly state?: BankState;
  readonly value: number | null;
  readonly limit: number | null;
  readonly unit: string;
  readonly source: string;
  readonly note: string;
  readonly bound?: Bound;
}

/** Relative slack within which an exact fit counts as a fit. */
const SLACK = 1e-9;

/**
 * value <= limit as a finding. Unknown value or limit: not assessed. An upper bound within the limit passes and one over it
 * proves nothing; a lower bound over the limit fails and one within it proves nothing. Source: [methods-derived].
 */
export function atMost(claim: Claim): Finding {
  const { id, value, limit, unit, source, note, state = "pulse", bound = "value" } = claim;
  const told = bound === "value" ? note : `${note} (${bound})`;
  if (value === null || limit === null) {
    return { id, state, verdict: "not assessed", value, limit, margin: null, unit, source, note: told };
  }
  const fits = value <= limit + SLACK * Math.abs(limit);
  const proven = bound === "value" || bound === (fits ? "upper bound" : "lower bound");
  const verdict = proven ? (fits ? "pass" : "fail") : "not assessed";
  const margin = limit === 0 ? null : (limit - value) / limit;
  return { id, state, verdict, value, limit, margin, unit, source, note: told };
}

/** value >= limit as a finding. Unknown value or limit: not assessed. */
export function atLeast(claim: Omit<Claim, "bound">): Finding {
  const { id, value, limit, unit, source, note, state = "pulse" } = claim;
  if (value === null || limit === null) {
    return { id, state, verdict: "not assessed", value, limit, margin: null, unit, source, note };
  }
  const verdict = value >= limit - SLACK * Math.abs(limit) ? "pass" : "fail";
  const margin = limit === 0 ? null : (value - limit) / limit;
  return { id, state, verdict, value, limit, margin, unit, source, note };
}

/** A finding that carries no limit: something the reader must know. */
export const remark = (id: string, verdict: Finding["verdict"], source: string, note: string): Finding => ({
  id,
  state: "pulse",
  verdict,
  value: null,
  limit: null,
  margin: null,
  unit: "",
  source,
  note,
});
