// The table of the brief's fields: key, words, kind, and what a blank means.
import { type Dimension, formatQuantity } from "../quantity/index.ts";
import type { Brief } from "../search/index.ts";

export interface Field {
  /** Place in the brief; a point goes one level down. */
  readonly key: string;
  readonly label: string;
  /** How the value read is shown again; null for text and choices. */
  readonly dimension: Dimension | null;
  /** What a blank stands for. */
  readonly blank: string;
  /** Fixed answers, gone through with left and right. */
  readonly choices?: readonly string[];
}

export const FIELDS: readonly Field[] = [
  { key: "energy", label: "Energy of one pulse", dimension: "energy", blank: "such as 2.4 kJ" },
  { key: "voltage", label: "Charge voltage", dimension: "voltage", blank: "such as 2.2 kV" },
  { key: "ripple", label: "Allowed fall", dimension: "fraction", blank: "100 % is a full dump" },
  {
    key: "basis",
    label: "Basis",
    dimension: null,
    blank: "worst case",
    choices: ["worst case", "nominal", "statistical"],
  },
  { key: "derating", label: "Derating", dimension: "fraction", blank: "90 % of rated voltage" },
  { key: "overshoot", label: "Charger overshoot", dimension: "fraction", blank: "none" },
  { key: "ageing", label: "Ageing loss", dimension: "fraction", blank: "none" },
  { key: "hold", label: "Hold", dimension: "time", blank: "for ever" },
  { key: "touchSafe", label: "Safe to touch below", dimension: "voltage", blank: "60 V" },
  { key: "load.resistance", label: "Load resistance", dimension: "resistance", blank: "such as 50 mohm" },
  { key: "load.inductance", label: "Load inductance", dimension: "inductance", blank: "such as 20 uH" },
  { key: "load.recorded", label: "Recorded current", dimension: null, blank: "or a CSV file: time, current" },
  { key: "maxSeries", label: "Most in series", dimension: "count", blank: "40" },
  { key: "maxUnits", label: "Most units", dimension: "count", blank: "2000" },
  { key: "spares", label: "Spares", dimension: "count", blank: "none" },
  { key: "maxCost", label: "Most cost", dimension: "count", blank: "no limit" },
  { key: "maxVolume", label: "Most volume", dimension: "volume", blank: "no limit" },
  { key: "maxMass", label: "Most mass", dimension: "mass", blank: "no limit" },
  { key: "currency", label: "Currency", dimension: null, blank: "as the catalogue" },
  { key: "risk", label: "Risk, statistical", dimension: "fraction", blank: "0.01 %" },
  { key: "title", label: "Title", dimension: null, blank: "none" },
];

/** A value of a brief, by its field. */
export const valueIn = (brief: Brief, field: Field): unknown =>
  field.key
    .split(".")
    .reduce<unknown>((node, key) => (node as Readonly<Record<string, unknown>> | undefined)?.[key], brief);

/** A value of the brief as text for the screen. */
export function shownValue(field: Field, value: unknown): string {
  if (typeof value === "string") return value;
  // a recorded current, read from the file that the field names
  if (Array.isArray(value)) return `${value.length} samples`;
  if (typeof value !== "number") return "";
  if (field.key === "hold" && value === Number.POSITIVE_INFINITY) return "for ever";
  return field.dimension === null ? String(value) : formatQuantity(value, field.dimension);
}

export const fieldAt = (index: number): Field => FIELDS[index] ?? (FIELDS[0] as Field);
