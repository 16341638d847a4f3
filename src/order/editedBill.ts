// A bill made anew with what its builder wrote in an earlier copy: own lines, prices and choices are kept, all else is reckoned again.
//
// Which cells are the builder's shows in the mark of the row. A file without marks was made before there were any: there the
// builder's are the cells that are filled where the program leaves them open.

import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { Bill, BillChange, BillLine, LineKind } from "./bill.ts";
import { boughtTogether } from "./boughtTogether.ts";
import { toBeChosen } from "./chosenLine.ts";
import { type BillColumn, cellText, isOpen, plainNumber } from "./columns.ts";
import type { CellValue } from "./editedCell.ts";
import type { EditedCell, EditedFile, EditedRow } from "./editedRows.ts";
import { BUILDERS_COLUMNS, isChanged, plainCell } from "./marks.ts";
import { reckoned, repriced } from "./reckon.ts";
import { totalsOf } from "./totals.ts";

export interface Money {
  /** Currency of the sums, and of a price without one; null when nothing of the plan has a price. */
  readonly currency: string | null;
  readonly exchange?: Readonly<Record<string, number>> | undefined;
}

/** Cells from which quantities follow, and from which costs and the state of the line follow. */
const COUNTED: readonly BillColumn["key"][] = ["item", "needed", "onHand", "pack"];
const PRICED: readonly BillColumn["key"][] = ["value", "unitPrice", "currency", "orderCode"];

interface Merged {
  /** Columns in which the builder's cell stands. */
  readonly own: readonly string[];
  readonly line: BillLine;
  readonly changes: readonly BillChange[];
}

const emptied = (column: BillColumn): CellValue => (column.kind === "text" && column.key !== "currency" ? "" : null);

/** What the builder chose or paid: another part, or another thing asked of it, may make it wrong. */
const CHOICE: readonly BillColumn["key"][] = ["item", "value", "unitPrice", "supplier", "orderCode"];
/** What the bank asks of a part. */
const ASKED: readonly BillColumn["key"][] = ["value", "rating"];

interface KeptCell {
  readonly column: BillColumn;
  readonly cell: EditedCell;
  readonly fresh: string;
}

/** Cells of the builder's that differ from what the program writes now. A line always has a name. */
function keptCells(made: BillLine, row: EditedRow): readonly KeptCell[] {
  return BUILDERS_COLUMNS.flatMap((column) => {
    const cell = row.cells.get(column.key);
    const fresh = cellText(made, column);
    if (cell === undefined || isSame(cell, fresh)) return [];
    const named = column.key !== "item" || cell.text !== "";
    return named && isBuilders(row, column, cell, fresh) ? [{ column, cell, fresh }] : [];
  });
}

/** The program's own cells in which the row stands as it was made for another bank. */
const movedCells = (made: BillLine, row: EditedRow, keys: readonly BillColumn["key"][]): readonly KeptCell[] =>
  BUILDERS_COLUMNS.filter(({ key }) => keys.includes(key)).flatMap((column) => {
    const cell = row.cells.get(column.key);
    const fresh = cellText(made, column);
    return cell === undefined || isSame(cell, fresh) || isBuilders(row, column, cell, fresh)
      ? []
      : [{ column, cell, fresh }];
  });

/** The builder's cells over the line as the program makes it. */
function merged(made: BillLine, row: EditedRow, currency: string | null): Merged {
  const told = (kind: BillChange["kind"], { column, cell, fresh }: KeptCell): BillChange => {
    const { item, line } = made;
    return { kind, item, line, at: row.at, heading: column.heading, made: fresh, read: cell.text };
  };
  const kept = keptCells(made, row);
  // A price or a code of one part says nothing of another.
  const other = movedCells(made, row, ["item"]).length > 0;
  const taken = other ? kept.filter(({ column }) => column.key === "note") : kept;
  const cells = Object.fromEntries(taken.map(({ column, cell }) => [column.key, cell.value ?? emptied(column)]));
  const line = { ...made, ...cells, extra: row.extra } as BillLine;
  const own = Object.keys(cells);
  const touches = (keys: readonly string[]): boolean => keys.some((key) => own.includes(key));
  // The currency that the program put beside a price of the builder's is no choice.
  const loud = kept.filter(({ column, cell }) => column.key !== "currency" || cell.value !== currency);
  const chosen = taken.some(({ column }) => CHOICE.includes(column.key));
  return {
    own,
    // A price says nothing of how many: the packs that were reckoned for units and spares together stay.
    line:
      touches(COUNTED) || (touches(PRICED) && line.toBuy === null)
        ? reckoned(line)
        : touches(PRICED)
          ? repriced(line)
          : line,
    changes: [
      ...loud.map((one) => told(taken.includes(one) ? "kept" : "not taken over", one)),
      ...(chosen ? movedCells(made, row, ASKED).map((one) => told("check again", one)) : []),
    ],
  };
}

