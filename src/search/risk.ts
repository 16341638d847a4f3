// The chance that any unit of a bank exceeds its limit while charging, for the statistical basis; and whether it is within the brief's.
//
// Quick yes: a rigorous bound within the brief's risk. Quick no: the normal approximation, used only for four or more in parallel and a
// chance of a stage above one in five, where it is good. Otherwise the exact tail of the bank layer. Source: [methods-derived] 1.3.

import { exceedRisk, riskBound, type TailCase, type Ties, type UnitLaw } from "../bank/index.ts";
import type { Tolerance } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";

export interface Risk {
  /** Chance that any unit of the bank exceeds its limit while charging. */
  readonly exceed: number;
  /** What `exceed` may be off by, either way. */
  readonly error: number;
  /** How one unit is taken to be spread. */
  readonly law?: string;
}

export interface RiskCase {
  readonly tolerance: Tolerance;
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  /** Unit limit over charge voltage, overshoot included. */
  readonly share: number;
  /** Measured capacitances, F: they stand in for the tolerance. */
  readonly lot?: readonly number[];
}

/** The law of one unit by the brief, over its nominal. */
const lawOf = ({ low, high }: Tolerance, distribution: Brief["distribution"]): UnitLaw =>
  distribution === "normal"
    ? { kind: "normal", nominal: 1, tLow: low, tHigh: high }
    : { kind: "uniform", low: 1 - low, high: 1 + high };

/** The bank as its tail and its counted witness want it. */
export function tailCaseOf({ series: n, parallel: p, ties, share, tolerance, lot }: RiskCase, brief: Brief): TailCase {
  const law: UnitLaw = lot === undefined ? lawOf(tolerance, brief.distribution) : { kind: "lot", values: lot };
  return { n, p, ties, share, law };
}

function lawWords({ lot, tolerance }: RiskCase, { distribution }: Brief): string {
  if (lot !== undefined) return `as the ${lot.length} measured units, each value equally likely`;
  if (distribution !== "normal") return "uniform over its tolerance";
  return tolerance.low === tolerance.high
    ? "normal over its tolerance, cut at three sigma"
    : "normal in two pieces about nominal, a third of each side of its tolerance the sigma there, cut at three sigma";
}

export function riskOf(given: RiskCase, brief: Brief): Risk {
  const { exceed, error } = exceedRisk(tailCaseOf(given, brief));
  return { exceed, error, law: lawWords(given, brief) };
}

/** Standard deviations between a stage's capacitance and the least that it may have beside average others. */
function sigmasOff({ series: n, parallel: p, share, tolerance }: RiskCase): number {
  const middle = 1 + (tolerance.high - tolerance.low) / 2;
  const sigma = (tolerance.low + tolerance.high) / Math.sqrt(12) / middle;
  const kappa = (1 - share) / share;
  return (Math.sqrt(p) * (1 - kappa / (n - 1))) / sigma;
}

/**
 * Asks, for many layouts of one plan, whether the chance is within the brief's; equal cases are worked out once.
 * With a lot every unit is drawn from it, whatever the tolerance: the plan is then of the measured part alone.
 */
export function riskJudge(brief: Brief, lot?: readonly number[]): (given: RiskCase) => boolean {
  const known = new Map<string, boolean>();
  return (shape) => {
    const given = lot === undefined ? shape : { ...shape, lot };
    const { series: n, parallel: p, ties, share, tolerance } = given;
    if (lot === undefined && ties === "cross-tied" && p >= 4 && brief.risk <= 0.01 && sigmasOff(given) < 0.84)
      return false;
    const key = `${tolerance.low} ${tolerance.high} ${n} ${p} ${ties} ${share}`;
    let within = known.get(key);
    if (within === undefined) {
      within = riskBound(tailCaseOf(given, brief)) <= brief.risk;
      if (!within) {
        const { exceed, error } = riskOf(given, brief);
        within = exceed + error <= brief.risk;
      }
      known.set(key, within);
    }
    return within;
  };
}
