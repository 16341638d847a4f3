// One shot in words: its figures with their spread, where the energy goes, and what the worst unit bears.

import { visible } from "../order/index.ts";
import type { Bound, DischargeEnergy, UnitDuty } from "../pulse/index.ts";
import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { ShotReport } from "../search/index.ts";
import { hanging } from "./layoutText.ts";
import { textTable } from "./table.ts";
import { pad } from "./wrap.ts";

const show = (x: number | null, dimension: Dimension): string => formatQuantity(x, dimension, { digits: 4 });

/** A part of one that may be very small. */
const portion = (x: number | null): string =>
  x !== null && x !== 0 && Math.abs(x) < 1e-4 ? x.toExponential(2) : show(x, "fraction");

interface FigureRow {
  readonly name: string;
  readonly low: string;
  readonly nominal: string;
  readonly high: string;
  readonly is: string;
}

/** Peak, its time, reversal and action, each at its lowest, nominal and highest. */
function figuresTable({ envelope, discharge }: ShotReport, width: number): string {
  const { bounds } = discharge;
  const row = (
    name: string,
    figure: "peakCurrent" | "peakTime" | "reversal" | "action",
    dimension: Dimension,
    bound: Bound,
  ): FigureRow => {
    const ends = envelope[figure];
    const text = (x: number | null): string =>
      x === null ? "no bound" : dimension === "fraction" ? portion(x) : show(x, dimension);
    return {
      name,
      low: text(ends.low),
      nominal: text(ends.nominal),
      high: text(ends.high),
      is: bound === "value" ? "" : bound,
    };
  };
  const rows = [
    row("peak current", "peakCurrent", "current", bounds.peakCurrent),
    row("at", "peakTime", "time", "value"),
    row("reversal", "reversal", "fraction", bounds.reversal),
    row("action", "action", "action", bounds.action),
  ];
  return textTable<FigureRow>(
    [
      { heading: "figure", cell: (one) => one.name },
      { heading: "low", cell: (one) => one.low, side: "right" },
      { heading: "nominal", cell: (one) => one.nominal, side: "right" },
      { heading: "high", cell: (one) => one.high, side: "right" },
      { heading: "", cell: (one) => one.is, rank: 1 },
    ],
    rows,
    width,
    "  ",
  );
}

/** zeta in words, or why there is none. */
function dampingWords({ discharge }: ShotReport): string {
  const { damping, lampAlpha, bounds } = discharge;
  if (lampAlpha !== null) return `alpha ${show(lampAlpha, "count")} (a lamp has no damping ratio)`;
  if (damping === null) return discharge.method === "samples" ? "the current is given" : "no inductance, so none";
  const kind = damping === 0 ? "lossless" : damping < 1 ? "rings" : damping === 1 ? "critical" : "does not ring";
  return `${show(damping, "count")}, ${kind}${bounds.damping === "value" ? "" : ` (${bounds.damping})`}`;
}

const WHERE: readonly (readonly [string, keyof DischargeEnergy])[] = [
  ["load", "load"],
  ["bank", "bank"],
  ["isolating", "isolating"],
  ["bus", "bus"],
  ["switch", "switch"],
  ["clamp", "clamp"],
  ["left", "left"],
];

/** Widest bar of the energy balance. */
const BAR = 24;

/** Where the joules go, each with its part as a bar; what is unknown says so, and what is nothing is left out. */
function energyText({ discharge: { energy, bounds } }: ShotReport): string {
  const lines = WHERE.flatMap(([name, key]) => {
    const value = energy[key];
    if (value === 0 && key !== "load" && key !== "left") return [];
    if (value === null) return [`  ${pad(name, 10)} unknown: its resistance is not known`];
    const part = energy.stored === 0 ? 0 : value / energy.stored;
    const bar = "#".repeat(Math.max(0, Math.min(BAR, Math.round(part * BAR))));
    // heat that an unknown bus would take is counted in the bank's, so its figure errs high
    const known =
      key === "load" && value > 0 ? bounds.loadEnergy : key === "bank" && energy.bus === null ? "upper bound" : "value";
    const bound = known === "value" ? "" : ` (${known})`;
    const joules = pad(show(value, "energy"), 10, "right");
    return [`  ${pad(name, 10)} ${joules} ${pad(portion(part), 8, "right")}  ${bar}${bound}`.trimEnd()];
  });
  return [`Where the ${show(energy.stored, "energy")} go`, ...lines].join("\n");
}

/** How the peak divides along the bus, all units alike; none where the place is not told. */
export function placeLines(place: UnitDuty["place"], width: number): readonly string[] {
  if (place === null) return [];
  const { alike, segment } = place;
  const [low, high] = [Math.min(...alike), Math.max(...alike)];
  const at = (share: number): string =>
    `${show(share * alike.length, "count")} at position ${alike.indexOf(share) + 1}`;
  const step = `${show(segment.resistance, "resistance")} and ${show(segment.inductance, "inductance")}`;
  return [
    hanging("along the bus", `alike units carry ${at(low)} to ${at(high)} of an even part; ${step} lie between`, width),
  ];
}

function unitText({ discharge: { unit }, bank }: ShotReport, width: number): string {
  const each = bank.parallel === 1 ? "" : `, ${show(unit.evenCurrent, "current")} if all were alike`;
  return [
    "Worst unit, nominal bank",
    hanging("peak current", `${show(unit.peakCurrent, "current")}${each}. ${visible(unit.why)}`, width),
    ...placeLines(unit.place, width),
    hanging("slew", show(unit.slew, "slew"), width),
    hanging("action", unit.action === null ? "no bound" : show(unit.action, "action"), width),
    hanging(
      "heat",
      unit.heat === null ? "unknown: its ESR is not known" : `${show(unit.heat, "energy")} a shot`,
      width,
    ),
  ].join("\n");
}

/** The blocks on the shot itself. */
export function shotBlocks(report: ShotReport, width: number): readonly string[] {
  const { bank, bus, voltage } = report;
  const known = (x: number | null, dimension: Dimension): string => (x === null ? "unknown" : show(x, dimension));
  const path = bus.path;
  const at = bus.frequency === null ? "" : ` at ${show(bus.frequency, "frequency")}`;
  const head = [
    "The shot",
    hanging("charged to", `${show(voltage, "voltage")}, ${show(bank.capacitance, "capacitance")} nominal`, width),
    hanging("bank's own", `ESR ${known(bank.esr, "resistance")}, ESL ${known(bank.esl, "inductance")}`, width),
    hanging(
      "bus",
      path === null ? "unknown" : `${show(path.resistance, "resistance")}, ${show(path.inductance, "inductance")}${at}`,
      width,
    ),
    hanging("damping", dampingWords(report), width),
  ];
  return [`${head.join("\n")}\n${figuresTable(report, width)}`, energyText(report), unitText(report, width)];
}
