// Messages in, state and effects out.
import { describe, expect, test } from "vitest";
import { answerFor } from "../../../src/tui/engine.ts";
import { arrangementOf, listed } from "../../../src/tui/pick.ts";
import type { Message, State } from "../../../src/tui/state.ts";
import { update } from "../../../src/tui/update/update.ts";
import { engine, stateWith } from "../../support/stock.ts";

const planned = (changes: Partial<State> = {}): State => {
  const state = stateWith(changes);
  return { ...state, answer: answerFor(state, engine, true) };
};
const sent = (state: State, ...messages: readonly Message[]): State =>
  messages.reduce((s, m) => update(s, m).state, state);

describe("update(state, message)", () => {
  test("an answer to an older question is dropped", () => {
    const state = stateWith({ asked: 5 });
    const answer = { kind: "refused", refusals: [] } as const;
    expect(update(state, { type: "answered", asked: 4, answer, slow: false }).state).toBe(state);
    expect(update(state, { type: "answered", asked: 5, answer, slow: true }).state).toMatchObject({
      answered: 5,
      answer,
      slow: true,
    });
  });
  test("going to the bank or the order first chooses what the cursor is on, later keeps the choice", () => {
    const first = update(planned({ screen: "layouts" }), { type: "go", screen: "order" });
    expect(first.state.chosen).toEqual(arrangementOf(listed(planned())[0] as never));
    expect(first.effects).toEqual([{ type: "ask", asked: 1 }]);
    const other = listed(planned())[3]?.id ?? "";
    expect(update({ ...first.state, selected: other }, { type: "go", screen: "bank" }).state.chosen).toEqual(
      first.state.chosen,
    );
    expect(update(stateWith(), { type: "go", screen: "bank" }).state).toMatchObject({ screen: "bank", chosen: null });
  });
  test("rank goes round all rankings and asks each time", () => {
    let state = planned({ screen: "layouts" });
    const seen: string[] = [];
    for (let i = 0; i < 5; i += 1) {
      const change = update(state, { type: "rank" });
      expect(change.effects).toEqual([{ type: "ask", asked: i + 1 }]);
      state = change.state;
      seen.push(state.rank);
    }
    expect(seen).toEqual(["units", "volume", "mass", "stress", "cost"]);
  });
  test("front, fold and help turn on and off", () => {
    expect(sent(planned(), { type: "front" }).frontOnly).toBe(true);
    expect(sent(planned(), { type: "front" }, { type: "front" }).frontOnly).toBe(false);
    expect(sent(planned(), { type: "fold" }).unfolded).toBe(true);
    expect(sent(planned(), { type: "help" }).help).toBe(true);
    expect(sent(planned(), { type: "help" }, { type: "help" }).help).toBe(false);
  });
  test("the column of the comparison stays among the pins", () => {
    const pins = listed(planned()).slice(0, 2).map(arrangementOf);
    const state = planned({ screen: "compare", pins });
    expect(sent(state, { type: "column", by: -1 }).column).toBe(0);
    expect(sent(state, { type: "column", by: 1 }, { type: "column", by: 1 }).column).toBe(1);
    expect(sent(stateWith({ screen: "compare" }), { type: "column", by: 1 }).column).toBe(0);
  });
  test("move goes to the field, the cursor or the scroll, by what is on top", () => {
    expect(sent(planned(), { type: "move", by: 1 }).field).toBe(1);
    expect(sent(planned({ screen: "layouts" }), { type: "move", by: 1 }).selected).toBe(listed(planned())[1]?.id);
    const bank = planned({ screen: "bank", chosen: arrangementOf(listed(planned())[0] as never), rows: 16 });
    expect(sent(bank, { type: "move", by: 1 }).scroll.bank).toBe(1);
    expect(sent({ ...bank, help: true, rows: 16 }, { type: "move", by: 1 }).scroll).toEqual({ help: 1 });
  });
  test.each(["quit", "suspend", "redraw"] as const)("%s is an effect and changes nothing", (type) => {
    const state = planned();
    expect(update(state, { type })).toEqual({ state, effects: [{ type }] });
  });
  test("a new size is kept, and nothing else changes", () => {
    const state = planned();
    expect(update(state, { type: "resized", columns: 10, rows: 2 }).state).toEqual({ ...state, columns: 10, rows: 2 });
  });
});
