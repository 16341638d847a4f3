// Where each value comes from, and the two things that may be assumed.
import { describe, expect, test } from "vitest";
import type { Capacitor } from "../../src/catalog/capacitor.ts";
import { assumedLeakage, namedStates, polarityOf, RULES, stateOf } from "../../src/catalog/states.ts";

const unit: Capacitor = {
  part: "a",
  capacitance: 1e-3,
  voltage: 450,
  esr: 0.1,
  leakage: 1e-3,
  states: { leakage: { state: "assumed", rule: RULES.leakage } },
  file: "c.csv",
  line: 2,
};

describe("stateOf(unit, key)", () => {
  test("absent is unknown", () => expect(stateOf(unit, "esl")).toEqual({ state: "unknown" }));
  test("given without a mark is from the datasheet", () =>
    expect(stateOf(unit, "esr")).toEqual({ state: "datasheet" }));
  test("assumed names its rule", () =>
    expect(stateOf(unit, "leakage")).toEqual({ state: "assumed", rule: RULES.leakage }));
});

describe("assumedLeakage(C, V): 0.01 C V uA with C in uF, at least 3 uA", () => {
  // Source: the worked leakage estimates, 3300 uF at 450 V: 14850 uA.
  test.each([
    [3300e-6, 450, 14850e-6],
    [1e-6, 450, 4.5e-6],
    [1e-6, 299, 3e-6],
    [1e-9, 10, 3e-6],
    [330e-6, 450, 1.485e-3],
  ])("%d F, %d V: %d A", (c, v, amps) => expect(assumedLeakage(c, v)).toBeCloseTo(amps, 12));
});

describe("polarityOf(technology)", () => {
  test.each([
    [undefined, undefined],
    ["", undefined],
    ["unheard of", undefined],
    ["photoflash electrolytic", true],
    ["double-layer", true],
    ["bipolar electrolytic", false],
    ["non-polarised electrolytic", false],
    ["film-foil pulse", false],
    ["oil-paper", false],
    ["home-made plates", false],
  ])("%s: %s", (technology, polarised) => expect(polarityOf(technology)).toBe(polarised));
});

describe("namedStates(measured, assumed)", () => {
  test("nothing named, nothing marked", () =>
    expect(namedStates(undefined, undefined)).toEqual({ states: {}, strange: [] }));
  test("headings to keys, in any separator and case; the strange come back", () =>
    expect(namedStates("Capacitance; surge voltage", "esr | colour")).toEqual({
      states: {
        capacitance: { state: "measured" },
        surgeVoltage: { state: "measured" },
        esr: { state: "assumed", rule: RULES.builder },
      },
      strange: ["colour"],
    }));
});
