// A line whose part is still to be chosen: its quantity may be known, its price is not.

import type { BillLine, LineKind } from "./bill.ts";

export interface Wish {
  readonly item: string;
  readonly line: LineKind;
  readonly needed: number | null;
  readonly value?: string;
  readonly rating?: string;
  readonly note: string;
}

/** The line of a wish; what it does not say is "to be chosen". */
export const toBeChosen = ({
  item,
  line,
  needed,
  value = "to be chosen",
  rating = "to be chosen",
  note,
}: Wish): BillLine => ({
  item,
  line,
  value,
  rating,
  needed,
  onHand: null,
  toBuy: needed,
  pack: null,
  packs: null,
  surplus: null,
  unitPrice: null,
  consumed: null,
  purchase: null,
  currency: null,
  supplier: "",
  orderCode: "",
  alternates: "",
  status: "",
  note,
  state: "to be chosen",
  mark: "",
});
