// What a blend costs: the groups' purchases, their lines, and one shipment a supplier.

import type { Layout } from "../bank/index.ts";
import { type Capacitor, isPriced, type ResistorFamily } from "../catalog/index.ts";
import { minorDigits, tenTo } from "../quantity/index.ts";
import type { BlendCost, BlendString } from "./blendResult.ts";
import { senderOf, shipmentOf, UNNAMED } from "./blendShipments.ts";
import type { BuyingTerms } from "./blendString.ts";
import type { LayoutResult } from "./result.ts";

/** A group as somebody built or means to build it, safe or not. */
export interface BuiltGroup {
  readonly unit: Capacitor;
  readonly layout: Layout;
  /** Families that its resistors are chosen from. */
  readonly families: readonly ResistorFamily[];
}

/** A shipment that must be paid for. */
export interface Sent {
  readonly supplier: string | null;
  /** Minor units. */
  readonly cost: number;
}

/** Suppliers of whom anything must be bought at a known price, each once, where a shipment costs something. */
export function shipmentsOf(
  groups: readonly BuiltGroup[],
  layouts: readonly LayoutResult[],
  terms: BuyingTerms,
): readonly Sent[] {
  const senders = new Set<string>();
  layouts.forEach(({ purchase, balance }, at) => {
    const { unit, families } = groups[at]!;
    if ((purchase.capacitors?.bought ?? 0) > 0) senders.add(senderOf(unit));
    const family = families.find((one) => one.family === balance?.family);
    if (family !== undefined && isPriced(family) && (purchase.resistors?.bought ?? 0) > 0)
      senders.add(senderOf(family));
  });
  return [...senders]
    .map((name): Sent => ({ supplier: name === UNNAMED ? null : name, cost: shipmentOf(terms, name) }))
    .filter(({ cost }) => cost > 0);
}

export function costOf(
  strings: readonly BlendString[],
  lineCost: number,
  shipments: readonly Sent[],
  currency: string | null,
): BlendCost | null {
  if (currency === null) return null;
  const scale = tenTo(minorDigits(currency));
  const minor = (amount: number | null | undefined): number => Math.round((amount ?? 0) * scale);
  const capacitors = strings.reduce((sum, { cost }) => sum + minor(cost?.capacitors), 0);
  const resistors = strings.reduce((sum, { cost }) => sum + minor(cost?.resistors), 0);
  const lines = lineCost * strings.filter((one) => one.bought > 0).length;
  const sent = shipments.reduce((sum, { cost }) => sum + cost, 0);
  const unpriced = new Set(strings.flatMap(({ cost }) => cost?.unpriced ?? []));
  const known = !unpriced.has("balancing resistors");
  return {
    capacitors: capacitors / scale,
    resistors: known || resistors > 0 ? resistors / scale : null,
    lines: lines / scale,
    shipments: sent / scale,
    total: (capacitors + resistors + lines + sent) / scale,
    currency,
    unpriced: [...unpriced],
  };
}
