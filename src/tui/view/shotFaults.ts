// The fault table of one bank: what one failure does to the sound units, and what stops it.
import type { Fault, FaultId } from "../../pulse/index.ts";
import { type Column, columnsFor, headingRow, snug, tableRow } from "../columns.ts";
import { type Row, span } from "../row.ts";
import { shown, shownWorst, UNKNOWN, VERDICT_STYLE } from "../values.ts";
import { VERDICT_MARK } from "./findings.ts";
import { paragraph } from "./words.ts";

const nameOf = (id: FaultId): string => id.replaceAll("-", " ");
const worst = (value: number | null, dimension: "voltage" | "energy" | "current"): string =>
  value === null ? UNKNOWN : shownWorst(value, dimension);

const COLUMNS: readonly Column<Fault>[] = [
  {
    title: "verdict",
    width: 14,
    side: "left",
    priority: 0,
    cell: ({ verdict }) => span(VERDICT_MARK[verdict], VERDICT_STYLE[verdict]),
  },
  { title: "fault", width: 16, side: "left", priority: 0, cell: ({ id }) => span(nameOf(id)) },
  {
    title: "sound unit",
    width: 10,
    side: "right",
    priority: 0,
    cell: ({ worstVoltageSpread }) => span(worst(worstVoltageSpread, "voltage")),
  },
  {
    title: "after hold",
    width: 10,
    side: "right",
    priority: 0,
    cell: ({ worstHeld }) => span(worst(worstHeld, "voltage")),
  },
  {
    title: "into unit",
    width: 10,
    side: "right",
    priority: 1,
    cell: ({ energyIntoUnit }) => span(worst(energyIntoUnit, "energy")),
  },
  {
    title: "its own",
    width: 10,
    side: "right",
    priority: 2,
    cell: ({ energyOwn }) => span(worst(energyOwn, "energy")),
  },
  {
    title: "both most",
    width: 10,
    side: "right",
    priority: 1,
    cell: ({ energyWorst }) => span(worst(energyWorst, "energy")),
  },
  {
    title: "peak",
    width: 10,
    side: "right",
    priority: 2,
    cell: ({ peakCurrent, peakCurrentWorst }) => span(worst(peakCurrentWorst ?? peakCurrent, "current")),
  },
  {
    title: "peak is",
    width: 12,
    side: "left",
    priority: 3,
    cell: ({ peakCurrent, peakIs }) => span(peakCurrent === null || peakIs === "value" ? "" : peakIs),
  },
];

/** The table, then what stops each fault that does not pass. Figures round up. */
export function faultRows(faults: readonly Fault[], columns: number): readonly Row[] {
  const table = columnsFor(snug(COLUMNS, faults), columns);
  return [
    headingRow(table),
    ...faults.map((fault) => tableRow(table, fault)),
    ...faults.flatMap(({ id, energyIntoIsolating: taken }) =>
      taken === null
        ? []
        : paragraph(
            `- ${nameOf(id)}: isolating resistors take ${shown(taken.faulted, "energy")} in the failed unit's leg and ${shown(taken.others, "energy")} in all the others.`,
            columns,
            "quiet",
          ),
    ),
    ...faults
      .filter(({ verdict }) => verdict !== "pass")
      .flatMap(({ id, stops }) => paragraph(`- ${nameOf(id)}: ${stops}`, columns, "quiet")),
  ];
}
