// One row of a table to its values: every cell read by its column, every fault placed.

import type { Place, Refusal } from "../quantity/index.ts";
import { readCell } from "./cell.ts";
import type { BoundColumn } from "./headings.ts";

export interface Row {
  readonly line: number;
  /** One value a column, in the order of the columns asked for; undefined where the cell is blank or the column missing. */
  readonly values: readonly unknown[];
}

/** What a row is read by. */
export interface BoundTable {
  readonly bound: readonly BoundColumn[];
  readonly decimalComma: boolean | "never";
  /** How many headings the file has. */
  readonly headings: number;
  /** How many columns were asked for. */
  readonly width: number;
}

/** The row's values, or null when it is lost; every fault is handed over. A row longer than the headings is lost whole. */
export function readRow(
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
