// One value of a catalogue row as text with its state.

import {
  CAPACITOR_COLUMNS,
  type Capacitor,
  type Column,
  type PriceBreak,
  PURCHASE_COLUMNS,
  type PurchaseTerms,
  stateOf,
} from "../catalog/index.ts";
import { formatMoney, formatQuantity, minorDigits, type Tolerance, toMajor } from "../quantity/index.ts";

export interface ValueWords {
  readonly heading: string;
  readonly key: string;
  /** SI number, text, yes or no, or a structure; absent when unknown. */
  readonly value?: unknown;
  readonly text: string;
  readonly state: "datasheet" | "measured" | "assumed" | "unknown";
  readonly rule?: string;
}

/** Terms of purchase and words have no state: blank is simply blank. */
const STATELESS = new Set([
  "part",
  "maker",
  "technology",
  "note",
  "measured",
  "assumed",
  "currency",
  "price",
  "priceBreaks",
  "pack",
  "minimumOrder",
  "onHand",
  "available",
  "supplier",
  "orderCode",
  "plateArea",
  "gap",
  "permittivity",
  "plates",
  "breakdownField",
]);

/** "10: 3.90; 100: 3.10", as a catalogue has them. */
const breaksText = (breaks: readonly PriceBreak[], currency: string): string =>
  breaks.map(({ from, price }) => `${from}: ${toMajor(price, currency).toFixed(minorDigits(currency))}`).join("; ");

const percent = (x: number): string => String(Number((x * 100).toPrecision(6)));

export function valueText(value: unknown, { type }: Pick<Column, "type">, currency = "EUR"): string {
  if (value === undefined) return "unknown";
  switch (type.kind) {
    case "quantity":
      return formatQuantity(value as number, type.dimension, { digits: 6 });
    case "tolerance": {
      const { low, high } = value as Tolerance;
      return low === high ? `+-${percent(low)} %` : `-${percent(low)}/+${percent(high)} %`;
    }
    case "yes-no":
      return value === true ? "yes" : "no";
    case "price":
      return formatMoney(value as number, currency);
    case "price-breaks":
      return breaksText(value as readonly PriceBreak[], currency);
    default:
      return typeof value === "object" ? JSON.stringify(value) : String(value);
  }
}

/** Every engineering value of a capacitor with its state. */
export function capacitorValues(unit: Capacitor): readonly ValueWords[] {
  return CAPACITOR_COLUMNS.filter((column) => !STATELESS.has(column.key)).map((column) => {
    const key = column.key as keyof Capacitor;
    const state = stateOf(unit, key);
    return {
      heading: column.heading,
      key,
      ...(unit[key] === undefined ? {} : { value: unit[key] }),
      text: valueText(unit[key], column, unit.currency),
      state: state.state,
      ...(state.state === "assumed" ? { rule: state.rule } : {}),
    };
  });
}

/** Terms of purchase as the catalogue has them; what it leaves blank is unknown. Money in words alone, so that no minor unit is read for a major one. */
export const purchaseValues = (terms: PurchaseTerms): readonly ValueWords[] =>
  PURCHASE_COLUMNS.map((column): ValueWords => {
    const key = column.key as keyof PurchaseTerms;
    const value = terms[key];
    const text = valueText(value, column, terms.currency);
    const { heading } = column;
    if (value === undefined) return { heading, key, text, state: "unknown" };
    const money = key === "price" || key === "priceBreaks";
    return { heading, key, ...(money ? {} : { value }), text, state: "datasheet" };
  });
