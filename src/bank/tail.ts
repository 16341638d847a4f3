/*
 * The chance that any unit of a bank is above its limit while charging, true in relative terms far into the tail.
 *
 * | symbol | in code | unit | meaning                                                              |
 * | ------ | ------- | ---- | -------------------------------------------------------------------- |
 * | n, p   | n, p    | 1    | series and parallel count; stages of p units cross-tied, else strings  |
 * | s      | share   | 1    | limit voltage over bank voltage                                        |
 * | a_i    |         | 1/F  | 1/C_i of stage i; share_i = a_i/sum(a)                                 |
 * | k      | kappa   | 1    | (1 - s)/s: share_i > s when the other a sum to less than k a_i         |
 *
 * P(one) = E[F(k a_1)], F the distribution of the sum of n - 1 others, by convolution of the unit's law over the p units and of 1/C
 * over the stages. Only values of C that can take part in an excess are put on the lattice, so a corner of any smallness is resolved.
 * Any of n: n P(one) - C(n,2) P(two), between the bounds of Bonferroni and Hunter; where two at once are not rare, exactly, as
 * n P(one, and it is the highest). Strings: 1 - (1 - P(string))^p.
 * Two lattices, one twice as fine, give the extrapolated value and the error that is stated with it.
 * Units are independent. What a whole lot has in common (all 5 % high) divides out of every share.
 * Source: [methods-derived] 1.3; [Galambos1996] I.1, I.3 for the bounds of a union (place from memory)
 */
import { power } from "../quantity/index.ts";
import { riskBound } from "./tailBound.ts";
import { LEAST_LOT, lawRange, type TailCase } from "./tailLaw.ts";
import { lotStages } from "./tailLot.ts";
import { type Stages, singleRisk, smoothStages, tailWindows, type Windows } from "./tailStages.ts";
import { highestShare, pairShare } from "./tailUnion.ts";

export interface Tail {
  /** Chance that any unit of the bank exceeds its limit, 0 to 1. */
  readonly exceed: number;
  /** What `exceed` may be off by, either way; 0 when it is exact. */
  readonly error: number;
  /** Sum over all stages, which counts a bank with two stages over twice: an upper bound, and how far it is above `exceed`. */
  readonly unionBound: number;
  readonly unionExcess: number;
}

const exactly = (exceed: number): Tail => ({ exceed, error: 0, unionBound: exceed, unionExcess: 0 });

/** Above this sum over the stages two at once are not rare. */
const RARE = 0.02;
/** Fineness of the three lattices, each step half the one before. */
const LEVELS = [1, 2, 4];
const ROUNDING = 1e-9;

/** Chance that any unit exceeds `share` of the bank's voltage while charging. Call with n >= 1, p >= 1, share > 0. */
export function exceedRisk(given: TailCase): Tail {
  const strings = given.ties === "strings" ? given.p : 1;
  const one = chainRisk({ ...given, p: given.ties === "strings" ? 1 : given.p });
  if (strings === 1 || one.exceed === 1) return one;
  if (one.exceed === 0) return { ...one, error: strings * one.error };
  const all = (chance: number): number => -Math.expm1(strings * Math.log1p(-Math.min(chance, 1)));
  const exceed = all(one.exceed);
  const unionBound = strings * one.unionBound;
  return {
    exceed,
    error: Math.max(all(one.exceed + one.error) - exceed, exceed - all(Math.max(0, one.exceed - one.error))),
    unionBound,
    unionExcess: unionBound - exceed,
  };
}

