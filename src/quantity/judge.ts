// A value against its limit as a finding: pass, fail or warn, or not assessed when either is unknown.

import type { Finding, Verdict } from "./finding.ts";

/** What a finding says, but for its verdict and margin. `exceeded` is the verdict beyond the limit, default fail. */
export type Claim = Omit<Finding, "verdict" | "margin"> & { readonly exceeded?: Verdict };

/** Within this, relatively, an exact fit is a fit. */
const FIT = 1e-9;

/** A finding against an upper limit: pass within it (1e-9 relative), `exceeded` above it, not assessed when either is unknown. */
export function withinMost(claim: Claim): Finding {
  const { exceeded = "fail", ...rest } = claim;
  const { value, limit } = rest;
  if (value === null || limit === null) return { ...rest, verdict: "not assessed", margin: null };
  return {
    ...rest,
    verdict: value <= limit * (1 + FIT) ? "pass" : exceeded,
    margin: limit === 0 ? null : (limit - value) / limit,
  };
}

/** A finding against a lower limit. */
export function withinLeast(claim: Claim): Finding {
  const { exceeded = "fail", ...rest } = claim;
  const { value, limit } = rest;
  if (value === null || limit === null) return { ...rest, verdict: "not assessed", margin: null };
  return {
    ...rest,
    verdict: value >= limit * (1 - FIT) ? "pass" : exceeded,
    margin: limit === 0 ? null : (value - limit) / limit,
  };
}
