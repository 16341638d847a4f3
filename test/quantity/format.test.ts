// Printing by the rules of the SI brochure and of engineering notation, and rounding to the safe side.

import { describe, expect, test } from "vitest";
import { formatQuantity, roundTo, toAscii } from "../../src/quantity/format.ts";
import fc from "../support/property.ts";

describe("formatQuantity(value, dimension, options)", () => {
  test.each([
    [null, "voltage", "unknown"],
    [undefined, "voltage", "unknown"],
    [Number.NaN, "voltage", "unknown"],
    [Number.POSITIVE_INFINITY, "resistance", "unlimited"],
    [Number.NEGATIVE_INFINITY, "voltage", "unknown"],
    [0, "voltage", "0 V"],
    [0, "time", "0 s"],
    [0, "fraction", "0 %"],
  ] as const)("%s: %s %s", (value, dimension, text) => expect(formatQuantity(value, dimension)).toBe(text));

  // Source: [SI-brochure] 5.3.3 space between number and unit, 5.4 prefix attached; engineering examples of the working notes.
  test.each([
    [4.125e-3, "capacitance", "4.125 mF"],
    [8e-8, "inductance", "80 nH"],
    [470e-6, "capacitance", "470 µF"],
    [25062.6566, "resistance", "25.06 kohm"],
    [0.99996, "current", "1 A"],
    [999.96, "current", "1 kA"],
    [0.000999996, "current", "1 mA"],
    [1e-15, "capacitance", "1 fF"],
    [-2200, "voltage", "-2.2 kV"],
    [0.2, "fraction", "20 %"],
    [0.333333333, "fraction", "33.33 %"],
    [0.5, "mass", "500 g"],
    [0.99996, "mass", "1 kg"],
    [56.25, "mass", "56.25 kg"],
    [30e-6, "volume", "30 cm3"],
    [0.08, "volume", "80 L"],
    [30e6, "field", "30 kV/mm"],
    [50e6, "slew", "50 V/us"],
    [0.012, "area", "120 cm2"],
    [25, "temperature", "25 degC"],
    [12, "count", "12"],
    [12000, "count", "12000"],
    [5e-9, "time", "5 ns"],
    [250e-6, "time", "250 µs"],
    [90, "time", "90 s"],
    [0.25, "time", "250 ms"],
    [600, "time", "10 min"],
    [7200, "time", "2 h"],
    [172800, "time", "2 d"],
  ] as const)("%d %s: %s", (value, dimension, text) => expect(formatQuantity(value, dimension)).toBe(text));

  test("56250 A2s carries no prefix, which would be squared", () =>
    expect(formatQuantity(56250, "action")).toBe("56250 A2s"));
  test("a time is rounded before its unit is chosen", () => {
    expect(formatQuantity(0.99996, "time")).toBe("1 s");
    expect(formatQuantity(9.9999e-4, "time", { digits: 3 })).toBe("1 ms");
    expect(formatQuantity(599.99, "time")).toBe("10 min");
  });
  test("digits: 1 to 15", () => {
    expect(formatQuantity(1234.5678, "voltage", { digits: 1 })).toBe("1 kV");
    expect(formatQuantity(1234.5678, "voltage", { digits: 7 })).toBe("1.234568 kV");
    // The nearest doubles to these lie a little beside them, which no figure shows.
    for (const text of ["1.1 V", "4.35 V", "-8.41 V"])
      expect(formatQuantity(Number(text.split(" ")[0]), "voltage", { digits: 15 })).toBe(text);
  });
  test("limits: R max down, times up", () => {
    expect(formatQuantity(25069.9, "resistance", { rounding: "down" })).toBe("25.06 kohm");
    expect(formatQuantity(25060.1, "resistance", { rounding: "up" })).toBe("25.07 kohm");
    expect(formatQuantity(222.122981, "time", { rounding: "up" })).toBe("222.2 s");
  });
  test("the number before an SI prefix lies from 1 up to 1000, and one space comes before the unit, 1000 times", () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-14, max: 9e14, noNaN: true }),
        fc.integer({ min: 1, max: 8 }),
        (value, digits) => {
          const text = formatQuantity(value, "current", { digits });
          const match = /^(\d+(?:\.\d+)?) ([fpnµmkMGT]?)A$/.exec(text);
          expect(match, text).not.toBe(null);
          expect(Number(match?.[1])).toBeGreaterThanOrEqual(1);
          expect(Number(match?.[1])).toBeLessThan(1000);
        },
      ),
      { numRuns: 1000, seed: 1 },
    );
  });
});

describe("roundTo(value, digits, rounding)", () => {
  test.each([
    [0, 4, "down", 0],
    [2.5, 1, "nearest", 3],
    [12345, 4, "down", 12340],
    [12345, 4, "up", 12350],
    [0.99999, 4, "down", 0.9999],
    [0.99999, 4, "up", 1],
    [99999, 3, "down", 99900],
    [10000.1, 4, "up", 10010],
    [-1.2345, 3, "down", -1.24],
    [-1.2345, 3, "up", -1.23],
    [1.234, 4, "down", 1.234],
    [0.3, 1, "down", 0.3],
    [0.1 + 0.2, 1, "up", 0.3],
    [0.7 + 0.1, 2, "down", 0.8],
    [0.0000012345, 3, "down", 0.00000123],
    [1.2345e22, 3, "up", 1.24e22],
    [Number.POSITIVE_INFINITY, 4, "down", Number.POSITIVE_INFINITY],
    [Number.NaN, 4, "up", Number.NaN],
  ] as const)("%d to %d figures %s: %d", (value, digits, rounding, rounded) =>
    expect(roundTo(value, digits, rounding)).toBe(rounded),
  );

  test("to the nearest unless told", () => expect([roundTo(1.2344, 4), roundTo(1.2346, 4)]).toEqual([1.234, 1.235]));

  test("down is never above, up never below, and neither is further than one in the last figure, 3000 times", () => {
    const any = fc.double({ min: 1e-12, max: 1e12, noNaN: true });
    fc.assert(
      fc.property(any, fc.integer({ min: 1, max: 9 }), fc.boolean(), (x, digits, minus) => {
        const value = minus ? -x : x;
        const [down, up] = [roundTo(value, digits, "down"), roundTo(value, digits, "up")];
        const last = 10 ** (Math.floor(Math.log10(x)) - digits + 1);
        expect(down).toBeLessThanOrEqual(value + 2e-12 * x);
        expect(up).toBeGreaterThanOrEqual(value - 2e-12 * x);
        expect(up - down).toBeLessThanOrEqual(last * (1 + 1e-6));
      }),
      { numRuns: 3000, seed: 2 },
    );
  });
});

describe("toAscii(text)", () => {
  test("every mark that we print has a plain spelling", () => {
    expect(toAscii("470 µF ±20 % ≤ 4.7 kΩ")).toBe("470 uF +-20 % <= 4.7 kohm");
    expect(toAscii("μ")).toBe("u");
    expect(toAscii("5 m² × 3 m · 2 ≥ 2 cm³")).toBe("5 m2 x 3 m x 2 >= 2 cm3");
    expect(toAscii("25 °C").replace(/ +/g, " ")).toBe("25 deg C");
  });
});
