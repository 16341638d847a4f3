// What must be said before any diagnosis: a reading over the limit, readings that do not add up, and how to stop safely.
import type { Finding } from "../quantity/index.ts";
import type { MeterModel, ReadingRow } from "./diagnoseEvidence.ts";

/** The order matters: nobody goes near before the voltage is gone from every stage, not only from the ends. Source: [common-practice]. */
export const STOP_ACTIONS: readonly string[] = [
  "Stop charging. Stay away from the bank; take nothing off and connect nothing.",
  "Switch the charger off and lock its supply off.",
  "Discharge from a distance through the dump resistor; if it does not act, wait for the bleed resistors.",
  "Wait the bleed time for one open balancing chain, and keep others away meanwhile.",
  "Prove the meter on a known source, then read the ends and every stage: a stage can keep voltage when the ends are at zero.",
  "Touch each stage that still reads with the resistive stick, then with the solid one; read zero again.",
  "Fit shorting links across every stage before any hand goes in.",
  "Find and mend the fault named here; begin the hot test again from its first step.",
];

/** Readings over the limit, one finding each. `limit`: V that no stage may exceed; null: not known. */
export function limitFindings(rows: readonly ReadingRow[], limit: number | null): Finding[] {
  if (limit === null) return [];
  return rows.flatMap((row) =>
    row.volts.flatMap((v, i): Finding[] => {
      if (v === null || Math.abs(v) <= limit) return [];
      return [
        {
          id: "commission.over-limit",
          state: row.seconds > 0 ? "holding" : "charging",
          verdict: "fail",
          value: Math.abs(v),
          limit,
          margin: (limit - Math.abs(v)) / limit,
          unit: "V",
          source: "common-practice",
          note: `Stage ${i + 1} reads ${Math.abs(v)} V ${row.seconds} s after charging, over its limit: stop.`,
        },
      ];
    }),
  );
}

/** More standard deviations than this apart, readings do not add up. */
const APART = 4;

/** Rows whose stage readings do not add up to the reading across the bank. */
export function sumFindings(rows: readonly ReadingRow[], meter: MeterModel): Finding[] {
  return rows.flatMap((row): Finding[] => {
    if (row.total === undefined || row.volts.some((v) => v === null)) return [];
    const volts = row.volts as readonly number[];
    const sum = volts.reduce((total, v) => total + v, 0);
    const variance = [...volts, row.total].reduce((s, v) => s + (v * meter.relative) ** 2 + meter.absolute ** 2, 0);
    const allowed = APART * Math.sqrt(variance);
    const apart = Math.abs(sum - row.total);
    if (apart <= allowed) return [];
    const sizes = volts.reduce((total, v) => total + Math.abs(v), 0);
    const swapped = Math.abs(sizes - row.total) <= allowed;
    return [
      {
        id: "commission.sum",
        state: row.seconds > 0 ? "holding" : "charging",
        verdict: "warn",
        value: sum,
        limit: row.total,
        margin: null,
        unit: "V",
        source: "methods-derived",
        note: swapped
          ? "The stage readings add up to the bank voltage only without their signs: a lead was swapped."
          : `The stage readings differ from the bank reading by ${apart.toPrecision(2)} V, more than the meter allows: read again.`,
      },
    ];
  });
}
