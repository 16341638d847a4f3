// The beginning: what was saved, or the brief given, never a crash.
import { expect, test } from "vitest";
import { startState } from "../../src/tui/restore.ts";
import { savedText } from "../../src/tui/saved.ts";
import { BRIEF, fakePorts, stateWith } from "../support/stock.ts";

test("with nothing saved it begins with the brief given, on the form", () => {
  const state = startState(fakePorts(100, 30));
  expect(state.values).toEqual(BRIEF);
  expect([state.screen, state.columns, state.rows, state.notice, state.caret]).toEqual(["brief", 100, 30, null, 6]);
});

test("what was saved comes back", () => {
  const ports = fakePorts();
  ports.kept.session = savedText(stateWith({ values: { energy: "5 kJ" }, screen: "layouts" }));
  const state = startState(ports);
  expect([state.values, state.screen, state.caret]).toEqual([{ energy: "5 kJ" }, "layouts", 4]);
});

test("a brief asked for now holds over the saved one; pins and place stay", () => {
  const ports = fakePorts(80, 24, { briefFirst: true });
  const pins = [{ part: "flash-a", series: 7, parallel: 4, ties: "strings" } as const];
  ports.kept.session = savedText(stateWith({ values: { energy: "5 kJ" }, screen: "compare", pins }));
  const state = startState(ports);
  expect([state.values, state.screen, state.pins]).toEqual([BRIEF, "compare", pins]);
});

test("a saved text that cannot be read is put aside and told, not overwritten", () => {
  const ports = fakePorts();
  ports.kept.session = "rubbish";
  const state = startState(ports);
  expect(ports.kept.aside).toBe("rubbish");
  expect(state.notice?.text).toContain("session.unread");
  expect(state.values).toEqual(BRIEF);
});

test("a terminal that does not tell its size is taken to be 80 by 24", () => {
  const ports = fakePorts();
  ports.stdout.columns = 0;
  ports.stdout.rows = 0;
  expect([startState(ports).columns, startState(ports).rows]).toEqual([80, 24]);
});
