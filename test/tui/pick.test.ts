// Which layouts are listed, under the cursor, pinned, shown.
import { expect, test } from "vitest";
import { answerFor } from "../../src/tui/engine.ts";
import {
  arrangementOf,
  isPinned,
  listed,
  pinnedLayouts,
  planOf,
  selectedIndex,
  selectedLayout,
  shownBank,
} from "../../src/tui/pick.ts";
import type { State } from "../../src/tui/state.ts";
import { engine, stateWith } from "../support/stock.ts";

const planned = (changes: Partial<State> = {}): State => {
  const state = stateWith(changes);
  return { ...state, answer: answerFor(state, engine, true) };
};

test("before an answer there is nothing, and nothing fails", () => {
  const state = stateWith();
  expect([
    planOf(state),
    listed(state),
    selectedIndex(state),
    selectedLayout(state),
    pinnedLayouts(state),
    shownBank(state),
  ]).toEqual([null, [], 0, null, [], null]);
});

test("the cursor follows a layout by its name, and falls to the first when it is gone", () => {
  const state = planned();
  const second = listed(state)[1];
  expect(second).toBeDefined();
  expect(selectedIndex({ ...state, selected: second?.id ?? "" })).toBe(1);
  expect(selectedIndex({ ...state, selected: "gone 1s1p strings" })).toBe(0);
});

test("a pin is the same arrangement, not the same object", () => {
  const layout = listed(planned())[0];
  if (layout === undefined) throw new Error("no layout");
  const state = planned({ pins: [arrangementOf(layout)] });
  expect(isPinned(state, layout)).toBe(true);
  expect(isPinned(state, { ...layout, parallel: layout.parallel + 1 })).toBe(false);
  expect(pinnedLayouts(state).map((pin) => pin?.id)).toEqual([layout.id]);
});

test("the shown bank is the chosen one, and not an answer about another", () => {
  const layout = listed(planned())[0];
  if (layout === undefined) throw new Error("no layout");
  const state = planned({ chosen: arrangementOf(layout) });
  expect(shownBank(state)?.id).toBe(layout.id);
  expect(shownBank({ ...state, chosen: { ...arrangementOf(layout), parallel: 999 } })).toBeNull();
});
