// A delimited table to records by its columns: headings understood, every fault placed, a bad row costs only itself.

import { accepted, type Place, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { Column } from "./column.ts";
import { readRecords, separatorOf } from "./csv.ts";
import { type BoundColumn, bindHeadings } from "./headings.ts";
import { type Row, readRow } from "./row.ts";

/** The values of a row by key, for tables short enough not to care. */
export const record = (columns: readonly Column[], row: Row): Readonly<Record<string, unknown>> =>
  Object.fromEntries(
    columns.map((column, i) => [column.key, row.values[i]]).filter(([, value]) => value !== undefined),
  );

/** Position of each key among the columns. */
export const positions = <K extends string>(columns: readonly Column[]): Readonly<Record<K, number>> =>
  Object.fromEntries(columns.map((column, i) => [column.key, i])) as Record<K, number>;

export interface TableReport {
  /** Rows that were lost, with every fault of each. */
  readonly faults: readonly Refusal[];
  /** Things passed over without losing a row. */
  readonly notes: readonly Refusal[];
  /** Rows below the heading, good and bad. */
  readonly rowCount: number;
}

const DECIMAL_COMMA = /(?:^|[;\t"])\s*-?(?:0,\d+|\d+,\d{1,2})(?=\s*(?:[;\t"\r\n]|$))/m;
/** Faults listed one by one; beyond it they are only counted, so that a ruined million-row file stays readable. */
export const MOST_FAULTS = 1000;

/**
 * Reads a table and hands over each good row, in order.
 * Refuses the whole only when nothing can be read from it: empty, binary, no heading understood, a required or repeated heading.
 */
export function readTable(
  text: string,
  columns: readonly Column[],
  file: string,
  take: (row: Row) => void,
): Read<TableReport> {
  const faults: Refusal[] = [];
  const notes: Refusal[] = [];
  let lost = 0;
  let bound: readonly BoundColumn[] | null = null;
  let fatal: readonly Refusal[] | null = null;
  let rowCount = 0;
  let headings = 0;
  const decimalComma = separatorOf(text) === "," ? "never" : DECIMAL_COMMA.test(text);
  const fault = (refusal: Refusal, place: Place): void => {
    if (faults.length < MOST_FAULTS) faults.push({ ...refusal, place: { file, ...place } });
    else lost++;
  };
  const separated = readRecords(text, (cells, line) => {
    if (fatal !== null) return;
    if (bound === null) {
      const read = bindHeadings(cells, columns, { file, line });
      if (!read.ok) {
        fatal = read.refusals;
        return;
      }
      bound = read.value.bound;
      headings = cells.length;
      notes.push(...read.value.notes);
      return;
    }
    rowCount++;
    const row = readRow(cells, line, { bound, decimalComma, headings, width: columns.length }, fault);
    if (row !== null) take(row);
  });
  if (!separated.ok) return refused(...separated.refusals.map((r) => ({ ...r, place: { file } })));
  if (fatal !== null) return refused(...(fatal as readonly Refusal[]));
  if (bound === null)
    return refused({ code: "empty-file", place: { file }, read: "nothing", want: "a heading row and rows below it" });
  for (const broken of separated.value.faults) fault(broken, broken.place);
  if (lost > 0) {
    faults.push({
      code: "more-faults",
      place: { file },
      read: `${lost} more faults`,
      want: "the faults above mended first",
    });
  }
  if (rowCount === 0)
    notes.push({ code: "no-rows", place: { file }, read: "a heading and no rows", want: "at least one row" });
  return accepted({ faults, notes, rowCount });
}
