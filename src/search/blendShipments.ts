// Who must send something for so many strings, what that costs, and the families of resistors by who sends them.

import { type Capacitor, cheapest, isPriced, type PurchaseTerms, type ResistorFamily } from "../catalog/index.ts";
import { type BuyingTerms, resistorsOf, type StringType } from "./blendString.ts";
import { NO_SHIPMENTS } from "./shipmentTerms.ts";

/** Things without a supplier are taken to come from one who is not named. */
export const UNNAMED = "";

export const senderOf = ({ supplier }: PurchaseTerms): string => supplier ?? UNNAMED;

export const shipmentOf = ({ shipments = NO_SHIPMENTS }: BuyingTerms, sender: string): number =>
  shipments.named.get(sender) ?? shipments.each;

/** Suppliers whose shipments cost something, in the order in which they appear. */
export function paidSenders(parts: readonly Capacitor[], terms: BuyingTerms): readonly string[] {
  const { shipments } = terms;
  if (shipments === undefined || (shipments.each === 0 && shipments.named.size === 0)) return [];
  const all = new Set([...parts, ...terms.families].filter(isBuyable).map(senderOf));
  return [...all].filter((sender) => shipmentOf(terms, sender) > 0);
}

const isBuyable = (terms: PurchaseTerms): boolean => terms.available !== 0;

/**
 * The families in groups of one sender each, for a string that takes its resistors from one of them. Families without a price
 * are in every group: they count only where nothing priced serves.
 */
export function familyGroups(terms: BuyingTerms, paid: readonly string[]): readonly (readonly ResistorFamily[])[] {
  const { families } = terms;
  const key = (family: ResistorFamily): string | null => (paid.includes(senderOf(family)) ? senderOf(family) : null);
  const keys = new Set(families.filter(isPriced).map(key));
  if (keys.size < 2) return [families];
  return [...keys].map((one) => families.filter((family) => !isPriced(family) || key(family) === one));
}

const bill = { quantity: 0, cost: 0 };

/** Who of `paid` must send something for so many strings with their resistors. */
export function sendersOf(type: StringType, strings: number, paid: readonly string[]): readonly string[] {
  if (paid.length === 0 || strings === 0) return [];
  const { unit, series, terms } = type;
  const senders = new Set<string>();
  if (cheapest(unit, series * strings + terms.brief.spares, bill) && bill.quantity > 0) senders.add(senderOf(unit));
  const from = resistorsOf(type, strings).from;
  if (from !== null) senders.add(senderOf(from));
  return paid.filter((one) => senders.has(one));
}

/** True when something on hand may spare a shipment for some counts and not for others. */
export function handMatters({ unit, series, terms }: StringType, paid: readonly string[]): boolean {
  const held = (one: PurchaseTerms): boolean => (one.onHand ?? 0) > 0 && paid.includes(senderOf(one));
  return held(unit) || (series > 1 && terms.families.some(held));
}
