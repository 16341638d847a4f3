// The catalogue screen's keys: the cursor stays on a part, and a value set by hand is held against its column first.
import { expect, test } from "vitest";
import type { Message, State } from "../../../src/tui/state.ts";
import {
  askValue,
  confirmValue,
  headingInHand,
  moveHeading,
  moveParts,
  partAt,
  partUnder,
} from "../../../src/tui/update/parts.ts";
import { update } from "../../../src/tui/update/update.ts";
import { SHARED_WORDS } from "../../../src/tui/workshop.ts";
import { stateWith } from "../../support/stock.ts";

const state = (changes: Partial<State> = {}): State =>
  stateWith({ screen: "parts", headingIndex: SHARED_WORDS.headings.indexOf("esr"), ...changes });
const typed = (text: string): Message => ({ type: "edit", edit: { edit: "insert", text } });
const run = (at: State, ...messages: readonly Message[]) =>
  messages.reduce((change, message) => update(change.state, message), { state: at, effects: [] } as ReturnType<
    typeof update
  >);

test("moveParts, moveHeading: ends stop, headings go round; a shrunk catalogue keeps the cursor on a part", () => {
  expect(partAt(moveParts(state(), "last", 0).state)).toBe(3);
  expect(partAt(moveParts(state(), -1, 0).state)).toBe(0);
  expect(partUnder(state({ partIndex: 99 }))?.part).toBe("film-d");
  expect(partUnder(state({ catalogue: null }))).toBeNull();
  expect(headingInHand(moveHeading(state({ headingIndex: 0 }), -1).state)).toBe(SHARED_WORDS.headings.at(-1));
  expect(headingInHand(state({ words: null }))).toBe("");
  expect(moveParts(state({ showFaults: true }), 1, 5).state.scroll.parts).toBe(1);
});

test("askValue(state): begins with what is set; nothing to ask without a part", () => {
  const own = { overrides: { "flash-a": { esr: "9 mohm" } } };
  expect(askValue(state(own)).state.prompt).toMatchObject({
    what: "value",
    part: "flash-a",
    heading: "esr",
    line: { text: "9 mohm" },
  });
  expect(askValue(state({ catalogue: null })).state.prompt).toBeNull();
});

test("a good value is set and saved, and undo takes it back from the file too", () => {
  const set = run(state(), { type: "value" }, typed("20 mohm"), { type: "confirm" });
  const overrides = { "flash-a": { esr: "20 mohm" } };
  expect(set.state.prompt).toBeNull();
  expect(set.effects).toEqual([{ type: "overrides", overrides }]);
  const back = update(set.state, { type: "undo" });
  expect(back.state.overrides).toEqual({});
  expect(back.effects).toContainEqual({ type: "overrides", overrides: {} });
});

test("a bad value is told and the question stays; a blank takes back what was set", () => {
  const bad = run(state(), { type: "value" }, typed("12 V"), { type: "confirm" });
  expect([bad.state.notice?.tone, bad.state.prompt === null, bad.effects]).toEqual(["bad", false, []]);
  const blank = run(
    state({ overrides: { "flash-a": { esr: "9 mohm" }, "flash-b": { esr: "1 ohm" } } }),
    { type: "value" },
    { type: "edit", edit: { edit: "clear" } },
    { type: "confirm" },
  );
  expect(blank.state.overrides).toEqual({ "flash-b": { esr: "1 ohm" } });
  const gone = state({ catalogue: { parts: [], sources: [] } });
  const asked = askValue(state()).state.prompt;
  if (asked?.what !== "value") throw new Error("asked");
  expect(confirmValue(gone, asked).state.prompt).toBeNull();
});

test("read again: what holds stays the same object; values set elsewhere go into every step back", () => {
  const nudged = run(state({ field: 1 }), { type: "nudge", up: true, coarse: false }).state;
  const { stock, catalogue, words } = nudged;
  if (catalogue === null || words === null) throw new Error("stock");
  const reopened = (overrides: State["overrides"]) =>
    update(nudged, { type: "opened", stock, words, catalogue, overrides }).state;
  expect(reopened({}).overrides).toBe(nudged.overrides);
  const elsewhere = reopened({ "flash-a": { esr: "3 mohm" } });
  expect(update(elsewhere, { type: "undo" }).state.overrides).toEqual({ "flash-a": { esr: "3 mohm" } });
  expect(elsewhere.reads).toBe(nudged.reads + 1);
});
