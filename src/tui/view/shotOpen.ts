// What is not assessed of a shot, and what was taken for granted; a blank is never a pass.
import type { ShotReport } from "../../search/index.ts";
import type { Row } from "../row.ts";
import { paragraph } from "./words.ts";

/** Sentences that name what is missing. */
export function openSentences({ life, heating, charge, discharge, findings, notes }: ShotReport): readonly string[] {
  const { energy } = discharge;
  const open = findings.filter(({ verdict }) => verdict === "not assessed").length;
  const told = (word: RegExp): boolean => notes.some((note) => word.test(note));
  return [
    ...(open > 0 ? [`${open} of ${findings.length} checks below could not be made.`] : []),
    ...(energy.bank === null ? ["Heat in the bank: its ESR is unknown."] : []),
    ...(energy.bus === null ? ["Heat in the bus: its resistance is unknown."] : []),
    ...(life.ratio === null ? [`Life: no exponent or reference for ${life.missing.join(", ")}.`] : []),
    ...(charge === null && !told(/charger/i)
      ? ["Charging time: the bank is left charged, or no charger was given."]
      : []),
    ...(heating === null && !told(/^Heat/) ? ["Heat at a rate: no rate was given."] : []),
  ];
}

export function openRows(report: ShotReport, columns: number): readonly Row[] {
  const sentences = openSentences(report);
  return [
    ...sentences.flatMap((text) => paragraph(`? ${text}`, columns, "accent")),
    ...report.notes.flatMap((text) => paragraph(`- ${text}`, columns)),
    ...(sentences.length + report.notes.length === 0 ? paragraph("Everything asked was assessed.", columns) : []),
  ];
}
