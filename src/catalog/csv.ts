// The owner of csv-parse: delimited text to records with their line numbers.
//
// Why a library: quoting, byte-order marks, mixed line ends and quoted newlines are a solved problem. What we rely on and check in our tests:
// a record keeps its cells in order, a quoted newline stays in its cell, and a record with a broken quote is told and skipped, not thrown.
// Long text is handed over in pieces that end between records, so that a million rows never stand in memory at once.

import { parse } from "csv-parse/sync";
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";

export type Separator = "," | ";" | "\t";

export interface CsvSummary {
  readonly separator: Separator;
  readonly faults: readonly Refusal[];
}

/** The separator: the one of comma, semicolon and tab that stands most often in the first line with text, outside quotes. */
export function separatorOf(text: string): Separator {
  const line = (/^.*\S.*$/m.exec(text)?.[0] ?? "").replace(/"[^"]*"/g, "");
  const count = (mark: string): number => line.split(mark).length - 1;
  const [tabs, semicolons, commas] = [count("\t"), count(";"), count(",")];
  if (tabs > 0 && tabs >= semicolons && tabs >= commas) return "\t";
  return semicolons > commas ? ";" : ",";
}

/** Characters in one piece: large enough that the cost of a piece is small, small enough to stay light. */
const PIECE = 1 << 21;

/** Ends of pieces: newlines outside quotes, that is, with an even count of quotes before them. */
function pieceEnd(text: string, from: number): number {
  let end = from + PIECE;
  if (end >= text.length) return text.length;
  let quotes = 0;
  for (let at = text.indexOf('"', from); at >= 0 && at < end; at = text.indexOf('"', at + 1)) quotes++;
  for (; end < text.length; end++) {
    const code = text.charCodeAt(end);
    if (code === 34) quotes++;
    else if (code === 10 && quotes % 2 === 0) return end + 1;
  }
  return text.length;
}

type Take = (cells: readonly string[], line: number) => void;

/**
 * Hands each record to `take` with the line it starts on, in order. Empty lines are passed over.
 * Refuses text that is empty or binary; a record that cannot be split costs itself and is listed in `faults`.
 */
export function readRecords(text: string, take: Take): Read<CsvSummary> {
  const body = text.charCodeAt(0) === 0xfeff ? text.slice(1) : text;
  if (!/\S/.test(body)) {
    return refused({ code: "empty-file", place: {}, read: "nothing", want: "a heading row and rows below it" });
  }
  const nul = body.indexOf("\u0000");
  if (nul >= 0) {
    const want = "text, UTF-8, comma, semicolon or tab separated";
    return refused({ code: "binary-file", place: {}, read: `a zero byte at character ${nul + 1}`, want });
  }
  const separator = separatorOf(body);
  const faults: Refusal[] = [];
  let line = 1;
  for (let from = 0; from < body.length; ) {
    const end = pieceEnd(body, from);
    line = readPiece(from === 0 && end === body.length ? body : body.slice(from, end), {
      separator,
      line,
      take,
      faults,
    });
    from = end;
  }
  return accepted({ separator, faults });
}

interface PieceContext {
  readonly separator: Separator;
  /** Line on which the piece starts. */
  readonly line: number;
  readonly take: Take;
  readonly faults: Refusal[];
}

/** One piece; returns the line after it. */
function readPiece(piece: string, context: PieceContext): number {
  const { separator, line, take } = context;
  let broken = false;
  const records = parse(piece, {
    ...OPTIONS,
    delimiter: separator,
    on_skip: () => {
      broken = true;
      return undefined;
    },
  });
  if (broken) return readByLine(piece, context);
  let at = line;
  for (const cells of records) {
    if (cells.length > 1 || cells[0] !== "") take(cells, at);
    at += 1 + breaksIn(cells);
  }
  return at;
}

/** Line ends of every kind, also mixed in one file. */
const OPTIONS = {
  record_delimiter: ["\r\n", "\n", "\r"],
  relax_column_count: true,
  skip_records_with_error: true,
  trim: true,
};
/** Lines that one cell may run over; a quote left open longer is taken for a slip. */
const LONGEST_CELL = 50;

/** The careful way for a piece with a broken quote: record by record, so that the fault costs its own line and no other. */
function readByLine(piece: string, { separator, line, take, faults }: PieceContext): number {
  const lines = piece.split(/\r\n|\n|\r/);
  if (lines.at(-1) === "") lines.pop();
  const open = (text: string): boolean => text.split('"').length % 2 === 0;
  for (let i = 0; i < lines.length; i++) {
    let record = lines[i] as string;
    let last = i;
    while (open(record) && last + 1 < lines.length && last - i < LONGEST_CELL) record += `\n${lines[++last]}`;
    const closed = !open(record);
    let stray = false;
    const [cells] = closed
      ? parse(record, {
          ...OPTIONS,
          delimiter: separator,
          on_skip: () => {
            stray = true;
            return undefined;
          },
        })
      : [];
    if (!closed || stray) {
      const read = closed ? "a stray quote" : "a quote that is never closed";
      const want = 'quotes around the whole cell, and two quotes ("") for one inside it';
      faults.push({ code: "broken-quotes", place: { line: line + i }, read, want });
      continue;
    }
    if (cells !== undefined && (cells.length > 1 || cells[0] !== "")) take(cells, line + i);
    i = last;
  }
  return line + lines.length;
}

function breaksIn(cells: readonly string[]): number {
  let breaks = 0;
  for (const cell of cells) {
    for (let at = cell.indexOf("\n"); at >= 0; at = cell.indexOf("\n", at + 1)) breaks++;
  }
  return breaks;
}
