// Saving an order: never over a file without a yes.
import { expect, test } from "vitest";
import { answerFor } from "../../../src/tui/engine.ts";
import { lineOf } from "../../../src/tui/line.ts";
import type { State } from "../../../src/tui/state.ts";
import { askName, cancel, confirm, editName, orderFileName, saved } from "../../../src/tui/update/order.ts";
import { engine, stateWith } from "../../support/stock.ts";

const pin = { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" } as const;
const withBank = (changes: Partial<State> = {}): State => {
  const state = stateWith({ screen: "order", chosen: pin, ...changes });
  return { ...state, answer: answerFor(state, engine, true) };
};
const asked = (text: string, replace = false) => withBank({ prompt: { what: "order", line: lineOf(text), replace } });

test("askName without a bank asks nothing, with one offers its name", () => {
  expect(askName(stateWith({ screen: "order" })).state.prompt).toBeNull();
  expect(askName(withBank()).state.prompt).toEqual({
    what: "order",
    line: lineOf("order-flash-a-7s4p.csv"),
    replace: false,
  });
});

test.each([
  ["a/../b", "1s1p", "order-a-..-b-1s1p.csv"],
  ["\x1b[31m ünit\u202e", "2s1p", "order-31m-u-nit-2s1p.csv"],
  ["", "1s1p", "order-1s1p.csv"],
])("orderFileName(%j, %s) is %s, no path and nothing odd", (part, shape, want) => {
  expect(orderFileName(part, shape)).toBe(want);
});

test("confirm asks for the file as named; a blank name is refused in words", () => {
  const [effect] = confirm(asked(" a.csv ")).effects;
  expect(effect).toMatchObject({ type: "export", path: "a.csv", replace: false });
  const blank = confirm(asked("  "));
  expect([blank.effects, blank.state.notice?.tone, blank.state.prompt === null]).toEqual([[], "warn", false]);
});

test("a file that is there asks once more, and only then is replaced", () => {
  const { state } = saved(asked("a.csv"), { kind: "exists", path: "a.csv" });
  expect(state.prompt?.replace).toBe(true);
  expect(confirm(state).effects[0]).toMatchObject({ replace: true });
  const kept = cancel(state).state;
  expect(kept.prompt).toEqual({ what: "order", line: lineOf("a.csv"), replace: false });
  expect(cancel(kept).state.prompt).toBeNull();
});

test("saved closes the question and says where; trouble keeps it open and says why", () => {
  const done = saved(asked("a.csv"), { kind: "saved", path: "/x/a.csv" }).state;
  expect([done.prompt, done.notice?.text]).toEqual([null, "The order is saved in /x/a.csv."]);
  const trouble = saved(asked("a.csv", true), { kind: "trouble", words: "the disk is full" }).state;
  expect([trouble.prompt?.replace, trouble.notice?.text]).toEqual([false, "Not saved: the disk is full"]);
  expect(saved(withBank(), { kind: "trouble", words: "x" }).state.prompt).toBeNull();
  expect(saved(withBank(), { kind: "exists", path: "x" }).state.prompt).toBeNull();
});

test("editName edits the name and clears what was said before", () => {
  const { state } = editName({ ...asked("a"), notice: { tone: "bad", text: "x" } }, { edit: "insert", text: "b" });
  expect([state.prompt?.line.text, state.notice]).toEqual(["ab", null]);
  expect(editName(withBank(), { edit: "back" }).state.prompt).toBeNull();
});
