// Parts and brief to the model that the blend search works on; every part that stays out is named with its reason.

import { FIT } from "../bank/index.ts";
import { type Capacitor, cheapest, isPriced, toBuy } from "../catalog/index.ts";
import { capacityNeeded } from "./blend/evaluate.ts";
import { type BlendModel, type BlendOption, type CostFloor, LARGEST_COST } from "./blend/model.ts";
import { stringsToReach } from "./blend/pool.ts";
import { lazyOption } from "./blend/tabulate.ts";
import { type BuyingTerms, type StringType, stringsCost, stringType } from "./blendString.ts";
import type { Brief } from "./brief.ts";
import type { RefusedPart } from "./result.ts";

export interface BlendWork {
  /** What each option of the model is made of. */
  readonly types: readonly StringType[];
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
  const most = Math.min(capped, stringsToReach(capacityNeeded(demand.required), each));
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

/** A bound on the table that needs no table: the least unit price for what is not on hand; resistors count nothing. */
function floorOf({ unit, series, terms }: StringType): CostFloor {
  const hand = unit.onHand ?? 0;
  const prices = [unit.price ?? Number.POSITIVE_INFINITY, ...(unit.priceBreaks ?? []).map((step) => step.price)];
  const least = Math.min(...prices);
  const bill = { quantity: 0, cost: 0 };
  const first = cheapest(unit, series + terms.brief.spares, bill) && Number.isFinite(bill.cost) ? bill.cost : 0;
  if (!Number.isFinite(least)) return { fixed: 0, perString: 0 };
  // A line is rounded to whole minor units, at most half of one down.
  return { fixed: least * (terms.brief.spares - hand) - 1, perString: series * least, least: first };
}

/** Costs of 0 to `most` strings, levelled from above: whoever wants few may build more. */
export function costTable(type: StringType, most: number): Float64Array {
  const costs = Float64Array.from({ length: most + 1 }, (_, x) => stringsCost(type, x) ?? LARGEST_COST);
  for (let x = most - 1; x >= 1; x -= 1) costs[x] = Math.min(costs[x]!, costs[x + 1]!);
  return costs;
}

function optionOf(type: StringType, partIndex: number, maxStrings: number, brief: Brief): BlendOption {
  const { series, candidate } = type;
  const facts = {
    capacity: candidate.basis / series,
    volume: brief.maxVolume === undefined ? 0 : series * (candidate.volume as number),
    mass: brief.maxMass === undefined ? 0 : series * (candidate.mass as number),
    units: series,
    maxStrings,
    partIndex,
  };
  return lazyOption(facts, floorOf(type), () => costTable(type, maxStrings));
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

/** The whole model. Its cost tables are made when first read. */
export function blendWork(demand: BlendDemand): BlendWork {
  const { brief } = demand.terms;
  const types: StringType[] = [];
  const options: BlendOption[] = [];
  const leftOut: RefusedPart[] = [];
  const unpriced: StringType[] = [];
  for (const unit of demand.parts) {
    const type = stringType(unit, demand.terms);
    if ("reason" in type) {
      leftOut.push({ part: unit.part, ...type });
      continue;
    }
    const had = mostUnits(unit);
    const why = shut(type, had, demand);
    // More of it could be had without a price, so a price could let it win.
    if (!isPriced(unit) && (why === null || why.reason === "price-missing") && unit.available !== 0)
      unpriced.push(type);
    const most = why === null ? mostStrings(type, had, demand) : 0;
    if (why !== null || most === 0) {
      leftOut.push({ part: unit.part, ...(why ?? { reason: "stock", value: type.series, limit: had }) });
      continue;
    }
    options.push(optionOf(type, options.length, most, brief));
    types.push(type);
  }
  const open = Number.POSITIVE_INFINITY;
  const ceilings = { volume: brief.maxVolume ?? open, mass: brief.maxMass ?? open, units: brief.maxUnits };
  const model = { options, requirement: demand.required, ceilings, maxTypes: demand.maxTypes };
  return { types, model, leftOut, unpriced };
}
