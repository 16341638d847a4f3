// The table of keys: what a key means depends on what is on top, and only live keys are named.
import { describe, expect, test } from "vitest";
import { answerFor } from "../../src/tui/engine.ts";
import { helpLineKeys, KEYS, liveKeys, messageFor } from "../../src/tui/keys.ts";
import { lineOf } from "../../src/tui/line.ts";
import { SCREEN_KEYS, SCREENS, type State } from "../../src/tui/state.ts";
import { BRIEF, engine, stateWith } from "../support/stock.ts";

const planned = (changes: Partial<State> = {}): State => {
  const state = stateWith(changes);
  return { ...state, answer: answerFor(state, engine, true) };
};
const press = (state: State, key: string, text = "") => messageFor(state, { kind: "key", key, text });

const BANK = { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" } as const;

describe("messageFor(state, event)", () => {
  test("a letter is typed on the form and is a key elsewhere", () => {
    expect(press(planned(), "r", "r")).toEqual({ type: "edit", edit: { edit: "insert", text: "r" } });
    expect(press(planned({ screen: "layouts" }), "r", "r")).toEqual({ type: "rank" });
    expect(press(planned(), "q", "q")).toEqual({ type: "edit", edit: { edit: "insert", text: "q" } });
    expect(press(planned({ screen: "layouts" }), "q", "q")).toEqual({ type: "quit" });
  });
  test("every function key up to F11 has its screen, and F12 is the mouse's, however many screens there are", () => {
    expect(press(planned(), "f2")).toEqual({ type: "go", screen: "brief" });
    expect(press(planned(), "f11")).toEqual({ type: "go", screen: SCREENS[9] });
    expect(press(planned(), "f12")).toEqual({ type: "mouse" });
    expect(press(planned({ screen: "layouts" }), "b")).toEqual({ type: "go", screen: "blend" });
    expect(press(planned(), "alt+b")).toEqual({ type: "go", screen: "blend" });
  });
  test("a letter on a field of choices does nothing, left and right choose", () => {
    const onBasis = planned({ field: 3 });
    expect(press(onBasis, "x", "x")).toBeNull();
    expect(press(onBasis, "right")).toEqual({ type: "choice", by: 1 });
    expect(press(planned({ field: 0 }), "right")).toEqual({ type: "edit", edit: { edit: "right" } });
  });
  test("Escape goes one step back, whatever is on top", () => {
    expect(press(planned({ help: true }), "escape")).toEqual({ type: "help" });
    expect(
      press(planned({ screen: "order", prompt: { what: "order", line: lineOf("a"), replace: false } }), "escape"),
    ).toEqual({
      type: "cancel",
    });
    expect(press(planned({ screen: "compare" }), "escape")).toEqual({ type: "go", screen: "layouts" });
    expect(press(planned({ screen: "layouts" }), "escape")).toEqual({ type: "go", screen: "brief" });
  });
  test("while a file name is asked for, letters and pastes go into it", () => {
    const asking = planned({ screen: "order", prompt: { what: "order", line: lineOf("a"), replace: false } });
    expect(press(asking, "q", "q")).toEqual({ type: "edit", edit: { edit: "insert", text: "q" } });
    expect(press(asking, "1", "1")).toEqual({ type: "edit", edit: { edit: "insert", text: "1" } });
    expect(messageFor(asking, { kind: "paste", text: "b.csv" })).toEqual({
      type: "edit",
      edit: { edit: "insert", text: "b.csv" },
    });
  });
  test("while it is asked whether to replace a file, only y, n and Escape answer", () => {
    const asking = planned({ screen: "order", prompt: { what: "order", line: lineOf("a"), replace: true } });
    expect(press(asking, "y", "y")).toEqual({ type: "confirm" });
    expect(press(asking, "n", "n")).toEqual({ type: "cancel" });
    expect(press(asking, "enter")).toBeNull();
    expect(press(asking, "e", "e")).toBeNull();
    expect(messageFor(asking, { kind: "paste", text: "y" })).toBeNull();
  });
  test("a paste where nothing is typed does nothing, and never acts as keys", () => {
    expect(messageFor(planned({ screen: "layouts" }), { kind: "paste", text: "q" })).toBeNull();
  });
  test("reports of the terminal do nothing", () => {
    expect(messageFor(planned(), { kind: "report", text: "\x1b[<0;3;4M" })).toBeNull();
  });
  test("every screen is one key away from every other, also while typing", () => {
    for (const screen of SCREENS) {
      const state = planned({ screen });
      SCREENS.forEach((goal, index) => {
        const key = SCREEN_KEYS[goal];
        expect(press(state, `alt+${key}`)).toEqual({ type: "go", screen: goal });
        if (index + 2 < 12) expect(press(state, `f${index + 2}`)).toEqual({ type: "go", screen: goal });
        if (screen !== "brief") expect(press(state, key, key)).toEqual({ type: "go", screen: goal });
      });
    }
  });
  test("Ctrl-C and Ctrl-Q quit from everywhere, help and questions included", () => {
    const tops: Partial<State>[] = [
      {},
      { help: true },
      { screen: "order", prompt: { what: "order", line: lineOf(""), replace: true } },
    ];
    for (const top of tops)
      for (const key of ["ctrl+c", "ctrl+q"]) expect(press(planned(top), key)).toEqual({ type: "quit" });
  });
  test("keys about layouts are dead where there are none", () => {
    const none = stateWith({ screen: "layouts", answer: { kind: "refused", refusals: [] } });
    for (const key of ["enter", "space", "r", "f", "down"]) expect(press(none, key, "")).toBeNull();
  });
});

describe("the words", () => {
  test("every named key can be pressed, and every row has words", () => {
    expect(KEYS.filter((row) => row.words === "")).toEqual([]);
    const covers = KEYS.filter((row) => row.keys.length === 0).map((row) => row.shown);
    expect(covers).toEqual([Object.values(SCREEN_KEYS).join(" "), "Alt-1 2 ..."]);
  });
  test.each([
    ["brief", {}, ["Up/Down", "Ctrl-U", "Alt-1 2 ...", "Esc", "F1", "Ctrl-Q"]],
    ["brief, choices", { field: 3 }, ["Up/Down", "Left/Right", "Alt-1 2 ...", "Esc", "F1", "Ctrl-Q"]],
    ["layouts", { screen: "layouts" }, ["Space", "Enter", "r", "f", "Up/Down", "u U", "Esc", "F1", "Ctrl-Q"]],
    ["compare without pins", { screen: "compare" }, ["u U", "Esc", "F1", "Ctrl-Q"]],
    ["sharing", { screen: "sharing", chosen: BANK }, ["c", "Space", "Up/Down", "u U", "Esc", "F1", "Ctrl-Q"]],
    ["shot", { screen: "shot", chosen: BANK }, ["l", "Space", "Up/Down", "u U", "Esc", "F1", "Ctrl-Q"]],
    ["shot without a bank", { screen: "shot" }, ["l", "u U", "Esc", "F1", "Ctrl-Q"]],
    ["help", { help: true }, ["Esc", "Up/Down", "Ctrl-Q"]],
  ] as const)("the help line on %s names what is live now, in order", (_name, changes, want) => {
    expect(helpLineKeys(planned(changes as Partial<State>)).map((row) => row.shown)).toEqual(want);
  });
  test("the spread is asked for only where it is not shown unasked: not on the statistical basis, not of one stage", () => {
    const on = (changes: Partial<State>) => press(planned({ screen: "sharing", chosen: BANK, ...changes }), "c", "c");
    expect(on({})).toEqual({ type: "spread" });
    expect(on({ values: { ...BRIEF, basis: "statistical" } })).toBeNull();
    expect(on({ chosen: { ...BANK, series: 1 } })).toBeNull();
    expect(on({ chosen: null })).toBeNull();
    expect(on({ screen: "bank" })).toBeNull();
  });
  test("no key is named twice on one screen", () => {
    for (const screen of SCREENS) {
      const names = liveKeys(planned({ screen })).map((row) => row.shown);
      expect([screen, names.filter((name, index) => names.indexOf(name) !== index)]).toEqual([screen, []]);
    }
  });
});
