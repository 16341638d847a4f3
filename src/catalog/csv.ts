// The owner of csv-parse: delimited text to records with their line numbers.
//
// Why a library: quoting, byte-order marks, mixed line ends and quoted newlines are a solved problem. What we rely on and check in our tests:
// the separator is found from the heading row, a record knows its line, and a record with a broken quote is told and skipped, not thrown.

import { type CsvError, parse } from "csv-parse/sync";
import { type Read, type Refusal, refused } from "../quantity/index.ts";

export type Separator = "," | ";" | "\t";

export interface CsvSummary {
  readonly separator: Separator;
  readonly faults: readonly Refusal[];
}

/** The separator: the one of comma, semicolon and tab that stands most often in the first line, outside quotes. */
export function separatorOf(text: string): Separator {
  const end = text.search(/[\r\n]/);
  const line = (end < 0 ? text : text.slice(0, end)).replace(/"[^"]*"/g, "");
  const count = (mark: string): number => line.split(mark).length - 1;
  const [tabs, semicolons, commas] = [count("\t"), count(";"), count(",")];
  if (tabs > 0 && tabs >= semicolons && tabs >= commas) return "\t";
  return semicolons > commas ? ";" : ",";
}

/**
 * Hands each record to `take` with the line it starts on, in order, so that a long table is never held twice.
 * Refuses text that is empty or binary; a record that cannot be split costs itself and is listed in `faults`.
 */
export function readRecords(text: string, take: (cells: readonly string[], line: number) => void): Read<CsvSummary> {
  const body = text.charCodeAt(0) === 0xfeff ? text.slice(1) : text;
  if (body.trim() === "")
    return refused({ code: "empty-file", place: {}, read: "nothing", want: "a heading row and rows below it" });
  const nul = body.indexOf("\u0000");
  if (nul >= 0)
    return refused({
      code: "binary-file",
      place: {},
      read: `a zero byte at character ${nul + 1}`,
      want: "text, UTF-8, comma, semicolon or tab separated",
    });
  const separator = separatorOf(body);
  const faults: Refusal[] = [];
  parse(body, {
    delimiter: separator,
    relax_column_count: true,
    skip_empty_lines: true,
    skip_records_with_error: true,
    trim: true,
    on_skip: (error: CsvError | undefined) => {
      const line = Number((error as { lines?: number } | undefined)?.lines ?? 0);
      faults.push({
        code: "broken-quotes",
        place: line > 0 ? { line } : {},
        read: error?.code === "CSV_QUOTE_NOT_CLOSED" ? "a quote that is never closed" : "a stray quote",
        want: 'quotes around the whole cell, and two quotes ("") for one inside it',
      });
      return undefined;
    },
    on_record: (cells: string[], info: { readonly lines: number }) => {
      let breaks = 0;
      for (const cell of cells) if (cell.includes("\n")) breaks += cell.split("\n").length - 1;
      take(cells, info.lines - breaks);
      return null;
    },
  });
  return { ok: true, value: { separator, faults } };
}
