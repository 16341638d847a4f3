// The figures of a shot at their low, nominal and high, and what the worst unit bears.
import type { PlaceShares } from "../../pulse/index.ts";
import type { Dimension } from "../../quantity/index.ts";
import type { ShotReport } from "../../search/index.ts";
import { type Column, columnsFor, headingRow, snug, tableRow } from "../columns.ts";
import { type Row, span } from "../row.ts";
import { shown, UNKNOWN } from "../values.ts";
import { hangingRows } from "./sharingCorners.ts";
import { paragraph } from "./words.ts";

/** A part of one; one too small for a percentage as a power of ten. */
export const portion = (part: number | null): string =>
  part !== null && part !== 0 && Math.abs(part) < 1e-4 ? part.toExponential(2) : shown(part, "fraction");

interface Figure {
  readonly name: string;
  readonly texts: readonly [string, string, string];
  readonly is: string;
}

function figuresOf({ envelope, discharge: { bounds } }: ShotReport): readonly Figure[] {
  const figure = (
    name: string,
    key: "peakCurrent" | "peakTime" | "reversal" | "action",
    dimension: Dimension,
    is: string,
  ): Figure => {
    const text = (value: number | null): string =>
      value === null ? "no bound" : dimension === "fraction" ? portion(value) : shown(value, dimension);
    const { low, nominal, high } = envelope[key];
    return { name, texts: [text(low), text(nominal), text(high)], is: is === "value" ? "" : is };
  };
  return [
    figure("peak current", "peakCurrent", "current", bounds.peakCurrent),
    figure("at", "peakTime", "time", "value"),
    figure("reversal", "reversal", "fraction", bounds.reversal),
    figure("action", "action", "action", bounds.action),
  ];
}

/** zeta in words, or why there is none. */
function dampingWords({ discharge }: ShotReport): string {
  const { damping, lampAlpha, bounds, method } = discharge;
  if (lampAlpha !== null) return `alpha ${shown(lampAlpha, "count")}; a lamp has no damping ratio`;
  if (damping === null) return method === "samples" ? "none: the current is given" : "none: no inductance is known";
  const kind = damping === 0 ? "lossless" : damping < 1 ? "rings" : damping === 1 ? "critical" : "does not ring";
  return `${shown(damping, "count")}, ${kind}${bounds.damping === "value" ? "" : ` (${bounds.damping})`}`;
}

export function figureRows(report: ShotReport, columns: number): readonly Row[] {
  const { envelope, bank, bus, voltage } = report;
  const figures = figuresOf(report);
  const column = (title: string, index: 0 | 1 | 2): Column<Figure> => ({
    title,
    width: 14,
    side: "right",
    priority: 0,
    cell: ({ texts }) => span(texts[index]),
  });
  const all: readonly Column<Figure>[] = [
    { title: "figure", width: 12, side: "left", priority: 0, cell: ({ name }) => span(name) },
    column("low", 0),
    column("nominal", 1),
    column("high", 2),
    { title: "", width: 12, side: "left", priority: 1, cell: ({ is }) => span(is, "warn") },
  ];
  const table = columnsFor(snug(all, figures), columns);
  const known = (value: number | null, dimension: Dimension): string => shown(value, dimension, UNKNOWN);
  const path = bus.path;
  const proven = envelope.proven
    ? "Low and high are the extremes over every corner of the spreads."
    : "Low and high are those of the corners; with a lamp, a clamp or a switch's drop that is no proof of the extremes.";
  return [
    headingRow(table),
    ...figures.map((figure) => tableRow(table, figure)),
    ...paragraph(proven, columns, "quiet"),
    ...hangingRows(
      "charged to",
      `${shown(voltage, "voltage")}, ${shown(bank.capacitance, "capacitance")} nominal`,
      columns,
    ),
    ...hangingRows("bank's own", `ESR ${known(bank.esr, "resistance")}, ESL ${known(bank.esl, "inductance")}`, columns),
    ...hangingRows(
      "bus",
      path === null
        ? UNKNOWN
        : bus.note !== null
          ? "counted in the load"
          : `${shown(path.resistance, "resistance")}, ${shown(path.inductance, "inductance")}`,
      columns,
    ),
    ...hangingRows("damping", dampingWords(report), columns),
  ];
}

function placeRows({ alike, segment }: PlaceShares, columns: number): readonly Row[] {
  const [low, high] = [Math.min(...alike), Math.max(...alike)];
  const at = (share: number): string =>
    `${shown(share * alike.length, "count")} at position ${alike.indexOf(share) + 1}`;
  const step = `${shown(segment.resistance, "resistance")} and ${shown(segment.inductance, "inductance")}`;
  const words = `alike units carry ${at(low)} to ${at(high)} of an even part; ${step} lie between`;
  return hangingRows("along the bus", words, columns);
}

export function unitRows({ discharge: { unit }, bank }: ShotReport, columns: number): readonly Row[] {
  const even = bank.parallel === 1 ? "" : `, ${shown(unit.evenCurrent, "current")} if all were alike`;
  return [
    ...hangingRows("peak current", `${shown(unit.peakCurrent, "current")}${even}. ${unit.why}`, columns),
    ...(unit.place === null ? [] : placeRows(unit.place, columns)),
    ...hangingRows("slew", shown(unit.slew, "slew"), columns),
    ...hangingRows("action", unit.action === null ? "no bound" : shown(unit.action, "action"), columns),
    ...hangingRows(
      "heat",
      unit.heat === null ? "unknown: its ESR is not known" : `${shown(unit.heat, "energy")} a shot`,
      columns,
    ),
  ];
}
