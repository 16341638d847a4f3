// The chance that any unit of a bank exceeds its limit while charging, for the statistical basis; and whether it is within the brief's.
//
// | symbol | in code | unit | meaning |
// | ------ | ------- | ---- | ------- |
// | s      | share   | 1    | unit limit over charge voltage |
// | k      | kappa   | 1    | (1 - s)/s |
// | sigma  | sigma   | 1    | standard deviation of one unit's capacitance over its middle |
//
// Quick yes: stage 1 exceeds only if k sum(C_j) > (n - 1)^2 C_1 (means in order: harmonic below arithmetic), a sum of independent units.
// A uniform unit is strictly sub-Gaussian, so the chance is at most exp(-mean^2/(2 variance)), times n stages and p strings.
// Quick no: the normal approximation of the same sum, used only for four or more in parallel and a chance above one in five, where it is good.
// Otherwise the exact tail of the bank layer. Sources: [methods-derived] 1.3; [Arbel2020] uniform laws are strictly sub-Gaussian (from memory).

import { exceedRisk, type Ties, type UnitLaw } from "../bank/index.ts";
import type { Tolerance } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";

export interface Risk {
  /** Chance that any unit of the bank exceeds its limit while charging. */
  readonly exceed: number;
  /** What `exceed` may be off by, either way. */
  readonly error: number;
}

export interface RiskCase {
  readonly tolerance: Tolerance;
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  /** Unit limit over charge voltage, overshoot included. */
  readonly share: number;
}

/** The law of one unit by the brief, over its nominal. */
const lawOf = ({ low, high }: Tolerance, distribution: Brief["distribution"]): UnitLaw =>
  distribution === "normal"
    ? { kind: "normal", nominal: 1, tLow: low, tHigh: high }
    : { kind: "uniform", low: 1 - low, high: 1 + high };

export function riskOf(given: RiskCase, brief: Brief): Risk {
  const { series: n, parallel: p, ties, share, tolerance } = given;
  const { exceed, error } = exceedRisk({ n, p, ties, share, law: lawOf(tolerance, brief.distribution) });
  return { exceed, error };
}

/** Mean over standard deviation of how far stage 1 is from exceeding, and so the exponent of the bound. */
function distanceOf({ series: n, parallel, ties, share, tolerance }: RiskCase): number {
  const p = ties === "cross-tied" ? parallel : 1;
  const sigma = (tolerance.low + tolerance.high) / Math.sqrt(12) / (1 + (tolerance.high - tolerance.low) / 2);
  const kappa = (1 - share) / share;
  const others = n - 1;
  return (Math.sqrt(p) * (others - kappa) * others) / (sigma * Math.sqrt(kappa * kappa * others + others ** 4));
}

/** Asks, for many layouts of one plan, whether the chance is within the brief's; equal cases are worked out once. */
export function riskJudge(brief: Brief): (given: RiskCase) => boolean {
  const known = new Map<string, boolean>();
  return (given) => {
    const { series: n, parallel: p, ties, share, tolerance } = given;
    const distance = distanceOf(given);
    const chances = ties === "strings" ? n * p : n;
    if (
      brief.distribution === "uniform" &&
      distance > 0 &&
      chances * Math.exp((-distance * distance) / 2) <= brief.risk
    )
      return true;
    if (ties === "cross-tied" && p >= 4 && brief.risk <= 0.01 && distance < 0.84) return false;
    const key = `${tolerance.low} ${tolerance.high} ${n} ${p} ${ties} ${share}`;
    let within = known.get(key);
    if (within === undefined) {
      const { exceed, error } = riskOf(given, brief);
      within = exceed + error <= brief.risk;
      known.set(key, within);
    }
    return within;
  };
}