/** A number as the program writes it, however the spreadsheet wrote it: 6,4 and 6.40 are 6.4. */
const plainText = ({ text, value }: EditedCell): string => (typeof value === "number" ? plainNumber(value) : text);

const isSame = (cell: EditedCell, fresh: string): boolean =>
  [cell.text, plainText(cell)].some((text) => plainCell(text) === plainCell(fresh));

const isCellChanged = (mark: string, key: BillColumn["key"], cell: EditedCell): boolean =>
  isChanged(mark, key, cell.text) && isChanged(mark, key, plainText(cell));

function isBuilders({ mark }: EditedRow, { key }: BillColumn, cell: EditedCell, fresh: string): boolean {
  return mark === "" ? isOpen(fresh) && !isOpen(cell.text) : isCellChanged(mark, key, cell);
}

/** A line that the bank does not take: the builder's own, or one that is no longer counted. */
function lineOf(row: EditedRow, needed?: number): BillLine {
  const bare = toBeChosen({ item: "", line: "own line", needed: null, note: "", value: "", rating: "" });
  const cells = BUILDERS_COLUMNS.flatMap((column) => {
    const value = row.cells.get(column.key)?.value;
    return value === undefined || value === null ? [] : [[column.key, value] as const];
  });
  return { ...bare, ...Object.fromEntries(cells), ...(needed === undefined ? {} : { needed }), extra: row.extra };
}

/** Of a row that the bank no longer takes: whether its builder wrote anything in it. */
const isTouched = (row: EditedRow): boolean =>
  BUILDERS_COLUMNS.some(({ key }) => {
    const cell = row.cells.get(key);
    if (cell === undefined) return false;
    return row.mark === "" ? key === "unitPrice" && !isOpen(cell.text) : isCellChanged(row.mark, key, cell);
  });

/** Joins a fresh bill and an edited copy. Refused: a price whose currency nothing says. */
export function withEdits(bill: Bill, edited: EditedFile, money: Money): Read<Bill> {
  const faults: Refusal[] = [];
  const changes: BillChange[] = [];
  const priced = (line: BillLine, row: EditedRow): BillLine => {
    if (line.currency !== null || (line.unitPrice === null && line.purchase === null)) return line;
    if (money.currency !== null) return repriced({ ...line, currency: money.currency });
    if (line.unitPrice === null) return line;
    const cell = row.cells.get("currency");
    const place = cell === undefined ? row.place : { ...row.place, column: cell.column, field: "currency" };
    faults.push({ code: "missing-value", place, read: "a price without a currency", want: "a currency such as EUR" });
    return line;
  };
  const owned = new Map<LineKind, readonly string[]>();
  const each = bill.lines.map((made) => {
    const row = edited.rows.find(({ line }) => line === made.line);
    if (row === undefined) {
      changes.push({ kind: "put back", item: made.item, line: made.line, at: null, heading: "", made: "", read: "" });
      return made;
    }
    const { line, own, changes: kept } = merged(made, row, money.currency);
    owned.set(made.line, own);
    changes.push(...kept);
    return priced(line, row);
  });
  const lines = boughtTogether(each, owned);
  const own = edited.rows.flatMap((row) => {
    const known = bill.lines.some(({ line }) => line === row.line);
    if (known || (row.line !== "own line" && !isTouched(row))) return [];
    const line = reckoned(lineOf(row, row.line === "own line" ? undefined : 0));
    const kind = row.line === "own line" ? "own line" : "not counted";
    changes.push({ kind, item: line.item, line: row.line, at: row.at, heading: "", made: "", read: "" });
    return [priced(line, row)];
  });
  if (faults.length > 0) return refused(...faults);
  const all = [...lines, ...own];
  const currency = money.currency ?? own.concat(lines).find((line) => line.purchase !== null)?.currency ?? null;
  return accepted({
    ...bill,
    lines: all,
    totals: totalsOf({ lines: all, currency, exchange: money.exchange }),
    ...(edited.extraHeadings.length > 0 ? { extraHeadings: edited.extraHeadings } : {}),
    changes,
  });
}
