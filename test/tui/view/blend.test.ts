// The screen of blends: not begun, on the way, ended with nothing, of another brief; its keys.
import { describe, expect, test } from "vitest";
import { blendKey } from "../../../src/tui/blend/key.ts";
import type { Seeking } from "../../../src/tui/blend/state.ts";
import { helpLineKeys, messageFor } from "../../../src/tui/keys.ts";
import type { State } from "../../../src/tui/state.ts";
import { blendPage } from "../../../src/tui/view/blend.ts";
import { drawScreen } from "../../../src/tui/view/screen.ts";
import { flatOf, foundFor, linesOf, plannedOn, withBlend } from "../../support/blendScreen.ts";
import { BRIEF, stateWith } from "../../support/stock.ts";

const state = plannedOn(undefined, { rows: 24 });
const key = blendKey(state) ?? "";
const running: Seeking = { key, stage: "ladder", seconds: 4.7, stopping: false };
const press = (at: State, name: string) => messageFor(at, { kind: "key", key: name, text: "" });
const keysOf = (at: State): readonly string[] => helpLineKeys(at).map(({ shown, words }) => `${shown} ${words}`);

describe("blendPage(state, room)", () => {
  test("not begun: says so, what a blend is, and the key that begins", () => {
    expect(flatOf(state)).toMatch(/No blend was sought for this brief yet\. Enter finds it\. A blend is a bank/);
    expect(press(state, "enter")).toEqual({ type: "blend", message: { type: "find" } });
    expect(keysOf(state)).toContain("Enter find the blend");
  });

  test("on the way: the stage, the whole seconds, Esc; told to stop, it says that", () => {
    const at = withBlend(state, { running });
    expect(flatOf(at)).toMatch(/Working out the cost ladder 4 s so far; .* Esc stops with the best so far\./);
    expect(press(at, "escape")).toEqual({ type: "blend", message: { type: "cancel" } });
    expect(keysOf(at)).not.toContain("Enter find the blend");
    expect(flatOf(withBlend(state, { running: { ...running, stopping: true } }))).toContain("Stopping; Esc again");
    const elsewhere = withBlend({ ...state, screen: "layouts" }, { running });
    expect(press(elsewhere, "escape")).toEqual({ type: "go", screen: "brief" });
  });

  test("the brief changed on the way: said, and Enter begins anew", () => {
    const at = withBlend(plannedOn(undefined, { values: { ...BRIEF, energy: "2.5 kJ" } }), { running });
    expect(flatOf(at)).toContain("This is for the brief before; Enter begins anew.");
    expect(press(at, "enter")).toEqual({ type: "blend", message: { type: "find" } });
  });

  test("ended with nothing: cancelled, or no thread with the command that finds it too", () => {
    expect(flatOf(withBlend(state, { ended: { key, why: "cancelled" } }))).toContain("Cancelled before anything");
    const failed = flatOf(withBlend(state, { ended: { key, why: "failed" } }));
    expect(failed).toMatch(/No thread can be had .* joulewright plan BRIEF --blend finds it too/);
    const other = withBlend(state, { ended: { key: "other", why: "failed" } });
    expect(flatOf(other)).toContain("No blend was sought for this brief yet");
  });

  test("found for another brief: no figure of it is shown; back at that brief it is", async () => {
    const found = await foundFor(state);
    const other = withBlend(plannedOn(undefined, { values: { ...BRIEF, energy: "2.5 kJ" } }), { found });
    expect(flatOf(other)).toContain("What was found is of another brief or catalogue.");
    expect(flatOf(other)).not.toMatch(/Cheapest blend|EUR/);
    expect(flatOf(withBlend(state, { found }))).toContain("Cheapest blend, 120 units in 2 groups");
    expect(press(withBlend(state, { found }), "enter")).toBeNull();
    expect(press(withBlend(state, { found: { ...found, stopped: true } }), "enter")).not.toBeNull();
  });

  test("no catalogue, a brief that is not whole, catalogues being read: as on the other screens, and Enter does nothing", () => {
    const none = stateWith({ screen: "blend", stock: { name: "", parts: 0, faults: 0, note: "" } });
    expect(flatOf(none)).toContain("There is no catalogue yet");
    expect(flatOf(plannedOn(undefined, { values: {} }))).toContain("No plan yet; still needed");
    expect(flatOf({ ...state, words: null, answer: null })).toContain("Reading test.csv.");
    expect(flatOf({ ...state, asked: 9 })).toContain("Planning the brief first.");
    for (const at of [none, plannedOn(undefined, { values: {} }), { ...state, asked: 9 }])
      expect(press(at, "enter")).toBeNull();
  });

  test("the help says what is shown and which command shows the same", () => {
    const help = flatOf({ ...state, help: true, rows: 60 });
    expect(help).toContain("Keys on blend");
    expect(help).toContain("joulewright plan BRIEF --blend --within 10% --ladder 10%");
  });

  test("every state fits 60x20, 80x24 and 200x50, in colour, without, and in ASCII alone", async () => {
    const found = await foundFor(state);
    const states = [
      state,
      withBlend(state, { running }),
      withBlend(state, { ended: { key, why: "failed" } }),
      withBlend(state, { found }),
    ];
    for (const [columns, rows] of [
      [60, 20],
      [80, 24],
      [200, 50],
    ] as const)
      for (const ascii of [true, false])
        for (const at of states) {
          const drawn = linesOf({ ...at, columns, rows, look: { colour: false, ascii } });
          expect(drawn).toHaveLength(rows);
          expect(Math.max(...drawn.map((line) => [...line].length))).toBeLessThanOrEqual(columns);
          expect(drawn[0]).toContain("[b blend]");
          if (ascii) expect(drawn.join("")).toMatch(/^[\x20-\x7e]*$/);
        }
    const plain = drawScreen({ ...states[3], look: { colour: false, ascii: false } } as State).rows.join("");
    expect(plain).not.toMatch(/\x1b\[(?:\d+;)*(?:3\d|4\d|9\d)(?:;\d+)*m/);
  });

  test("what is found scrolls to its end, the cautions", async () => {
    const at = withBlend({ ...state, rows: 20 }, { found: await foundFor(state) });
    const { mostScroll } = blendPage(at, { columns: 80, rows: 14 });
    expect(mostScroll).toBeGreaterThan(20);
    expect(flatOf({ ...at, scroll: { blend: mostScroll } })).toContain("not an approval");
  });
});
