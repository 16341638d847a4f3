// The help: which keys are live on the screen behind it, and what its words and marks mean.
import { liveKeys } from "../keys.ts";
import { EMPTY_ROW, type Row, rowOf, span } from "../row.ts";
import type { State } from "../state.ts";
import { fitText } from "../text.ts";
import { type Page, type Room, scrolled } from "./page.ts";
import { paragraph } from "./words.ts";

const ABOUT: Readonly<Record<State["screen"], string>> = {
  brief:
    "The brief says what the bank must do. A value takes a unit (2.4 kJ, 2.2 kV, 20 %); what fits follows as you type. As text: joulewright plan BRIEF, or its flags.",
  layouts:
    "Every layout that does the job, in order. * is pinned. Unbeaten: no other is as good in cost, volume, mass, units and stress and better in one. As text: joulewright plan BRIEF.",
  compare:
    "The pinned layouts side by side, called A to D in the sentences. ^ marks the best of a row, v the worst, with how far the others are from the best; rows that agree are folded into one sentence. As text: joulewright check LAYOUT for each.",
  bank: "One bank, stage by stage. The bar is the worst voltage a unit may see, | its limit. A check that could not be made is not assessed, never a pass. As text: joulewright check LAYOUT.",
  sharing:
    "How one bank divides its voltage. L on a bar is the unit limit, R its full rating. P on the course is the highest moment, N the lowest below zero. Causes say what eats the margin and what a new search with one value tightened would save. As text: joulewright check LAYOUT.",
  shot: "One shot of the bank into the brief's load. P is the peak current, R the most reversed voltage. Low and high are over capacitance and whatever else the brief says may spread. A bound is no value: something in the loop is unknown. As text: joulewright pulse LAYOUT.",
  trail:
    "Every brief that was planned, with its best layout and what that cost. Enter makes the one under the cursor hold again. As text: joulewright plan BRIEF for each.",
  map: "Every unbeaten layout as a point: no other is as good in cost, volume, mass, units and stress and better in one. X is the cursor, A to D are pinned. As text: joulewright plan BRIEF --json, its front.",
  parts:
    "What was understood of the catalogues. Enter sets the value in hand; it is kept in a file beside the catalogue, never in it, and planned with at once. A catalogue that changes on disk is read again. As text: joulewright parts FILE.",
  units:
    "Measured units, each where the voltages come out most equal. A mark is a unit, low to high capacitance in the lot; a gap is how far the worst stands over an even share; the mark on its bar is what the meter can tell. As text: joulewright place.",
  blend:
    "The cheapest mix of whole strings of different parts for the brief, with its proof, others of another kind up to a tenth dearer, and what less and more energy would cost. > on the ladder is the energy asked. As text: joulewright plan BRIEF --blend --within 10% --ladder 10%.",
  order:
    "What must be bought: needed, less what is on hand, in whole packs and at the price for the quantity. As text: joulewright order LAYOUT.",
};

export function helpPage(state: State, room: Room): Page {
  const keys = liveKeys({ ...state, help: false });
  const rows: readonly Row[] = [
    ...paragraph(ABOUT[state.screen], room.columns),
    EMPTY_ROW,
    ...keys.map((row) => rowOf(span(`  ${fitText(row.shown, 14)}`, "key"), span(row.words))),
  ];
  return scrolled(state, "help", [rowOf(span(`Keys on ${state.screen}`, "strong"))], rows, room);
}
