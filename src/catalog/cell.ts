// One cell to one value, by its column's kind; a fault says what was read and what would be accepted.

import {
  accepted,
  type Dimension,
  formatQuantity,
  parsePrice,
  parseQuantity,
  parseTolerance,
  type Read,
  refused,
  type Scale,
} from "../quantity/index.ts";
import type { ColumnKind } from "./column.ts";

export interface CellContext {
  /** Scale of a bare number, from the heading's unit; null when the heading has none. */
  readonly bare: Scale | null;
  readonly decimalComma: boolean | "never";
  /** Currency of the row, for its prices. */
  readonly currency: string;
}

export interface PriceBreak {
  readonly from: number;
  readonly price: number;
}

const no = (code: string, read: string, want: string): Read<never> =>
  refused({ code, place: {}, read: JSON.stringify(read.length > 80 ? `${read.slice(0, 80)}...` : read), want });

const YES = /^(yes|y|true|1|polarised|polarized)$/i;
const NO = /^(no|n|false|0|non-?polari[sz]ed|bipolar)$/i;
const WHOLE = /^\d+$/;

/** Reads a cell that is not blank. */
export function readCell(cell: string, type: ColumnKind, context: CellContext): Read<unknown> {
  switch (type.kind) {
    case "quantity": {
      const read = parseQuantity(cell, type.dimension, context);
      if (!read.ok) return read;
      return inRange(read.value, cell, type);
    }
    case "whole": {
      const value = WHOLE.test(cell) ? Number(cell) : Number.NaN;
      if (value >= type.least && value <= type.most) return accepted(value);
      return no("bad-count", cell, `a whole number from ${type.least} to ${type.most}`);
    }
    case "tolerance":
      return parseTolerance(cell, context.bare, context.decimalComma);
    case "text":
      return cell.length <= type.longest ? accepted(cell) : no("too-long", cell, `at most ${type.longest} characters`);
    case "yes-no":
      if (YES.test(cell)) return accepted(true);
      return NO.test(cell) ? accepted(false) : no("bad-yes-no", cell, "yes or no");
    case "price":
      return parsePrice(cell, context.currency, context.decimalComma);
    case "price-breaks":
      return readBreaks(cell, context);
    case "currency":
      return /^[A-Z]{3}$/.test(cell) ? accepted(cell) : no("bad-currency", cell, "a code of ISO 4217 such as EUR");
    case "choice":
      return type.among.includes(cell) ? accepted(cell) : no("bad-choice", cell, type.among.join(", "));
  }
}

function inRange(value: number, cell: string, type: ColumnKind & { kind: "quantity" }): Read<number> {
  if (value >= type.least && value <= type.most) return accepted(value);
  const show = (x: number, dimension: Dimension): string => formatQuantity(x, dimension, { digits: 3 });
  return no("out-of-range", cell, `from ${show(type.least, type.dimension)} to ${show(type.most, type.dimension)}`);
}

/** "10: 3.90; 100: 3.10": quantity from which a unit price holds for all units bought. Rising quantities, no repeats. */
function readBreaks(cell: string, context: CellContext): Read<readonly PriceBreak[]> {
  const want = 'price breaks such as "10: 3.90; 100: 3.10", quantities rising';
  const breaks: PriceBreak[] = [];
  for (const part of cell.split(/[;|]/)) {
    if (part.trim() === "") continue;
    const match = /^\s*(\d+)\s*\+?\s*[:=]\s*(\S+)\s*$/.exec(part);
    if (!match) return no("bad-breaks", cell, want);
    const price = parsePrice(match[2] ?? "", context.currency, context.decimalComma);
    const from = Number(match[1]);
    if (!price.ok || from < 1 || from > 1e9 || from <= (breaks.at(-1)?.from ?? 0)) return no("bad-breaks", cell, want);
    breaks.push({ from, price: price.value });
  }
  return breaks.length > 0 ? accepted(breaks) : no("bad-breaks", cell, want);
}
