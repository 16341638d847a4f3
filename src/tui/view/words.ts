// The sentences that stand in for a screen's contents when there are none, and what each change or refusal says.
import type { Refusal } from "../../quantity/index.ts";
import type { Change } from "../../search/index.ts";
import { FIELDS, fieldAt, shownValue } from "../fields.ts";
import { type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { safeText, wrapText } from "../text.ts";
import type { StyleName } from "../theme.ts";

export const CAUTIONS: readonly string[] = [
  "Caution: stored energy can kill. Follow local codes and licensed practice.",
  "Stored energy can kill; follow codes and licensed practice.",
];

export const paragraph = (text: string, columns: number, style: StyleName = "plain"): readonly Row[] =>
  wrapText(safeText(text), Math.max(1, columns)).map((line) => rowOf(span(line, style)));

const labelOf = (key: string): string => FIELDS.find((field) => field.key === key)?.label ?? key;

export function refusalOf(state: State, key: string): Refusal | null {
  if (state.answer?.kind !== "refused") return null;
  return state.answer.refusals.find(({ place }) => place.field === key || place.field?.startsWith(`${key}.`)) ?? null;
}

/** A blank that must be filled is no fault, only a blank. */
const isMissing = (refusal: Refusal): boolean => refusal.code === "missing-value" || refusal.code === "empty";

/** What a field's refusal says beside it. */
export const refusalWords = (refusal: Refusal): string =>
  isMissing(refusal) ? `needed: ${refusal.want}` : `not ${refusal.read}: ${refusal.want}`;

/** Names the fields that keep the brief from being read. */
export function refusedSentence(refusals: readonly Refusal[]): string {
  const labels = (list: readonly Refusal[]): string =>
    [...new Set(list.map(({ place }) => labelOf(place.field ?? "brief")))].join(", ");
  const missing = refusals.filter(isMissing);
  const wrong = refusals.filter((refusal) => !isMissing(refusal));
  const parts = [
    ...(wrong.length > 0 ? [`to be mended: ${labels(wrong)}`] : []),
    ...(missing.length > 0 ? [`still needed: ${labels(missing)}`] : []),
  ];
  return `No plan yet; ${parts.join("; ")}.`;
}

/** "Charge voltage 2.05 kV in place of 2.2 kV, which lets in <layout>." */
export function changeSentence(change: Change): string {
  const known = FIELDS.findIndex((field) => field.key === change.field);
  const value = (number: number | null): string =>
    number === null ? "none" : known < 0 ? String(number) : shownValue(fieldAt(known), number);
  if (change.field === "available") {
    return `${change.to} units of ${change.note} to be had in place of ${value(change.from)}, for ${change.layout}.`;
  }
  const note = change.note === "" ? "" : ` (${change.note})`;
  return `${labelOf(change.field)} ${value(change.to)} in place of ${value(change.from)}, for ${change.layout}${note}.`;
}

/** Why there is nothing to list, in sentences; empty when there is something. */
export function emptySentences(state: State): readonly string[] {
  if (state.words === null) return [`Reading ${state.stock.name}.`];
  if (state.stock.parts === 0) {
    return [
      "There is no catalogue yet, so there is nothing to build from.",
      "Start with one: joulewright --catalog FILE.csv. It needs the headings part, capacitance [uF] and voltage [V].",
    ];
  }
  const { answer } = state;
  if (answer === null) return ["Working out the first plan."];
  if (answer.kind === "refused") return [refusedSentence(answer.refusals)];
  const { plan } = answer;
  if (plan.layouts.length > 0) return [];
  const nothing = `Nothing fits: none of the ${plan.searched.parts} parts does this within the brief's limits.`;
  if (!answer.changesSought) {
    const wait = state.slow
      ? "The catalogue is too large to look for the least change while you type; joulewright plan does it."
      : "Looking for the least change that would let something in.";
    return [nothing, wait];
  }
  if (plan.changes.length === 0)
    return [nothing, "No change of one value alone lets anything in: change two, or add parts."];
  return [
    nothing,
    "Any one of these would let something in:",
    ...plan.changes.map((change) => `- ${changeSentence(change)}`),
  ];
}

export const emptyRows = (state: State, columns: number): readonly Row[] =>
  emptySentences(state).flatMap((sentence, index) => paragraph(sentence, columns, index === 0 ? "strong" : "plain"));
