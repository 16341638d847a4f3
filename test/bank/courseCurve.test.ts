// Sums of exponentials: zeros and highest points, against dense sampling and cases known by hand.
import { describe, expect, test, vi } from "vitest";
import { type Curve, curveAt, firstBelowZero, highestOf, riseOf } from "../../src/bank/courseCurve.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";

// Seconds of arithmetic here may be a minute on a busy machine.
vi.setConfig({ testTimeout: 120_000 });

const curve = (start: number, ...parts: readonly (readonly [number, number])[]): Curve => ({
  start,
  rates: Float64Array.from(parts, ([rate]) => rate),
  parts: Float64Array.from(parts, ([, part]) => part),
});

describe("riseOf(rate, t), curveAt(curve, t)", () => {
  test("at rate 0 it is time itself; for ever it is 1/rate", () => {
    expect(riseOf(0, 7)).toBe(7);
    expect(riseOf(4, Number.POSITIVE_INFINITY)).toBe(0.25);
    expect(curveAt(curve(5, [0, -2]), 1.5)).toBe(2);
  });
});

describe("firstBelowZero(curve, from, to)", () => {
  test("never: above zero, only approaching it, or rising from it", () => {
    expect(firstBelowZero(curve(2, [1, -1]), 0, Number.POSITIVE_INFINITY)).toBeNull();
    expect(firstBelowZero(curve(1, [1, -1]), 0, Number.POSITIVE_INFINITY)).toBeNull();
    expect(firstBelowZero(curve(0, [1, 1]), 0, 10)).toBeNull();
  });

  test("a straight fall, and an exponential one", () => {
    expect(firstBelowZero(curve(6, [0, -2]), 0, Number.POSITIVE_INFINITY)).toBeCloseTo(3, 12);
    expect(firstBelowZero(curve(1, [1, -2]), 0, Number.POSITIVE_INFINITY)).toBeCloseTo(Math.LN2, 12);
    expect(firstBelowZero(curve(6, [0, -2]), 0, 2)).toBeNull();
  });

  test("a dip so short that 1,000 even samples step over it", () => {
    // Falls by 1 within microseconds, climbs back within milliseconds.
    const dip = curve(0.99, [1e6, -1e6], [1e3, 1e3]);
    expect(firstBelowZero(dip, 0, 100)).toBeCloseTo(5e-6, 5);
    expect(firstBelowZero(dip, 0, 100)).not.toBeNull();
  });
});

describe("firstBelowZero(curve, from, to) of random sums", () => {
  test("120 sums of up to 5 exponentials: on the curve's first zero as 400 samples see it, or none where all are above", () => {
    const draw = uniformFrom(streamState(6, 0));
    const seen = { found: 0, none: 0 };
    for (let k = 0; k < 120; k++) {
      const parts = Array.from({ length: 1 + (k % 5) }, () => {
        const rate = draw() < 0.15 ? 0 : 10 ** (4 * draw() - 2);
        return [rate, (draw() - 0.6) * (rate || 0.01)] as const;
      });
      const sum = curve(0.2 + draw(), ...parts);
      const [from, to] = [k % 3 === 0 ? 0.001 : 0, k % 2 === 0 ? 50 : Number.POSITIVE_INFINITY];
      if (curveAt(sum, from) <= 0) continue;
      const times = Array.from({ length: 400 }, (_, j) => from + 50 * 10 ** (-5 * (1 - j / 399)));
      const crossed = times.find((t) => t <= to && curveAt(sum, t) < 0);
      const at = firstBelowZero(sum, from, to);
      if (at === null) {
        expect(crossed, `case ${k}`).toBeUndefined();
        seen.none++;
        continue;
      }
      seen.found++;
      expect(Math.abs(curveAt(sum, at))).toBeLessThan(1e-12);
      expect(at).toBeGreaterThan(from);
      expect(at).toBeLessThanOrEqual(Math.min(to, crossed ?? Number.POSITIVE_INFINITY));
      for (const t of times) if (t < at * (1 - 1e-9)) expect(curveAt(sum, t)).toBeGreaterThan(0);
    }
    expect(seen.found).toBeGreaterThan(20);
    expect(seen.none).toBeGreaterThan(20);
  });

  test("nothing to look at, and a zero just at the end", () => {
    const fall = curve(6, [0, -2]);
    expect(firstBelowZero(fall, 2, 2)).toBeNull();
    expect(firstBelowZero(fall, 4, 2)).toBeNull();
    expect(firstBelowZero(fall, 0, 3)).toBeCloseTo(3, 12);
    expect(firstBelowZero(fall, 1, 3.5)).toBeCloseTo(3, 12);
    expect(firstBelowZero(fall, 0, 2.999999)).toBeNull();
  });
});

