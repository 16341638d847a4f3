// The columns of a bill, in order: data that every format is written from, and an edited bill is read by.

import type { Bill, BillLine } from "./bill.ts";

export interface BillColumn {
  readonly heading: string;
  readonly key: keyof BillLine;
  readonly kind: "text" | "number" | "money";
  /** The builder may write in it, and what is written there is kept. All else is reckoned anew. */
  readonly builders?: true;
}

export const BILL_COLUMNS: readonly BillColumn[] = [
  { heading: "item", key: "item", kind: "text", builders: true },
  { heading: "line", key: "line", kind: "text" },
  { heading: "value", key: "value", kind: "text", builders: true },
  { heading: "rating", key: "rating", kind: "text", builders: true },
  { heading: "quantity needed", key: "needed", kind: "number", builders: true },
  { heading: "on hand", key: "onHand", kind: "number", builders: true },
  { heading: "to buy", key: "toBuy", kind: "number" },
  { heading: "pack", key: "pack", kind: "number", builders: true },
  { heading: "packs", key: "packs", kind: "number" },
  { heading: "surplus", key: "surplus", kind: "number" },
  { heading: "unit price", key: "unitPrice", kind: "money", builders: true },
  { heading: "consumed cost", key: "consumed", kind: "money" },
  { heading: "purchase cost", key: "purchase", kind: "money" },
  { heading: "currency", key: "currency", kind: "text", builders: true },
  { heading: "supplier", key: "supplier", kind: "text", builders: true },
  { heading: "order code", key: "orderCode", kind: "text", builders: true },
  { heading: "alternates", key: "alternates", kind: "text", builders: true },
  { heading: "status", key: "status", kind: "text", builders: true },
  { heading: "note", key: "note", kind: "text", builders: true },
  { heading: "state", key: "state", kind: "text" },
];

/** What stands in a cell whose content is still open. */
export const OPEN = "to be chosen";
const NO_PRICE = "no price";

/** True for a cell that holds nothing, or the words that mark an open one. */
export const isOpen = (text: string): boolean => text === "" || text === OPEN || text === NO_PRICE;

/** A number as plain decimals, never an exponent, so that any spreadsheet reads it. */
export function plainNumber(value: number): string {
  const text = String(value);
  return text.includes("e") ? value.toFixed(20).replace(/\.?0+$/, "") : text;
}

/** What a cell says. A missing price is marked in its place, because a blank is read as nought; other unknowns stay blank. */
export function cellText(line: BillLine, column: BillColumn): string {
  const value = line[column.key];
  if (value === null) {
    if (column.key === "purchase") return line.state === OPEN ? OPEN : NO_PRICE;
    return column.key === "needed" ? OPEN : "";
  }
  return typeof value === "number" ? plainNumber(value) : String(value ?? "");
}

export interface ShownColumn {
  readonly heading: string;
  readonly kind: BillColumn["kind"];
  readonly cell: (line: BillLine) => string;
}

/** The columns of one bill: its own, then those that the builder added. */
export const columnsOf = (bill: Pick<Bill, "extraHeadings">): readonly ShownColumn[] => [
  ...BILL_COLUMNS.map((column) => ({ ...column, cell: (line: BillLine) => cellText(line, column) })),
  ...(bill.extraHeadings ?? []).map(
    (heading, i): ShownColumn => ({ heading, kind: "text", cell: (line) => line.extra?.[i] ?? "" }),
  ),
];
