// Along the trail, and back to a brief of it.
import { expect, test } from "vitest";
import type { State } from "../../../src/tui/state.ts";
import { moveTrail, retry, trailIndex } from "../../../src/tui/update/trail.ts";
import { stateWith } from "../../support/stock.ts";

const entry = (voltage: string) => ({
  values: { voltage },
  extra: {},
  words: "",
  best: null,
  cost: null,
  currency: null,
  units: null,
  load: null,
  chosenCost: null,
});
const state = (changes: Partial<State> = {}) =>
  stateWith({ screen: "trail", trail: ["1 kV", "2 kV", "3 kV"].map(entry), ...changes });

test("moveTrail(state, by): the cursor begins at the end and stops at both", () => {
  expect(trailIndex(state())).toBe(2);
  expect(trailIndex(moveTrail(state(), -1).state)).toBe(1);
  expect(trailIndex(moveTrail(state(), "first").state)).toBe(0);
  expect(trailIndex(moveTrail(state(), 5).state)).toBe(2);
  expect(trailIndex(moveTrail(stateWith(), -1).state)).toBe(0);
});

test("retry(state): the brief of the entry, asked again; nothing on an empty trail", () => {
  const back = retry(state({ trailBack: 2, field: 1 }));
  expect([back.state.values, back.state.caret, back.state.trailBack]).toEqual([{ voltage: "1 kV" }, 4, 0]);
  expect(back.effects).toHaveLength(1);
  expect(retry(stateWith()).effects).toEqual([]);
});
