// The axes of the map: what each measures of a layout, and its words.
import type { Brief, LayoutResult } from "../search/index.ts";
import { shown, shownMoney, shownWorst } from "./values.ts";

/** A layout of the front, and its life over that at its ratings; null is unknown, or was not asked for. */
export interface FrontPoint {
  readonly layout: LayoutResult;
  readonly life: number | null;
}

export interface Axis {
  readonly words: string;
  readonly value: (point: FrontPoint, brief: Brief) => number | null;
  readonly text: (value: number, point: FrontPoint) => string;
}

const TABLE = {
  cost: {
    words: "cost",
    value: ({ layout: { cost } }) => (cost === null || cost.unpriced.length > 0 ? null : cost.total),
    text: (value, { layout }) => shownMoney(value, layout.cost?.currency ?? ""),
  },
  volume: { words: "volume", value: ({ layout }) => layout.volume, text: (value) => shown(value, "volume") },
  mass: { words: "mass", value: ({ layout }) => layout.mass, text: (value) => shown(value, "mass") },
  stress: {
    words: "worst of rating",
    value: ({ layout }) => layout.stress,
    text: (value) => shownWorst(value, "fraction"),
  },
  margin: {
    words: "energy margin",
    value: ({ layout: { energy } }, brief) => (energy.low === null ? null : energy.low / brief.energy - 1),
    text: (value) => shown(value, "fraction"),
  },
  bleed: {
    words: "bleed time",
    value: ({ layout }) => layout.bleed.seconds,
    text: (value) => shownWorst(value, "time"),
  },
  life: { words: "life over rated", value: ({ life }) => life, text: (value) => `${Number(value.toPrecision(3))}` },
} satisfies Readonly<Record<string, Axis>>;

export type AxisName = keyof typeof TABLE;
export const AXES: Readonly<Record<AxisName, Axis>> = TABLE;
export const AXIS_NAMES = Object.keys(TABLE) as readonly AxisName[];

/** What the map shows. */
export interface MapView {
  readonly x: AxisName;
  readonly y: AxisName;
  /** Series against parallel counts as a table in place of the scatter. */
  readonly table: boolean;
}

export const FIRST_MAP: MapView = { x: "cost", y: "volume", table: false };
