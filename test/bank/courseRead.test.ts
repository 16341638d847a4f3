// Readings of a stretch: one instant, many at once, ends, current.
import { describe, expect, test } from "vitest";
import type { Stage } from "../../src/bank/chain.ts";
import { curveAt } from "../../src/bank/courseCurve.ts";
import { endsCurve, segmentAt, segmentCurrent, segmentOver } from "../../src/bank/courseRead.ts";
import { segmentFrom } from "../../src/bank/courseSegment.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";

const draw = uniformFrom(streamState(21, 0));
const chain: readonly Stage[] = Array.from({ length: 11 }, () => ({
  capacitance: 0.5 + draw(),
  leakageCurrent: 0,
  conductance: draw(),
  resistance: 5 + draw(),
}));
const start = chain.map(() => 100 * draw());
const segment = segmentFrom(chain, { kind: "source", voltage: 50, resistance: 2 }, start);

describe("segmentAt(segment, t)", () => {
  test("at zero it is the start; for ever it is the divider", () => {
    expect([...segmentAt(segment, 0)]).toEqual(start);
    const end = segmentAt(segment, Number.POSITIVE_INFINITY);
    const current = segmentCurrent(segment, Number.POSITIVE_INFINITY);
    for (const [i, stage] of chain.entries())
      expect(end[i]! * (stage.conductance + 1 / stage.resistance)).toBeCloseTo(current, 10);
  });
});

describe("segmentAt(segment, t) of a stage that nothing moves", () => {
  test("for ever it stays where it was", () => {
    const still: Stage = { capacitance: 1, leakageCurrent: 0, conductance: 0, resistance: Number.POSITIVE_INFINITY };
    const at = segmentFrom([still, { ...still, conductance: 1 }], { kind: "current", current: 0 }, [5, 7]);
    expect([...segmentAt(at, Number.POSITIVE_INFINITY)]).toEqual([5, expect.closeTo(0, 12)]);
  });
});

describe("segmentOver(segment, grid, out, row)", () => {
  test("2,000 steps of the recurrence stay within 1e-11 of asking one by one, from the row given", () => {
    const out = new Float64Array(2001 * 11).fill(-1);
    segmentOver(segment, { from: 0.1, step: 0.004, count: 2000 }, out, 1);
    expect([...out.subarray(0, 11)]).toEqual(chain.map(() => -1));
    for (let k = 0; k < 2000; k += 37)
      for (const [i, v] of segmentAt(segment, 0.1 + 0.004 * k).entries())
        expect(Math.abs(out[(k + 1) * 11 + i]! - v)).toBeLessThan(1e-11 * 100);
  });
});

describe("endsCurve(segment), segmentCurrent(segment, t)", () => {
  test("sum of the stages, and the volts across the resistor over its ohms", () => {
    for (const seconds of [0, 0.3, 2]) {
      const sum = segmentAt(segment, seconds).reduce((all, v) => all + v, 0);
      expect(curveAt(endsCurve(segment), seconds)).toBeCloseTo(sum, 10);
      expect(segmentCurrent(segment, seconds)).toBeCloseTo((50 - sum) / 2, 10);
    }
  });
});
