// Pins and the chosen bank.
import { expect, test } from "vitest";
import { foldedRows } from "../../../src/tui/comparison.ts";
import { answerFor } from "../../../src/tui/engine.ts";
import { arrangementOf, listed, pinnedLayouts } from "../../../src/tui/pick.ts";
import { MOST_PINS, type State } from "../../../src/tui/state.ts";
import { chooseBank, orderPins, togglePin } from "../../../src/tui/update/pins.ts";
import { engine, stateWith } from "../../support/stock.ts";

const planned = (changes: Partial<State> = {}): State => {
  const state = stateWith({ screen: "layouts", ...changes });
  return { ...state, answer: answerFor(state, engine, true) };
};

test("with nothing under the cursor nothing happens", () => {
  expect(togglePin(stateWith({ screen: "layouts" })).effects).toEqual([]);
  expect(togglePin(stateWith({ screen: "compare" })).effects).toEqual([]);
  expect(chooseBank(stateWith({ screen: "layouts" })).state.screen).toBe("layouts");
});

test("togglePin pins the layout under the cursor, again unpins it, and asks for both", () => {
  const pinned = togglePin(planned());
  expect(pinned.state.pins).toEqual([arrangementOf(listed(planned())[0] as never)]);
  expect(pinned.effects).toEqual([{ type: "ask", asked: 1 }]);
  expect(pinned.state.notice?.text).toContain("1 of 4");
  expect(togglePin(pinned.state).state.pins).toEqual([]);
});

test(`a pin past ${MOST_PINS} is refused in words, and unpinning stays possible`, () => {
  const layouts = listed(planned()).map(arrangementOf);
  const full = planned({ pins: layouts.slice(0, MOST_PINS), selected: listed(planned())[MOST_PINS]?.id ?? "" });
  const more = togglePin(full);
  expect(more.state.pins).toHaveLength(MOST_PINS);
  expect(more.state.notice?.tone).toBe("warn");
  expect(togglePin({ ...full, selected: listed(full)[0]?.id ?? "" }).state.pins).toHaveLength(MOST_PINS - 1);
});

test("on the comparison the column's pin goes, and the cursor stays on a column", () => {
  const layouts = listed(planned()).map(arrangementOf);
  const state = planned({ screen: "compare", pins: layouts.slice(0, 2), column: 1 });
  const { state: after } = togglePin(state);
  expect([after.pins, after.column]).toEqual([layouts.slice(0, 1), 0]);
});

test("chooseBank goes to the bank and begins at its top", () => {
  const { state, effects } = chooseBank(planned({ scroll: { bank: 7 } }));
  expect(state.screen).toBe("bank");
  expect(state.chosen).toEqual(arrangementOf(listed(planned())[0] as never));
  expect(state.scroll.bank).toBe(0);
  expect(effects).toEqual([{ type: "ask", asked: 1 }]);
});

test("orderPins(state): the pins in the order of the row under the cursor, best first; alone or in order nothing is asked", () => {
  const layouts = listed(planned()).filter(({ part }, i, all) => all.findIndex((one) => one.part === part) === i);
  const pins = layouts.slice(0, 3).map(arrangementOf);
  expect(pins).toHaveLength(3);
  const state = planned({ screen: "compare", pins });
  const rows = foldedRows(pinnedLayouts(state), false).shown;
  const units = rows.findIndex(({ label }) => label === "units");
  const ordered = orderPins({ ...state, scroll: { compare: units } });
  const after = planned({ screen: "compare", pins: ordered.state.pins });
  const counts = pinnedLayouts(after).map((layout) => layout?.units ?? 0);
  expect(counts).toEqual([...counts].sort((a, b) => a - b));
  expect(new Set(ordered.state.pins)).toEqual(new Set(pins));
  expect(orderPins({ ...after, scroll: { compare: units } }).effects).toEqual([]);
  expect(orderPins(planned({ screen: "compare", pins: pins.slice(0, 1) })).effects).toEqual([]);
});
