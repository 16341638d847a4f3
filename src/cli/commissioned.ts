// The verdict on a bank that stands charged: each of its chains read against its prediction, joined to one answer.

import {
  chargerOff,
  type Diagnosis,
  diagnose,
  exactCourse,
  type NextMeasurement,
  type ReadingRow,
} from "../place/index.ts";
import { accepted, type Finding, type Read, refused } from "../quantity/index.ts";
import { type BankSheet, readSheet } from "./bankSheet.ts";
import { type CommissionChoices, type CommissionFlags, readCommissionFlags } from "./commissionFlags.ts";
import type { Ports } from "./ports.ts";
import { readRows } from "./readingRows.ts";
import { latestOf, readLog, type Watched, watched } from "./watched.ts";

/** A place of the bank, counted from 1 as on the position list. */
export interface Spot {
  /** Stage, or place in its string. */
  readonly position: number;
  /** Null when cross-tied. */
  readonly string: number | null;
  /** Units that stand there; empty when the sheet does not name them. */
  readonly serials: readonly string[];
}

export interface SpotSuspect extends Spot {
  readonly kind: string;
  readonly likelihood: number;
  readonly size: number;
}

export interface Compared extends Spot {
  readonly seconds: number;
  readonly bank: number;
  readonly read: number;
  readonly predicted: number;
}

export interface Commissioned {
  readonly verdict: Diagnosis["verdict"];
  /** Probability that nothing is wrong, the least of the chains. */
  readonly sound: number;
  readonly suspects: readonly SpotSuspect[];
  readonly unexplained: boolean;
  readonly next: (NextMeasurement & Partial<Spot>) | null;
  readonly goOn: (NonNullable<Diagnosis["goOn"]> & Spot) | null;
  readonly actions: readonly string[];
  readonly findings: readonly Finding[];
  readonly compared: readonly Compared[];
  readonly sheet: BankSheet;
  readonly choices: CommissionChoices;
  readonly notes: readonly string[];
}

const RANK = { agrees: 0, differs: 1, stop: 2 } as const;

/** What was asked of a bank: its readings judged, its log, or both. */
export interface Answered {
  readonly found: Commissioned | null;
  readonly watched: Watched | null;
  readonly sheet: BankSheet;
  readonly choices: CommissionChoices;
}

/** A log by itself needs no readings. */
export function commissionedBank(path: string, flags: CommissionFlags, ports: Ports): Read<Answered> {
  const { choices, faults } = readCommissionFlags(flags);
  const log = flags.history === undefined ? accepted(null) : readLog(flags.history, ports.files);
  const latest = log.ok && log.value !== null ? { latest: latestOf(log.value) } : {};
  const sheet = readSheet(path, { ...choices, ...latest }, ports.files);
  if (faults.length > 0 || !sheet.ok || !log.ok)
    return refused(...faults, ...[sheet, log].flatMap((read) => (read.ok ? [] : read.refusals)));
  const answer = {
    watched: log.value === null ? null : watched(log.value, sheet.value, choices),
    sheet: sheet.value,
    choices,
  };
  if (flags.readings === undefined && log.value !== null) return accepted({ ...answer, found: null });
  const rows = readRows(flags.readings, sheet.value, ports.files);
  if (!rows.ok) return rows;
  const found = commissioned(sheet.value, rows.value.chains, choices);
  return found.ok ? accepted({ ...answer, found: found.value }) : found;
}

/** Diagnoses every chain that was read. */
export function commissioned(
  sheet: BankSheet,
  chains: readonly (readonly ReadingRow[])[],
  choices: CommissionChoices,
): Read<Commissioned> {
  const course = choices.charger === "off" ? chargerOff : exactCourse;
  const spotOf = (chain: number, position: number): Spot =>
    sheet.ties === "strings"
      ? {
          position: position + 1,
          string: chain + 1,
          serials: (sheet.groups[chain] ?? []).slice(position, position + 1),
        }
      : { position: position + 1, string: null, serials: sheet.groups[position] ?? [] };
  const answers: { readonly chain: number; readonly diagnosis: Diagnosis }[] = [];
  const compared: Compared[] = [];
  const readChains = chains.flatMap((rows, chain) => (rows.length > 0 ? [chain] : []));
  // Nothing read at all is the same trouble wherever it is missing.
  for (const chain of readChains.length > 0 ? readChains : [0]) {
    const stages = sheet.chains[chain] ?? [];
    const rows = chains[chain] ?? [];
    const asked = diagnose({
      stages,
      rows,
      meter: { relative: choices.meter, absolute: choices.resolution },
      doubt: sheet.doubt,
      polarised: sheet.polarised,
      course,
      ...(sheet.limit === null ? {} : { limit: sheet.limit }),
      ...(choices.next === null ? {} : { next: choices.next }),
    });
    if (!asked.ok) return asked;
    answers.push({ chain, diagnosis: asked.value });
    for (const row of rows) {
      const [predicted] = course(stages, row.bank, [row.seconds]);
      for (const [i, read] of row.volts.entries()) {
        if (read === null) continue;
        const { seconds, bank } = row;
        compared.push({ ...spotOf(chain, i), seconds, bank, read, predicted: predicted?.volts[i] ?? Number.NaN });
      }
    }
  }
  const worst = answers.reduce((a, b) => (severity(b.diagnosis) > severity(a.diagnosis) ? b : a));
  const { diagnosis } = worst;
  const suspects = answers
    .flatMap(({ chain, diagnosis: one }) =>
      one.suspects.map(({ position, ...suspect }) => ({ ...spotOf(chain, position), ...suspect })),
    )
    .sort((a, b) => b.likelihood - a.likelihood);
  const { goOn } = diagnosis;
  return accepted({
    verdict: diagnosis.verdict,
    sound: Math.min(...answers.map((one) => one.diagnosis.sound)),
    suspects,
    unexplained: answers.some((one) => one.diagnosis.unexplained),
    next: nextOf(diagnosis, (position) => spotOf(worst.chain, position)),
    goOn: goOn === null ? null : { ...goOn, ...spotOf(worst.chain, goOn.position) },
    actions: diagnosis.actions,
    findings: answers.flatMap((one) => one.diagnosis.findings),
    compared,
    sheet,
    choices,
    notes: notesOf(sheet, chains, choices),
  });
}

/** Nobody is sent to a charged bank that has to be stopped. */
function nextOf({ next, verdict }: Diagnosis, spotOf: (position: number) => Spot): Commissioned["next"] {
  if (next === null || (verdict === "stop" && next.action !== "with the bank dead")) return null;
  return "position" in next ? { ...next, ...spotOf(next.position) } : next;
}

const severity = ({ verdict, sound }: Diagnosis): number => RANK[verdict] + (1 - sound) / 2;

function notesOf(sheet: BankSheet, chains: readonly (readonly ReadingRow[])[], choices: CommissionChoices): string[] {
  const notes = [...sheet.notes];
  const unread = chains.flatMap((rows, chain) => (rows.length === 0 ? [chain + 1] : []));
  if (unread.length > 0 && unread.length < chains.length)
    notes.push(`Strings without a reading, not judged: ${unread.join(", ")}.`);
  if (choices.meterAssumed)
    notes.push("The voltmeter is taken as good to 0.5 % and 0.1 V, assumed; --meter and --resolution set it.");
  if (sheet.limit === null)
    notes.push("The limit of a unit is not known, so no reading was held against it; --unit-limit sets it.");
  return notes;
}
