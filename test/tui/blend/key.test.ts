// The name of the brief in force: none while it is not whole or not planned, another after another brief or reading.
import { expect, test } from "vitest";
import { blendKey, keyInForce } from "../../../src/tui/blend/key.ts";
import { answerFor } from "../../../src/tui/engine.ts";
import { BRIEF, engine, stateWith } from "../../support/stock.ts";

const planned = (changes: Parameters<typeof stateWith>[0] = {}) => {
  const state = stateWith(changes);
  return { ...state, answer: answerFor(state, engine, true) };
};

test("blendKey(state): null before an answer and for a refused brief", () => {
  expect(blendKey(stateWith())).toBeNull();
  expect(blendKey(planned({ values: {} }))).toBeNull();
});

test("the same for the same brief, another for another brief or newly read catalogues", () => {
  const key = blendKey(planned());
  expect(key).not.toBeNull();
  expect(blendKey(planned({ screen: "map", rank: "mass" }))).toBe(key);
  expect(blendKey(planned({ values: { ...BRIEF, energy: "2.5 kJ" } }))).not.toBe(key);
  expect(blendKey(planned({ reads: 3 }))).not.toBe(key);
});

test("keyInForce(state): the same, but null while a newer brief is being planned", () => {
  expect(keyInForce(planned())).toBe(blendKey(planned()));
  expect(keyInForce({ ...planned(), asked: 7 })).toBeNull();
  expect(blendKey({ ...planned(), asked: 7 })).toBe(blendKey(planned()));
});
