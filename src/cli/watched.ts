// A built bank over time: its log read, every unit's drift from its first reading, and what the bank stands at now.

import { type HistoryRow, type MeasuredUnit, readHistory } from "../catalog/index.ts";
import { type DriftKind, type LotDrift, lotDrift, type Remeasured, type UnitReadings } from "../place/index.ts";
import { accepted, type Finding, type Read, refused } from "../quantity/index.ts";
import type { BankSheet } from "./bankSheet.ts";
import type { CommissionChoices } from "./commissionFlags.ts";
import type { Files } from "./files.ts";
import { watchedFindings } from "./watchedFindings.ts";

export interface Watched extends LotDrift {
  /** Shots fired in all; null when the log does not say. */
  readonly shots: number | null;
  /** Whole days since 1970 of the first and the last row. */
  readonly from: number;
  readonly to: number;
  readonly findings: readonly Finding[];
  readonly notes: readonly string[];
}

/** Of one reading where its row does not say, relative. Common practice, no source. */
const ASSUMED: Readonly<Record<DriftKind, number>> = { capacitance: 0.003, esr: 0.05, leakage: 0.1 };
const DOUBTS = { capacitance: "uncertainty", esr: "esrUncertainty", leakage: "leakageUncertainty" } as const;
const KINDS: readonly DriftKind[] = ["capacitance", "esr", "leakage"];

/** Reads the log. A row that cannot be read refuses the whole: the unit passed over could be the one that is due. */
export function readLog(path: string, files: Files): Read<readonly HistoryRow[]> {
  const file = path === "-" ? "standard input" : path;
  const text = files.read(path);
  if (!text.ok) return text;
  const read = readHistory(text.value, file);
  if (!read.ok) return read;
  const { rows, faults, notes } = read.value;
  if (faults.length > 0) return refused(...faults);
  if (rows.length === 0)
    return refused(...notes, { code: "no-rows", place: { file }, read: "no rows", want: "a dated row or more" });
  return accepted(rows);
}

/** The newest value of each kind of each unit. */
export function latestOf(rows: readonly HistoryRow[]): ReadonlyMap<string, Partial<MeasuredUnit>> {
  const latest = new Map<string, Partial<MeasuredUnit>>();
  for (const row of rows) {
    if (row.serial === undefined) continue;
    const now = Object.fromEntries(KINDS.flatMap((kind) => (row[kind] === undefined ? [] : [[kind, row[kind]]])));
    latest.set(row.serial, { ...latest.get(row.serial), ...now });
  }
  return latest;
}

/** All readings of one unit: the sheet's first, before any shot, unless the log repeats it. */
function readingsOf(serial: string, rows: readonly HistoryRow[], sheet: BankSheet): UnitReadings {
  const logged = rows.some(({ shots }) => shots !== undefined);
  const first = sheet.units.find((unit) => unit.serial === serial);
  const of = (kind: DriftKind): readonly Remeasured[] => {
    const later = rows.flatMap((row): Remeasured[] => {
      const value = row[kind];
      if (row.serial !== serial || value === undefined) return [];
      const { day, shots } = row;
      const uncertainty = row[DOUBTS[kind]] ?? (kind === "capacitance" ? sheet.uncertainty : ASSUMED[kind]);
      return [{ value, uncertainty, day, ...(shots === undefined ? {} : { shots }) }];
    });
    const value = first?.[kind];
    if (value === undefined || value === null || later[0]?.value === value) return later;
    const uncertainty = kind === "capacitance" ? (first?.uncertainty ?? sheet.uncertainty) : ASSUMED[kind];
    return [{ value, uncertainty, ...(logged ? { shots: 0 } : {}) }, ...later];
  };
  return { serial, readings: { capacitance: of("capacitance"), esr: of("esr"), leakage: of("leakage") } };
}

/** Drift of every unit of the log, and the charging stress of the bank as last measured. `sheet` has the newest values in its chains. */
export function watched(rows: readonly HistoryRow[], sheet: BankSheet, choices: CommissionChoices): Watched {
  const serials = [...new Set(rows.flatMap(({ serial }) => serial ?? []))];
  const lot = lotDrift(
    serials.map((serial) => readingsOf(serial, rows, sheet)),
    choices.life,
  );
  const fitted = sheet.groups.flat();
  const unread = fitted.filter((serial) => !serials.includes(serial));
  return {
    ...lot,
    shots: rows.at(-1)?.shots ?? null,
    from: rows[0]?.day ?? 0,
    to: rows.at(-1)?.day ?? 0,
    findings: watchedFindings(lot, sheet, choices.life),
    notes: notesOf(lot, { rows, sheet, serials, unread }),
  };
}

interface Seen {
  readonly rows: readonly HistoryRow[];
  readonly sheet: BankSheet;
  readonly serials: readonly string[];
  readonly unread: readonly string[];
}

/** A lot that moves as one by more than this is told of. Common practice, no source. */
const COMMON = 0.002;

function notesOf({ median }: LotDrift, { rows, sheet, serials, unread }: Seen): readonly string[] {
  const notes: string[] = [];
  const measured = rows.filter(({ serial }) => serial !== undefined);
  const plain = measured.some((row) =>
    KINDS.some((kind) => row[kind] !== undefined && row[DOUBTS[kind]] === undefined),
  );
  if (plain)
    notes.push(
      `Where a row gives no uncertainty, ${sheet.uncertainty * 100} % of a capacitance, 5 % of an ESR and 10 % of a leakage are assumed.`,
    );
  if (Math.abs(median.capacitance ?? 0) > COMMON)
    notes.push(
      `Half of the units moved by ${(100 * (median.capacitance ?? 0)).toFixed(1)} % in capacitance or further: if all moved together, look at the meter and the temperature before the units.`,
    );
  const strangers = serials.filter((serial) => sheet.units.length > 0 && !sheet.units.some((u) => u.serial === serial));
  if (strangers.length > 0) notes.push(`Not among the units of the sheet: ${strangers.slice(0, 6).join(", ")}.`);
  if (unread.length > 0 && serials.length > 0)
    notes.push(
      `${unread.length} fitted ${unread.length === 1 ? "unit was" : "units were"} not measured again, and ${unread.length === 1 ? "is" : "are"} not judged.`,
    );
  if (rows.every(({ shots }) => shots === undefined))
    notes.push("The log counts no shots, so drift is told by date alone; a column `shots` or `fired` adds them.");
  return notes;
}
