// The trail of what was tried: what changed, the best layout that then came, and what it cost more or less than the one before.
import { type Column, columnsFor, headingRow, snug, tableRow, widen } from "../columns.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { trailIndex } from "../update/trail.ts";
import { grouped, shownMoney, shownWorst } from "../values.ts";
import type { Tried } from "../work.ts";
import { type Page, pageOf, type Room } from "./page.ts";
import { emptyRows, paragraph } from "./words.ts";

interface Line {
  readonly number: number;
  readonly tried: Tried;
  readonly before: Tried | null;
}

const NOTHING = "nothing fits";

/** "+12.30 EUR (+18 %)" against the one before; empty where either has no price. */
export function costStep(tried: Tried, before: Tried | null): string {
  const { cost, currency } = tried;
  if (before === null || cost === null || before.cost === null || currency !== before.currency) return "";
  const step = cost - before.cost;
  if (Math.abs(step) < 1e-9) return "same";
  const sign = step > 0 ? "+" : "-";
  const percent = before.cost > 0 ? ` (${sign}${Math.abs((step / before.cost) * 100).toFixed(1)} %)` : "";
  return `${sign}${shownMoney(Math.abs(step), currency ?? "")}${percent}`;
}

const COLUMNS: readonly Column<Line>[] = [
  { title: "no.", width: 4, priority: 0, side: "right", cell: ({ number }) => span(String(number)) },
  { title: "what was tried", width: 60, priority: 0, side: "left", cell: ({ tried }) => span(tried.words) },
  {
    title: "best cost",
    width: 14,
    priority: 0,
    side: "right",
    cell: ({ tried }) =>
      tried.best === null
        ? span(NOTHING, "warn")
        : span(tried.cost === null ? "no price" : shownMoney(tried.cost, tried.currency ?? "")),
  },
  {
    title: "than before",
    width: 24,
    priority: 1,
    side: "right",
    cell: ({ tried, before }) => span(costStep(tried, before)),
  },
  { title: "best layout", width: 40, priority: 3, side: "left", cell: ({ tried }) => span(tried.best ?? "") },
  {
    title: "units",
    width: 6,
    priority: 4,
    side: "right",
    cell: ({ tried }) => span(tried.units === null ? "" : grouped(tried.units)),
  },
  {
    title: "of limit",
    width: 8,
    priority: 5,
    side: "right",
    cell: ({ tried }) =>
      span(tried.best === null ? "" : tried.load === null ? "unknown" : shownWorst(tried.load, "fraction")),
  },
  {
    title: "chosen bank",
    width: 14,
    priority: 2,
    side: "right",
    cell: ({ tried }) => span(tried.chosenCost === null ? "" : shownMoney(tried.chosenCost, tried.currency ?? "")),
  },
];

export function trailPage(state: State, room: Room): Page {
  const { trail } = state;
  const empty = state.answer?.kind === "planned" ? [] : emptyRows(state, room.columns);
  if (trail.length === 0 && empty.length > 0) return pageOf(empty);
  if (trail.length === 0)
    return pageOf(
      paragraph("Nothing was tried yet: the first brief that can be planned begins the trail.", room.columns),
    );
  const lines = trail.map((tried, index): Line => ({ number: index + 1, tried, before: trail[index - 1] ?? null }));
  const snugged = snug(COLUMNS, lines).map((column) =>
    column.title === "what was tried" ? { ...column, width: Math.min(column.width, 26) } : column,
  );
  const columns = widen(columnsFor(snugged, room.columns - 2), "what was tried", room.columns - 2, 80);
  const at = trailIndex(state);
  const current = lines[at];
  const detail =
    current === undefined
      ? []
      : paragraph(`${current.number}: ${current.tried.words}.`, room.columns, "strong").slice(0, 3);
  const space = Math.max(1, room.rows - 3 - detail.length);
  const from = Math.max(0, Math.min(lines.length - space, at - Math.floor(space / 2)));
  const rows = lines.slice(from, from + space).map((line, index): Row => {
    const row = tableRow(columns, line);
    const here = from + index === at;
    return {
      left: [
        span(here ? "> " : "  ", "key"),
        ...(here ? row.left.map((cell) => ({ ...cell, style: "focus" as const })) : row.left),
      ],
    };
  });
  return pageOf([
    rowOf(span(`Tried so far: ${trail.length}${trail.length === 1 ? " brief" : " briefs"}, the latest last`, "strong")),
    { left: [span("  "), ...headingRow(columns).left] },
    ...rows,
    ...Array.from({ length: space - rows.length }, () => EMPTY_ROW),
    EMPTY_ROW,
    ...detail,
  ]);
}
