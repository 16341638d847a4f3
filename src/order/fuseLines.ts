// The fuse that was chosen for each unit as a bought line, and what else the brief asks for between units.

import { formatQuantity, minorDigits } from "../quantity/index.ts";
import { type Brief, type FuseChoice, type LayoutResult, sectionCount } from "../search/index.ts";
import type { BillLine } from "./bill.ts";
import { toBeChosen, type Wish } from "./chosenLine.ts";
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

/** A line priced by the builder: so many pieces at so much each; without a price it stays to be chosen. */
function ownLine(
  wish: Wish & { readonly needed: number },
  price: number | undefined,
  currency: string | null,
): BillLine {
  const line = toBeChosen(wish);
  if (price === undefined || currency === null) return line;
  const sum = Number((price * wish.needed).toFixed(minorDigits(currency)));
  return { ...line, onHand: 0, surplus: 0, unitPrice: price, consumed: sum, purchase: sum, currency, state: "priced" };
}

/** Isolating resistors and section inductances, when the brief has them, at the price it gives. */
export function isolatingLines(layout: LayoutResult, brief: Brief, currency: string | null): readonly BillLine[] {
  const { isolating, isolatingPrice, section } = brief;
  const lines: BillLine[] = [];
  if (isolating !== undefined) {
    const wish = {
      item: "isolating resistor",
      line: "isolating resistors",
      needed: layout.units,
      value: formatQuantity(isolating, "resistance"),
      rating: countsOf(layout).fuses > 0 ? "the neighbours' energy in one fault, whole" : "its part of the shot",
      note: "One in series with each unit; choose by joules and pulse voltage, not watts.",
    } as const;
    lines.push(ownLine(wish, isolatingPrice, currency));
  }
  if (section !== undefined) {
    const needed = sectionCount(layout);
    const wish = {
      item: "section inductance",
      line: "section inductances",
      needed,
      value: formatQuantity(section.inductance, "inductance"),
      rating: "the fault's peak current without saturating, and the shot's action",
      note: `One in series with each ${needed === layout.units ? "unit" : "string"}; it holds the fault's current down, not its joules.`,
    } as const;
    lines.push(ownLine(wish, section.price, currency));
  }
  return lines;
}
