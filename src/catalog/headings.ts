// Which column each heading of a table means, and the unit that stands in its brackets.

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
import type { Column } from "./column.ts";

/** A column found in the file's headings. */
export interface BoundColumn {
  readonly column: Column;
  /** Position in the file, and among the columns asked for. */
  readonly index: number;
  readonly slot: number;
  readonly scale: Scale | null;
  /** For the quick way through plain numbers: `e-6` behind them, and the range; null where there is no quick way. */
  readonly quick: { readonly suffix: string; readonly least: number; readonly most: number } | null;
}

const HEADING = /^([^[\]]*?)\s*(?:\[([^[\]]*)\])?$/;
/** Which column each heading means. Currency is read before prices, whatever the order in the file. */
export function bindHeadings(
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
