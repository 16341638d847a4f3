// The log of a built bank: shots fired and units measured anew, one dated row each.

import { accepted, type Place, type Read, type Refusal } from "../quantity/index.ts";
import { above, type Column, fromZero, text } from "./column.ts";
import { readTable, record } from "./table.ts";

export interface HistoryRow {
  /** Whole days since 1970-01-01. */
  readonly day: number;
  /** Shots that the bank has fired in all when the row was written; absent where the log does not say. */
  readonly shots?: number;
  /** The unit that was measured anew; absent in a row that only logs shots. */
  readonly serial?: string;
  /** F, A, ohm. */
  readonly capacitance?: number;
  readonly leakage?: number;
  readonly esr?: number;
  /** Relative, of each of the three. */
  readonly uncertainty?: number;
  readonly leakageUncertainty?: number;
  readonly esrUncertainty?: number;
  readonly line: number;
}

const count = { kind: "whole", least: 0, most: 1e12 } as const;

const HISTORY_COLUMNS: readonly Column[] = [
  { heading: "date", also: ["day"], key: "date", type: text(10), required: true },
  { heading: "shots", also: ["total shots", "counter"], key: "shots", type: count },
  { heading: "fired", also: ["shots fired"], key: "fired", type: count },
  { heading: "charge voltage", key: "voltage", type: above("voltage", 1e-3, 1e7) },
  { heading: "serial", also: ["serial number", "unit"], key: "serial", type: text(120) },
  { heading: "capacitance", key: "capacitance", type: above("capacitance", 1e-13, 1e5) },
  { heading: "leakage", also: ["leakage current"], key: "leakage", type: fromZero("current", 100) },
  { heading: "esr", key: "esr", type: above("resistance", 1e-7, 1e6) },
  { heading: "uncertainty", key: "uncertainty", type: above("fraction", 1e-9, 0.5) },
  { heading: "leakage uncertainty", key: "leakageUncertainty", type: above("fraction", 1e-9, 0.99) },
  { heading: "esr uncertainty", key: "esrUncertainty", type: above("fraction", 1e-9, 0.99) },
  { heading: "note", also: ["notes"], key: "note", type: text(1000) },
];

/** Days since 1970-01-01 of a date written 2026-03-09; null when there is no such day. Source: [ISO8601] 5.2.2. */
export function dayOf(date: string): number | null {
  const [, year, month, day] = /^(\d{4})-(\d{2})-(\d{2})$/.exec(date)?.map(Number) ?? [];
  if (year === undefined || month === undefined || day === undefined) return null;
  const leap = (year % 4 === 0 && year % 100 !== 0) || year % 400 === 0;
  const longest = [31, leap ? 29 : 28, 31, 30, 31, 30, 31, 31, 30, 31, 30, 31][month - 1];
  if (longest === undefined || day < 1 || day > longest) return null;
  return Math.round(Date.UTC(year, month - 1, day) / 86_400_000);
}

type Logged = Omit<HistoryRow, "day"> & { readonly date: string; readonly fired?: number };
type Dated = Logged & { readonly day: number };

export interface History {
  /** In order of date, then of the file. */
  readonly rows: readonly HistoryRow[];
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
}

/** Reads a log. `shots` is what the counter stands at, `fired` what was added; a counter that goes back is a fault of its row. */
export function readHistory(source: string, file: string): Read<History> {
  const dated: Dated[] = [];
  const faults: Refusal[] = [];
  const wrong = (code: string, place: Omit<Place, "file">, read: string, want: string): void => {
    faults.push({ code, place: { file, ...place }, read, want });
  };
  const table = readTable(source, HISTORY_COLUMNS, file, (row) => {
    const { line } = row;
    const logged = { ...(record(HISTORY_COLUMNS, row) as unknown as Logged), line };
    const day = dayOf(logged.date);
    if (day === null)
      return wrong("bad-value", { line, field: "date" }, JSON.stringify(logged.date), "a day written 2026-03-09");
    const values = [logged.capacitance, logged.leakage, logged.esr].filter((value) => value !== undefined);
    if (values.length > 0 && logged.serial === undefined)
      return wrong("missing-value", { line, field: "serial" }, "a blank cell", "the unit that was measured");
    dated.push({ ...logged, day });
  });
  if (!table.ok) return table;
  dated.sort((a, b) => a.day - b.day || a.line - b.line);
  // Before the first row that adds shots, none were fired; before the first that reads a counter, nobody knows.
  let total =
    dated.find((row) => row.shots !== undefined || row.fired !== undefined)?.shots === undefined ? 0 : undefined;
  if (dated.every((row) => row.shots === undefined && row.fired === undefined)) total = undefined;
  const rows = dated.flatMap(({ date: _, fired, shots: counter, ...row }): HistoryRow[] => {
    const reached = total === undefined ? counter : total + (fired ?? 0);
    if (counter !== undefined && reached !== undefined && counter < reached) {
      const want = `${reached} or more: the counter was there, or has to be, by then`;
      wrong("contradiction", { line: row.line, field: "shots" }, String(counter), want);
      return [];
    }
    total = counter ?? reached;
    return [{ ...row, ...(total === undefined ? {} : { shots: total }) }];
  });
  return accepted({ rows, faults: [...table.value.faults, ...faults], notes: table.value.notes });
}
