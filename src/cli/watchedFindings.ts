// What a log amounts to as findings: the unit nearest its end of life, and the charging stress after drift.

import { type DriftKind, exactCourse, type LifeLimits, type LotDrift } from "../place/index.ts";
import { type Finding, withinMost } from "../quantity/index.ts";
import type { BankSheet } from "./bankSheet.ts";

const KINDS: readonly DriftKind[] = ["capacitance", "esr", "leakage"];
/** Units named in one note. */
const NAMED = 6;

const FOUND = {
  capacitance: "history.capacitance-lost",
  esr: "history.esr-grown",
  leakage: "history.leakage",
} as const;

/** One finding a kind, about the unit nearest its end of life; then the stress of the bank as it is now. */
export function watchedFindings({ units }: LotDrift, sheet: BankSheet, life: LifeLimits): readonly Finding[] {
  const worst = KINDS.flatMap((kind): Finding[] => {
    // The list is worst first.
    const one = units.find((unit) => unit.kind === kind && unit.readings > 1);
    if (one === undefined) return [];
    const limit = life[kind] ?? null;
    const value = kind === "leakage" ? one.last : kind === "esr" ? one.change : -one.change;
    const named = (verdict: Finding["verdict"]): string => {
      const all = units.filter((unit) => unit.kind === kind && unit.verdict === verdict).map(({ serial }) => serial);
      return `${all.slice(0, NAMED).join(", ")}${all.length > NAMED ? ` and ${all.length - NAMED} more` : ""}`;
    };
    const close = named("warn") === "" ? "" : ` Within the meter's doubt of it: ${named("warn")}.`;
    const note = {
      pass: `No unit is due; ${one.serial} is nearest.`,
      warn: `No unit is over its end of life.${close} Measure these with a better meter.`,
      fail: `Due: ${named("fail")}. Take out what is over its end of life before the next shot.${close}`,
      "not assessed": `No end of life was given, so no unit is judged; ${one.serial} has changed most for the worse.`,
    }[one.verdict];
    return [
      {
        id: FOUND[kind],
        state: "stored",
        verdict: one.verdict,
        value,
        limit,
        margin: limit === null ? null : (limit - value) / limit,
        unit: kind === "leakage" ? "A" : "1",
        source: "builder",
        note,
      },
    ];
  });
  return [...worst, ...stressOf(sheet)];
}

/** What drift has done to the sharing: the worst unit while charging, as last measured. */
function stressOf({ chains, voltage, limit }: BankSheet): readonly Finding[] {
  if (voltage === null) return [];
  const highest = chains.map((chain) => Math.max(...(exactCourse(chain, voltage, [0])[0]?.volts ?? [])));
  return [
    withinMost({
      id: "history.charging-stress",
      state: "charging",
      value: Math.max(...highest),
      limit,
      unit: "V",
      source: "methods-derived",
      note: "The voltage of the worst unit while charging, with every unit as it was last measured.",
    }),
  ];
}
