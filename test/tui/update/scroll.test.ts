// Cursor and scroll: the ends hold, and an overshoot never has to be scrolled back.
import { expect, test } from "vitest";
import { answerFor } from "../../../src/tui/engine.ts";
import { listed, selectedIndex } from "../../../src/tui/pick.ts";
import type { State } from "../../../src/tui/state.ts";
import { moveSelection, pageOf, scrollScreen } from "../../../src/tui/update/scroll.ts";
import { engine, stateWith } from "../../support/stock.ts";

const planned = (): State => {
  const state = stateWith({ screen: "layouts" });
  return { ...state, answer: answerFor(state, engine, true) };
};

test("moveSelection stops at the ends and pages", () => {
  const state = planned();
  const last = listed(state).length - 1;
  const at = (from: State, by: Parameters<typeof moveSelection>[1]) => selectedIndex(moveSelection(from, by).state);
  expect(last).toBeGreaterThan(30);
  expect([at(state, -1), at(state, 1), at(state, "last"), at(state, "page"), at(state, "pageBack")]).toEqual([
    0,
    1,
    last,
    pageOf(state),
    0,
  ]);
  const end = moveSelection(state, "last").state;
  expect([at(end, 1), at(end, "page"), at(end, "first")]).toEqual([last, last, 0]);
});

test("moveSelection on an empty list keeps what was selected", () => {
  expect(moveSelection(stateWith({ selected: "x" }), 1).state.selected).toBe("x");
});

test("scrollScreen stays from 0 to the most, also when the most shrank meanwhile", () => {
  const state = stateWith({ scroll: { bank: 50 } });
  const to = (by: Parameters<typeof scrollScreen>[2], most: number) =>
    scrollScreen(state, "bank", by, most).state.scroll.bank;
  expect([to(-1, 10), to(1, 10), to("first", 10), to("last", 10), to(-1, 0)]).toEqual([9, 10, 0, 10, 0]);
  expect(scrollScreen(stateWith(), "bank", "page", 100).state.scroll.bank).toBe(14);
});
