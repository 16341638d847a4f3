// Clicks mean the screen or the row that is drawn where they fall, at any size.
import { expect, test } from "vitest";
import { messageFor } from "../../../src/tui/keys.ts";
import { SCREENS, type State } from "../../../src/tui/state.ts";
import { clickMeans } from "../../../src/tui/update/click.ts";
import { update } from "../../../src/tui/update/update.ts";
import { drawScreen } from "../../../src/tui/view/screen.ts";
import { detailed } from "../../support/detailed.ts";

const at = (changes: Partial<State>): State => detailed({ mouse: true, ...changes });
const rows = (state: State): readonly string[] =>
  drawScreen(state).rows.map((row) => row.replace(/\x1b\[[\d;]*m/g, ""));

test.each([60, 80, 200])("every screen can be clicked by its name or key at %i columns", (columns) => {
  const state = at({ screen: "layouts", columns });
  const seen = new Set<string>();
  for (let column = 0; column < columns; column += 1) {
    const means = clickMeans(state, { column, row: 0 });
    if (means?.type === "go") seen.add(means.screen);
  }
  expect([...seen]).toEqual([...SCREENS]);
});

test("a click on a row of the list moves the cursor there", () => {
  const state = at({ screen: "layouts" });
  const means = clickMeans(state, { column: 5, row: 8 });
  if (means === null) throw new Error("no row");
  const before = rows(state)[8] ?? "";
  const after = rows(update(state, means).state).find((row) => row.startsWith("> ")) ?? "";
  expect(after.slice(2)).toBe(before.slice(2));
});

test("a click on a field takes it; on the results under the form, the rule, the caution or the cursor itself nothing", () => {
  const state = at({ screen: "brief" });
  expect(clickMeans(state, { column: 5, row: 5 })).toEqual({ type: "move", by: 2 });
  const result = rows(state).findIndex((row) => row.includes("layouts fit"));
  for (const row of [1, 2, 3, result, 21, 22, 23]) expect(clickMeans(state, { column: 5, row })).toBeNull();
});

test("with the mouse off reports mean nothing; the terminal's ground is always taken", () => {
  const report = (text: string) => ({ kind: "report", text }) as const;
  const off = at({ mouse: false });
  expect(messageFor(off, report("\x1b[<0;3;1M"))).toBeNull();
  expect(messageFor(at({}), report("\x1b[<0;3;1M"))).toEqual({ type: "click", column: 2, row: 0 });
  expect(messageFor(at({}), report("\x1b[<65;3;1M"))).toEqual({ type: "move", by: 3 });
  expect(messageFor(at({ help: true }), report("\x1b[<0;3;1M"))).toBeNull();
  expect(messageFor(off, report("\x1b]11;rgb:ffff/ffff/ffff\x07"))).toEqual({ type: "ground", ground: "light" });
  expect(update(off, { type: "ground", ground: "light" }).state.look.palette).toBe("light256");
  expect(update(off, { type: "mouse" }).effects).toEqual([{ type: "mouse", on: true }]);
});
