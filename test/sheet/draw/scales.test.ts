import { describe, expect, test } from "vitest";
import { linearScale, logScale, timeScale } from "../../../src/sheet/draw/scales.ts";
import fc from "../../support/property.ts";

describe("linearScale({ low, high, from, to })", () => {
  test("ends are round and hold the values; places run from end to end", () => {
    const scale = linearScale({ low: 0, high: 463, from: 100, to: 400 });
    expect([scale.low, scale.high]).toEqual([0, 500]);
    expect(scale.place(0)).toBe(100);
    expect(scale.place(500)).toBe(400);
    expect(scale.place(250)).toBe(250);
    expect(scale.ticks(5)).toEqual([0, 100, 200, 300, 400, 500]);
  });

  test("equal ends are widened; any values give finite places within the ends", () => {
    expect(linearScale({ low: 0, high: 0, from: 0, to: 1 }).high).toBeGreaterThan(0);
    const value = fc.double({ min: -1e9, max: 1e9, noNaN: true });
    fc.assert(
      fc.property(value, value, (a, b) => {
        const [low, high] = [Math.min(a, b), Math.max(a, b)];
        const scale = linearScale({ low, high, from: 10, to: 90 });
        for (const place of [low, high].map(scale.place)) {
          expect(place).toBeGreaterThanOrEqual(10 - 1e-6);
          expect(place).toBeLessThanOrEqual(90 + 1e-6);
        }
      }),
    );
  });
});

describe("logScale({ low, high, from, to })", () => {
  const scale = logScale({ low: 10, high: 1000, from: 200, to: 0 });

  test("equal ratios are equal distances", () => {
    expect(scale.place(10)).toBe(200);
    expect(scale.place(100)).toBeCloseTo(100);
    expect(scale.place(1000)).toBeCloseTo(0);
  });

  test("ticks begin with 1, 2 or 5, or with 1 alone where there is less room", () => {
    expect(scale.ticks(9)).toEqual([10, 20, 50, 100, 200, 500, 1000]);
    expect(scale.ticks(4)).toEqual([10, 100, 1000]);
    expect(scale.ticks(99).length).toBeGreaterThan(9);
  });
});

describe("timeScale(high, from, to)", () => {
  test("all ticks are in one unit, round in it", () => {
    const words = (high: number) => {
      const scale = timeScale(high, 0, 100);
      return scale.ticks(6).map(scale.words);
    };
    expect(words(600e-6)).toEqual(["0 s", "100 µs", "200 µs", "300 µs", "400 µs", "500 µs", "600 µs"]);
    expect(words(599).at(-1)).toBe("600 s");
    expect(words(1200)).toEqual(["0 min", "5 min", "10 min", "15 min", "20 min"]);
    expect(words(5 * 3600)).toEqual(["0 h", "1 h", "2 h", "3 h", "4 h", "5 h"]);
    expect(words(3e5).every((text) => text.endsWith(" d"))).toBe(true);
  });

  test("places are those of the seconds", () => {
    const scale = timeScale(1200, 0, 100);
    expect(scale.place(600)).toBeCloseTo(50);
    expect(scale.high).toBe(1200);
  });
});
