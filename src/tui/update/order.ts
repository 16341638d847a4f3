// Saving the order of the shown bank: asks for a name, then once more before a file is replaced.
import { editLine, type LineEdit, lineOf } from "../line.ts";
import { shownBank } from "../pick.ts";
import type { SaveAnswer } from "../ports.ts";
import { type Change, type State, still } from "../state.ts";

/** A file name made of the bank's own name: letters, digits, dots and hyphens only. */
export const orderFileName = (part: string, shape: string): string =>
  `${`order-${part}-${shape}`
    .normalize("NFKD")
    .replace(/[^A-Za-z0-9.-]+/g, "-")
    .replace(/-+/g, "-")
    .replace(/^[-.]+|[-.]+$/g, "")}.csv`;

export function askName(state: State): Change {
  const bank = shownBank(state);
  if (bank === null) return still(state);
  const name = orderFileName(bank.part, `${bank.series}s${bank.parallel}p`);
  return still({ ...state, prompt: { what: "order", line: lineOf(name), replace: false }, notice: null });
}

export function editName(state: State, edit: LineEdit): Change {
  if (state.prompt === null) return still(state);
  return still({ ...state, prompt: { ...state.prompt, line: editLine(state.prompt.line, edit) }, notice: null });
}

export function confirm(state: State): Change {
  const bill = state.answer?.kind === "planned" && shownBank(state) !== null ? state.answer.bill : null;
  if (state.prompt === null || bill === null) return still({ ...state, prompt: null });
  const { line, replace } = state.prompt;
  const path = line.text.trim();
  if (path === "") return still({ ...state, notice: { tone: "warn", text: "A name is needed, such as order.csv." } });
  return { state, effects: [{ type: "export", bill, path, replace }] };
}

/** "Keep the file" goes back to the name; "do not save" closes the question. */
export function cancel(state: State): Change {
  if (state.prompt?.what === "order" && state.prompt.replace)
    return still({ ...state, prompt: { ...state.prompt, replace: false }, notice: null });
  return still({ ...state, prompt: null, notice: { tone: "plain", text: "Nothing was saved." } });
}

export function saved(state: State, answer: SaveAnswer): Change {
  switch (answer.kind) {
    case "saved":
      return still({ ...state, prompt: null, notice: { tone: "good", text: `The order is saved in ${answer.path}.` } });
    case "exists":
      if (state.prompt?.what !== "order") return still(state);
      return still({ ...state, prompt: { ...state.prompt, replace: true }, notice: null });
    case "trouble":
      if (state.prompt === null)
        return still({ ...state, notice: { tone: "bad", text: `Not saved: ${answer.words}` } });
      return still({
        ...state,
        prompt: { ...state.prompt, replace: false },
        notice: { tone: "bad", text: `Not saved: ${answer.words}` },
      });
  }
}
