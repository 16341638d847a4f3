// The limits of the brief on shot, fault and life, judged for one part in one shape; what is not known never passes.

import { FIT } from "../bank/index.ts";
import type { Capacitor } from "../catalog/index.ts";
import { atLeast, atMost, type Bound, unitShort } from "../pulse/index.ts";
import type { Finding, Read } from "../quantity/index.ts";
import { pouredIntoShort } from "./blendPoured.ts";
import { type Beside, besideShot, othersNominal } from "./blendShot.ts";
import type { Brief } from "./brief.ts";
import { chargeFor, firingOf } from "./charging.ts";
import { faultUnitOf, guardsOf } from "./faults.ts";
import { atHighest } from "./highestShot.ts";
import { lifeOf } from "./life.ts";
import { LIMIT_KEYS, type RatedLimit } from "./limitKeys.ts";
import { type CornerName, type Shape, type ShotCorner, shotCorner } from "./shotCorner.ts";

export interface LimitCase extends Shape {
  readonly unit: Capacitor;
  /** Highest voltage of any unit before a fault, V; not finite where it is unknown. */
  readonly worst: number;
  /** The other groups, where the shape is one group of a blend. */
  readonly beside?: Beside | undefined;
}

/** One limit and the figure it bears on. `stuck`: more in parallel does not lower the figure. */
export interface LimitClaim {
  readonly key: (typeof LIMIT_KEYS)[number];
  readonly value: number | null;
  readonly limit: number | null;
  readonly bound: Bound;
  readonly unit: string;
  readonly stuck: boolean;
}

/** Why a layout is refused. */
export interface Broken {
  readonly reason: string;
  readonly value: number | null;
  readonly limit: number | null;
  readonly stuck: boolean;
}

/** Names of the limits in reasons and findings. */
export const LIMIT_NAMES: Readonly<Record<LimitClaim["key"], string>> = {
  maxPeakCurrent: "peak-current",
  maxSlew: "slew",
  maxReversal: "reversal",
  maxRms: "rms",
  maxTemperatureRise: "temperature-rise",
  maxFaultEnergy: "fault-energy",
  minLife: "life",
};

const finite = (value: number): number | null => (Number.isFinite(value) ? value : null);
const ratedLimit = (limit: RatedLimit, rating: number | undefined): number | null =>
  limit.kind === "absolute" ? limit.value : rating === undefined ? null : limit.value * rating;

/** The joules that the others pour into a shorted unit, as in the fault table. */
function faultClaim(limit: number, { unit, worst, beside, ...shape }: LimitCase, brief: Brief): LimitClaim {
  const voltage = brief.voltage * (1 + brief.overshoot);
  const known = Number.isFinite(worst);
  const bank = {
    ...shape,
    unit: faultUnitOf(unit),
    voltage,
    ...guardsOf(brief),
    worstCharging: known ? worst : voltage,
    worstHolding: null,
  };
  const own = known ? unitShort(bank).energyIntoUnit : null;
  const others = beside === undefined ? 0 : othersNominal(beside);
  const value =
    own === null ? null : own + pouredIntoShort({ ...shape, capacitance: unit.capacitance, others, voltage });
  return { key: "maxFaultEnergy", value, limit, bound: "value", unit: "J", stuck: true };
}

/** Heat of the worst unit at the brief's rate; null where it cannot be told. */
function heatOf(brief: Brief, unit: Capacitor, high: ShotCorner) {
  const charge = chargeFor(brief, { capacitance: high.bank.capacitance, left: high.left });
  if (!charge.ok || charge.value === null) return null;
  const shot = { action: high.action, seconds: 0, share: high.unit.actionShare };
  return firingOf(brief, high.bank, unit, { charge: charge.value, shot }).heating;
}

/**
 * The claims of a brief on one layout; null when its shot cannot be reckoned. By the nominal basis capacitance is nominal;
 * else current, slew and heat are taken with every unit high, reversal with every unit low, and the worst share on top.
 */
