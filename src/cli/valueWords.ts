// One value of a catalogue row as text with its state.

import { CAPACITOR_COLUMNS, type Capacitor, type Column, stateOf } from "../catalog/index.ts";
import { formatMoney, formatQuantity, type Tolerance } from "../quantity/index.ts";

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
