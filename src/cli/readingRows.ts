// Readings, one a row of the file, to rows of simultaneous readings for each chain of the bank.

import { type Reading, readReadings } from "../catalog/index.ts";
import type { ReadingRow } from "../place/index.ts";
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { BankSheet } from "./bankSheet.ts";
import type { Files } from "./files.ts";
import { tableKind } from "./kind.ts";

export interface ReadRows {
  /** Rows by chain: one when cross-tied, one for each string. */
  readonly chains: readonly (readonly ReadingRow[])[];
  readonly count: number;
  readonly notes: readonly Refusal[];
}

type Sheet = Pick<BankSheet, "ties" | "series" | "parallel" | "groups">;

interface Spot {
  readonly chain: number;
  readonly stage: number | null;
}

/** Where a reading was taken; a refusal when the bank has no such place. */
function spotOf(reading: Reading, sheet: Sheet, file: string): Spot | Refusal {
  const { ties, series, parallel, groups } = sheet;
  const no = (field: string, read: string, want: string): Refusal => ({
    code: "bad-position",
    place: { file, line: reading.line, field },
    read,
    want,
  });
  const strings = ties === "strings";
  if (reading.serial !== undefined) {
    const g = groups.findIndex((group) => group.includes(reading.serial as string));
    if (g < 0) return no("serial", reading.serial, "the serial of a unit of the sheet");
    return strings
      ? { chain: g, stage: (groups[g] as readonly string[]).indexOf(reading.serial) }
      : { chain: 0, stage: g };
  }
  const chains = strings ? parallel : 1;
  const string = strings ? (reading.string ?? (parallel === 1 ? 1 : undefined)) : 1;
  if (string === undefined && reading.stage !== undefined) return no("string", "nothing", `1 to ${parallel}`);
  if (string !== undefined && string > chains) return no("string", String(string), `1 to ${chains}`);
  const { stage } = reading;
  if (stage !== undefined && stage > series) return no("stage", String(stage), `1 to ${series}`);
  if (stage === undefined && reading.voltage !== undefined)
    return no("stage", "nothing", "the stage (or the serial) that the voltage was read on");
  return { chain: (string ?? 1) - 1, stage: stage === undefined ? null : stage - 1 };
}

/** Reads the file. Any row that cannot be read or placed refuses the whole: a reading passed over could be the one that matters. */
export function readRows(path: string | undefined, sheet: Sheet, files: Files): Read<ReadRows> {
  if (path === undefined) {
    const want = "a file of readings: --readings FILE; or a log of the bank: --history FILE";
    return refused({ code: "missing-option", place: { field: "--readings" }, read: "nothing", want });
  }
  const file = path === "-" ? "standard input" : path;
  const text = files.read(path);
  if (!text.ok) return text;
  if (tableKind(text.value) === "json") {
    const want = "readings in CSV, with the headings time [s], charge voltage [V], stage, voltage [V]";
    return refused({ code: "wrong-kind", place: { file }, read: "JSON", want });
  }
  const read = readReadings(text.value, file);
  if (!read.ok) return read;
  const { readings, faults, notes } = read.value;
  const spots = readings.map((reading) => spotOf(reading, sheet, file));
  const lost = spots.flatMap((spot) => ("code" in spot ? [spot] : []));
  if (faults.length + lost.length > 0) return refused(...faults, ...lost);
  const count = sheet.ties === "strings" ? sheet.parallel : 1;
  const tables = Array.from(
    { length: count },
    () => new Map<string, { -readonly [K in keyof ReadingRow]: ReadingRow[K] }>(),
  );
  const twice: Refusal[] = [];
  for (const [k, reading] of readings.entries()) {
    const { chain, stage } = spots[k] as Spot;
    const table = tables[chain] as (typeof tables)[number];
    const key = `${reading.time} ${reading.bank}`;
    const row = table.get(key) ?? {
      seconds: reading.time,
      bank: reading.bank,
      volts: new Array<number | null>(sheet.series).fill(null),
    };
    table.set(key, row);
    if (stage !== null && reading.voltage !== undefined) {
      if (row.volts[stage] !== null) {
        const place = { file, line: reading.line, field: "stage" };
        const want = "one reading of a place at one time and charge voltage";
        twice.push({ code: "contradiction", place, read: `a second reading of ${stage + 1}`, want });
      }
      (row.volts as (number | null)[])[stage] = reading.voltage;
    }
    if (reading.total !== undefined) row.total = reading.total;
    if (reading.current !== undefined) row.current = reading.current;
  }
  if (twice.length > 0) return refused(...twice);
  const chains = tables.map((table) => [...table.values()].sort((a, b) => a.bank - b.bank || a.seconds - b.seconds));
  return accepted({ chains, count: readings.length, notes });
}
