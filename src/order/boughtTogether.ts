// Units and spares of an edited bill: one purchase while they are one part in one pack, and two that say so when they are not.

import type { BillLine, LineKind } from "./bill.ts";
import { WITH_SPARES, WITH_UNITS } from "./partLines.ts";
import { reckoned, repriced } from "./reckon.ts";

const QUANTITIES = ["needed", "onHand", "pack"];

const shortOf = ({ needed, onHand }: BillLine): number | null =>
  needed === null ? null : Math.max(0, needed - (onHand ?? 0));

/** The note without the sentence that no longer holds. */
const without = (line: BillLine, sentence: string): BillLine => ({
  ...line,
  note: line.note.replace(sentence, "").trim(),
});

/** Packs for both, and what is over, with the units; the spares pay for themselves. */
function joint(units: BillLine, spares: BillLine): readonly [BillLine, BillLine] {
  const [short, beside] = [shortOf(units), shortOf(spares)];
  const { pack } = units;
  if (short === null || beside === null || pack === null) return [reckoned(units), reckoned(spares)];
  const packs = Math.ceil((short + beside) / pack - 1e-9);
  const surplus = packs * pack - short - beside;
  return [
    repriced({ ...units, toBuy: short + surplus, packs, surplus }),
    repriced({ ...spares, toBuy: beside, packs: null, surplus: 0 }),
  ];
}

/** `owned`: of each line, the columns that its builder wrote in. A price written for the units is paid for the spares too. */
export function boughtTogether(
  lines: readonly BillLine[],
  owned: ReadonlyMap<LineKind, readonly string[]>,
): readonly BillLine[] {
  const units = lines.find(({ line }) => line === "units");
  const spares = lines.find(({ line }) => line === "spares");
  if (units === undefined || spares === undefined) return lines;
  const [ofUnits, ofSpares] = [owned.get("units") ?? [], owned.get("spares") ?? []];
  const recounted = [...ofUnits, ...ofSpares].some((key) => QUANTITIES.includes(key));
  const follows = ofUnits.includes("unitPrice") && !ofSpares.includes("unitPrice");
  const put = (changed: readonly [BillLine, BillLine]): readonly BillLine[] =>
    lines.map((line) => (line === units ? changed[0] : line === spares ? changed[1] : line));
  if (units.item !== spares.item || units.pack !== spares.pack) {
    return recounted || [...ofUnits, ...ofSpares].includes("item")
      ? put([without(reckoned(units), WITH_SPARES), without(reckoned(spares), WITH_UNITS)])
      : lines;
  }
  const { unitPrice, currency } = units;
  const paid = follows ? repriced({ ...spares, unitPrice, currency }) : spares;
  if (recounted) return put(joint(units, paid));
  return follows ? put([units, paid]) : lines;
}
