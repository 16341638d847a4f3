// The trail: one entry a brief that was planned, what it changed and cost; half-typed text leaves no entries.
import { expect, test } from "vitest";
import { answerFor } from "../../src/tui/engine.ts";
import type { Message, State } from "../../src/tui/state.ts";
import { withTried } from "../../src/tui/trail.ts";
import { update } from "../../src/tui/update/update.ts";
import { engine, stateWith } from "../support/stock.ts";

const answered = (state: State): State =>
  update(state, { type: "answered", asked: state.asked, answer: answerFor(state, engine, true), slow: false }).state;
const run = (state: State, ...messages: readonly Message[]): State =>
  messages.reduce((at, message) => answered(update(at, message).state), state);
const nudge: Message = { type: "nudge", up: true, coarse: false };

test("withTried(state): nothing of a refused brief, and nothing twice", () => {
  const refused = answered(stateWith({ values: { energy: "x" } }));
  expect(refused.trail).toEqual([]);
  const once = answered(stateWith());
  expect(withTried(once)).toBe(once);
  expect(once.trail.map(({ words }) => words)).toEqual(["the brief at the start"]);
});

test("a step of a value: what changed, the best and its figures as the plan has them", () => {
  const state = run(answered(stateWith({ field: 1 })), nudge);
  expect(state.trail).toHaveLength(2);
  const plan = state.answer?.kind === "planned" ? state.answer.plan : null;
  const best = plan?.layouts[0];
  expect(state.trail[1]).toMatchObject({
    words: "Charge voltage 2.2 kV to 2.4 kV",
    best: best?.id,
    units: best?.units,
    // Balancing resistors have no price here: a cost without them is none.
    cost: null,
    chosenCost: null,
  });
});

test("typing on in one field keeps one entry, the last; typing elsewhere begins another", () => {
  const edit = (text: string): Message => ({ type: "edit", edit: { edit: "insert", text } });
  const state = run(answered(stateWith({ caret: 3 })), edit("1"), edit("2"), { type: "move", by: 1 }, edit(" "));
  expect(state.trail.map(({ words }) => words)).toEqual([
    "the brief at the start",
    "Energy of one pulse 2.4 kJ to 2.412 kJ",
    "Charge voltage 2.2 kV to 2.2 kV ",
  ]);
});

test("pins and the order of the list leave no entry", () => {
  const state = run(answered(stateWith({ screen: "layouts" })), { type: "pin" }, { type: "rank" });
  expect(state.trail).toHaveLength(1);
});
