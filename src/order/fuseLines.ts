// The fuse that was chosen for each unit as a bought line, and the isolating resistors that the brief asks for.

import { formatQuantity } from "../quantity/index.ts";
import type { Brief, FuseChoice, LayoutResult } from "../search/index.ts";
import type { BillLine } from "./bill.ts";
import { toBeChosen } from "./chosenLine.ts";
import { countsOf } from "./counts.ts";
import { pricedLine } from "./partLines.ts";

/** The line of a chosen fuse; none when none was chosen, so that its line stays to be chosen. */
export function fuseLines(layout: LayoutResult, choice: FuseChoice | null): readonly BillLine[] {
  if (choice === null || choice.chosen === null) return [];
  const { row, purchase } = choice.chosen;
  const { fromHand, surplus, packs, cost, unitPrice } = purchase;
  const amperes = row.current === undefined ? "" : `${formatQuantity(row.current, "current")}, `;
  const where = choice.count === layout.units ? "unit" : "string";
  return [
    pricedLine(
      {
        item: row.fuse,
        line: "fuses",
        value: `${amperes}melts at ${formatQuantity(row.melting ?? null, "action")}`,
        rating: `${formatQuantity(row.voltage ?? null, "voltage")} dc, clears at ${formatQuantity(row.clearing ?? null, "action")}`,
        note: `One to each ${where}: lives through the shot, clears on the neighbours' discharge.${row.note ? ` ${row.note}` : ""}`,
      },
      row,
      { needed: choice.count, fromHand, surplus, packs, cost },
      unitPrice,
    ),
  ];
}

/** One resistor in series with each unit, when the brief has them. */
export function isolatingLines(layout: LayoutResult, { isolating }: Brief): readonly BillLine[] {
  if (isolating === undefined) return [];
  return [
    toBeChosen({
      item: "isolating resistor",
      line: "isolating resistors",
      needed: layout.units,
      value: formatQuantity(isolating, "resistance"),
      rating: countsOf(layout).fuses > 0 ? "the neighbours' energy in one fault, whole" : "its part of the shot",
      note: "One in series with each unit; choose by joules and pulse voltage, not watts.",
    }),
  ];
}
