// Undo and redo over everything that is the user's work: the brief, pins, the chosen bank, the order, values set by hand.
import { fieldAt } from "./fields.ts";
import { ask, type Change, type Message, type State, still } from "./state.ts";
import { differenceWords, type History, type Work } from "./work.ts";

/** Steps that can be taken back. */
const KEPT = 500;

const KEYS: readonly (keyof Work)[] = ["values", "extra", "pins", "chosen", "rank", "frontOnly", "overrides"];

const workOf = ({ values, extra, pins, chosen, rank, frontOnly, overrides }: State): Work => ({
  values,
  extra,
  pins,
  chosen,
  rank,
  frontOnly,
  overrides,
});

/** Messages that are no doing of the user's: they do not end what is being typed. */
const PASSIVE: readonly Message["type"][] = [
  "answered",
  "detailed",
  "resized",
  "say",
  "saved",
  "opened",
  "work",
  "ground",
  "mouse",
];

const typedInto = (state: State, message: Message): string | null =>
  message.type === "edit" && state.prompt === null ? fieldAt(state.field).key : null;

function go(state: State, from: "past" | "future"): Change {
  const { past, future } = state.history;
  const list = from === "past" ? past : future;
  const target = list.at(-1);
  const undo = from === "past";
  if (target === undefined) {
    const text = undo ? "There is nothing to take back." : "There is nothing to bring back.";
    return still({ ...state, notice: { tone: "plain", text } });
  }
  const here = workOf(state);
  const rest = list.slice(0, -1);
  const history: History = undo
    ? { past: rest, future: [...future, here], typing: null }
    : { past: [...past, here], future: rest, typing: null };
  const words = undo ? differenceWords(target, here) : differenceWords(here, target);
  const text = `${undo ? "Taken back" : "Brought back"}: ${words}.`;
  const caret = (target.values[fieldAt(state.field).key] ?? "").length;
  const column = Math.max(0, Math.min(state.column, target.pins.length - 1));
  const change = ask({ ...state, ...target, history, caret, column, notice: { tone: "plain", text } });
  const { overrides } = target;
  if (overrides === state.overrides) return change;
  return { ...change, effects: [...change.effects, { type: "overrides", overrides }] };
}

/** What was set by hand elsewhere cannot be taken back here: all steps go on with it. */
function reopened(before: State, change: Change): Change {
  const { overrides, history } = change.state;
  if (overrides === before.overrides) return change;
  const on = (list: readonly Work[]): readonly Work[] => list.map((work) => ({ ...work, overrides }));
  return {
    ...change,
    state: { ...change.state, history: { ...history, past: on(history.past), future: on(history.future) } },
  };
}

/** Keeps the history about an update of the state. */
export const withHistory =
  (update: (state: State, message: Message) => Change) =>
  (state: State, message: Message): Change => {
    if (message.type === "undo") return go(state, "past");
    if (message.type === "redo") return go(state, "future");
    const change = update(state, message);
    if (message.type === "opened") return reopened(state, change);
    if (PASSIVE.includes(message.type)) return change;
    const after = change.state;
    const typing = typedInto(state, message);
    const { history } = state;
    if (KEYS.every((key) => after[key] === state[key])) {
      // The caret moves within one text that is being typed.
      if (typing === history.typing || (typing === null && history.typing === null)) return change;
      return { ...change, state: { ...after, history: { ...history, typing: null } } };
    }
    const joins = typing !== null && typing === history.typing;
    const past = joins ? history.past : [...history.past, workOf(state)].slice(-KEPT);
    return { ...change, state: { ...after, history: { past, future: [], typing } } };
  };
