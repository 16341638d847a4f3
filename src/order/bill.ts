// The shape of a bill of materials: counted lines and their totals, plain data, money in the major unit of its currency.

/** What a line is; one name for each kind of thing a bank needs, and `own line` for what its builder adds. */
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
  "load bus",
  "insulator",
  "resistor mounts",
  "lugs",
  "screws and washers",
  "labels",
  "meter with divider",
  "screen",
  "test resistor",
  "shipment",
  "own line",
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
  /** Other parts that would do in its place, as far as the catalogues show. */
  readonly alternates: string;
  /** How far its buying has come; empty until the builder says. */
  readonly status: string;
  readonly note: string;
  readonly state: LineState;
  /** What its cells were when the program made it, so that a later reading knows which the builder changed; empty in an own line. */
  readonly mark: string;
  /** Cells under headings that the builder added, in their order. */
  readonly extra?: readonly string[];
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

/**
 * `kept`: the builder's cell stands in place of the program's. `not taken over`: it was written beside another part than the bank takes now.
 * `check again`: something was chosen for what the bank asked then (`read`), and it asks something else now (`made`). `own line`: a line of the
 * builder's own. `put back`: the edited copy lacks a line that the bank takes. `not counted`: the bank no longer takes it; what the builder
 * wrote is kept at a quantity of 0.
 */
export interface BillChange {
  readonly kind: "kept" | "not taken over" | "check again" | "own line" | "put back" | "not counted";
  readonly item: string;
  readonly line: LineKind;
  /** Line of the edited file; null where it has none. */
  readonly at: number | null;
  /** Heading, what the program would write, and what the builder wrote; empty for whole lines. */
  readonly heading: string;
  readonly made: string;
  readonly read: string;
}

export interface Bill {
  readonly layout: string;
  readonly lines: readonly BillLine[];
  readonly totals: Totals;
  /** Said on every copy of the bill. */
  readonly cautions: readonly string[];
  /** Headings that the builder added. */
  readonly extraHeadings?: readonly string[];
  /** What was taken over from an edited copy, and what was not; absent in a bill made anew. */
  readonly changes?: readonly BillChange[];
}
