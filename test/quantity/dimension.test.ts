// Units and prefixes: what each spelling scales by, and which dimension it belongs to.
import { describe, expect, test } from "vitest";
import { DIMENSIONS, type Dimension, dimensionOf, PREFIXES, unitScale } from "../../src/quantity/dimension.ts";

describe("unitScale(unit, dimension)", () => {
  test.each([
    ["uF", "capacitance", -6],
    ["µF", "capacitance", -6],
    ["μF", "capacitance", -6],
    ["F", "capacitance", 0],
    ["mohm", "resistance", -3],
    ["Mohm", "resistance", 6],
    ["kΩ", "resistance", 3],
    ["g", "mass", -3],
    ["kg", "mass", 0],
    ["k ohm", "resistance", 3],
    ["L", "volume", -3],
    ["mL", "volume", -6],
    ["%", "fraction", -2],
  ] as const)("%s of %s: ten to the %d", (unit, dimension, exponent) =>
    expect(unitScale(unit, dimension)).toEqual({ exponent, factor: 1 }),
  );
  test.each([
    ["V", "capacitance"],
    ["", "capacitance"],
    ["xF", "capacitance"],
    ["kkF", "capacitance"],
    ["constructor", "capacitance"],
    ["toString", "time"],
    ["__proto__", "fraction"],
  ] as const)("%j of %s: none", (unit, dimension) => expect(unitScale(unit, dimension)).toBe(null));
  test("capital M is mega and small m milli, never the other way", () => {
    expect(unitScale("MF", "capacitance")?.exponent).toBe(6);
    expect(unitScale("mF", "capacitance")?.exponent).toBe(-3);
  });
});

describe("dimensionOf(unit)", () => {
  test.each([
    ["uF", "capacitance"],
    ["kV", "voltage"],
    ["ohm", "resistance"],
    ["min", "time"],
    ["kg", "mass"],
    ["%", "fraction"],
    ["A2s", "action"],
    ["jar", null],
  ])("%s: %s", (unit, dimension) => expect(dimensionOf(unit)).toBe(dimension));
  test("the printed symbol of every dimension reads as that dimension", () => {
    for (const [name, { symbol }] of Object.entries(DIMENSIONS)) {
      if (symbol !== "") expect(unitScale(symbol, name as Dimension), name).not.toBe(null);
    }
  });
});

describe("PREFIXES", () => {
  // Source: [SI-brochure] table of prefixes.
  test("powers of ten", () =>
    expect(PREFIXES).toMatchObject({ f: -15, p: -12, n: -9, u: -6, m: -3, "": 0, k: 3, M: 6, G: 9, T: 12 }));
});