export function limitClaims(brief: Brief, given: LimitCase): readonly LimitClaim[] | null {
  const { unit, worst } = given;
  const asked = (key: LimitClaim["key"]): boolean => brief[key] !== undefined;
  const claims: LimitClaim[] = [];
  if (brief.maxFaultEnergy !== undefined) claims.push(faultClaim(brief.maxFaultEnergy, given, brief));
  if (!LIMIT_KEYS.some((key) => key !== "maxFaultEnergy" && asked(key))) return claims;
  const ends = brief.basis === "nominal" ? (["nominal", "nominal"] as const) : (["low", "high"] as const);
  const { beside } = given;
  const at = (end: CornerName, fired: Brief = brief): Read<ShotCorner> =>
    beside === undefined ? shotCorner(fired, unit, given, end) : besideShot(fired, given, beside);
  const low = at(ends[0]);
  const high = at(ends[1]);
  // amperes and their slope are judged at the highest voltage the charger reaches
  const top =
    brief.overshoot > 0 && (asked("maxPeakCurrent") || asked("maxSlew")) ? at(ends[1], atHighest(brief)) : high;
  if (!low.ok || !high.ok || !top.ok) return null;
  // without the tolerance neither the worst unit's part of the current nor the corners are known
  const spread = unit.tolerance !== undefined || brief.basis === "nominal";
  const alone = given.parallel === 1 && beside === undefined;
  const others = beside?.others ?? [];
  const shared =
    spread && (unit.tolerance !== undefined || alone) && others.every((one) => one.unit.tolerance !== undefined);
  const { bounds } = high.value;
  const claim = (key: LimitClaim["key"], figure: Omit<LimitClaim, "key" | "stuck">): void => {
    claims.push({ key, stuck: false, ...figure });
  };
  const { maxPeakCurrent, maxSlew, maxReversal, maxRms, maxTemperatureRise, minLife } = brief;
  if (maxPeakCurrent !== undefined) {
    const limit = ratedLimit(maxPeakCurrent, unit.peakCurrent);
    const value = shared ? top.value.unit.peakCurrent : null;
    claim("maxPeakCurrent", { value, limit, bound: bounds.peakCurrent, unit: "A" });
  }
  if (maxSlew !== undefined) {
    const limit = ratedLimit(maxSlew, unit.slew);
    claim("maxSlew", { value: shared ? top.value.unit.slew : null, limit, bound: bounds.peakCurrent, unit: "V/s" });
  }
  // The unit that its place on the bus reverses more than the bank decides.
  const reversals = [low.value, high.value].flatMap((one) => [one.reversal, one.unit.reversal]);
  const reversal = spread ? Math.max(...reversals) : null;
  if (maxReversal !== undefined)
    claim("maxReversal", { value: reversal, limit: maxReversal, bound: bounds.reversal, unit: "1" });
  const heat =
    shared && (maxRms ?? maxTemperatureRise ?? minLife) !== undefined ? heatOf(brief, unit, high.value) : null;
  if (maxRms !== undefined) {
    const limit = ratedLimit(maxRms, unit.rippleCurrent);
    claim("maxRms", { value: heat?.unitRms ?? null, limit, bound: bounds.action, unit: "A" });
  }
  if (maxTemperatureRise !== undefined)
    claim("maxTemperatureRise", {
      value: heat?.unitRise ?? null,
      limit: maxTemperatureRise,
      bound: bounds.action,
      unit: "K",
    });
  if (minLife !== undefined) {
    const rise = brief.rate === undefined ? 0 : (heat?.unitRise ?? null);
    const life = reversal === null ? null : lifeOf(brief, unit, { voltage: finite(worst), reversal, rise }).ratio;
    const turned: Record<Bound, Bound> = {
      value: "value",
      "upper bound": "lower bound",
      "lower bound": "upper bound",
      "side unknown": "side unknown",
    };
    claim("minLife", { value: life, limit: minLife, bound: turned[bounds.reversal], unit: "1" });
  }
  return claims;
}

/** Whether a claim is broken, and why: over the limit, not proven because of what is unknown, or unknown altogether. */
function brokenBy({ key, value, limit, bound, stuck }: LimitClaim): Broken | null {
  const name = LIMIT_NAMES[key];
  if (value === null || limit === null) return { reason: `${name}-unknown`, value, limit, stuck: true };
  const least = key === "minLife";
  const fits = least ? value >= limit * (1 - FIT) : value <= limit * (1 + FIT);
  const provenFit = bound === "value" || bound === (least ? "lower bound" : "upper bound");
  if (fits && provenFit) return null;
  if (fits) return { reason: `${name}-unproven`, value, limit, stuck: true };
  const sure = bound === "value" || bound === (least ? "upper bound" : "lower bound");
  return { reason: sure ? `${name}-limit` : `${name}-unproven`, value, limit, stuck };
}

/** The first limit that is a part of a rating which the unit does not have: no shape of it can be proven to keep that. */
export function unratedFor(brief: Brief, unit: Capacitor): Omit<Broken, "stuck"> | null {
  const rated = [
    ["maxPeakCurrent", unit.peakCurrent],
    ["maxSlew", unit.slew],
    ["maxRms", unit.rippleCurrent],
  ] as const;
  const lacking = rated.find(([key, rating]) => brief[key] !== undefined && ratedLimit(brief[key], rating) === null);
  return lacking === undefined ? null : { reason: `${LIMIT_NAMES[lacking[0]]}-unknown`, value: null, limit: null };
}

/** True when the brief sets any of the limits. */
export const hasLimits = (brief: Brief): boolean => LIMIT_KEYS.some((key) => brief[key] !== undefined);

/** The judge of a brief, called for each shape; null when it sets no such limit. */
export function limitJudge(brief: Brief): ((given: LimitCase) => Broken | null) | null {
  if (!hasLimits(brief)) return null;
  return (given) => {
    const claims = limitClaims(brief, given);
    if (claims === null) return { reason: "no-shot", value: null, limit: null, stuck: false };
    for (const claim of claims) {
      const broken = brokenBy(claim);
      if (broken !== null) return broken;
    }
    return null;
  };
}

/** The same claims as findings, for one layout in full. */
export function limitFindings(brief: Brief, given: LimitCase): readonly Finding[] {
  return (limitClaims(brief, given) ?? []).map(({ key, value, limit, bound, unit }) => {
    const id = `limit-${LIMIT_NAMES[key]}`;
    const state = key === "maxFaultEnergy" ? ("faulted" as const) : ("pulse" as const);
    const note = `The brief's own limit, ${key}.`;
    const base = { id, state, value, limit, unit, source: "methods-derived", note };
    if (key !== "minLife") return atMost({ ...base, bound });
    const finding = atLeast(base);
    const proven = bound === "value" || bound === (finding.verdict === "pass" ? "lower bound" : "upper bound");
    return proven ? finding : { ...finding, verdict: "not assessed" as const };
  });
}
