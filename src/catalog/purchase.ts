// The cheapest purchase of q or more: on hand first at no cost, the rest in packs, at least the minimum order, at all-units price breaks.
//
// Buying more than is needed is chosen when a price break makes it cheaper. The quantity bought, packs and minimum order included,
// is at most what is available. Source: [joulewright-design] section 3 "Cost".

import { lineCost } from "../quantity/index.ts";
import type { PurchaseTerms } from "./capacitor.ts";

export interface Purchase {
  readonly needed: number;
  /** Taken from what is on hand, at no cost. */
  readonly fromHand: number;
  readonly bought: number;
  readonly packs: number;
  /** Bought and not needed. */
  readonly surplus: number;
  /** Unit price paid, minor units; null when nothing is bought or the price is unknown. */
  readonly unitPrice: number | null;
  /** Money spent, whole minor units; null when the price is unknown and something must be bought. */
  readonly cost: number | null;
  /** Cost of the units that go into the bank alone, at the price paid; null when unknown. */
  readonly consumed: number | null;
}

/** Unit price when `quantity` is bought, minor units; null when unknown or when none is sold in so small a quantity. */
export function unitPriceAt(terms: PurchaseTerms, quantity: number): number | null {
  let price = terms.price ?? null;
  for (const step of terms.priceBreaks ?? []) if (quantity >= step.from) price = step.price;
  return price;
}

const inPacks = (quantity: number, pack: number): number => Math.ceil(quantity / pack) * pack;

/** True when a price is known at some quantity. */
export const isPriced = (terms: PurchaseTerms): boolean =>
  terms.price !== undefined || (terms.priceBreaks?.length ?? 0) > 0;

/** True when some larger quantity has a higher unit price than a smaller one. */
export function breaksRise({ price, priceBreaks = [] }: PurchaseTerms): boolean {
  const prices = [...(price === undefined ? [] : [price]), ...priceBreaks.map((step) => step.price)];
  return prices.some((one, at) => at > 0 && one > prices[at - 1]!);
}

/** What must be bought to have `needed`, packs and minimum order included, whether or not it can be had; zero when the hand suffices. */
export function toBuy(terms: PurchaseTerms, needed: number): number {
  const short = needed - (terms.onHand ?? 0);
  return short <= 0 ? 0 : inPacks(Math.max(short, terms.minimumOrder ?? 1), terms.pack ?? 1);
}

/**
 * Least quantity that can be bought to have `needed`, zero when the hand suffices; null when not enough can be had.
 */
export function leastBuyable(terms: PurchaseTerms, needed: number): number | null {
  const least = toBuy(terms, needed);
  return least === 0 || terms.available === undefined || least <= terms.available ? least : null;
}

/**
 * Quantity and cost of the cheapest purchase (the least quantity among equals), or null when not enough can be had.
 * Written without objects because the search calls it for every layout; the result is read from `best`.
 */
export function cheapest(terms: PurchaseTerms, needed: number, best: { quantity: number; cost: number }): boolean {
  const least = leastBuyable(terms, needed);
  if (least === null) return false;
  best.quantity = least;
  best.cost = 0;
  if (least === 0) return true;
  const price = unitPriceAt(terms, least);
  best.cost = price === null ? Number.POSITIVE_INFINITY : lineCost(least, price);
  const breaks = terms.priceBreaks;
  if (breaks === undefined) return true;
  const pack = terms.pack ?? 1;
  for (const step of breaks) {
    if (step.from <= least) continue;
    const quantity = inPacks(step.from, pack);
    if (terms.available !== undefined && quantity > terms.available) break;
    const cost = lineCost(quantity, unitPriceAt(terms, quantity) ?? Number.POSITIVE_INFINITY);
    if (cost < best.cost) {
      best.cost = cost;
      best.quantity = quantity;
    }
  }
  return true;
}

/** The cheapest purchase with all its figures; null when not enough can be had. */
export function purchase(terms: PurchaseTerms, needed: number): Purchase | null {
  const best = { quantity: 0, cost: 0 };
  if (!cheapest(terms, needed, best)) return null;
  const bought = best.quantity;
  const fromHand = Math.min(terms.onHand ?? 0, needed);
  const unitPrice = bought === 0 ? null : unitPriceAt(terms, bought);
  const used = needed - fromHand;
  return {
    needed,
    fromHand,
    bought,
    packs: bought / (terms.pack ?? 1),
    surplus: bought - used,
    unitPrice,
    cost: Number.isFinite(best.cost) ? best.cost : null,
    consumed: bought === 0 ? 0 : unitPrice === null ? null : lineCost(used, unitPrice),
  };
}
