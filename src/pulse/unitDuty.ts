/*
 * What one shot asks of the worst unit of a bank, against that unit's own ratings.
 *
 *   symbol  name        unit   meaning
 *   a, b    toleranceLow, toleranceHigh   fractions below and above the nominal capacitance
 *   m       parallel    1      units per stage (cross-tied) or strings
 *   share   share       1      (1 + b)/((1 + b) + (m - 1)(1 - a)): one high among lows takes current by capacitance
 *   dv/dt   slew        V/s    fastest unit: I/(m C_lo) cross-tied; strings: I/(C_lo + (m - 1) C_lo ((n - 1) C_lo/C_hi + 1)/n)
 *
 * Units of a cross-tied stage share by capacitance, strings by string capacitance (one string all high, the rest all low), so
 * one formula serves both. Holds while capacitance decides; where the place on the bus is told, the ladder's shares stand instead.
 * Source: [methods-derived], corners checked by brute force.
 */
import type { Ties } from "../bank/index.ts";
import type { Finding } from "../quantity/index.ts";
import type { PlaceShares } from "./busPath.ts";
import { atMost, type Bound } from "./verdict.ts";

/** What the maker allows one unit in one shot; null is not known. A, V/s, fraction of the charge voltage, A^2 s. */
export interface UnitRatings {
  readonly peakCurrent: number | null;
  readonly slew: number | null;
  readonly reversal: number | null;
  readonly action: number | null;
}

/** One unit as a shot sees it. ESR [ohm] and ESL [H] null when unknown. */
export interface PulseUnit {
  readonly capacitance: number;
  readonly toleranceLow: number;
  readonly toleranceHigh: number;
  readonly esr: number | null;
  readonly esl: number | null;
  readonly polarised: boolean;
  readonly ratings: UnitRatings;
}

/** How a bank is made up: series count n, parallel count m. */
export interface Arrangement {
  readonly unit: PulseUnit;
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
}

/** Current of the worst unit over the bank's current [1]. Source: [methods-derived] file head. */
export function worstShare({ unit, parallel }: Pick<Arrangement, "unit" | "parallel">): number {
  const high = 1 + unit.toleranceHigh;
  return high / (high + (parallel - 1) * (1 - unit.toleranceLow));
}

/** dv/dt [V/s] of the fastest unit at a bank current [A]. Source: [methods-derived] file head. */
export function worstSlew({ unit, series, parallel, ties }: Arrangement, current: number): number {
  const low = unit.capacitance * (1 - unit.toleranceLow);
  if (ties === "cross-tied") return current / (parallel * low);
  const high = unit.capacitance * (1 + unit.toleranceHigh);
  return current / (low + ((parallel - 1) * low * (((series - 1) * low) / high + 1)) / series);
}

/** One shot as the bank sees it: peak bank current [A], action [A^2 s] (null: no bound), reversal [1]. */
export interface BankDuty {
  readonly peakCurrent: number;
  readonly action: number | null;
  readonly reversal: number;
}

/**
 * What the worst unit carries. `evenCurrent` is what each would carry if all were alike; heat [J] null when ESR is unknown.
 * `share` is its part of the peak, `actionShare` squared that of the action; `place` null: its place on the bus is not counted. `reversal` is that
 * of the bank, or of the unit that its place reverses more.
 */
export interface UnitDuty {
  readonly share: number;
  readonly actionShare: number;
  readonly place: PlaceShares | null;
  readonly evenCurrent: number;
  readonly peakCurrent: number;
  readonly action: number | null;
  readonly slew: number;
  readonly reversal: number;
  readonly heat: number | null;
  readonly why: string;
}

