// The ranked list of layouts, and beneath it the one under the cursor in sentences.

import type { LayoutResult } from "../../search/index.ts";
import { type Column, columnsFor, headingRow, snug, tableRow, widen } from "../columns.ts";
import { isPinned, listed, planOf, selectedIndex } from "../pick.ts";
import { EMPTY_ROW, type Row, type Span, span } from "../row.ts";
import type { State } from "../state.ts";
import {
  grouped,
  nameOf,
  shapeOf,
  shareOfLimit,
  shown,
  shownCost,
  shownLimit,
  shownSpan,
  shownVerdict,
  shownWorst,
  VERDICT_STYLE,
  worstVerdict,
  worstVoltage,
} from "../values.ts";
import { type Page, pageOf, type Room } from "./page.ts";
import { emptyRows, paragraph } from "./words.ts";

const cells = new WeakMap<LayoutResult, Map<string, Span>>();

/** A cell that follows from its layout alone is worked out once: rows are drawn again at every key. */
function cellOnce(layout: LayoutResult, title: string, text: (layout: LayoutResult) => string): Span {
  const known = cells.get(layout) ?? new Map<string, Span>();
  cells.set(layout, known);
  const found = known.get(title) ?? span(text(layout));
  known.set(title, found);
  return found;
}

/** Every column the list can have; those there is room for are shown. */
export function layoutColumns(state: State): readonly Column<LayoutResult>[] {
  const unbeaten = new Set(planOf(state)?.front ?? []);
  const column = (
    title: string,
    width: number,
    priority: number,
    text: (layout: LayoutResult) => string,
    side: "left" | "right" = "right",
  ): Column<LayoutResult> => ({
    title,
    width,
    priority,
    side,
    cell: (layout) => (title === "" || title === "unbeaten" ? span(text(layout)) : cellOnce(layout, title, text)),
  });
  return [
    column("", 1, 0, (l) => (isPinned(state, l) ? "*" : " "), "left"),
    column("part", 24, 0, (l) => l.part, "left"),
    column("shape", 8, 0, shapeOf, "left"),
    column("ties", 10, 3, (l) => l.ties, "left"),
    column("units", 5, 4, (l) => String(l.units)),
    column("energy", 8, 5, (l) => shownLimit(l.energy.low, "energy")),
    column("cost", 13, 0, shownCost),
    column("worst", 12, 7, (l) => shownWorst(worstVoltage(l), "voltage")),
    column("limit", 7, 8, (l) => shownLimit(l.share.limit, "voltage")),
    column("of limit", 8, 1, (l) => (shareOfLimit(l) === null ? "unknown" : shownWorst(shareOfLimit(l), "fraction"))),
    column("bleeds in", 12, 9, (l) => shownWorst(l.bleed.seconds, "time")),
    column("volume", 8, 10, (l) => shown(l.volume, "volume")),
    column("mass", 8, 11, (l) => shown(l.mass, "mass")),
    column("least C", 8, 12, (l) => shownLimit(l.capacitance.low, "capacitance")),
    column("balancing", 10, 13, (l) => (l.balance === null ? "none" : shown(l.balance.resistance, "resistance"))),
    column("after dump", 12, 14, (l) => shownWorst(l.share.leftAfterDump, "voltage")),
    column("unbeaten", 8, 6, (l) => (unbeaten.has(l.id) ? "yes" : ""), "left"),
    {
      title: "checks",
      width: 10,
      priority: 2,
      side: "left",
      cell: (l) => span(shownVerdict(l), VERDICT_STYLE[worstVerdict(l).verdict]),
    },
  ];
}

const snugColumns = new WeakMap<readonly LayoutResult[], readonly Column<LayoutResult>[]>();

/** The columns at the widths that the whole list needs, so that they stand still while it scrolls; worked out once a plan. */
export function listColumns(state: State, layouts: readonly LayoutResult[]): readonly Column<LayoutResult>[] {
  const widths = snugColumns.get(layouts) ?? snug(layoutColumns(state), layouts);
  snugColumns.set(layouts, widths);
  return layoutColumns(state).map((column, index) => ({ ...column, width: widths[index]?.width ?? column.width }));
}

