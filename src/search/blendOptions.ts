// Parts and brief to the model that the blend search works on; every part that stays out is named with its reason.

import { FIT } from "../bank/index.ts";
import { type Capacitor, cheapest, isPriced, toBuy } from "../catalog/index.ts";
import { capacityNeeded } from "./blend/evaluate.ts";
import { type BlendModel, type BlendOption, LARGEST_COST } from "./blend/model.ts";
import { stringsToReach } from "./blend/pool.ts";
import { paidSenders, shipmentOf } from "./blendShipments.ts";
import { type BuyingTerms, type StringType, stringsCost } from "./blendString.ts";
import { typesOf, waysOf } from "./blendWays.ts";
import { hasLimits, unratedFor } from "./limits.ts";
import type { RefusedPart } from "./result.ts";

export interface BlendWork {
  /** What each option of the model is made of. */
  readonly types: readonly StringType[];
  /** Suppliers of the model's shipments, by name; "" for those who are not named. */
  readonly senders: readonly string[];
  readonly model: BlendModel;
  readonly leftOut: readonly RefusedPart[];
  /** Strings that are sound but have no price; they are named in `leftOut` too. */
  readonly unpriced: readonly StringType[];
}

export interface BlendDemand {
  readonly parts: readonly Capacitor[];
  readonly terms: BuyingTerms;
  readonly required: number;
  readonly maxTypes: number;
}

/** With limits on the shot, so many times the strings that would meet the need alone are looked at. */
const SURPLUS = 2;

/** Units that can be had, on hand or bought at a known price. */
function mostUnits(unit: Capacitor): number {
  const hand = unit.onHand ?? 0;
  const bill = { quantity: 0, cost: 0 };
  if (!cheapest(unit, hand + 1, bill) || !Number.isFinite(bill.cost)) return hand;
  if (unit.available === undefined) return Number.POSITIVE_INFINITY;
  const pack = unit.pack ?? 1;
  return hand + Math.floor(unit.available / pack) * pack;
}

/** Most strings of use: what can be had, what the unit ceiling lets in, what meets the need alone. */
function mostStrings(type: StringType, had: number, demand: BlendDemand): number {
  const { brief } = demand.terms;
  const byStock = Math.floor((had - brief.spares) / type.series);
  const byUnits = Math.floor(brief.maxUnits / type.series);
  const capped = Math.max(0, Math.min(byStock, byUnits));
  const each = type.candidate.basis / type.series;
  // More strings than the need asks for lower what each unit bears: where the brief limits that, they are of use.
  const enough = (hasLimits(brief) ? SURPLUS : 1) * stringsToReach(capacityNeeded(demand.required), each);
  const most = Math.min(capped, enough);
  // Sums of costs stay exact whole numbers only below the largest cost of the model.
  let [good, bad] = [0, most + 1];
  while (bad - good > 1) {
    const middle = bad > most ? most : Math.floor((good + bad) / 2);
    const cost = stringsCost(type, middle);
    if (cost !== null && cost <= LARGEST_COST) good = middle;
    else bad = middle;
  }
  return good;
}

/** Why a sound string cannot be used even once; null when it can. */
function shut(type: StringType, had: number, demand: BlendDemand): Omit<RefusedPart, "part"> | null {
  const { brief } = demand.terms;
  const { unit, series, candidate } = type;
  const over = (value: number, limit: number): boolean => value > limit * (1 + FIT);
  if (series > brief.maxUnits) return { reason: "unit-limit", value: series, limit: brief.maxUnits };
  for (const [name, each, limit] of [
    ["volume", candidate.volume, brief.maxVolume],
    ["mass", candidate.mass, brief.maxMass],
  ] as const) {
    if (limit === undefined) continue;
    if (each === null) return { reason: `${name}-unknown`, value: null, limit };
    if (over(series * each, limit)) return { reason: `${name}-limit`, value: series * each, limit };
  }
  if (had >= series + brief.spares) return null;
  const priced = isPriced(unit);
  const value = toBuy(unit, series + brief.spares);
  return priced || (unit.available !== undefined && value > unit.available)
    ? { reason: "stock", value, limit: unit.available ?? null }
    : { reason: "price-missing", value, limit: unit.onHand ?? 0 };
}

/** The whole model. Its cost tables are made when first read, but for parts whose hand may spare a shipment. */
export function blendWork(demand: BlendDemand): BlendWork {
  const { brief } = demand.terms;
  const senders = paidSenders(demand.parts, demand.terms);
  const types: StringType[] = [];
  const options: BlendOption[] = [];
  const leftOut: RefusedPart[] = [];
  const unpriced: StringType[] = [];
  for (const [partIndex, unit] of demand.parts.entries()) {
    const made = typesOf(unit, demand.terms, senders);
    if ("reason" in made) {
      leftOut.push({ part: unit.part, ...made });
      continue;
    }
    const had = mostUnits(unit);
    const unrated = unratedFor(brief, unit);
    if (unrated !== null) {
      leftOut.push({ part: unit.part, ...unrated });
      continue;
    }
    const why = shut(made[0]!, had, demand);
    // More of it could be had without a price, so a price could let it win.
    if (!isPriced(unit) && (why === null || why.reason === "price-missing") && unit.available !== 0)
      unpriced.push(made[0]!);
    const before = options.length;
    for (const type of made) {
      const most = why === null ? mostStrings(type, had, demand) : 0;
      if (most === 0) continue;
      for (const way of waysOf(type, most, { partIndex, senders }, brief)) {
        options.push(way);
        types.push(type);
      }
    }
    if (options.length === before)
      leftOut.push({ part: unit.part, ...(why ?? { reason: "stock", value: made[0]!.series, limit: had }) });
  }
  const open = Number.POSITIVE_INFINITY;
  const ceilings = { volume: brief.maxVolume ?? open, mass: brief.maxMass ?? open, units: brief.maxUnits };
  const plain = { options, requirement: demand.required, ceilings, maxTypes: demand.maxTypes };
  const shipments = senders.map((name) => shipmentOf(demand.terms, name));
  const model = senders.length === 0 ? plain : { ...plain, shipments };
  return { types, senders, model, leftOut, unpriced };
}
