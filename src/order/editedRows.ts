// An edited bill, CSV, to rows of known cells: every fault with its line and column, nothing guessed.

import { readRecords } from "../catalog/index.ts";
import {
  accepted,
  nearestWord,
  type Place,
  type Read,
  type Refusal,
  refused,
  versionFault,
} from "../quantity/index.ts";
import { LINE_KINDS, type LineKind } from "./bill.ts";
import type { BillColumn } from "./columns.ts";
import { csvPlain, FOOTER_KINDS, MARK_HEADING, SUM_ITEM } from "./csv.ts";
import { type CellValue, readEditedCell } from "./editedCell.ts";
import { type Headings, plainWord, readHeadings } from "./editedHeadings.ts";
import { BILL_VERSION, markVersion } from "./marks.ts";

export interface EditedCell {
  readonly text: string;
  readonly value: CellValue;
  /** Of the file, from 1. */
  readonly column: number;
}

export interface EditedRow {
  readonly line: LineKind;
  /** Line of the file. */
  readonly at: number;
  readonly place: Place;
  /** Only of the builder's columns that the file has. */
  readonly cells: ReadonlyMap<BillColumn["key"], EditedCell>;
  readonly extra: readonly string[];
  /** Empty where there is none: a row of the builder's, or of a file made before marks. */
  readonly mark: string;
}

export interface EditedFile {
  readonly rows: readonly EditedRow[];
  readonly extraHeadings: readonly string[];
}

/** The kind of a row; null for a sum or a caution; a refusal for a word that is none. */
function kindOf(text: string, item: string): LineKind | null | { readonly want: string } {
  const word = plainWord(text);
  if (FOOTER_KINDS.some((kind) => kind === word)) return null;
  // So they were written before the footer had kinds of its own.
  if (word === "" && (item === SUM_ITEM || item === "caution")) return null;
  if (word === "") return "own line";
  const kind = LINE_KINDS.find((one) => one === word);
  if (kind !== undefined) return kind;
  const near = nearestWord(word, LINE_KINDS);
  return {
    want: `${near === null ? "" : `perhaps "${near}"; `}a kind of line of the bill, or a blank for a line of your own`,
  };
}

/** Reads a bill that was edited. Any fault refuses the whole: a bill with a hole in it is no bill. */
export function readEditedBill(text: string, file: string): Read<EditedFile> {
  const faults: Refusal[] = [];
  const rows: EditedRow[] = [];
  let headings: Headings | null = null;
  let fatal = false;
  // Whether a comma is the decimal mark shows in the numbers of the whole file, so that rows are kept until all are read.
  const raw: { readonly cells: readonly string[]; readonly line: number }[] = [];
  const split = readRecords(text, (cells, line) => {
    if (headings !== null || fatal) raw.push({ cells, line });
    else {
      const read = readHeadings(cells, { file, line });
      if (read.ok) headings = read.value;
      else {
        fatal = true;
        faults.push(...read.refusals);
      }
    }
  });
  if (!split.ok) return refused(...split.refusals.map((one) => ({ ...one, place: { file } })));
  faults.push(...split.value.faults.map((one) => ({ ...one, place: { file, ...one.place } })));
  const bound = headings as Headings | null;
  if (bound === null) return refused(...faults);
  const comma = split.value.separator === "," ? "never" : raw.some(({ cells }) => hasDecimalComma(cells, bound));
  const seen = new Map<LineKind, number>();
  for (const { cells, line } of raw) {
    const row = readRow(cells, { bound, place: { file, line }, comma, faults });
    if (row === null) continue;
    const before = seen.get(row.line);
    if (before !== undefined && row.line !== "own line") {
      const want = `"${row.line}" once only (it stands in line ${before} too); a blank under "line" for a line of your own`;
      faults.push({
        code: "duplicate-line",
        place: { file, line, field: "line" },
        read: JSON.stringify(row.line),
        want,
      });
    }
    seen.set(row.line, line);
    rows.push(row);
  }
  const extraHeadings = bound.extra.map(({ heading }) => heading);
  return faults.length > 0 ? refused(...faults) : accepted({ rows, extraHeadings });
}

const hasDecimalComma = (cells: readonly string[], { columns }: Headings): boolean =>
  columns.some(({ column, index }) => column.kind !== "text" && /^\d+,\d+$/.test(cells[index] ?? ""));

interface RowContext {
  readonly bound: Headings;
  readonly place: Place;
  readonly comma: boolean | "never";
  readonly faults: Refusal[];
}

function readRow(given: readonly string[], { bound, place, comma, faults }: RowContext): EditedRow | null {
  const texts = given.map(csvPlain);
  const cellOf = (key: BillColumn["key"]): string =>
    texts[bound.columns.find(({ column }) => column.key === key)?.index ?? -1] ?? "";
  if (texts.every((text) => text === "")) return null;
  if (texts.some((text, i) => i >= bound.count && text !== "")) {
    const want = `at most ${bound.count}, one below each heading; a cell that holds a separator stands in quotes`;
    faults.push({
      code: "row-too-long",
      place: { ...place, column: bound.count + 1 },
      read: `${texts.length} cells`,
      want,
    });
    return null;
  }
  const kind = kindOf(cellOf("line"), cellOf("item"));
  if (kind === null) return null;
  const spot = (index: number, heading: string): Place => ({ ...place, column: index + 1, field: heading });
  if (typeof kind === "object") {
    const index = bound.columns.findIndex(({ column }) => column.key === "line");
    const at = spot(bound.columns[index]?.index ?? 0, "line");
    faults.push({ code: "bad-choice", place: at, read: JSON.stringify(cellOf("line")), want: kind.want });
    return null;
  }
  const mark = texts[bound.mark] ?? "";
  const version = markVersion(mark);
  const at = spot(bound.mark, MARK_HEADING);
  const old = version === null ? null : versionFault({ found: version, newest: BILL_VERSION, place: at });
  if (old !== null) {
    faults.push(old);
    return null;
  }
  const cells = new Map<BillColumn["key"], EditedCell>();
  for (const { column, index } of bound.columns) {
    // The rest is reckoned anew, whatever stands there.
    if (!column.builders) continue;
    const text = texts[index] ?? "";
    const value = readEditedCell(text, column, comma);
    if (value.ok) cells.set(column.key, { text, value: value.value, column: index + 1 });
    else faults.push(...value.refusals.map((one) => ({ ...one, place: spot(index, column.heading) })));
  }
  if (kind === "own line" && cellOf("item") === "")
    faults.push({
      code: "missing-value",
      place: { ...place, field: "item" },
      read: "a blank cell",
      want: "what the line is",
    });
  const extra = bound.extra.map(({ index }) => texts[index] ?? "");
  return { line: kind, at: place.line ?? 0, place, cells, extra, mark: version === null ? "" : mark };
}
