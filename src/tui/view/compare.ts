// The pinned layouts side by side: what differs, with the best and the worst marked, and what agrees folded away.
import { type ComparedCell, type ComparedRow, compareLayouts } from "../comparison.ts";
import { pinnedLayouts } from "../pick.ts";
import type { Arrangement } from "../ports.ts";
import { type Row, rowOf, type Span, span } from "../row.ts";
import type { State } from "../state.ts";
import { cutText, fitText, safeText } from "../text.ts";
import type { StyleName } from "../theme.ts";
import { shapeOf } from "../values.ts";
import { textWidth } from "../width.ts";
import { type Page, pageOf, type Room, scrolled } from "./page.ts";
import { emptyRows, paragraph } from "./words.ts";

const STANDING: Readonly<Record<"best" | "worst", { readonly mark: string; readonly style: StyleName }>> = {
  best: { mark: "^", style: "good" },
  worst: { mark: "v", style: "warn" },
};

/** A column narrower than this could not hold an amount of money and its mark. */
const LEAST_COLUMN = 14;

const indent = (width: number): string => (width < 18 ? " " : "  ");

/** A name in at most two lines; what is longer still is cut. */
function splitName(name: string, width: number): readonly string[] {
  const first = cutText(name, width, "");
  const rest = name.slice(first.length);
  return rest === "" ? [name] : [first, cutText(rest, width)];
}

/** The columns in sight: as many as fit, the one under the cursor among them. */
function columnsInSight(
  state: State,
  columns: number,
  label: number,
): { readonly from: number; readonly count: number } {
  const count = Math.max(1, Math.min(state.pins.length, Math.floor((columns - label) / LEAST_COLUMN)));
  return { from: Math.max(0, Math.min(state.pins.length - count, state.column - count + 1)), count };
}

/** A cell at three levels of words, the richest first: mark, word and distance; mark and word; mark alone. */
function cellLevels(cell: ComparedCell, width: number): readonly string[] {
  const { standing, beyondBest } = cell;
  const value = indent(width) + safeText(cell.text);
  // The mark stands after the number: before it, it would read as a sign.
  const mark = standing === null ? "" : ` ${STANDING[standing].mark}`;
  const word = standing === null ? "" : ` ${standing}`;
  const percent = beyondBest === null ? "" : ` ${shownDistance(beyondBest)}`;
  return [value + mark + word + percent, value + mark + word, value + mark];
}

/** The cells of a row at the richest level for which all have room: the reader compares like with like. */
function cellSpans(row: ComparedRow, width: number): readonly Span[] {
  const levels = row.cells.map((cell) => cellLevels(cell, width));
  const level = [0, 1].find((one) => levels.every((texts) => textWidth(texts[one] ?? "") <= width)) ?? 2;
  return row.cells.map(({ standing }, index) =>
    span(fitText(levels[index]?.[level] ?? "", width), standing === null ? "plain" : STANDING[standing].style),
  );
}

/** "+12 %" from the best. */
function shownDistance(fraction: number): string {
  const percent = Math.abs(fraction * 100);
  return `(${fraction >= 0 ? "+" : "-"}${percent.toFixed(percent < 10 ? 1 : 0)} %)`;
}

const labelWidth = (columns: number, count: number): number => (columns - 20 >= count * 15 ? 20 : 16);

function comparedRow(row: ComparedRow, label: number, width: number): Row {
  return rowOf(span(fitText(row.label, label)), ...cellSpans(row, width).flatMap((cell) => [span(" "), cell]));
}

function foldedRow(rows: readonly ComparedRow[], columns: number): readonly Row[] {
  if (rows.length === 0) return [];
  const names = rows.map((row) => `${row.label.trim()} ${row.cells[0]?.text ?? ""}`).join("; ");
  return paragraph(`Same in all: ${names}.`, columns, "quiet");
}

export function comparePage(state: State, room: Room): Page {
  if (state.pins.length === 0) {
    const empty = emptyRows(state, room.columns);
    if (empty.length > 0) return pageOf(empty);
    return pageOf([
      ...paragraph("Nothing is pinned yet.", room.columns, "strong"),
      ...paragraph(
        "Pin two to four layouts with Space on the layouts screen; they then stand here side by side.",
        room.columns,
      ),
    ]);
  }
  if (state.answer?.kind !== "planned") return pageOf(emptyRows(state, room.columns));
  const layouts = pinnedLayouts(state);
  const label = labelWidth(room.columns, layouts.length);
  const { from, count } = columnsInSight(state, room.columns, label);
  const inSight = <T>(list: readonly T[]): readonly T[] => list.slice(from, from + count);
  const width = Math.min(44, Math.floor((room.columns - label) / count) - 1);
  const hidden = layouts.length > count ? `${from + 1}-${from + count} of ${layouts.length}` : "";
  // A name too long for its column goes on in the next row: its end often says more than its beginning.
  const names = inSight(state.pins).map(({ part }) => splitName(safeText(part), width - indent(width).length));
  const nameRows = Math.max(1, ...names.map((lines) => lines.length));
  const heads = Array.from({ length: nameRows }, (_, line) =>
    names.flatMap((lines, index) => {
      const here = from + index === state.column;
      const lead = `${here && line === 0 ? ">" : " "}${indent(width).slice(1)}`;
      return [span(" "), span(fitText(lead + (lines[line] ?? ""), width), here ? "focus" : "strong")];
    }),
  );
  const under = (text: (pin: Arrangement) => string): readonly Span[] =>
    inSight(state.pins).flatMap((pin) => [span(" "), span(fitText(indent(width) + text(pin), width), "quiet")]);
  const head: readonly Row[] = [
    ...heads.map((spans, line) => rowOf(span(fitText(line === 0 ? "^ best  v worst" : "", label), "quiet"), ...spans)),
    rowOf(span(fitText(hidden, label), "accent"), ...under(shapeOf)),
    rowOf(span(" ".repeat(label)), ...under(({ ties }) => ties)),
  ];
  const all = compareLayouts(layouts);
  const seen = (row: ComparedRow): ComparedRow => ({ ...row, cells: inSight(row.cells) });
  const named = new Set(["part", "in series", "in parallel", "ties"]);
  const differing = all.filter((row) => (state.unfolded ? true : !row.agrees && !named.has(row.label)));
  const folded =
    state.unfolded || layouts.length < 2
      ? []
      : foldedRow(
          all.filter((row) => row.agrees),
          room.columns,
        );
  const shownRows = layouts.length < 2 ? all.filter((row) => !named.has(row.label)) : differing;
  const more =
    layouts.length > 1 ? [] : paragraph("Pin another layout to set beside this one.", room.columns, "accent");
  const body = [...shownRows.map((row) => comparedRow(seen(row), label, width)), ...folded, ...more];
  return scrolled(state, "compare", head, body, room);
}