describe("highestOf(curve, from, to)", () => {
  test("constant, rising for ever, falling", () => {
    expect(highestOf(curve(3), 0, 5)).toEqual({ voltage: 3, seconds: 0 });
    expect(highestOf(curve(0, [2, 2]), 0, Number.POSITIVE_INFINITY)).toEqual({
      voltage: 1,
      seconds: Number.POSITIVE_INFINITY,
    });
    expect(highestOf(curve(1, [2, -2]), 0, 9).seconds).toBe(0);
  });

  test("from a later time, to an earlier end, and over nothing", () => {
    const hump = curve(0, [2, 3], [1, -2]);
    const turn = Math.log(1.5);
    expect(highestOf(hump, 1, 5)).toEqual({ voltage: curveAt(hump, 1), seconds: 1 });
    expect(highestOf(hump, 0, 0.1)).toEqual({ voltage: curveAt(hump, 0.1), seconds: 0.1 });
    expect(highestOf(hump, 0, 0)).toEqual({ voltage: 0, seconds: 0 });
    expect(highestOf(hump, 0.2, 0.2).seconds).toBe(0.2);
    expect(highestOf(hump, 0.1, 3).seconds).toBeCloseTo(turn, 7);
  });

  test("of two humps the higher, whichever comes first", () => {
    // Fast up and down within milliseconds, then slowly up and down within seconds; and the same with the first one higher.
    const humps = (first: number, second: number) =>
      curve(0, [2000, 3 * first], [1000, -2 * first], [2, 3 * second], [1, -2 * second]);
    const slow = highestOf(humps(100, 1), 0, Number.POSITIVE_INFINITY);
    expect(slow.seconds).toBeCloseTo(Math.log(1.5), 1);
    const fast = highestOf(humps(4000, 0.1), 0, Number.POSITIVE_INFINITY);
    expect(fast.seconds).toBeCloseTo(Math.log(1.5) / 1000, 5);
    for (const [sum, peak] of [
      [humps(100, 1), slow],
      [humps(4000, 0.1), fast],
    ] as const)
      for (let j = 0; j < 2000; j++)
        expect(curveAt(sum, 10 ** (-5 + j / 300))).toBeLessThanOrEqual(peak.voltage + 1e-12);
  });

  test("up then down: the slope 3 exp(-2t) - 2 exp(-t) is zero at t = ln 1.5", () => {
    const peak = highestOf(curve(0, [2, 3], [1, -2]), 0, Number.POSITIVE_INFINITY);
    expect(peak.seconds).toBeCloseTo(Math.log(1.5), 9);
    expect(peak.voltage).toBeCloseTo(3 * riseOf(2, Math.log(1.5)) - 2 * riseOf(1, Math.log(1.5)), 13);
  });

  test("never below the best of 500 samples, over 120 random sums of up to 6 exponentials", () => {
    const draw = uniformFrom(streamState(5, 0));
    for (let k = 0; k < 120; k++) {
      const parts = Array.from({ length: 1 + (k % 6) }, () => {
        const rate = 10 ** (4 * draw() - 2);
        return [rate, (draw() - 0.5) * rate] as const;
      });
      const sum = curve(draw(), ...parts);
      const peak = highestOf(sum, 0, 200);
      let sampled = sum.start;
      for (let j = 0; j < 500; j++) sampled = Math.max(sampled, curveAt(sum, 200 * 10 ** (-6 * (j / 499))));
      expect(peak.voltage).toBeGreaterThanOrEqual(sampled - 1e-11);
      expect(curveAt(sum, peak.seconds)).toBeCloseTo(peak.voltage, 12);
    }
  });
});
