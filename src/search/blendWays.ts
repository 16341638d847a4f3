// The ways to have strings of one part: by whose resistors they take, and by who must send something for so many.

import { type Capacitor, cheapest } from "../catalog/index.ts";
import { type BlendOption, type CostFloor, LARGEST_COST } from "./blend/model.ts";
import { lazyOption } from "./blend/tabulate.ts";
import { familyGroups, handMatters, sendersOf } from "./blendShipments.ts";
import { type BuyingTerms, type NoString, type StringType, stringsCost, stringType } from "./blendString.ts";
import type { Brief } from "./brief.ts";

/** The string types of one part: one for each group of families that one supplier sends; or why there is none. */
export function typesOf(
  unit: Capacitor,
  terms: BuyingTerms,
  senders: readonly string[],
): readonly StringType[] | NoString {
  const made = familyGroups(terms, senders).map((families) => stringType(unit, { ...terms, families }));
  const sound = made.filter((type): type is StringType => !("reason" in type));
  const [first] = sound;
  // Single units take no resistors: one way is all.
  if (first !== undefined) return first.series === 1 ? [first] : sound;
  return made[0] as NoString;
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

/** Costs of 0 to `most` strings, levelled from above: whoever wants few may build more. Counts that `may` shuts out are passed over. */
export function costTable(
  type: StringType,
  most: number,
  may: (strings: number) => boolean = () => true,
): Float64Array {
  const costs = Float64Array.from({ length: most + 1 }, (_, x) =>
    x === 0 ? 0 : may(x) ? (stringsCost(type, x) ?? LARGEST_COST) : LARGEST_COST,
  );
  for (let x = most - 1; x >= 1; x -= 1) costs[x] = Math.min(costs[x]!, costs[x + 1]!);
  return costs;
}

export interface Place {
  readonly partIndex: number;
  readonly senders: readonly string[];
}

/** The ways to buy so many strings of a type: one for each set of suppliers that must send something for some count. */
export function waysOf(type: StringType, most: number, place: Place, brief: Brief): readonly BlendOption[] {
  const { series, candidate } = type;
  const { senders, partIndex } = place;
  const facts = {
    capacity: candidate.basis / series,
    volume: brief.maxVolume === undefined ? 0 : series * (candidate.volume as number),
    mass: brief.maxMass === undefined ? 0 : series * (candidate.mass as number),
    units: series,
    partIndex,
  };
  const suppliersOf = (names: readonly string[]) =>
    names.length === 0 ? {} : { suppliers: names.map((name) => senders.indexOf(name)) };
  const floor = floorOf(type);
  if (!handMatters(type, senders)) {
    const own = { ...facts, maxStrings: most, ...suppliersOf(sendersOf(type, 1, senders)) };
    return [lazyOption(own, floor, () => costTable(type, most))];
  }
  const needed = Array.from({ length: most + 1 }, (_, x) => sendersOf(type, x, senders));
  const sets = new Map(needed.slice(1).map((names) => [JSON.stringify(names), names]));
  return [...sets.values()].map((names) => {
    const may = (x: number): boolean => needed[x]!.every((name) => names.includes(name));
    const last = needed.findLastIndex((_, x) => x > 0 && may(x));
    return lazyOption({ ...facts, maxStrings: last, ...suppliersOf(names) }, floor, () => costTable(type, last, may));
  });
}
