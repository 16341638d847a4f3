// What a table column may be: its heading, its key, its kind and range. Tables are read from these rows alone.

import type { Dimension } from "../quantity/index.ts";

export type ColumnKind =
  /** A number in SI, in the heading's unit or the cell's own. */
  | {
      readonly kind: "quantity";
      readonly dimension: Dimension;
      readonly least: number;
      readonly most: number;
      readonly open?: boolean;
    }
  | { readonly kind: "whole"; readonly least: number; readonly most: number }
  | { readonly kind: "tolerance" }
  | { readonly kind: "text"; readonly longest: number }
  | { readonly kind: "yes-no" }
  | { readonly kind: "price" }
  | { readonly kind: "price-breaks" }
  | { readonly kind: "currency" }
  | { readonly kind: "choice"; readonly among: readonly string[] };

export interface Column {
  readonly heading: string;
  /** Other spellings of the heading, lower case. */
  readonly also?: readonly string[];
  readonly key: string;
  readonly type: ColumnKind;
  readonly required?: boolean;
}

/** A quantity above zero, up to `most`. */
export const above = (dimension: Dimension, least: number, most: number): ColumnKind => ({
  kind: "quantity",
  dimension,
  least,
  most,
});

/** A quantity that may be zero. */
export const fromZero = (dimension: Dimension, most: number): ColumnKind => ({
  kind: "quantity",
  dimension,
  least: 0,
  most,
});

export const text = (longest = 200): ColumnKind => ({ kind: "text", longest });

/** Buying terms, common to every table of things one buys. */
export const PURCHASE_COLUMNS: readonly Column[] = [
  { heading: "currency", key: "currency", type: { kind: "currency" } },
  { heading: "price", also: ["unit price"], key: "price", type: { kind: "price" } },
  { heading: "price breaks", also: ["breaks"], key: "priceBreaks", type: { kind: "price-breaks" } },
  { heading: "pack", also: ["pack size"], key: "pack", type: { kind: "whole", least: 1, most: 1e6 } },
  { heading: "minimum order", also: ["moq"], key: "minimumOrder", type: { kind: "whole", least: 1, most: 1e7 } },
  { heading: "on hand", key: "onHand", type: { kind: "whole", least: 0, most: 1e7 } },
  { heading: "available", also: ["stock"], key: "available", type: { kind: "whole", least: 0, most: 1e9 } },
  { heading: "supplier", key: "supplier", type: text() },
  { heading: "order code", key: "orderCode", type: text() },
];