function chainRisk(given: TailCase): Tail {
  const { n, share, law } = given;
  const { low, high } = lawRange(law);
  if (share >= 1) return exactly(0);
  if (high - low <= 1e-9 * low) return exactly(1 / n > share ? 1 : 0);
  if (share < 1 / n) return exactly(1);
  const kappa = (1 - share) / share;
  const span = tailWindows(given, kappa);
  if (span === null) return exactly(0);
  const { single, off, stages } = lotSingle(given, kappa) ?? smoothSingle(given, kappa, span);
  // Far beyond any use, at about 1e-300 or in a corner of dozens of units, the sums vanish; the chance is then below this, not 0.
  if (single === 0) {
    const error = Math.max(Number.MIN_VALUE, Math.min(vanishing(stages, n), riskBound(given)));
    return { exceed: 0, error, unionBound: 0, unionExcess: 0 };
  }
  const sum = n * single;
  // So far out that the masses are below the smallest number.
  if (!(sum > 0)) return underflown(given);
  const joint = sum > RARE ? highestShare(stages, kappa, n) : pairShare(stages, kappa, n);
  const exceed = Math.min(1, sum * joint.kept);
  return { exceed, error: n * off + sum * joint.error, unionBound: sum, unionExcess: sum - exceed };
}

/** What the lattices cannot hold is bounded instead. */
function underflown(given: TailCase): Tail {
  const bound = riskBound(given);
  if (!(bound < 1e-20)) throw new RangeError("the lattices of a tail lost its mass");
  return { exceed: 0, error: bound, unionBound: bound, unionExcess: 0 };
}

interface Single {
  /** Chance that one given stage is over, and what it may be off by. */
  readonly single: number;
  readonly off: number;
  readonly stages: Stages;
}

function smoothSingle(given: TailCase, kappa: number, span: Windows): Single {
  const levels = LEVELS.map((scale) => smoothStages(given, span, scale)) as [Stages, Stages, Stages];
  const [rough, middle, fine] = levels.map((level) => singleRisk(level, kappa)) as [number, number, number];
  // The lattice is right to the square of its step for a smooth law; a lot's values fall where they fall.
  const smooth = given.law.kind !== "lot" && rough > 0;
  const single = smooth ? extrapolated(middle, fine) : fine;
  const before = smooth ? extrapolated(rough, middle) : middle;
  return { single, off: Math.abs(single - before) + ROUNDING * single, stages: levels[1] };
}

/** A lot of few values, as what it is: separate values. Null when their combinations are too many. */
function lotSingle(given: TailCase, kappa: number): Single | null {
  const found = lotStages(given);
  if (found === null) return null;
  const { stages, blur } = found;
  const single = singleRisk(stages, kappa);
  let spread = 0;
  for (const [k, mass] of stages.victim.masses.entries()) {
    const value = kappa * stages.victim.values[k]!;
    spread += mass * (stages.butOneBelow(value + blur) - stages.butOneBelow(value - blur));
  }
  return { single, off: spread / 2 + 1e-12 * single, stages };
}

/** Chance that every unit lies where an excess needs it, over all stages: an upper bound. */
function vanishing({ victim, other }: Stages, n: number): number {
  const all = (masses: Float64Array): number => masses.reduce((sum, mass) => sum + mass, 0);
  return Math.max(Number.MIN_VALUE, n * all(victim.masses) * power(all(other.masses), n - 1));
}

/** A chance spans decades, so it is its logarithm that goes as the square of the step. */
const extrapolated = (coarse: number, fine: number): number => Math.exp((4 * Math.log(fine) - Math.log(coarse)) / 3);

export type TailFault =
  | "lot too small for a distribution"
  | "capacitance not above zero"
  | "share not above zero"
  | "counts not whole numbers from 1";

/** What keeps a case from being one at all; empty when `exceedRisk` may be asked. */
export function tailFaults(given: TailCase): readonly TailFault[] {
  const faults: TailFault[] = [];
  const { law, n, p, share } = given;
  if (law.kind === "lot" && law.values.length < LEAST_LOT) faults.push("lot too small for a distribution");
  const { low, high } = lawRange(law);
  if (!(low > 0 && Number.isFinite(high) && high >= low)) faults.push("capacitance not above zero");
  if (!(share > 0)) faults.push("share not above zero");
  if (![n, p].every((count) => Number.isInteger(count) && count >= 1)) faults.push("counts not whole numbers from 1");
  return faults;
}