interface ListTable {
  readonly columns: readonly Column<LayoutResult>[];
  readonly rowOf: (layout: LayoutResult) => Row;
}

const tables = new WeakMap<readonly LayoutResult[], { readonly of: readonly unknown[]; readonly table: ListTable }>();

/** The table of a list, kept while the list, the pins and the width are the same: scrolling then draws no row twice. */
function tableFor(state: State, layouts: readonly LayoutResult[], width: number): ListTable {
  const of = [state.pins, planOf(state)?.front, width];
  const known = tables.get(layouts);
  if (known?.of.every((one, index) => one === of[index])) return known.table;
  const columns = widen(columnsFor(listColumns(state, layouts), width), "part", width, 40);
  const rows = new Map<LayoutResult, Row>();
  const rowOf = (layout: LayoutResult): Row => {
    const row = rows.get(layout) ?? { left: [span("  "), ...tableRow(columns, layout).left] };
    rows.set(layout, row);
    return row;
  };
  const table: ListTable = { columns, rowOf };
  tables.set(layouts, { of, table });
  return table;
}

const sentences = new WeakMap<LayoutResult, readonly string[]>();

/** The layout in a few sentences, the most wanted first. */
export function layoutSentences(layout: LayoutResult): readonly string[] {
  const found = sentences.get(layout) ?? newSentences(layout);
  sentences.set(layout, found);
  return found;
}

function newSentences(layout: LayoutResult): readonly string[] {
  const { share, balance, bleed } = layout;
  const holding = layout.series === 1 ? "" : `, ${shownWorst(share.holding, "voltage")} holding`;
  return [
    `${nameOf(layout)}: ${layout.units} units, ${shownSpan(layout.capacitance, "capacitance")}.`,
    `Worst unit ${shownWorst(share.charging, "voltage")} charging${holding}, of ${shownLimit(share.limit, "voltage")} allowed.`,
    balance === null
      ? "No balancing resistors."
      : `Balancing ${shown(balance.resistance, "resistance")} at ${balance.positions} places, ${balance.elements} in series each${balance.assumed ? " (resistor assumed)" : ""}.`,
    bleed.seconds === null
      ? "Bleeding down by itself: not assessed."
      : `Bleeds below ${shown(bleed.toVoltage, "voltage")} by itself in ${shownWorst(bleed.seconds, "time")}.`,
  ];
}

export function layoutsPage(state: State, room: Room): Page {
  const empty = emptyRows(state, room.columns);
  if (empty.length > 0) return pageOf(empty);
  const layouts = listed(state);
  const plan = planOf(state);
  const { columns, rowOf: rowFor } = tableFor(state, layouts, room.columns - 2);
  const count = grouped(plan?.searched.layouts ?? 0);
  const which = state.frontOnly
    ? `${layouts.length} unbeaten in every respect, of ${count}`
    : `the first ${layouts.length} of ${count}`;
  const selected = selectedIndex(state, layouts);
  const current = layouts[selected];
  const detail: readonly Row[] =
    current === undefined || room.rows < 11
      ? []
      : [EMPTY_ROW, ...layoutSentences(current).flatMap((sentence) => paragraph(sentence, room.columns, "plain"))];
  const kept = detail.slice(0, Math.max(0, Math.floor(room.rows * 0.45)));
  const space = Math.max(1, room.rows - 2 - kept.length);
  // Derived from the cursor each time: a kept offset would hide the cursor when the terminal shrinks.
  const from = Math.max(0, Math.min(layouts.length - space, selected - Math.floor(space / 2)));
  const rows = layouts.slice(from, from + space).map((layout, index): Row => {
    const row = rowFor(layout);
    if (from + index !== selected) return row;
    return { left: [span("> ", "key"), ...row.left.slice(1).map((cell) => ({ ...cell, style: "focus" as const }))] };
  });
  const proof = plan?.searched.proof === "exhaustive" ? "all were tried" : (plan?.searched.proof ?? "");
  return pageOf([
    { left: [span(`Layouts by ${state.rank}: ${which}`, "strong")], right: [span(proof, "quiet")] },
    { left: [span("  "), ...headingRow(columns).left] },
    ...rows,
    ...Array.from({ length: space - rows.length }, () => EMPTY_ROW),
    ...kept,
  ]);
}
