// Which unit stands where: serial, place, what it was measured at, and the share that it bears; lines to fill in where none was measured.

import type { Position } from "../../place/index.ts";
import { formatQuantity } from "../../quantity/index.ts";
import { cell, up } from "../cells.ts";
import type { SheetInput } from "../input.ts";
import { type Cell, type Section, type Table, text } from "../model.ts";
import { groupWord, spotsOf, unitName } from "../names.ts";

/** Enough figures that what is printed gives the same voltages again. */
const exact = (value: number): string => formatQuantity(value, "capacitance", { digits: 7 });

/** Spares that are listed and drawn: as many as were asked for, and never more than a page takes beside the bank. */
const MOST_SPARES = 12;
export const sparesShown = ({ brief }: Pick<SheetInput, "brief">): number => Math.max(brief.spares, MOST_SPARES);

export function placedSection(input: SheetInput): Section {
  const { layout, placed, unit } = input;
  const columns = [
    { heading: "unit" },
    { heading: "serial", ...(placed === null ? { written: true as const } : {}) },
    { heading: "capacitance", side: "right" as const },
    { heading: "leakage", side: "right" as const },
    { heading: "ESR", side: "right" as const },
    { heading: "lot" },
    { heading: "share of V", side: "right" as const },
    { heading: "initials", written: true as const },
  ];
  if (placed === null) {
    const table: Table = {
      kind: "table",
      id: "places",
      caption: "As-measured record, to fill in",
      columns,
      rows: spotsOf(layout).map((spot) => [unitName(spot), null, null, null, null, null, null, null]),
    };
    const each = cell(unit.capacitance, "capacitance");
    return {
      id: "places",
      title: "Units in their places",
      ownPage: true,
      blocks: [
        text(
          `The units were not measured for this sheet: nominal is ${each} each. While serials and capacitances are blank no unit can be traced, and every ${groupWord(layout)} must be allowed the whole tolerance. Measure at one temperature with one meter, write the serials here, and let the units be placed from the list.`,
        ),
        table,
      ],
    };
  }
  const table: Table = {
    kind: "table",
    id: "places",
    caption: "As measured, in place",
    columns,
    rows: placed.positions.filter(({ use }) => use === "fitted").map(rowOf),
  };
  const beside = placed.positions.filter(({ use }) => use !== "fitted");
  const spares: Table = {
    ...table,
    id: "spares",
    caption: "Spares, and units set aside",
    rows: beside.slice(0, sparesShown(input)).map(rowOf),
  };
  const more = beside.length - spares.rows.length;
  return {
    id: "places",
    title: "Units in their places",
    ownPage: true,
    blocks: [
      table,
      ...(spares.rows.length > 0 ? [spares] : []),
      ...(more > 0 ? [text(`${more} more measured units are in none of these places; the placing lists them.`)] : []),
    ],
  };
}

const rowOf = (p: Position): readonly Cell[] => [
  p.group === null || p.place === null ? p.use : unitName({ group: p.group, place: p.place }),
  p.serial,
  exact(p.capacitance),
  cell(p.leakage, "current"),
  cell(p.esr, "resistance"),
  p.lot,
  p.share === null ? "" : up(p.share, "fraction"),
  null,
];
