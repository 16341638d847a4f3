// The name of the brief in force: none while it is not whole or not planned, another after another brief or reading.
import { expect, test } from "vitest";
import { blendKey } from "../../../src/tui/blend/key.ts";
import { answerFor } from "../../../src/tui/engine.ts";
import { BRIEF, engine, stateWith } from "../../support/stock.ts";

const planned = (changes: Parameters<typeof stateWith>[0] = {}) => {
  const state = stateWith(changes);
  return { ...state, answer: answerFor(state, engine, true) };
};

test("blendKey(state): null before an answer, for a refused brief, and while a newer one is planned", () => {
  expect(blendKey(stateWith())).toBeNull();
  expect(blendKey(planned({ values: {} }))).toBeNull();
  expect(blendKey({ ...planned(), asked: 7 })).toBeNull();
});

test("the same for the same brief, another for another brief or newly read catalogues", () => {
  const key = blendKey(planned());
  expect(key).not.toBeNull();
  expect(blendKey(planned({ screen: "map", rank: "mass" }))).toBe(key);
  expect(blendKey(planned({ values: { ...BRIEF, energy: "2.5 kJ" } }))).not.toBe(key);
  expect(blendKey(planned({ reads: 3 }))).not.toBe(key);
});
