// The screen of blends: what was found for the brief in force, the search under way, or why there is neither.
import { blendKey } from "../blend/key.ts";
import type { Seeking } from "../blend/state.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { foundPage } from "./blendFound.ts";
import { type Page, pageOf, type Room } from "./page.ts";
import { emptyRows, paragraph } from "./words.ts";

const ABOUT =
  "A blend is a bank made of whole strings of different parts: it may use up what is on hand, or come closer to the energy asked than one part can. The search proves that nothing cheaper exists, or says how far it is from that. It runs beside the other screens.";
const STAGES: Readonly<Record<Seeking["stage"], string>> = {
  "one part": "the cheapest layout of one part, to compare with",
  cheapest: "the cheapest blend, and its proof",
  kinds: "others of another kind",
  ladder: "the cost ladder",
};

/** No blend can be sought: what the other screens say then, but that no layout of one part fits does not end it. */
function notYet(state: State, columns: number): readonly Row[] {
  const { answer, words, stock } = state;
  if (words === null || stock.parts === 0 || answer === null || answer.kind === "refused")
    return emptyRows(state, columns);
  return state.asked === state.answered ? [] : paragraph("Planning the brief first.", columns, "strong");
}

function runningRows({ stage, seconds, stopping }: Seeking, columns: number): readonly Row[] {
  const words = stopping ? "Stopping; Esc again gives it up." : "Esc stops with the best so far.";
  return [
    rowOf(span("Working out ", "strong"), span(STAGES[stage], "accent")),
    ...paragraph(`${Math.floor(seconds)} s so far; how long it still takes cannot be told.`, columns),
    ...paragraph(words, columns),
  ];
}

export function blendPage(state: State, room: Room): Page {
  const { columns } = room;
  const { running, found, ended } = state.blend;
  const key = blendKey(state);
  if (running !== null) {
    const other =
      key === null || running.key === key
        ? []
        : paragraph("This is for the brief before; Enter begins anew.", columns, "warn");
    return pageOf([...runningRows(running, columns), ...other, EMPTY_ROW, ...paragraph(ABOUT, columns, "quiet")]);
  }
  if (found !== null && found.key === key && state.words !== null) return foundPage(found, state, room);
  const empty = notYet(state, columns);
  if (empty.length > 0) return pageOf(empty);
  const why =
    ended !== null && ended.key === key
      ? ended.why === "cancelled"
        ? "Cancelled before anything was in hand. Enter begins again."
        : "No thread can be had for it here, or it failed. Enter tries again; joulewright plan BRIEF --blend finds it too."
      : found !== null
        ? "What was found is of another brief or catalogue. Enter finds the blend for this one."
        : "No blend was sought for this brief yet. Enter finds it.";
  return pageOf([...paragraph(why, columns, "strong"), EMPTY_ROW, ...paragraph(ABOUT, columns, "quiet")]);
}
