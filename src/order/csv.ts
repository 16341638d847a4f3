// A bill as CSV for a spreadsheet: quoted where it must be, numbers as numbers, and no text that a spreadsheet would run.
//
// A text cell that begins with = + - @, a tab or a line break, or a full-width form of these, gets an apostrophe before it, also after
// leading blanks or quotes. Source: [RFC4180] quoting; formula guard: common practice, no source.

import type { Bill, BillLine } from "./bill.ts";
import { BILL_COLUMNS, columnsOf, plainNumber } from "./columns.ts";
import { visible } from "./visible.ts";

const FORMULA = /^[\s"']*[=+\-@\t\r\n＝＋－＠]/u;

/** A text cell that no spreadsheet takes for a formula, quoted where it must be. */
export function csvText(text: string): string {
  const guarded = FORMULA.test(text) ? `'${visible(text)}` : visible(text);
  return /[",;\t\r\n]|^\s|\s$/.test(guarded) ? `"${guarded.replaceAll('"', '""')}"` : guarded;
}

/** A cell as it was before `csvText` kept it from being a formula. */
export const csvPlain = (cell: string): string => (cell.startsWith("'") && FORMULA.test(cell) ? cell.slice(1) : cell);

/** What stands under `line` in the rows below the lines. */
export const FOOTER_KINDS = ["sum", "caution"] as const;
export const SUM_ITEM = "sum of the priced lines";
export const MARK_HEADING = "mark";

/**
 * One heading row, one row a line, then the sums and the cautions. Lines end in CR LF. The last column is the mark by which an
 * edited copy is told from what the program wrote.
 */
export function billToCsv(bill: Bill): string {
  const columns = [...columnsOf(bill), { heading: MARK_HEADING, kind: "text", cell: (line: BillLine) => line.mark }];
  const rows = [columns.map(({ heading }) => csvText(heading))];
  // A number of ours begins with a digit, so that the guard leaves it as it is.
  for (const line of bill.lines) rows.push(columns.map(({ cell }) => csvText(cell(line))));
  const { purchase, consumed, currency, unpriced } = bill.totals;
  const money = (amount: number | null): string => (amount === null ? "no price" : plainNumber(amount));
  const footer = (cells: Readonly<Record<string, string>>): void => {
    rows.push(columns.map(({ heading }, i) => (i < BILL_COLUMNS.length ? csvText(cells[heading] ?? "") : "")));
  };
  footer({
    item: SUM_ITEM,
    line: "sum",
    "consumed cost": money(consumed),
    "purchase cost": money(purchase),
    currency: currency ?? "",
    note: unpriced.length > 0 ? `Left out, no price: ${unpriced.join("; ")}` : "",
  });
  for (const caution of bill.cautions) footer({ item: "caution", line: "caution", note: caution });
  return `${rows.map((row) => row.join(",")).join("\r\n")}\r\n`;
}