/** Why this unit: its place on the bus and its capacitance, each with what it does to an even part. */
function whyOf({ parallel, ties }: Arrangement, place: PlaceShares | null): string {
  if (parallel === 1) return "It carries all the current.";
  const group = ties === "cross-tied" ? "unit of a stage" : "string";
  if (place === null) return `Its ${group} has the highest capacitance among low ones.`;
  const { position, feed, byPlace, byCapacitance, share, alike, otherFeed } = place;
  const times = (factor: number): string => `x ${factor.toFixed(3)}`;
  const other = feed === "end" ? "the centre" : "one end";
  const gain = otherFeed / Math.max(...alike);
  return [
    `Position ${position} of ${parallel} on a bus fed at ${feed === "end" ? "one end" : "the centre"}:`,
    `${times(byPlace)} by its place, ${times(byCapacitance)} by the highest capacitance among low ones,`,
    `${times(share * parallel)} by both. Fed at ${other} the place's part would be ${times(gain)} of this.`,
  ].join(" ");
}

/** Below this part of the charge voltage the ladder's own error stands, V/V. */
const NOTHING = 1e-5;

/** Reversal of the branch that its place reverses most; 0 where the place is not told. */
const ownReversal = (place: PlaceShares | null): number =>
  place === null || place.lowest > -NOTHING ? 0 : -place.lowest;

/** Why the reversal is that: the place on the bus, where it says more than the bank as one. */
function reversalWords({ place, reversal }: UnitDuty): string {
  if (place === null || ownReversal(place) < reversal) return "";
  return ` The unit at position ${place.lowestPosition} on the bus is reversed more than the bank as one.`;
}

/** `place`: how the branches share by where they hang on the bus; null: by capacitance alone. */
export function unitDutyOf(arrangement: Arrangement, duty: BankDuty, place: PlaceShares | null = null): UnitDuty {
  const { unit, parallel } = arrangement;
  const share = place?.share ?? worstShare(arrangement);
  const part = place?.action ?? share * share;
  const action = duty.action === null ? null : duty.action * part;
  // with all units low the place alone decides which one falls fastest
  const crowding = place === null ? 1 : Math.max(...place.alike) * parallel;
  return {
    share,
    actionShare: Math.sqrt(part),
    place,
    evenCurrent: duty.peakCurrent / parallel,
    peakCurrent: duty.peakCurrent * share,
    action,
    slew: worstSlew(arrangement, duty.peakCurrent) * crowding,
    reversal: Math.max(duty.reversal, ownReversal(place)),
    heat: unit.esr === null || action === null ? null : unit.esr * action,
    why: whyOf(arrangement, place),
  };
}

/** Bounds of the bank figures, from what was unknown. */
export interface DutyBounds {
  readonly peakCurrent: Bound;
  readonly action: Bound;
  readonly reversal: Bound;
}

/** The worst unit against its ratings; a missing rating is not assessed. */
export function unitFindings(duty: UnitDuty, ratings: UnitRatings, bounds: DutyBounds): readonly Finding[] {
  const source = "methods-derived";
  return [
    atMost({
      id: "pulse.unit.current",
      value: duty.peakCurrent,
      limit: ratings.peakCurrent,
      unit: "A",
      source,
      bound: bounds.peakCurrent,
      note: `Peak current of the worst unit against its rating. ${duty.why}`,
    }),
    atMost({
      id: "pulse.unit.slew",
      value: duty.slew,
      limit: ratings.slew,
      unit: "V/s",
      source,
      bound: bounds.peakCurrent,
      note: "Fastest fall of a unit's voltage against its rating.",
    }),
    atMost({
      id: "pulse.unit.action",
      value: duty.action,
      limit: ratings.action,
      unit: "A2s",
      source,
      bound: bounds.action,
      note: "Action of one shot through the worst unit against its rating.",
    }),
    atMost({
      id: "pulse.unit.reversal",
      value: duty.reversal,
      limit: ratings.reversal,
      unit: "1",
      source,
      bound: bounds.reversal,
      note: `First opposite voltage over the charge voltage, against the unit's rating.${reversalWords(duty)}`,
    }),
  ];
}
