// What keys do on the brief's form: move between fields, edit one, go through its choices. Every change asks the engine again.
import { FIELDS, fieldAt } from "../fields.ts";
import { editLine, type LineEdit } from "../line.ts";
import { ask, type Change, type State, still } from "../state.ts";

const focusedText = (state: State): string => state.values[fieldAt(state.field).key] ?? "";

const withValue = (state: State, text: string): Change => {
  const { key } = fieldAt(state.field);
  if (text === (state.values[key] ?? "")) return still(state);
  return ask({ ...state, values: { ...state.values, [key]: text }, notice: null });
};

/** Moves the focus; the ends join, so that a key held down never gets stuck. */
export function moveField(state: State, by: number | "first" | "last" | "page" | "pageBack"): Change {
  const count = FIELDS.length;
  const field =
    typeof by === "number"
      ? (((state.field + by) % count) + count) % count
      : by === "first" || by === "pageBack"
        ? 0
        : count - 1;
  return still({ ...state, field, caret: (state.values[fieldAt(field).key] ?? "").length });
}

export function editField(state: State, edit: LineEdit): Change {
  const text = focusedText(state);
  const line = editLine({ text, caret: Math.min(state.caret, text.length) }, edit);
  return withValue({ ...state, caret: line.caret }, line.text);
}

/** Goes to the choice before or after; a text that is none of them (from a file) gives way to the first. */
export function chooseField(state: State, by: number): Change {
  const { choices } = fieldAt(state.field);
  if (choices === undefined) return still(state);
  const text = focusedText(state);
  const at = text === "" ? 0 : choices.indexOf(text);
  const next = at < 0 ? 0 : (at + by + choices.length) % choices.length;
  return withValue(state, choices[next] ?? "");
}
