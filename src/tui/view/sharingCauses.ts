// What eats the margin, the largest first, each as a bar, and what a new search with that one value tightened would save.
import type { Dimension } from "../../quantity/index.ts";
import type { Improve, Improvement, LayoutResult } from "../../search/index.ts";
import { type Column, columnsFor, headingRow, snug, tableRow } from "../columns.ts";
import { type Row, span } from "../row.ts";
import { NOT_ASSESSED, shown, shownMoney, UNKNOWN } from "../values.ts";
import { paragraph } from "./words.ts";

const DIMENSIONS: Readonly<Record<string, Dimension>> = { A: "current", ohm: "resistance", "1": "fraction" };
const BAR = 10;

function triedWords({ tightened }: Improvement): string {
  if (tightened === null) return "nothing to try";
  return `to ${shown(tightened.to, DIMENSIONS[tightened.unit] ?? "count")}`;
}

function savesWords({ tightened, saves }: Improvement, currency: string | null): string {
  if (tightened === null) return "";
  if (saves === null) return NOT_ASSESSED;
  const units = saves.units === 0 ? "no units" : `${saves.units} ${Math.abs(saves.units) === 1 ? "unit" : "units"}`;
  if (saves.cost === null || currency === null) return units;
  return `${units}, ${saves.cost === 0 ? "no money" : shownMoney(saves.cost, currency)}`;
}

export interface CausesOf {
  readonly layout: LayoutResult;
  readonly currency: string | null;
  readonly columns: number;
}

export function causeRows(margin: Improve | null, { layout, currency, columns }: CausesOf): readonly Row[] {
  if (margin === null) {
    const why =
      layout.series === 1
        ? "One in series: there is no margin to divide."
        : "Not assessed: the tolerance of the unit is unknown.";
    return paragraph(why, columns, layout.series === 1 ? "plain" : "accent");
  }
  const bar = ({ share }: Improvement): string =>
    "#".repeat(Math.max(0, Math.min(BAR, Math.round((share ?? 0) * BAR))));
  const all: readonly Column<Improvement>[] = [
    { title: "cause", width: 21, side: "left", priority: 0, cell: (one) => span(one.cause) },
    {
      title: "eats",
      width: 8,
      side: "right",
      priority: 0,
      cell: ({ volts }) => span(shown(volts, "voltage"), volts === null ? "accent" : "plain"),
    },
    {
      title: "of margin",
      width: 9,
      side: "right",
      priority: 2,
      cell: ({ share, volts }) =>
        span(share !== null ? shown(share, "fraction") : volts === null ? UNKNOWN : "no margin"),
    },
    { title: "", width: BAR, side: "left", priority: 4, cell: (one) => span(bar(one), "accent") },
    { title: "tried", width: 14, side: "left", priority: 3, cell: (one) => span(triedWords(one)) },
    { title: "saves", width: 24, side: "left", priority: 0, cell: (one) => span(savesWords(one, currency)) },
  ];
  const table = columnsFor(snug(all, margin.causes), columns);
  const { even, rating, free, baseline } = margin;
  const rest =
    free === null ? "what is free is unknown" : `${shown(Math.abs(free), "voltage")} ${free < 0 ? "over" : "free"}`;
  const from = baseline === null ? "nothing, for nothing fits as things are" : `${baseline.units} units as things are`;
  return [
    headingRow(table),
    ...margin.causes.map((one) => tableRow(table, one)),
    ...paragraph(
      `Margin: ${shown(even, "voltage")} even share to ${shown(rating, "voltage")} full rating; ${rest}. Saved against ${from}, same part and ties; below zero is more. Derating is there for life and for what is not known: no advice.`,
      columns,
      "quiet",
    ),
  ];
}
