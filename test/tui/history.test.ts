// Undo and redo: every change of the work can be taken back and brought back; typing in one field is one change.
import { describe, expect, test } from "vitest";
import { withHistory } from "../../src/tui/history.ts";
import type { Message, State } from "../../src/tui/state.ts";
import { update } from "../../src/tui/update/update.ts";
import { detailed } from "../support/detailed.ts";
import fc from "../support/property.ts";
import { stateWith } from "../support/stock.ts";

const run = (state: State, ...messages: readonly Message[]): State =>
  messages.reduce((at, message) => update(at, message).state, state);
const typed = (text: string): Message => ({ type: "edit", edit: { edit: "insert", text } });
const undo: Message = { type: "undo" };
const redo: Message = { type: "redo" };

describe("withHistory(update)", () => {
  test("with nothing done there is nothing to take back or bring back, and both say so", () => {
    expect(run(stateWith(), undo).notice?.text).toBe("There is nothing to take back.");
    expect(run(stateWith(), redo).notice?.text).toBe("There is nothing to bring back.");
  });
  test("typing in one field is one change, also after the caret moved in it; another field is another", () => {
    const state = run(
      stateWith(),
      typed("1"),
      { type: "edit", edit: { edit: "left" } },
      typed("2"),
      { type: "move", by: 1 },
      typed("3"),
    );
    expect(state.history.past).toHaveLength(2);
    const once = run(state, undo);
    expect([once.values.voltage, once.values.energy]).toEqual(["2.2 kV", "2.4 kJ21"]);
    expect(run(once, undo).values).toEqual(stateWith().values);
    expect(once.notice?.text).toBe("Taken back: Charge voltage 2.2 kV to 2.2 kV3.");
  });
  test("each step of a value is a change of its own, and a change after an undo forgets what was undone", () => {
    const nudge: Message = { type: "nudge", up: true, coarse: false };
    const state = run(stateWith({ field: 1 }), nudge, nudge);
    expect(state.values.voltage).toBe("2.7 kV");
    expect(run(state, undo).values.voltage).toBe("2.4 kV");
    expect(run(state, undo, redo).values.voltage).toBe("2.7 kV");
    expect(run(state, undo, nudge, redo).notice?.text).toBe("There is nothing to bring back.");
  });
  test("an undo asks the engine again, and the caret and the column stay where something is", () => {
    const NONE = {};
    const state = {
      ...stateWith({ overrides: NONE }),
      history: { past: [stateWith({ values: {}, overrides: NONE })], future: [], typing: null },
    };
    const back = withHistory((at) => ({ state: at, effects: [] }))({ ...state, column: 3, caret: 6 }, undo);
    expect(back.effects).toEqual([{ type: "ask", asked: 1 }]);
    expect([back.state.caret, back.state.column]).toEqual([0, 0]);
  });
  test("any work taken back whole and brought back whole is the same work", () => {
    const begun = detailed({ screen: "layouts" });
    const message = fc.constantFrom<Message>(
      { type: "pin" },
      { type: "rank" },
      { type: "front" },
      { type: "nudge", up: true, coarse: true },
      { type: "nudge", up: false, coarse: false },
      { type: "hand", by: 1 },
      { type: "choose" },
      { type: "go", screen: "layouts" },
      { type: "move", by: 1 },
      typed("1"),
    );
    const work = ({ values, pins, chosen, rank, frontOnly }: State) => ({ values, pins, chosen, rank, frontOnly });
    fc.assert(
      fc.property(fc.array(message, { maxLength: 30 }), (messages) => {
        const end = run(begun, ...messages);
        const steps = end.history.past.length;
        const start = run(end, ...Array.from({ length: steps }, () => undo));
        expect(work(start)).toEqual(work(begun));
        expect(work(run(start, ...Array.from({ length: steps }, () => redo)))).toEqual(work(end));
      }),
      { numRuns: 60 },
    );
  });
});
