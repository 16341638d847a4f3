// `parts`: reads catalogues and says row by row what was understood.

import { visible, visibleJson } from "../../order/index.ts";
import type { Refusal } from "../../quantity/index.ts";
import { EXIT } from "../exit.ts";
import { withWords } from "../inputNotes.ts";
import { laidOver } from "../overrides.ts";
import type { Ports } from "../ports.ts";
import { readAnyTable, type ToldRow, type ToldTable } from "../readAnyTable.ts";
import { tell } from "../tell.ts";
import { refusalWords } from "../words.ts";
import { wrap } from "../wrap.ts";

export interface PartsFlags {
  readonly json?: boolean;
  readonly limit?: string;
}

/** Rows told in one piece of output, so that a long table is never one text. */
const PIECE = 500;

const compactJson = (value: unknown): string => visibleJson(JSON.stringify(value));

export function partsCommand(paths: readonly string[], flags: PartsFlags, ports: Ports): number {
  const limit = flags.limit ?? "0";
  if (!/^\d{1,9}$/.test(limit)) {
    const want = "a whole number of rows; 0 for all";
    return tell(
      ports,
      [{ code: "bad-count", place: { field: "--limit" }, read: JSON.stringify(limit), want }],
      flags.json,
    );
  }
  const most = limit === "0" ? Number.POSITIVE_INFINITY : Number(limit);
  const lost: Refusal[] = [];
  let understood = 0;
  let flaws = 0;
  let first = true;
  if (flags.json) ports.out('{"files":[');
  for (const path of paths) {
    const file = path === "-" ? "standard input" : path;
    const text = ports.files.read(path);
    const read = text.ok ? readAnyTable(text.value, file, (parts) => laidOver(path, parts, ports.files)) : text;
    if (!read.ok) {
      lost.push(...read.refusals);
      continue;
    }
    understood += read.value.count;
    flaws += read.value.faults.length;
    if (flags.json) {
      ports.out(first ? "\n" : ",\n");
      tableJson(file, read.value, most, ports);
    } else tableText(file, read.value, most, ports);
    first = false;
  }
  if (flags.json) ports.out(`\n],"refusals":${compactJson(lost.map(withWords))}}\n`);
  else if (flaws > 0)
    ports.out(`${flaws} ${flaws === 1 ? "fault" : "faults"} in all, each told above with its line.\n`);
  if (lost.length > 0) ports.err(`${lost.map(refusalWords).join("\n")}\n`);
  return understood > 0 && lost.length === 0 ? EXIT.done : EXIT.wrongUse;
}

function tableJson(file: string, table: ToldTable, most: number, { out }: Ports): void {
  const { kind, count, faults, notes } = table;
  const head = { file, kind, understood: count, faults: faults.map(withWords), notes: notes.map(withWords) };
  out(`${compactJson(head).slice(0, -1)},"rows":[`);
  inPieces(table, most, (rows, begin) => {
    out(`${begin === 0 ? "\n" : ",\n"}${rows.map(compactJson).join(",\n")}`);
  });
  out("\n]}");
}

function tableText(file: string, table: ToldTable, most: number, { out, columns }: Ports): void {
  const { kind, count, faults, notes } = table;
  const lost = faults.length > 0 ? `, ${faults.length} ${faults.length === 1 ? "fault" : "faults"}` : ", no faults";
  out(`${visible(file)}: ${kind}, ${count} ${count === 1 ? "row" : "rows"} understood${lost}\n`);
  for (const refusal of [...faults, ...notes]) out(`${wrap(refusalWords(refusal), columns, "  ")}\n`);
  inPieces(table, most, (rows) => out(rows.map((row) => `${rowText(row, columns)}\n`).join("")));
  if (count > most) out(`  and ${count - most} more rows; --limit 0 for all\n`);
  out("\n");
}

function inPieces(table: ToldTable, most: number, take: (rows: readonly ToldRow[], begin: number) => void): void {
  const end = Math.min(table.count, most);
  for (let begin = 0; begin < end; begin += PIECE) {
    const size = Math.min(PIECE, end - begin);
    take(
      Array.from({ length: size }, (_, i) => table.row(begin + i)),
      begin,
    );
  }
}

/** One row: its name and line, then values by state; what is unknown is named. */
function rowText({ name, line, values, purchase = [] }: ToldRow, width: number): string {
  const of = (state: string, among = values): string =>
    among
      .filter((value) => value.state === state)
      .map(({ heading, text, rule }) => `${heading} ${visible(text)}${rule === undefined ? "" : ` (${rule})`}`)
      .join(", ");
  const unknown = values.filter((value) => value.state === "unknown").map((value) => value.heading);
  const blank = purchase.filter((value) => value.state === "unknown").map((value) => value.heading);
  const parts = [
    ["datasheet", of("datasheet")],
    ["measured", of("measured")],
    ["assumed", of("assumed")],
    ["unknown", unknown.join(", ")],
    ["purchase", of("datasheet", purchase)],
    ["purchase unknown", blank.join(", ")],
  ] as const;
  const lines = parts.flatMap(([state, text]) => (text === "" ? [] : [wrap(`${state}: ${text}`, width, "      ")]));
  return [`  ${line === undefined ? "" : `line ${line}: `}${visible(name)}`, ...lines].join("\n");
}
