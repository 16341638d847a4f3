// A bill as CSV for a spreadsheet: quoted where it must be, numbers as numbers, and no text that a spreadsheet would run.
//
// A text cell that begins with = + - @, a tab or a line break, or a full-width form of these, gets an apostrophe before it, also after
// leading blanks or quotes. Source: [RFC4180] quoting; formula guard: common practice, no source.

import type { Bill } from "./bill.ts";
import { BILL_COLUMNS, cellText } from "./columns.ts";
import { visible } from "./visible.ts";

const FORMULA = /^[\s"']*[=+\-@\t\r\n＝＋－＠]/u;

/** A text cell that no spreadsheet takes for a formula, quoted where it must be. */
export function csvText(text: string): string {
  const guarded = FORMULA.test(text) ? `'${visible(text)}` : visible(text);
  return /[",;\t\r\n]|^\s|\s$/.test(guarded) ? `"${guarded.replaceAll('"', '""')}"` : guarded;
}

/** One heading row, one row a line, then the sums and the cautions. Lines end in CR LF. */
export function billToCsv(bill: Bill): string {
  const rows = [BILL_COLUMNS.map((column) => csvText(column.heading))];
  for (const line of bill.lines) {
    rows.push(
      BILL_COLUMNS.map((column) => {
        const cell = cellText(line, column);
        return typeof line[column.key] === "number" ? cell : csvText(cell);
      }),
    );
  }
  const { purchase, consumed, currency, unpriced } = bill.totals;
  const sums: Readonly<Record<string, string>> = {
    item: "sum of the priced lines",
    consumed: consumed === null ? "no price" : String(consumed),
    purchase: purchase === null ? "no price" : String(purchase),
    currency: currency ?? "",
    note: unpriced.length > 0 ? csvText(`Left out, no price: ${unpriced.join("; ")}`) : "",
  };
  rows.push(BILL_COLUMNS.map((column) => sums[column.key] ?? ""));
  for (const caution of bill.cautions) {
    rows.push(
      BILL_COLUMNS.map((column) => (column.key === "item" ? "caution" : column.key === "note" ? csvText(caution) : "")),
    );
  }
  return `${rows.map((row) => row.join(",")).join("\r\n")}\r\n`;
}
