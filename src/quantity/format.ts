// SI numbers to text: engineering prefixes, a chosen count of significant figures, rounding to the safe side for limits.
//
// A number is rounded to its digits before the prefix is chosen (0.99996 A at 4 digits prints 1.000 A); halves go up (rule B).
// Source: [SI-brochure] 5.3.3 and 5.4 (read); [ISO80000-1] Annex B rule B (from memory).

import { DIMENSIONS, type Dimension } from "./dimension.ts";

export type Rounding = "nearest" | "down" | "up";

export interface FormatOptions {
  /** Significant figures, 1 to 15. Default 4. */
  readonly digits?: number;
  /** `down` for a limit that must not be overstated, `up` for one that must not be understated. Default nearest. */
  readonly rounding?: Rounding;
}

const PRINTED: Readonly<Record<number, string>> = {
  [-15]: "f",
  [-12]: "p",
  [-9]: "n",
  [-6]: "µ",
  [-3]: "m",
  0: "",
  3: "k",
  6: "M",
  9: "G",
  12: "T",
};

/** Dimensions printed with a scale of their own: the unit, and its power of ten. */
const OWN_SCALE: Partial<Record<Dimension, readonly (readonly [limit: number, unit: string, factor: number])[]>> = {
  fraction: [[Number.POSITIVE_INFINITY, "%", 0.01]],
  mass: [
    [1, "g", 1e-3],
    [Number.POSITIVE_INFINITY, "kg", 1],
  ],
  volume: [
    [1e-3, "cm3", 1e-6],
    [Number.POSITIVE_INFINITY, "L", 1e-3],
  ],
  slew: [[Number.POSITIVE_INFINITY, "V/us", 1e6]],
  field: [[Number.POSITIVE_INFINITY, "kV/mm", 1e6]],
  area: [[Number.POSITIVE_INFINITY, "cm2", 1e-4]],
  action: [[Number.POSITIVE_INFINITY, "A2s", 1]],
  temperature: [[Number.POSITIVE_INFINITY, "degC", 1]],
  count: [[Number.POSITIVE_INFINITY, "", 1]],
};

/** value times 10^power, by its decimal figures, so that no binary error enters. */
function shifted(value: number, power: number): number {
  const [figure, exponent] = value.toExponential().split("e");
  return Number(`${figure}e${Number(exponent) + power}`);
}

/** Rounds to significant digits. Range: any value; zero stays zero, what is not finite stays itself. */
export function roundTo(value: number, digits: number, rounding: Rounding = "nearest"): number {
  const near = Number(value.toPrecision(digits));
  if (rounding === "nearest" || Math.abs(near - value) <= Math.abs(value) * 1e-12) return near;
  const wrong = rounding === "down" ? near > value : near < value;
  if (!wrong) return near;
  // Counted in the last figure of the value itself: of what it was rounded to, 0.99999 down would lose a figure (0.999).
  const power = Number(value.toExponential(15).split("e")[1]) - (digits - 1);
  const last = Math.round(shifted(near, -power));
  return Number(`${last + (rounding === "down" ? -1 : 1)}e${power}`);
}

/** A number with exactly `digits` significant figures and no exponent, where it has up to seven places before the point. */
function figures(value: number, digits: number): string {
  const before = Math.floor(Math.log10(Math.abs(value))) + 1;
  return value.toFixed(Math.min(Math.max(digits - before, 0), 20));
}

/** An SI value as text with its unit: `4.125 mF`, `25.06 kohm`, `20 %`. Unknown (null or undefined) prints `unknown`. */
export function formatQuantity(
  value: number | null | undefined,
  dimension: Dimension,
  options: FormatOptions = {},
): string {
  const { digits = 4, rounding = "nearest" } = options;
  const known = value ?? Number.NaN;
  if (!Number.isFinite(known)) return known > 0 ? "unlimited" : "unknown";
  const rounded = roundTo(known, digits, rounding);
  for (const [limit, unit, factor] of OWN_SCALE[dimension] ?? []) {
    if (Math.abs(rounded) >= limit) continue;
    const shown = trimZeros(figures(roundTo(known / factor, digits, rounding), digits));
    return unit === "" ? shown : `${shown} ${unit}`;
  }
  if (dimension === "time") return formatTime(known, digits, rounding);
  const { symbol } = DIMENSIONS[dimension];
  if (rounded === 0) return `0 ${symbol}`;
  const power = Math.min(Math.max(Math.floor(Math.floor(Math.log10(Math.abs(rounded)) + 1e-12) / 3) * 3, -15), 12);
  return `${trimZeros(figures(shifted(rounded, -power), digits))} ${PRINTED[power]}${symbol}`;
}

/** Units of time below one day, each up to where the next is easier to read. */
const TIME_STEPS: readonly (readonly [below: number, unit: string, seconds: number])[] = [
  [1e-6, "ns", 1e-9],
  [1e-3, "µs", 1e-6],
  [1, "ms", 1e-3],
  [600, "s", 1],
  [7200, "min", 60],
  [172800, "h", 3600],
];
const DAY = [Number.POSITIVE_INFINITY, "d", 86400] as const;

/** Seconds with prefixes below one second, then s, min, h, d; rounded before the unit is chosen. */
function formatTime(value: number, digits: number, rounding: Rounding): string {
  if (value === 0) return "0 s";
  const inUnits = (seconds: number): number => roundTo(value / seconds, digits, rounding);
  const [, unit, seconds] =
    TIME_STEPS.find(([below, , size]) => Math.abs(inUnits(size)) * size < below * (1 - 1e-12)) ?? DAY;
  return `${trimZeros(figures(inUnits(seconds), digits))} ${unit}`;
}

function trimZeros(text: string): string {
  return text.includes(".") ? text.replace(/\.?0+$/, "") : text;
}

const ASCII: readonly (readonly [RegExp, string])[] = [
  [/[µμ]/g, "u"],
  [/[ΩΩ]/g, "ohm"],
  [/±/g, "+-"],
  [/≤/g, "<="],
  [/≥/g, ">="],
  [/[·×]/g, "x"],
  [/°/g, " deg "],
  [/²/g, "2"],
  [/³/g, "3"],
];

/** The same text in plain ASCII: u for micro, ohm, +-, <=. */
export const toAscii = (text: string): string => ASCII.reduce((t, [from, to]) => t.replace(from, to), text);
