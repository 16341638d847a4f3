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

describe("highestOf(curve, from, to)", () => {
  test("constant, rising for ever, falling", () => {
    expect(highestOf(curve(3), 0, 5)).toEqual({ voltage: 3, seconds: 0 });
    expect(highestOf(curve(0, [2, 2]), 0, Number.POSITIVE_INFINITY)).toEqual({
      voltage: 1,
      seconds: Number.POSITIVE_INFINITY,
    });
    expect(highestOf(curve(1, [2, -2]), 0, 9).seconds).toBe(0);
  });

  test("up then down: the slope 3 exp(-2t) - 2 exp(-t) is zero at t = ln 1.5", () => {
    const peak = highestOf(curve(0, [2, 3], [1, -2]), 0, Number.POSITIVE_INFINITY);
    expect(peak.seconds).toBeCloseTo(Math.log(1.5), 9);
    expect(peak.voltage).toBeCloseTo(3 * riseOf(2, Math.log(1.5)) - 2 * riseOf(1, Math.log(1.5)), 13);
  });

  test("never below the best of 4,000 samples, over 300 random sums of up to 6 exponentials", () => {
    const draw = uniformFrom(streamState(5, 0));
    for (let k = 0; k < 300; k++) {
      const parts = Array.from({ length: 1 + (k % 6) }, () => {
        const rate = 10 ** (4 * draw() - 2);
        return [rate, (draw() - 0.5) * rate] as const;
      });
      const sum = curve(draw(), ...parts);
      const peak = highestOf(sum, 0, 200);
      let sampled = sum.start;
      for (let j = 0; j < 4000; j++) sampled = Math.max(sampled, curveAt(sum, 200 * 10 ** (-6 * (j / 3999))));
      expect(peak.voltage).toBeGreaterThanOrEqual(sampled - 1e-11);
      expect(curveAt(sum, peak.seconds)).toBeCloseTo(peak.voltage, 12);
    }
  });
});
