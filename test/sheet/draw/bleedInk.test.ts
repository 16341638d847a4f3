import { describe, expect, test } from "vitest";
import {
  bleedScales,
  curveInk,
  FRAME,
  letterOf,
  styleOf,
  thresholdInk,
  volts,
} from "../../../src/sheet/draw/bleedInk.ts";

const exponential = (tau: number, end: number) => ({
  words: `tau ${tau} s`,
  points: [
    { time: 0, voltage: 2200 },
    { time: end, voltage: 2200 * Math.exp(-end / tau) },
  ],
});
const thresholds = [{ words: "touch-safe", value: 60 }];
const level = {
  words: "open",
  points: [
    { time: 0, voltage: 2200 },
    { time: 9e5, voltage: 2200 },
  ],
};

describe("bleedScales(bleeding)", () => {
  test("reaches under the lowest threshold, and as far as the slowest line that falls to it; a level line does not count", () => {
    const scales = bleedScales({ curves: [exponential(100, 1e4), exponential(5, 1e4), level], thresholds });
    expect(scales.voltage.low).toBe(30);
    expect(scales.voltage.high).toBeGreaterThan(2200);
    expect(scales.time.high).toBeGreaterThanOrEqual(100 * Math.log(2200 / 30));
    expect(scales.time.high).toBeLessThan(1.3 * 100 * Math.log(2200 / 30));
  });

  test("level lines alone, no threshold, or no point at all still give a scale", () => {
    expect(bleedScales({ curves: [level], thresholds: [] }).time.high).toBeGreaterThanOrEqual(9e5);
    const none = bleedScales({ curves: [{ words: "x", points: [] }], thresholds: [] });
    expect(
      [none.time.high, none.voltage.low, none.voltage.high].every((value) => value > 0 && Number.isFinite(value)),
    ).toBe(true);
  });
});

describe("curveInk(curve, index, of)", () => {
  test("starts at full voltage, ends on the frame, and carries its letter on the line", () => {
    const curve = exponential(100, 1e4);
    const scales = bleedScales({ curves: [curve], thresholds });
    const ink = curveInk(curve, 1, { ...scales, count: 1 });
    const d = ink.curves![0]!.d;
    expect(d.startsWith(`M${FRAME.left},`)).toBe(true);
    expect(d.endsWith(`,${FRAME.bottom}`)).toBe(true);
    const { text, x, y } = ink.plates![0]!;
    expect(text).toBe("B");
    const [time, voltage] = [(x - FRAME.left) / (scales.time.place(1) - FRAME.left), 0];
    expect(y).toBeCloseTo(scales.voltage.place(2200 * Math.exp(-time / 100)) + voltage, 6);
  });

  test("a line without a point that can be drawn is nothing", () => {
    const scales = bleedScales({ curves: [level], thresholds });
    expect(curveInk({ words: "x", points: [{ time: 0, voltage: 0 }] }, 0, { ...scales, count: 1 })).toEqual({});
  });
});

test("thresholdInk(thresholds, curves, scales): a line with its words, a point where a curve crosses it", () => {
  const curves = [exponential(100, 1e4), level];
  const scales = bleedScales({ curves, thresholds });
  const ink = thresholdInk(thresholds, curves, scales);
  expect(ink.dashes).toHaveLength(1);
  expect(ink.points).toHaveLength(1);
  expect(ink.points![0]!.x).toBeCloseTo(scales.time.place(100 * Math.log(2200 / 60)));
  expect(ink.words![0]!.text).toBe("touch-safe 60 V");
});

test("styleOf, letterOf, volts: six lines are told apart by style and letter", () => {
  const looks = [0, 1, 2, 3, 4, 5].map((index) => JSON.stringify(styleOf(index)));
  expect(new Set(looks).size).toBe(6);
  expect([0, 1, 5].map(letterOf)).toEqual(["A", "B", "F"]);
  expect(volts(1234)).toBe("1.23 kV");
});
