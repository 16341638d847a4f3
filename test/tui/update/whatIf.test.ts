// What if, from any screen: the value in hand, what a blank stands for, and what cannot be stepped.
import { expect, test } from "vitest";
import { answerFor } from "../../../src/tui/engine.ts";
import { FIELDS } from "../../../src/tui/fields.ts";
import { selectedLayout } from "../../../src/tui/pick.ts";
import type { State } from "../../../src/tui/state.ts";
import { nudge, takeInHand } from "../../../src/tui/update/whatIf.ts";
import { BRIEF, engine, stateWith } from "../../support/stock.ts";

const at = (key: string, changes: Partial<State> = {}): State => {
  const state = stateWith({ field: FIELDS.findIndex((field) => field.key === key), ...changes });
  return { ...state, answer: answerFor(state, engine, true) };
};
const up = { up: true, coarse: false };
const value = (state: State, key: string) => nudge(state, up).state.values[key];

test("nudge(state, by): a given value, the default of a blank, a choice", () => {
  expect(value(at("voltage"), "voltage")).toBe("2.4 kV");
  expect(value(at("derating"), "derating")).toBe("91 %");
  expect(value(at("basis"), "basis")).toBe("nominal");
  expect(nudge(at("voltage"), up).effects).toEqual([{ type: "ask", asked: 1 }]);
});

test("a limit that is blank begins at what the layout in sight takes", () => {
  const state = at("maxMass");
  const mass = selectedLayout(state)?.mass ?? 0;
  const read = engine.readBrief({ ...BRIEF, maxMass: value(state, "maxMass") });
  expect(read.ok && (read.value.maxMass ?? 0) > mass && (read.value.maxMass ?? 0) < mass * 1.2).toBe(true);
});

test("words, blanks without a default and ends are told, and nothing is asked", () => {
  for (const [state, words] of [
    [at("title"), "there is nothing to step"],
    [at("load.resistance"), "type one on the brief"],
    [at("ripple"), "goes no higher"],
  ] as const) {
    const { state: after, effects } = nudge(state, up);
    expect([after.notice?.text.includes(words), effects.length, after.values]).toEqual([true, 0, state.values]);
  }
});

test("takeInHand(state, by): round both ends, past the words", () => {
  const keys = [at("energy")];
  for (let i = 0; i < FIELDS.length; i += 1) keys.push(takeInHand(keys.at(-1) as State, 1).state);
  const seen = new Set(keys.map(({ field }) => FIELDS[field]?.key));
  expect(["title", "currency", "load.recorded"].filter((word) => seen.has(word))).toEqual([]);
  expect(seen.size).toBe(FIELDS.length - 3);
  expect(FIELDS[takeInHand(at("energy"), -1).state.field]?.key).toBe("risk");
});
