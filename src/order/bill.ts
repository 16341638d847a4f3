// The shape of a bill of materials: counted lines and their totals, plain data, money in the major unit of its currency.

/** What a line is; one name for each kind of thing a bank needs. */
export const LINE_KINDS = [
  "units",
  "spares",
  "balancing resistors",
  "clamp diodes",
  "bleed resistor",
  "fuses",
  "fuse holders",
  "isolating resistors",
  "section inductances",
  "dump resistor",
  "dump relay",
  "earthing stick",
  "shorting links",
  "bus bars",
  "unit links",
  "insulator",
  "resistor mounts",
  "lugs",
  "screws and washers",
  "labels",
  "meter with divider",
  "screen",
  "test resistor",
] as const;
export type LineKind = (typeof LINE_KINDS)[number];

/** `priced`; `no price` when the part is known and its price is not; `to be chosen` when the part itself is open. */
export type LineState = "priced" | "no price" | "to be chosen";

/** One line. null is unknown or to be chosen, never zero. */
export interface BillLine {
  readonly item: string;
  readonly line: LineKind;
  readonly value: string;
  readonly rating: string;
  /** Pieces that the bank takes (or, for spares, that lie beside it). */
  readonly needed: number | null;
  readonly onHand: number | null;
  readonly toBuy: number | null;
  /** Pieces in a pack. */
  readonly pack: number | null;
  readonly packs: number | null;
  /** Bought and not needed: toBuy = needed - onHand + surplus. */
  readonly surplus: number | null;
  readonly unitPrice: number | null;
  /** Cost of the pieces that are needed, at the price paid. */
  readonly consumed: number | null;
  /** Money spent. */
  readonly purchase: number | null;
  readonly currency: string | null;
  readonly supplier: string;
  readonly orderCode: string;
  readonly note: string;
  readonly state: LineState;
}

export interface Totals {
  /** Sums of the priced lines alone; null when no line is priced. */
  readonly purchase: number | null;
  readonly consumed: number | null;
  readonly currency: string | null;
  readonly pricedLines: number;
  /** Items of the lines that the sums leave out. */
  readonly unpriced: readonly string[];
}

export interface Bill {
  readonly layout: string;
  readonly lines: readonly BillLine[];
  readonly totals: Totals;
  /** Said on every copy of the bill. */
  readonly cautions: readonly string[];
}
