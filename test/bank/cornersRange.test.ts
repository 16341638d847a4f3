// Ranges of a stage, and a corner of them in words.
import { describe, expect, test } from "vitest";
import { cornerWords, type Sides, stageRange } from "../../src/bank/cornersRange.ts";

const range = (over: Partial<Parameters<typeof stageRange>[0]> = {}) =>
  stageRange({
    units: 5,
    capacitance: 1e-3,
    tLow: 0.1,
    tHigh: 0.5,
    leakage: 2e-3,
    insulation: 1e6,
    resistance: 1e4,
    q: 0.05,
    ...over,
  });
const LOW: Sides = { capacitance: "low", leakageCurrent: "low", conductance: "low", resistance: "high" };
const HIGH: Sides = { capacitance: "high", leakageCurrent: "high", conductance: "high", resistance: "low" };

describe("stageRange({ units, ... })", () => {
  test("units in parallel add; leakage from nothing to all; no resistor is Infinity", () => {
    const found = range();
    expect(found.capacitance.low).toBeCloseTo(4.5e-3, 15);
    expect(found.capacitance.high).toBeCloseTo(7.5e-3, 15);
    expect(found.capacitance.nominal).toBeCloseTo(5e-3, 15);
    expect(found.leakageCurrent).toEqual({ low: 0, nominal: 0.01, high: 0.01 });
    expect(found.conductance).toMatchObject({ low: 0, nominal: found.conductance.high });
    expect(found.resistance.nominal).toBe(1e4);
    expect(found.conductance.high).toBeCloseTo(5e-6, 18);
    expect(found.resistance).toMatchObject({ low: 9500, high: 10500 });
    expect(range({ resistance: null }).resistance.low).toBe(Number.POSITIVE_INFINITY);
  });
});

describe("cornerWords(ranges, stage, named, victim, rest)", () => {
  test("lopsided tolerance, the third stage", () => {
    const ranges = [range(), range(), range()];
    expect(cornerWords(ranges, 2, ["capacitance"], LOW, HIGH)).toBe("stage 3 at -10 %, the rest at +50 %");
    expect(cornerWords(ranges, 0, ["leakageCurrent"], LOW, HIGH)).toBe(
      "stage 1 with no leakage, the rest with the greatest leakage",
    );
  });

  test("resistors by their tolerance, insulation by its leakage, several quantities one after the other", () => {
    const ranges = [range({ q: 0.01234 }), range({ q: 0.01234 })];
    expect(cornerWords(ranges, 1, ["resistance"], LOW, HIGH)).toBe(
      "stage 2 resistor at +1.234 %, the rest resistor at -1.234 %",
    );
    expect(cornerWords(ranges, 0, ["conductance"], HIGH, LOW)).toBe(
      "stage 1 with the greatest insulation leakage, the rest with no insulation leakage",
    );
    expect(cornerWords(ranges, 0, ["capacitance", "leakageCurrent"], LOW, HIGH)).toBe(
      "stage 1 at -10 %, the rest at +50 %; stage 1 with no leakage, the rest with the greatest leakage",
    );
  });

  test("one stage has no company; a spread in one stage alone is named", () => {
    expect(cornerWords([range()], 0, ["capacitance"], LOW, HIGH)).toBe("stage 1 at -10 %");
    const alike = range({ tLow: 0, tHigh: 0 });
    expect(cornerWords([alike, range()], 1, ["capacitance"], LOW, HIGH)).toBe("stage 2 at -10 %, the rest at 0 %");
    expect(cornerWords([alike, range(), range({ tLow: 0.2 })], 0, ["capacitance"], HIGH, LOW)).toBe(
      "stage 1 at 0 %, the rest each at its least",
    );
  });

  test("unlike neighbours are each at their own; a quantity without spread is left out", () => {
    const ranges = [range(), range({ tHigh: 0.2 }), range()];
    expect(cornerWords(ranges, 0, ["capacitance"], LOW, HIGH)).toBe("stage 1 at -10 %, the rest each at its greatest");
    expect(cornerWords([range({ q: 0 }), range({ q: 0 })], 0, ["resistance"], LOW, HIGH)).toBe("every stage alike");
  });
});
