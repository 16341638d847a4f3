// A line reckoned from its own cells alone: quantity, packs and costs at the price that stands in it, or the costs alone.

import { lineCost, minorDigits, toMajor } from "../quantity/index.ts";
import type { BillLine, LineState } from "./bill.ts";
import { isOpen, plainNumber } from "./columns.ts";

const costOf = ({ unitPrice, currency }: BillLine, quantity: number | null): number | null => {
  if (quantity === 0) return 0;
  if (quantity === null || unitPrice === null || currency === null) return null;
  return toMajor(lineCost(quantity, Number(`${plainNumber(unitPrice)}e${minorDigits(currency)}`)), currency);
};

/** The quantities as they stand, at the price that stands in the line now. */
export function repriced(line: BillLine): BillLine {
  const { toBuy, surplus } = line;
  const purchase = costOf(line, toBuy);
  const consumed = costOf(line, toBuy === null ? null : toBuy - (surplus ?? 0));
  return { ...line, consumed, purchase, state: stateOf(line, purchase) };
}

/** Whole packs for what is not on hand, at one unit price: no price breaks, no minimum order. */
export function reckoned(line: BillLine): BillLine {
  const { needed, onHand, pack } = line;
  const short = needed === null ? null : Math.max(0, needed - (onHand ?? 0));
  // A quantity may be a length or a weight; only what comes in packs is rounded up to them.
  const packs = short === null || pack === null ? null : Math.max(0, Math.ceil(short / pack - 1e-9));
  const toBuy = packs === null || pack === null ? short : packs * pack;
  return repriced({ ...line, toBuy, packs, surplus: toBuy === null || short === null ? null : toBuy - short });
}

/** Without a price a line lacks the price, or still the choice, when neither value nor order code says what it is. */
function stateOf({ value, orderCode }: BillLine, purchase: number | null): LineState {
  if (purchase !== null) return "priced";
  return isOpen(value) && isOpen(orderCode) ? "to be chosen" : "no price";
}
