// The pinned layouts side by side: what differs, with the best and the worst marked, and what agrees folded away.

import type { LayoutResult } from "../../search/index.ts";
import { type ComparedCell, type ComparedRow, foldedRows } from "../comparison.ts";
import { pinnedLayouts } from "../pick.ts";
import type { Arrangement } from "../ports.ts";
import { EMPTY_ROW, type Row, rowOf, type Span, span } from "../row.ts";
import type { State } from "../state.ts";
import { cutText, fitText, safeText } from "../text.ts";
import type { StyleName } from "../theme.ts";
import { tradeSentence } from "../tradeSentence.ts";
import { shapeOf } from "../values.ts";
import { textWidth } from "../width.ts";
import { type Page, pageOf, type Room } from "./page.ts";
import { emptyRows, paragraph } from "./words.ts";

const STANDING: Readonly<Record<"best" | "worst", { readonly mark: string; readonly style: StyleName }>> = {
  best: { mark: "^", style: "good" },
  worst: { mark: "v", style: "warn" },
};

/** A column narrower than this could not hold an amount of money and its mark. */
const LEAST_COLUMN = 14;

/** What a layout is called in the sentences. */
const letterOf = (index: number): string => "ABCD"[index] ?? "?";

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

/** A cell at four levels of words, the richest first: mark, word, difference and percent; without the difference; mark and word; mark alone. */
function cellLevels(cell: ComparedCell, width: number): readonly string[] {
  const { standing, beyondBest, difference } = cell;
  const value = indent(width) + safeText(cell.text);
  // The mark stands after the number: before it, it would read as a sign.
  const mark = standing === null ? "" : ` ${STANDING[standing].mark}`;
  const word = standing === null ? "" : ` ${standing}`;
  const percent = beyondBest === null ? "" : shownDistance(beyondBest);
  const both = [difference ?? "", percent].filter((part) => part !== "").join(", ");
  return [
    value + mark + word + (both === "" ? "" : ` (${both})`),
    value + mark + word + (percent === "" ? "" : ` (${percent})`),
    value + mark + word,
    value + mark,
  ];
}

/** The cells of a row at the richest level for which all have room: the reader compares like with like. */
function cellSpans(row: ComparedRow, width: number): readonly Span[] {
  const levels = row.cells.map((cell) => cellLevels(cell, width));
  const level = [0, 1, 2].find((one) => levels.every((texts) => textWidth(texts[one] ?? "") <= width)) ?? 3;
  return row.cells.map(({ standing }, index) =>
    span(fitText(levels[index]?.[level] ?? "", width), standing === null ? "plain" : STANDING[standing].style),
  );
}

/** "+12 %" from the best. */
function shownDistance(fraction: number): string {
  const percent = Math.abs(fraction * 100);
  return `${fraction >= 0 ? "+" : "-"}${percent.toFixed(percent < 10 ? 1 : 0)} %`;
}

const labelWidth = (columns: number, count: number): number => (columns - 20 >= count * 15 ? 20 : 16);

function comparedRow(row: ComparedRow, label: number, width: number, here: boolean): Row {
  const name = here ? `> ${row.label.trim()}` : row.label;
  return rowOf(
    span(fitText(name, label), here ? "focus" : "plain"),
    ...cellSpans(row, width).flatMap((cell) => [span(" "), cell]),
  );
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
  const names = inSight(state.pins).map(({ part }, index) =>
    splitName(`${letterOf(from + index)} ${safeText(part)}`, width - indent(width).length),
  );
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
  const { shown, folded } = foldedRows(layouts, state.unfolded);
  const at = Math.min(state.scroll.compare ?? 0, Math.max(0, shown.length - 1));
  const seen = (row: ComparedRow): ComparedRow => ({ ...row, cells: inSight(row.cells) });
  const body = shown.map((row, index) => comparedRow(seen(row), label, width, index === at));
  const pairs = pairRows(layouts, room.columns);
  // The one sentence about two is what decides: it stays in sight where there is room.
  const inFoot = layouts.length === 2 && room.rows - head.length - pairs.length >= 8;
  const words = [
    ...(layouts.length > 1 ? [] : paragraph("Pin another layout to set beside this one.", room.columns, "accent")),
    ...(inFoot ? [] : pairs),
    ...foldedRow(folded, room.columns),
  ];
  const foot = [...(inFoot ? pairs : []), ...rowDetail(shown[at], room.columns)];
  return followed({ head, body, at, foot, words, room });
}

/** One row of the table in full, for screens too narrow to say it in the cells. */
function rowDetail(row: ComparedRow | undefined, columns: number): readonly Row[] {
  if (row === undefined || row.cells.length < 2) return [];
  const told = row.cells.map(({ text, standing, difference, beyondBest }, index) => {
    const apart = [difference ?? "", beyondBest === null ? "" : shownDistance(beyondBest)].filter((one) => one !== "");
    return `${letterOf(index)} ${text}${standing === null ? "" : ` ${standing}`}${apart.length === 0 ? "" : ` (${apart.join(", ")})`}`;
  });
  return paragraph(`${row.label.trim()}: ${told.join("; ")}.`, columns, "accent").slice(0, 2);
}

/** A sentence for every two of the layouts. */
const pairRows = (layouts: readonly (LayoutResult | null)[], columns: number): readonly Row[] =>
  layouts.flatMap((a, one) =>
    layouts.flatMap((b, other) =>
      a === null || b === null || other <= one
        ? []
        : paragraph(tradeSentence(a, b, [letterOf(one), letterOf(other)]), columns),
    ),
  );

interface Followed {
  readonly head: readonly Row[];
  readonly body: readonly Row[];
  /** Row of the body that must be seen. */
  readonly at: number;
  /** Kept at the bottom. */
  readonly foot: readonly Row[];
  /** What follows the body; seen as far as there is room, and whole with the cursor at the end. */
  readonly words: readonly Row[];
  readonly room: Room;
}

/** The table about its cursor: with the cursor on the last row the end of the words is seen. */
function followed({ head, body, at, foot, words, room }: Followed): Page {
  const lines = [...body, ...(words.length > 0 && body.length > 0 ? [EMPTY_ROW] : []), ...words];
  const space = Math.max(1, room.rows - head.length - foot.length);
  const extra = Math.max(0, lines.length - space);
  const mostScroll = Math.max(0, body.length - 1 + Math.max(0, lines.length - body.length - space + 1));
  const wanted = Math.max(0, Math.min(extra, at - Math.floor(space / 2)));
  const from = at >= body.length - 1 && at > 0 ? extra : wanted;
  const shownLines = lines.slice(from, from + space);
  const fill = Array.from({ length: Math.max(0, space - shownLines.length) }, () => EMPTY_ROW);
  return {
    rows: [...head, ...shownLines, ...fill, ...foot],
    caret: null,
    mostScroll: Math.min(mostScroll, Math.max(0, body.length - 1)),
  };
}
