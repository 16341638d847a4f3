// The headings of an edited bill: which column each is, which are the builder's own, and where the mark stands.

import { accepted, type Place, type Read, type Refusal, refused } from "../quantity/index.ts";
import { BILL_COLUMNS, type BillColumn } from "./columns.ts";
import { csvPlain, MARK_HEADING } from "./csv.ts";

export interface Headings {
  readonly columns: readonly { readonly column: BillColumn; readonly index: number }[];
  readonly extra: readonly { readonly heading: string; readonly index: number }[];
  /** Position of the mark; -1 where there is none. */
  readonly mark: number;
  readonly count: number;
}

/** A heading or a kind as it is compared. */
export const plainWord = (text: string): string => text.trim().toLowerCase().replace(/\s+/g, " ");

/** Refuses a heading that stands twice, and a table without `item` and `line`. */
export function readHeadings(cells: readonly string[], at: Place): Read<Headings> {
  const faults: Refusal[] = [];
  const seen = new Set<string>();
  const columns: { column: BillColumn; index: number }[] = [];
  const extra: { heading: string; index: number }[] = [];
  let mark = -1;
  for (const [index, text] of cells.entries()) {
    const heading = plainWord(csvPlain(text));
    if (heading === "") continue;
    if (seen.has(heading)) {
      const place = { ...at, column: index + 1 };
      faults.push({ code: "duplicate-heading", place, read: JSON.stringify(text), want: `"${heading}" once only` });
    }
    seen.add(heading);
    const column = BILL_COLUMNS.find((one) => one.heading === heading);
    if (heading === MARK_HEADING) mark = index;
    else if (column !== undefined) columns.push({ column, index });
    else extra.push({ heading: csvPlain(text), index });
  }
  for (const heading of ["item", "line"])
    if (!seen.has(heading))
      faults.push({
        code: "missing-heading",
        place: at,
        read: [...seen].join(", "),
        want: `the heading "${heading}" of a bill as CSV`,
      });
  return faults.length > 0 ? refused(...faults) : accepted({ columns, extra, mark, count: cells.length });
}
