// A resistor family as sold: one construction, a series of preferred values, its limits and price; and the reader of such a catalogue.

import {
  accepted,
  type Read,
  type Refusal,
  SERIES_NAMES,
  type SeriesName,
  seriesBetween,
  type Tolerance,
} from "../quantity/index.ts";
import type { PurchaseTerms } from "./capacitor.ts";
import { above, type Column, fromZero, PURCHASE_COLUMNS, text } from "./column.ts";
import { readTable, record } from "./table.ts";

export interface ResistorFamily extends PurchaseTerms {
  readonly family: string;
  readonly series: SeriesName;
  /** Smallest and largest value made, ohm. */
  readonly lowest: number;
  readonly highest: number;
  /** Fraction q: a resistor lies between R(1 - q) and R(1 + q). */
  readonly tolerance: number;
  /** Rated power of one element at the ambient, W, and the fraction of it that is used. */
  readonly power: number;
  readonly derating: number;
  /** Largest continuous working voltage of one element, V. */
  readonly voltage: number;
  /** Energy one element absorbs in a single pulse, J. */
  readonly pulseEnergy?: number;
  readonly note?: string;
  readonly assumed: boolean;
  /** All values made, ohm, rising. */
  readonly values: readonly number[];
  /** Largest ratio of a value to the one below it; 1 for a single value. */
  readonly step: number;
}

function family(row: Omit<ResistorFamily, "values" | "step">): ResistorFamily {
  const values = seriesBetween(row.series, row.lowest, row.highest);
  const step = values.reduce((most, value, i) => Math.max(most, value / (values[i - 1] ?? value)), 1);
  return { ...row, values, step };
}

/** The family used when no resistor catalogue is given: unpriced and assumed. */
export const DEFAULT_FAMILY: ResistorFamily = family({
  family: "assumed 2 W leaded",
  series: "E24",
  lowest: 1,
  highest: 1e7,
  tolerance: 0.05,
  power: 2,
  derating: 0.5,
  voltage: 350,
  assumed: true,
});

export const RESISTOR_COLUMNS: readonly Column[] = [
  { heading: "family", also: ["part", "resistor"], key: "family", type: text(120), required: true },
  { heading: "series", key: "series", type: { kind: "choice", among: SERIES_NAMES } },
  { heading: "lowest", also: ["min", "minimum", "from"], key: "lowest", type: above("resistance", 1e-6, 1e15) },
  { heading: "highest", also: ["max", "maximum", "to"], key: "highest", type: above("resistance", 1e-6, 1e15) },
  { heading: "tolerance", key: "tolerance", type: { kind: "tolerance" }, required: true },
  { heading: "power", key: "power", type: above("power", 1e-4, 1e6), required: true },
  { heading: "derating", key: "derating", type: above("fraction", 0.01, 1) },
  {
    heading: "voltage",
    also: ["working voltage", "limiting voltage"],
    key: "voltage",
    type: above("voltage", 0.1, 1e7),
    required: true,
  },
  { heading: "pulse energy", key: "pulseEnergy", type: fromZero("energy", 1e9) },
  ...PURCHASE_COLUMNS,
  { heading: "note", also: ["notes"], key: "note", type: text(1000) },
  { heading: "maker", key: "maker", type: text() },
];

export interface ResistorCatalogue {
  readonly families: readonly ResistorFamily[];
  readonly faults: readonly Refusal[];
  readonly notes: readonly Refusal[];
}

/** Reads a resistor catalogue; blank series is E24, blank range 1 ohm to 10 Mohm, blank derating 0.5. */
export function readResistors(source: string, file: string): Read<ResistorCatalogue> {
  const families: ResistorFamily[] = [];
  const faults: Refusal[] = [];
  const table = readTable(source, RESISTOR_COLUMNS, file, (found) => {
    const { line } = found;
    const row = record(RESISTOR_COLUMNS, found) as Partial<ResistorFamily> & { readonly tolerance: never };
    const lowest = row.lowest ?? DEFAULT_FAMILY.lowest;
    const highest = row.highest ?? DEFAULT_FAMILY.highest;
    const tolerance = row.tolerance as Tolerance;
    // Stock of a family does not say of which values: a count of it would promise what nobody knows.
    const { onHand: _hand, available: _available, ...terms } = row;
    const fault = (code: string, read: string, want: string): void => {
      faults.push({ code, place: { file, line }, read, want });
    };
    if (lowest > highest)
      return fault("contradiction", `lowest ${lowest} ohm above highest ${highest} ohm`, "lowest at most highest");
    if (families.some((f) => f.family === row.family))
      return fault("duplicate-part", JSON.stringify(row.family), "a name of its own for each row");
    const made = family({
      ...(terms as ResistorFamily),
      series: row.series ?? DEFAULT_FAMILY.series,
      lowest,
      highest,
      tolerance: Math.max(tolerance.low, tolerance.high),
      derating: row.derating ?? DEFAULT_FAMILY.derating,
      assumed: false,
    });
    if (made.values.length === 0)
      return fault(
        "contradiction",
        `no ${made.series} value from ${lowest} to ${highest} ohm`,
        "a range that holds a preferred value",
      );
    families.push(made);
  });
  if (!table.ok) return table;
  return accepted({ families, faults: [...table.value.faults, ...faults], notes: table.value.notes });
}
