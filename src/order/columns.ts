// The columns of a bill, in order: data that every format is written from.

import type { BillLine } from "./bill.ts";

export interface BillColumn {
  readonly heading: string;
  readonly key: keyof BillLine;
  readonly kind: "text" | "number" | "money";
}

export const BILL_COLUMNS: readonly BillColumn[] = [
  { heading: "item", key: "item", kind: "text" },
  { heading: "line", key: "line", kind: "text" },
  { heading: "value", key: "value", kind: "text" },
  { heading: "rating", key: "rating", kind: "text" },
  { heading: "quantity needed", key: "needed", kind: "number" },
  { heading: "on hand", key: "onHand", kind: "number" },
  { heading: "to buy", key: "toBuy", kind: "number" },
  { heading: "pack", key: "pack", kind: "number" },
  { heading: "packs", key: "packs", kind: "number" },
  { heading: "surplus", key: "surplus", kind: "number" },
  { heading: "unit price", key: "unitPrice", kind: "money" },
  { heading: "consumed cost", key: "consumed", kind: "money" },
  { heading: "purchase cost", key: "purchase", kind: "money" },
  { heading: "currency", key: "currency", kind: "text" },
  { heading: "supplier", key: "supplier", kind: "text" },
  { heading: "order code", key: "orderCode", kind: "text" },
  { heading: "note", key: "note", kind: "text" },
  { heading: "state", key: "state", kind: "text" },
];

/** A number as plain decimals, never an exponent, so that any spreadsheet reads it. */
export function plainNumber(value: number): string {
  const text = String(value);
  return text.includes("e") ? value.toFixed(20).replace(/\.?0+$/, "") : text;
}

/** What a cell says. A missing price is marked in its place, because a blank is read as nought; other unknowns stay blank. */
export function cellText(line: BillLine, column: BillColumn): string {
  const value = line[column.key];
  if (value === null) {
    if (column.key === "purchase") return line.state === "to be chosen" ? "to be chosen" : "no price";
    return column.key === "needed" ? "to be chosen" : "";
  }
  return typeof value === "number" ? plainNumber(value) : value;
}
