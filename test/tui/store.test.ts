// The store: messages one at a time, effects after the state is done, no message lost.
import { expect, test } from "vitest";
import { type Change, type Message, type State, still } from "../../src/tui/state.ts";
import { createStore } from "../../src/tui/store.ts";
import { stateWith } from "../support/stock.ts";

const column = (state: State, by: number): Change => still({ ...state, column: state.column + by });

test("send(message) updates, draws once a change, and not when nothing changed", () => {
  let drawn = 0;
  const store = createStore({
    initial: stateWith(),
    update: (state, message) => (message.type === "column" ? column(state, message.by) : still(state)),
    run: () => {},
    changed: () => (drawn += 1),
  });
  store.send({ type: "column", by: 2 });
  store.send({ type: "redraw" });
  expect([store.state().column, drawn]).toEqual([2, 1]);
});

test("a message sent by an effect waits until the update before it is whole", () => {
  const seen: number[] = [];
  const store = createStore({
    initial: stateWith(),
    update: (state, message) => {
      seen.push(state.column);
      if (message.type !== "column") return still(state);
      return message.by === 1
        ? { ...column(state, 1), effects: [{ type: "ask", asked: 1 }, { type: "redraw" }] }
        : column(state, 10);
    },
    run: (effect, send) => {
      if (effect.type === "ask") send({ type: "column", by: 10 });
    },
    changed: () => {},
  });
  store.send({ type: "column", by: 1 });
  expect(seen).toEqual([0, 1]);
  expect(store.state().column).toBe(11);
});

test("an update that throws leaves the store usable", () => {
  const store = createStore({
    initial: stateWith(),
    update: (state, message: Message) => {
      if (message.type === "quit") throw new Error("planted");
      return column(state, 1);
    },
    run: () => {},
    changed: () => {},
  });
  expect(() => store.send({ type: "quit" })).toThrow("planted");
  store.send({ type: "redraw" });
  expect(store.state().column).toBe(1);
});
