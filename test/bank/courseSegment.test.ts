// One linear stretch: which leakages flow, when that changes, and the current that it draws.
import { describe, expect, test } from "vitest";
import type { Stage } from "../../src/bank/chain.ts";
import { curveAt } from "../../src/bank/courseCurve.ts";
import { endsCurve, segmentAt, segmentCurrent } from "../../src/bank/courseRead.ts";
import { segmentFrom, voltageCurve } from "../../src/bank/courseSegment.ts";

const stage = (capacitance: number, leakageCurrent = 0, conductance = 0): Stage => ({
  capacitance,
  leakageCurrent,
  conductance,
  resistance: Number.POSITIVE_INFINITY,
});
const held = (voltage: number) => ({ kind: "source", voltage, resistance: 0 }) as const;
const steady = (current: number) => ({ kind: "current", current }) as const;

describe("segmentFrom(chain, drive, start)", () => {
  test("an empty stage takes no more than the chain brings: 1 mA into a 2 mA leak stays at zero for ever", () => {
    const segment = segmentFrom([stage(1e-3, 2e-3)], steady(1e-3), [0]);
    expect(segment.seconds).toBe(Number.POSITIVE_INFINITY);
    expect([...segmentAt(segment, 100)]).toEqual([0]);
  });

  test("3 mA into a 2 mA leak rises by 1 V/s on 1 mF", () => {
    const segment = segmentFrom([stage(1e-3, 2e-3)], steady(3e-3), [0]);
    expect(segmentAt(segment, 5)[0]).toBeCloseTo(5, 12);
  });

  test("open ends: the stretch ends when the leak has emptied its stage", () => {
    expect(segmentFrom([stage(1e-3, 2e-3)], steady(0), [10]).seconds).toBeCloseTo(5, 12);
  });

  test("a stage in reverse does not leak by current, only through its insulation", () => {
    const segment = segmentFrom([stage(1, 5), stage(1, 0, 2)], steady(0), [-3, -3]);
    expect([...segmentAt(segment, 1)]).toEqual([-3, expect.closeTo(-3 * Math.exp(-2), 12)]);
  });

  test("held ends: the sum stays, the current is what every stage in play takes", () => {
    const chain = [stage(1, 0, 0.5), stage(2, 0.1, 0.1), stage(3, 0, 0.2)];
    const segment = segmentFrom(chain, held(60), [30, 20, 10]);
    for (const seconds of [0, 0.5, 3, 20]) {
      const v = segmentAt(segment, seconds);
      expect(v[0]! + v[1]! + v[2]!).toBeCloseTo(60, 10);
      expect(curveAt(endsCurve(segment), seconds)).toBeCloseTo(60, 10);
      const slope = (curveAt(voltageCurve(segment, 2), seconds + 1e-6) - v[2]!) / 1e-6;
      expect(segmentCurrent(segment, seconds)).toBeCloseTo(3 * slope + 0.2 * v[2]!, 4);
    }
  });

  test("fed through a resistor: the current is the volts across it", () => {
    const segment = segmentFrom([stage(1), stage(2)], { kind: "source", voltage: 10, resistance: 4 }, [1, 2]);
    for (const seconds of [0, 1, 5]) {
      const v = segmentAt(segment, seconds);
      expect(segmentCurrent(segment, seconds)).toBeCloseTo((10 - v[0]! - v[1]!) / 4, 12);
    }
  });
});
