// A placing as data: the groups, what is proven, the positions, and all that a later reading of the bank needs.

import { PLACING_VERSION } from "./bankSheet.ts";
import { withWords } from "./inputNotes.ts";
import type { Placed } from "./placed.ts";
import { toJson } from "./toJson.ts";

/** Spares listed for each fitted unit. */
const LISTED = 3;

export function placeJson(placed: Placed): string {
  const { input, placing, course, findings, positions, spares, resistors, front, mending, notes } = placed;
  const { request, bank, measured, units, assessed } = input;
  const { ties, series, parallel, groups, charging, holding, floor, digits, moves, rejected } = placing;
  const voltage = bank.voltage;
  return toJson({
    version: PLACING_VERSION,
    ties,
    series,
    parallel,
    groups,
    spares: placing.spares,
    charging: { ...charging, worstVoltage: voltage === null ? null : voltage * charging.worst },
    holding: holding === null ? null : { ...holding, worstVoltage: voltage === null ? null : voltage * holding.worst },
    floor,
    digits,
    goal: request.goal ?? "both",
    seed: request.seed ?? 1,
    moves,
    uncertainty: request.uncertainty ?? null,
    bank,
    worstCase: assessed === null ? null : { charging: assessed.share.charging, holding: assessed.share.holding },
    course,
    rejected,
    resistors:
      resistors?.map((row) => ({
        ...row,
        resistance: Number.isFinite(row.resistance) ? row.resistance : null,
      })) ?? null,
    replacements: Object.fromEntries(
      [...spares].map(([serial, rows]) => [
        serial,
        rows.slice(0, LISTED).map(({ spare, charging: gap, change, holding: held, allowed }) => ({
          spare,
          charging: gap,
          change,
          holding: held,
          allowed,
        })),
      ]),
    ),
    front,
    mending,
    positions,
    units,
    findings,
    notes,
    inputs: { measured: measured.file, faults: measured.faults.map(withWords), notes: measured.notes.map(withWords) },
  });
}
