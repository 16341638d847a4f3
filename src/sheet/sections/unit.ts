// The unit capacitor, value by value: what it is, where it comes from, and what a missing one blocks.

import { type Capacitor, stateOf } from "../../catalog/index.ts";
import { type Dimension, formatQuantity } from "../../quantity/index.ts";
import type { SheetInput } from "../input.ts";
import type { Cell, Section, Table } from "../model.ts";

interface ValueRow {
  readonly key: keyof Capacitor;
  readonly label: string;
  readonly show: Dimension | ((unit: Capacitor) => Cell);
  /** What cannot be judged without it; null: nothing. */
  readonly blocks: string | null;
}

const percent = (x: number): string => formatQuantity(x, "fraction", { digits: 4 });

/** A polarity that nobody told is not a polarity. */
const polarity = ({ polarised }: Capacitor): Cell =>
  polarised === undefined ? null : polarised ? "polarised" : "not polarised";

const VALUES: readonly ValueRow[] = [
  { key: "technology", label: "technology", show: (u) => u.technology ?? null, blocks: "cautions by kind of unit" },
  { key: "polarised", label: "polarity", show: polarity, blocks: "whether reverse voltage spoils it" },
  { key: "capacitance", label: "capacitance", show: "capacitance", blocks: null },
  { key: "voltage", label: "rated voltage, dc", show: "voltage", blocks: null },
  {
    key: "tolerance",
    label: "tolerance",
    show: (u) => (u.tolerance === undefined ? null : `-${percent(u.tolerance.low)}, +${percent(u.tolerance.high)}`),
    blocks: "voltage sharing, bleed times, acceptance bands",
  },
  {
    key: "surgeVoltage",
    label: "surge voltage",
    show: "voltage",
    blocks: "whether a fault that passes the rating is borne",
  },
  {
    key: "reverseVoltage",
    label: "reverse voltage at rest",
    show: "voltage",
    blocks: "whether a dump's reverse is borne",
  },
  { key: "derating", label: "derating of its own", show: "fraction", blocks: null },
  {
    key: "leakage",
    label: "leakage current, greatest",
    show: "current",
    blocks: "sharing while holding, unless insulation is known",
  },
  {
    key: "insulation",
    label: "insulation resistance",
    show: "resistance",
    blocks: "sharing while holding, unless leakage is known",
  },
  { key: "esr", label: "ESR", show: "resistance", blocks: "heat in the unit, fault currents, action through a fault" },
  { key: "esl", label: "ESL", show: "inductance", blocks: "fault currents" },
  { key: "peakCurrent", label: "peak current", show: "current", blocks: "whether the shot is borne" },
  { key: "rippleCurrent", label: "ripple current, rms", show: "current", blocks: "the highest rate of shots" },
  { key: "slew", label: "slew", show: "slew", blocks: "whether the shot is borne, film units" },
  { key: "reversal", label: "reversal in a shot", show: "fraction", blocks: "whether the ring is borne" },
  { key: "ratedShots", label: "rated shots", show: "count", blocks: "shots before replacement" },
  {
    key: "ruptureEnergy",
    label: "energy that the case contains",
    show: "energy",
    blocks: "the verdict on a shorted unit, the screen",
  },
  { key: "thermalResistance", label: "thermal resistance, K/W", show: "count", blocks: "temperature at a rate" },
  { key: "diameter", label: "diameter", show: "length", blocks: "bar lengths and the bank's size" },
  { key: "length", label: "length", show: "length", blocks: null },
  { key: "width", label: "width", show: "length", blocks: null },
  { key: "height", label: "height", show: "length", blocks: null },
  { key: "mass", label: "mass", show: "mass", blocks: "the frame" },
];

/** Sizes that a unit of the other shape has not. */
const absent = (unit: Capacitor, key: keyof Capacitor): boolean =>
  (key === "diameter" && unit.width !== undefined) ||
  (["width", "height"].includes(key) && unit[key] === undefined) ||
  (key === "derating" && unit.derating === undefined);

const stateWords = (unit: Capacitor, key: keyof Capacitor): string => {
  const found = stateOf(unit, key);
  if (found.state === "datasheet") return "stated";
  return found.state === "assumed" ? `assumed: ${found.rule}` : found.state;
};

export function unitSection({ unit }: SheetInput): Section {
  const rows = VALUES.filter(({ key }) => !absent(unit, key)).map(({ key, label, show, blocks }): readonly Cell[] => {
    const value = unit[key];
    const shown =
      typeof show === "function"
        ? show(unit)
        : value === undefined
          ? null
          : formatQuantity(value as number, show, { digits: 6 });
    return [label, shown, stateWords(unit, key), shown === null ? (blocks ?? "") : ""];
  });
  const named: readonly (readonly Cell[])[] = [
    ["part", unit.part, "stated", ""],
    ["maker", unit.maker ?? null, stateWords(unit, "maker"), ""],
  ];
  const table: Table = {
    kind: "table",
    id: "unit",
    caption: "One unit, by its catalogue",
    columns: [
      { heading: "value" },
      { heading: "figure", side: "right" },
      { heading: "state" },
      { heading: "blocks while blank" },
    ],
    rows: [
      ...named,
      ...rows,
      ["terminal and its torque", null, "unknown", "the wiring list's torque column"],
      ["case potential", null, "unknown", "mounting and insulation"],
      ["lot and date code", null, "unknown", "traceability of a failed unit"],
      ...(unit.note === undefined ? [] : [["note", unit.note, "stated", ""]]),
    ],
  };
  return { id: "unit", title: "The unit", blocks: [table] };
}
