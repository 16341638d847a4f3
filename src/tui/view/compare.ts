// The pinned layouts side by side: what differs, with the best and the worst marked, and what agrees folded away.
import { type ComparedCell, type ComparedRow, compareLayouts } from "../comparison.ts";
import { pinnedLayouts } from "../pick.ts";
import { type Row, rowOf, type Span, span } from "../row.ts";
import type { State } from "../state.ts";
import { fitText, safeText } from "../text.ts";
import type { StyleName } from "../theme.ts";
import { shapeOf } from "../values.ts";
import { textWidth } from "../width.ts";
import { type Page, pageOf, type Room, scrolled } from "./page.ts";
import { emptyRows, paragraph } from "./words.ts";

const STANDING: Readonly<Record<"best" | "worst", { readonly mark: string; readonly style: StyleName }>> = {
  best: { mark: "^", style: "good" },
  worst: { mark: "v", style: "warn" },
};

/** Value, mark, and as much of word and distance as there is room for; line 1 explains the marks where words have none. */
function cellSpan(cell: ComparedCell, width: number): Span {
  const { standing, beyondBest } = cell;
  const value = `  ${safeText(cell.text)}`;
  // The mark stands after the number: before it, it would read as a sign.
  const mark = standing === null ? "" : ` ${STANDING[standing].mark}`;
  const word = standing === null ? "" : ` ${standing}`;
  const percent = beyondBest === null ? "" : ` ${shownDistance(beyondBest)}`;
  const fits = [value + mark + word + percent, value + mark + word, value + mark].find(
    (text) => textWidth(text) <= width,
  );
  return span(fitText(fits ?? value + mark, width), standing === null ? "plain" : STANDING[standing].style);
}

/** "+12 %" from the best. */
function shownDistance(fraction: number): string {
  const percent = Math.abs(fraction * 100);
  return `(${fraction >= 0 ? "+" : "-"}${percent.toFixed(percent < 10 ? 1 : 0)} %)`;
}

const labelWidth = (columns: number, count: number): number => (columns - 20 >= count * 15 ? 20 : 16);

function comparedRow(row: ComparedRow, label: number, width: number): Row {
  return rowOf(span(fitText(row.label, label)), ...row.cells.flatMap((cell) => [span(" "), cellSpan(cell, width)]));
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
  const width = Math.min(44, Math.floor((room.columns - label) / Math.max(1, layouts.length)) - 1);
  const heads = state.pins.map((pin, index) => {
    const here = index === state.column;
    return span(fitText(`${here ? "> " : "  "}${safeText(pin.part)}`, width), here ? "focus" : "strong");
  });
  const shapes = state.pins.map((pin) => span(fitText(`  ${shapeOf(pin)} ${pin.ties}`, width), "quiet"));
  const head: readonly Row[] = [
    rowOf(span(fitText("^ best  v worst", label), "quiet"), ...heads.flatMap((cell) => [span(" "), cell])),
    rowOf(span(" ".repeat(label)), ...shapes.flatMap((cell) => [span(" "), cell])),
  ];
  const all = compareLayouts(layouts);
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
  const body = [...shownRows.map((row) => comparedRow(row, label, width)), ...folded, ...more];
  return scrolled(state, "compare", head, body, room);
}
