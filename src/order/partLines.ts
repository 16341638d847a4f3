// The lines that are bought from the catalogues: units, spares and balancing resistors, with packs and prices.

import type { Capacitor, Purchase, PurchaseTerms, ResistorFamily } from "../catalog/index.ts";
import { formatQuantity, lineCost, toMajor } from "../quantity/index.ts";
import type { LayoutResult } from "../search/index.ts";
import type { BillLine, LineKind } from "./bill.ts";

const NOT_TO_BE_HAD = "Not enough can be had: ask the supplier, or choose another layout.";

export const WITH_SPARES = "Packs and surplus are those of units and spares together.";

export const WITH_UNITS = "Bought with the units: packs and surplus stand there.";

/** Pieces of text one after the other, each ended before the next begins. */
const sentences = (...parts: readonly string[]): string =>
  parts
    .filter((part) => part !== "")
    .reduce((text, part) => (text === "" ? part : `${text}${/[.!?]$/.test(text) ? "" : "."} ${part}`), "");

/** How much of one purchase a line takes: the rest of it belongs to another line. */
interface Take {
  readonly needed: number;
  readonly fromHand: number;
  /** Pieces bought beyond what this line needs. */
  readonly surplus: number;
  readonly packs: number | null;
  /** Minor units; null when the price is unknown. */
  readonly cost: number | null;
}

interface Wording {
  readonly item: string;
  readonly line: LineKind;
  readonly value: string;
  readonly rating: string;
  readonly note: string;
}

/** A line bought on the terms of a catalogue row. */
export function pricedLine(wording: Wording, terms: PurchaseTerms, take: Take, unitPrice: number | null): BillLine {
  const { needed, fromHand, surplus, packs, cost } = take;
  const currency = terms.currency ?? "EUR";
  const bought = needed - fromHand + surplus;
  const spent = bought === 0 ? 0 : cost;
  const used = needed - fromHand;
  return {
    ...wording,
    needed,
    onHand: fromHand,
    toBuy: bought,
    pack: terms.pack ?? null,
    packs,
    surplus,
    unitPrice: unitPrice === null ? null : toMajor(unitPrice, currency),
    consumed: used === 0 ? 0 : unitPrice === null ? null : toMajor(lineCost(used, unitPrice), currency),
    purchase: spent === null ? null : toMajor(spent, currency),
    currency: spent === null ? null : currency,
    supplier: terms.supplier ?? "",
    orderCode: terms.orderCode ?? "",
    alternates: "",
    status: "",
    state: spent === null ? "no price" : "priced",
    mark: "",
  };
}

/** A line whose quantity cannot be bought as the catalogue stands. */
const shortLine = (wording: Wording, terms: PurchaseTerms, needed: number): BillLine => ({
  ...wording,
  needed,
  onHand: Math.min(terms.onHand ?? 0, needed),
  toBuy: null,
  pack: terms.pack ?? null,
  packs: null,
  surplus: null,
  unitPrice: null,
  consumed: null,
  purchase: null,
  currency: null,
  supplier: terms.supplier ?? "",
  orderCode: terms.orderCode ?? "",
  alternates: "",
  status: "",
  mark: "",
  note: sentences(NOT_TO_BE_HAD, wording.note),
  state: "no price",
});

const percent = (fraction: number): string => `${Number((fraction * 100).toPrecision(6))}`;

function unitRating(unit: Capacitor): string {
  const { tolerance } = unit;
  if (tolerance === undefined) return `${formatQuantity(unit.voltage, "voltage")}, tolerance unknown`;
  const spread =
    tolerance.low === tolerance.high
      ? `+-${percent(tolerance.low)} %`
      : `-${percent(tolerance.low)}/+${percent(tolerance.high)} %`;
  return `${formatQuantity(unit.voltage, "voltage")}, ${spread}`;
}

/**
 * Units and spares as two lines of one purchase. What is on hand goes into the bank first; packs and surplus stand with the units,
 * and the two purchase costs add up to the money spent.
 */
export function unitLines(layout: LayoutResult, unit: Capacitor, spares: number): readonly BillLine[] {
  const bought: Purchase | null = layout.purchase.capacitors;
  const wording: Wording = {
    item: unit.part,
    line: "units",
    value: formatQuantity(unit.capacitance, "capacitance"),
    rating: unitRating(unit),
    note: sentences(unit.note ?? "", spares > 0 ? WITH_SPARES : ""),
  };
  const spareWording: Wording = {
    ...wording,
    line: "spares",
    note: spares > 0 ? WITH_UNITS : "",
  };
  if (bought === null) {
    const lines = [shortLine(wording, unit, layout.units)];
    return spares > 0 ? [...lines, shortLine(spareWording, unit, spares)] : lines;
  }
  const handForUnits = Math.min(bought.fromHand, layout.units);
  const handForSpares = bought.fromHand - handForUnits;
  const { unitPrice, cost, packs, surplus } = bought;
  const spareCost =
    spares === handForSpares ? 0 : unitPrice === null ? null : lineCost(spares - handForSpares, unitPrice);
  const main = pricedLine(
    wording,
    unit,
    {
      needed: layout.units,
      fromHand: handForUnits,
      surplus,
      packs,
      cost: cost === null || spareCost === null ? null : cost - spareCost,
    },
    unitPrice,
  );
  if (spares === 0) return [main];
  const beside = { needed: spares, fromHand: handForSpares, surplus: 0, packs: null, cost: spareCost };
  return [main, pricedLine(spareWording, unit, beside, unitPrice)];
}

/** The balancing resistors, by value; none when the layout has none. */
export function resistorLines(layout: LayoutResult, family: ResistorFamily | null): readonly BillLine[] {
  const { balance } = layout;
  if (balance === null) return [];
  const needed = balance.positions * balance.elements;
  const value = formatQuantity(balance.elementResistance, "resistance");
  const tolerance = `+-${percent(balance.tolerance)} %`;
  const rating =
    family === null
      ? tolerance
      : `${formatQuantity(family.power, "power")}, ${formatQuantity(family.voltage, "voltage")}, ${tolerance}`;
  const each = balance.elements === 1 ? "one" : `${balance.elements} in series`;
  const where = layout.ties === "cross-tied" ? "stage" : "unit";
  const assumed = balance.assumed ? " The family is assumed: choose a real one and check again." : "";
  const made = family?.values.some((ohms) => Math.abs(ohms - balance.elementResistance) <= 1e-9 * ohms) ?? true;
  const odd = made ? "" : " No preferred value of this family: choose the nearest that is made and check again.";
  const wording: Wording = {
    item: `balancing resistor, ${balance.family}`,
    line: "balancing resistors",
    value,
    rating,
    note: `${each} across each ${where}, ${balance.positions} positions.${assumed}${odd}`,
  };
  const bought = layout.purchase.resistors;
  const terms: PurchaseTerms = family ?? {};
  if (bought === null) return [shortLine(wording, terms, needed)];
  const { fromHand, surplus, packs, cost, unitPrice } = bought;
  const line = pricedLine(wording, terms, { needed, fromHand, surplus, packs, cost }, unitPrice);
  return [balance.assumed ? { ...line, state: "to be chosen" } : line];
}
