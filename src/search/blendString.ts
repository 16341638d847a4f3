// One kind of string for a blend: a part in its least safe series count, and what so many of them cost with their resistors.

import { chooseBalance, type Ties } from "../bank/index.ts";
import { type Capacitor, cheapest, isPriced, type ResistorFamily } from "../catalog/index.ts";
import { bestBalance, chainOf, newBalancing, type SearchChain } from "./balancing.ts";
import type { Brief } from "./brief.ts";
import { type Candidate, prepare } from "./candidate.ts";
import type { RefusedPart } from "./result.ts";
import type { ShipmentTerms } from "./shipmentTerms.ts";
import { leastSeries } from "./sweep.ts";

/** How strings are bought: the brief's spares are had for every part used, and a line may cost something of its own. */
export interface BuyingTerms {
  readonly brief: Brief;
  readonly families: readonly ResistorFamily[];
  /** Charged once for every part that must be bought, whole minor units. */
  readonly lineCost: number;
  /** Charged once for every supplier who sends anything; absent: nothing. */
  readonly shipments?: ShipmentTerms;
}

export interface StringType {
  readonly unit: Capacitor;
  readonly candidate: Candidate;
  /** Least that is safe in charging and holding. */
  readonly series: number;
  /** Elements that each family needs across a unit in strings; 0 where it cannot serve. */
  readonly elements: readonly number[];
  readonly terms: BuyingTerms;
}

/** What goes across the units of so many strings. */
export interface Resistors {
  readonly ties: Ties;
  /** Minor units; families without a price count nothing, and the result says so. */
  readonly cost: number;
  /** The priced family of which some must be bought; null when none must. */
  readonly from: ResistorFamily | null;
}

export type NoString = Omit<RefusedPart, "part">;

/** The part's string, or why it has none that can be vouched for. The worst case decides, also under the statistical basis. */
export function stringType(unit: Capacitor, terms: BuyingTerms): StringType | NoString {
  const { brief, families } = terms;
  const candidate = prepare(unit, brief);
  const { tolerance, limit } = candidate;
  const least = leastSeries(brief.voltage * (1 + brief.overshoot), limit, tolerance);
  if (least > brief.maxSeries) return { reason: "series-limit", value: least, limit: brief.maxSeries };
  // Without its spread neither the least energy nor the sharing of a part is known: no proof can rest on it.
  if (tolerance === null && (least > 1 || brief.basis !== "nominal"))
    return { reason: "tolerance-unknown", value: null, limit: null };
  if (least === 1) return { unit, candidate, series: 1, elements: [], terms };
  const chain = chainOf(candidate, brief);
  if (chain === null) return { reason: "leakage-unknown", value: null, limit: null };
  for (let series = least; series <= brief.maxSeries; series += 1) {
    chain.series = series;
    chain.sharing = 1;
    const elements = families.map((family) => elementsOf(chain, limit, family));
    if (elements.some((count) => count > 0)) return { unit, candidate, series, elements, terms };
  }
  return { reason: "balance", value: null, limit };
}

const trial = { resistance: 0, element: 0, elements: 0, worst: 0 };
const bill = { quantity: 0, cost: 0 };
const balancing = newBalancing();

function elementsOf(chain: SearchChain, limit: number, family: ResistorFamily): number {
  chain.spread = family.tolerance;
  return chooseBalance(chain, limit, family, trial) ? trial.elements : 0;
}

/** Resistors of so many independent strings: the cheapest family that serves. */
function inStrings({ series, elements, terms }: StringType, strings: number): Omit<Resistors, "ties"> {
  let cost = Number.POSITIVE_INFINITY;
  let from: ResistorFamily | null = null;
  terms.families.forEach((family, at) => {
    const each = elements[at]!;
    if (each === 0 || !isPriced(family) || !cheapest(family, series * strings * each, bill) || bill.cost >= cost)
      return;
    cost = bill.cost;
    from = bill.quantity > 0 ? family : null;
  });
  return { cost: Number.isFinite(cost) ? cost : 0, from };
}

/** The cheaper ties of so many strings; cross-tied when equal, as the ranking of layouts has it. */
export function resistorsOf(type: StringType, strings: number): Resistors {
  const { series, candidate, terms } = type;
  if (series === 1 || strings === 0) return { ties: "strings", cost: 0, from: null };
  const apart = inStrings(type, strings);
  if (strings === 1) return { ties: "strings", ...apart };
  const chain = chainOf(candidate, terms.brief) as SearchChain;
  chain.series = series;
  chain.sharing = strings;
  if (!bestBalance(chain, candidate.limit, series, terms.families, balancing)) return { ties: "strings", ...apart };
  const priced = Number.isFinite(balancing.cost);
  const tied = priced ? balancing.cost : 0;
  if (tied > apart.cost) return { ties: "strings", ...apart };
  const family = terms.families[balancing.family]!;
  const bought = priced && cheapest(family, series * balancing.elements, bill) && bill.quantity > 0;
  return { ties: "cross-tied", cost: tied, from: bought ? family : null };
}

/** Cheapest purchase for so many strings, minor units, or null when it cannot be had or has no price. */
export function stringsCost(type: StringType, strings: number): number | null {
  const { unit, series, terms } = type;
  if (strings === 0) return 0;
  if (!cheapest(unit, series * strings + terms.brief.spares, bill) || !Number.isFinite(bill.cost)) return null;
  const units = bill.cost + (bill.quantity > 0 ? terms.lineCost : 0);
  return units + resistorsOf(type, strings).cost;
}
