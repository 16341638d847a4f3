// The mark of a line: a short sum of each cell that the builder may change, so that a later reading knows which were changed.
//
// `v1.` and six characters a cell. A change goes unseen when both texts have the same sum, one time in two thousand million, and then the
// cell is made anew. Two products of 32 bits are mixed to 53; nothing secret hangs on it. Source: [common-practice].

import type { BillLine } from "./bill.ts";
import { BILL_COLUMNS, type BillColumn, cellText } from "./columns.ts";
import { visible } from "./visible.ts";

/** Columns that the builder may write in, in the order of the mark. */
export const BUILDERS_COLUMNS: readonly BillColumn[] = BILL_COLUMNS.filter(({ builders }) => builders === true);

/** Version of the file format of an edited bill. */
export const BILL_VERSION = 1;
const SIZE = 6;
/** 36^6, written out: powers differ in their last figure from one engine to the next. */
const MOST = 2_176_782_336;

/** A cell as it is compared: blanks and unseen characters do not count. */
export const plainCell = (text: string): string => visible(text).trim().replace(/\s+/g, " ");

function sumOf(text: string): string {
  let [a, b] = [0x9e3779b1, 0x5f356495];
  for (const char of plainCell(text)) {
    const code = char.codePointAt(0) as number;
    a = Math.imul(a ^ code, 0x9e3779b1);
    b = Math.imul(b ^ code, 0x5f356495);
  }
  a = Math.imul(a ^ (a >>> 16), 0x85ebca6b) ^ Math.imul(b ^ (b >>> 13), 0xc2b2ae35);
  b = Math.imul(b ^ (b >>> 16), 0x85ebca6b) ^ Math.imul(a ^ (a >>> 13), 0xc2b2ae35);
  const mixed = (b & 0x1fffff) * 0x1_0000_0000 + (a >>> 0);
  return (mixed % MOST).toString(36).padStart(SIZE, "0");
}

/** The line with the mark of its cells as they are. */
export const marked = (line: BillLine): BillLine => ({
  ...line,
  mark: `v${BILL_VERSION}.${BUILDERS_COLUMNS.map((column) => sumOf(cellText(line, column))).join("")}`,
});

/** Version that a mark was written by; null when the text is no mark. */
export const markVersion = (mark: string): number | null => {
  const found = /^v(\d{1,6})\.[0-9a-z]*$/.exec(mark);
  return found === null ? null : Number(found[1]);
};

/** Whether a cell differs from what stood there when the mark was made. */
export function isChanged(mark: string, key: BillColumn["key"], cell: string): boolean {
  const at = BUILDERS_COLUMNS.findIndex((column) => column.key === key);
  const start = mark.indexOf(".") + 1 + at * SIZE;
  return at >= 0 && mark.slice(start, start + SIZE) !== sumOf(cell);
}
