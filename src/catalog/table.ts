// A delimited table to records by its columns: headings understood, every fault placed, a bad row costs only itself.

import {
  accepted,
  nearestWord,
  type Place,
  type Read,
  type Refusal,
  refused,
  type Scale,
  unitScale,
} from "../quantity/index.ts";
import { readCell } from "./cell.ts";
import type { Column } from "./column.ts";
import { readRecords, separatorOf } from "./csv.ts";

export interface Row {
  readonly line: number;
  /** One value a column, in the order of the columns asked for; undefined where the cell is blank or the column missing. */
  readonly values: readonly unknown[];
}

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

interface BoundColumn {
  readonly column: Column;
  /** Position in the file, and among the columns asked for. */
  readonly index: number;
  readonly slot: number;
  readonly scale: Scale | null;
  /** For the quick way through plain numbers: `e-6` behind them, and the range; null where there is no quick way. */
  readonly quick: { readonly suffix: string; readonly least: number; readonly most: number } | null;
}

interface BoundTable {
  readonly bound: readonly BoundColumn[];
  readonly decimalComma: boolean | "never";
  /** How many headings the file has. */
  readonly headings: number;
  /** How many columns were asked for. */
  readonly width: number;
}

const HEADING = /^([^[\]]*?)\s*(?:\[([^[\]]*)\])?$/;
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

function readRow(
  cells: readonly string[],
  line: number,
  table: BoundTable,
  fault: (refusal: Refusal, place: Place) => void,
): Row | null {
  const values: unknown[] = new Array(table.width).fill(undefined);
  let good = true;
  if (cells.length > table.headings && cells.some((cell, i) => i >= table.headings && cell !== "")) {
    const place = { line, column: table.headings + 1 };
    const want = `at most ${table.headings}, one below each heading; a cell that holds a separator stands in quotes`;
    fault({ code: "row-too-long", place, read: `${cells.length} cells`, want }, place);
    return null;
  }
  let currency = "";
  for (const { column, index, slot, scale, quick } of table.bound) {
    const cell = cells[index];
    if (cell === undefined || cell === "") {
      if (column.required) {
        const place = { line, column: index + 1, field: column.heading };
        fault({ code: "missing-value", place, read: "a blank cell", want: `a value for ${column.heading}` }, place);
        good = false;
      }
      continue;
    }
    if (quick !== null && table.decimalComma !== true && isPlain(cell)) {
      const value = Number(cell + quick.suffix);
      if (value >= quick.least && value <= quick.most) {
        values[slot] = value;
        continue;
      }
    }
    const read = readCell(cell, column.type, { bare: scale, decimalComma: table.decimalComma, currency });
    if (read.ok) {
      values[slot] = read.value;
      if (column.key === "currency") currency = read.value as string;
    } else {
      good = false;
      for (const refusal of read.refusals) fault(refusal, { line, column: index + 1, field: column.heading });
    }
  }
  return good ? { line, values } : null;
}

/** Digits with at most one point among them: what most cells hold. */
function isPlain(cell: string): boolean {
  let points = 0;
  for (let i = 0; i < cell.length; i++) {
    const code = cell.charCodeAt(i);
    if (code === 46) points++;
    else if (code < 48 || code > 57) return false;
  }
  return points === 0 || (points === 1 && cell.length > 1 && cell.charCodeAt(0) !== 46 && !cell.endsWith("."));
}

/** Which column each heading means. Currency is read before prices, whatever the order in the file. */
function bindHeadings(
  cells: readonly string[],
  columns: readonly Column[],
  at: Place,
): Read<{ readonly bound: readonly BoundColumn[]; readonly notes: readonly Refusal[] }> {
  const bound: BoundColumn[] = [];
  const notes: Refusal[] = [];
  const faults: Refusal[] = [];
  cells.forEach((cell, index) => {
    const place: Place = { ...at, column: index + 1 };
    if (cell.trim() === "") return;
    const [, name = "", unit] = HEADING.exec(cell.trim()) ?? [];
    const plain = name.trim().toLowerCase().replace(/\s+/g, " ");
    const column = columns.find((c) => c.heading === plain || c.also?.includes(plain));
    if (column === undefined) {
      const near = nearestWord(
        plain,
        columns.map((c) => c.heading),
      );
      const want =
        near === null
          ? "a heading of the catalogue format; this column is passed over"
          : `perhaps "${near}"; this column is passed over`;
      notes.push({ code: "unknown-heading", place, read: JSON.stringify(cell), want });
      return;
    }
    if (bound.some((b) => b.column === column)) {
      faults.push({
        code: "duplicate-heading",
        place,
        read: JSON.stringify(cell),
        want: `"${column.heading}" once only`,
      });
      return;
    }
    const scaled = headingScale(column, unit);
    if (scaled === undefined) {
      const dimension = column.type.kind === "quantity" ? column.type.dimension : "fraction";
      faults.push({
        code: "unknown-unit",
        place,
        read: JSON.stringify(cell),
        want: `a unit of ${dimension} in the brackets`,
      });
      return;
    }
    bound.push({ column, index, slot: columns.indexOf(column), scale: scaled, quick: quickWay(column, scaled) });
  });
  for (const column of columns.filter((c) => c.required)) {
    if (bound.some((b) => b.column === column)) continue;
    const seen = cells.map((c) => c.trim()).filter((c) => c !== "");
    const read = seen.length > 0 ? `headings ${seen.slice(0, 12).join(", ")}` : "no headings";
    faults.push({
      code: "missing-heading",
      place: { ...at, field: column.heading },
      read,
      want: `a heading "${column.heading}"`,
    });
  }
  if (faults.length > 0) return refused(...faults);
  bound.sort((a, b) => columns.indexOf(a.column) - columns.indexOf(b.column));
  return accepted({ bound, notes });
}

function quickWay({ type }: Column, scale: Scale | null): BoundColumn["quick"] {
  if (type.kind !== "quantity" || scale === null || scale.factor !== 1) return null;
  return { suffix: scale.exponent === 0 ? "" : `e${scale.exponent}`, least: type.least, most: type.most };
}

/**
 * Scale of bare numbers below a heading; null when only cells with their own unit are accepted, undefined for a wrong unit.
 * A fraction without a unit is a plain fraction (`derating` 0.85); a tolerance is not, because 20 is written as often as 0.2.
 */
function headingScale(column: Column, unit: string | undefined): Scale | null | undefined {
  const dimension =
    column.type.kind === "quantity" ? column.type.dimension : column.type.kind === "tolerance" ? "fraction" : null;
  if (dimension === null || dimension === "count") return { exponent: 0, factor: 1 };
  if (unit === undefined || unit.trim() === "") {
    return column.type.kind === "quantity" && dimension === "fraction" ? { exponent: 0, factor: 1 } : null;
  }
  return unitScale(unit.trim(), dimension) ?? undefined;
}
