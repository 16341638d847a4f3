// What if: the brief's value in hand is stepped from any screen, and another is taken in hand.
import { FIELDS, type Field, fieldAt, valueIn } from "../fields.ts";
import { type Nudge, nudged, numberIn } from "../nudge.ts";
import { selectedLayout, shownBank } from "../pick.ts";
import { ask, type Change, type State, still } from "../state.ts";
import { chooseField } from "./form.ts";

/** What a field's text stands for, and its blank: the brief's own default, or for a limit what the bank in sight takes. */
function standing(state: State, field: Field): number | null {
  const text = state.values[field.key] ?? "";
  if (text.trim() !== "") return numberIn(field, text);
  const read = state.answer?.kind === "planned" ? valueIn(state.answer.brief, field) : undefined;
  if (typeof read === "number") return read;
  const bank = shownBank(state) ?? selectedLayout(state);
  if (bank === null) return null;
  if (field.key === "maxCost") return bank.cost?.total ?? null;
  if (field.key === "maxVolume") return bank.volume;
  return field.key === "maxMass" ? bank.mass : null;
}

export function nudge(state: State, by: Nudge): Change {
  const field = fieldAt(state.field);
  if (field.choices !== undefined) return chooseField(state, by.up ? 1 : -1);
  const say = (text: string): Change => still({ ...state, notice: { tone: "warn", text } });
  if (field.dimension === null) return say(`${field.label} is a word: there is nothing to step.`);
  const value = standing(state, field);
  if (value === null) return say(`${field.label} has no value to step from: type one on the brief.`);
  const text = nudged(field, value, by);
  if (text === null) return say(`${field.label} goes no ${by.up ? "higher" : "lower"}.`);
  return ask({ ...state, values: { ...state.values, [field.key]: text }, caret: text.length, notice: null });
}

/** Takes the next or the last field in hand; the ends join. Words alone cannot be stepped and are passed over. */
export function takeInHand(state: State, by: 1 | -1): Change {
  const count = FIELDS.length;
  let field = state.field;
  do field = (field + by + count) % count;
  while (fieldAt(field).dimension === null && fieldAt(field).choices === undefined);
  return still({ ...state, field, caret: (state.values[fieldAt(field).key] ?? "").length, notice: null });
}
