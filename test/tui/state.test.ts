// Beginnings and questions.
import { expect, test } from "vitest";
import { ask, initialState, still } from "../../src/tui/state.ts";
import { STOCK, stateWith } from "../support/stock.ts";

test("initialState puts the caret behind the first field's text", () => {
  const start = { columns: 80, rows: 24, look: { colour: true, ascii: false }, stock: STOCK, extra: {} };
  expect(initialState({ ...start, values: {} }).caret).toBe(0);
  expect(initialState({ ...start, values: { energy: "2.4 kJ" } }).caret).toBe(6);
});

test("ask(state) numbers its questions", () => {
  const first = ask(stateWith());
  expect([first.state.asked, first.effects]).toEqual([1, [{ type: "ask", asked: 1 }]]);
  expect(ask(first.state).effects).toEqual([{ type: "ask", asked: 2 }]);
});

test("still(state) has no effects and is the same state", () => {
  const state = stateWith();
  expect(still(state)).toEqual({ state, effects: [] });
  expect(still(state).state).toBe(state);
});
