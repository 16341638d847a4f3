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

  test("a stage in reverse that is charged: the stretch ends at zero, where its leak begins", () =>
    expect(segmentFrom([stage(1, 0.5)], steady(1), [-3]).seconds).toBeCloseTo(3, 12));

  test("looks no further than the horizon: an end beyond it, or none at all, is no end", () => {
    expect(segmentFrom([stage(1e-3, 2e-3)], steady(0), [10], 2).seconds).toBe(Number.POSITIVE_INFINITY);
    expect(segmentFrom([stage(1e-3, 2e-3)], steady(0), [10], 7).seconds).toBeCloseTo(5, 12);
    expect(segmentFrom([stage(1)], steady(0), [10], 7).seconds).toBe(Number.POSITIVE_INFINITY);
    // Of two ends the earlier, in either order.
    for (const leaks of [
      [1, 2],
      [2, 1],
    ])
      expect(
        segmentFrom(
          leaks.map((leak) => stage(1, leak)),
          steady(0),
          [10, 10],
        ).seconds,
      ).toBeCloseTo(5, 12);
  });

  test.each([
    [3, [1, 2]],
    [1.5, [0, 0.5]],
    [2, [0, 1]],
    [0.5, [0, 0]],
    [0, [0, 0]],
    [-1, [-1, -1]],
  ])(
    "two empty stages that leak 2 A and 1 A: %d A for a second lifts them to %j, in either order",
    (current, volts) => {
      const chain = [stage(1, 2), stage(1, 1)];
      expect([...segmentAt(segmentFrom(chain, steady(current), [0, 0]), 1)]).toEqual(
        volts.map((v) => expect.closeTo(v, 12)),
      );
      const turned = segmentAt(segmentFrom(chain.toReversed(), steady(current), [0, 0]), 1);
      expect([...turned]).toEqual(volts.toReversed().map((v) => expect.closeTo(v, 12)));
    },
  );

  // Held at 10 V: alone the third would drain 10 A. With the first leak in play it is 5.5 A, which the leak of 6 A takes whole.
  test.each([0, 1])(
    "of two empty stages on held ends the smaller leak is filled first, and the larger may then stay empty (%d)",
    (at) => {
      const chain = at === 0 ? [stage(1, 1), stage(1, 6), stage(1, 0, 1)] : [stage(1, 6), stage(1, 1), stage(1, 0, 1)];
      const segment = segmentFrom(chain, held(10), [0, 0, 10]);
      expect(segmentCurrent(segment, 0)).toBeCloseTo(5.5, 12);
      const v = segmentAt(segment, 0.01);
      expect(v[1 - at]).toBe(0);
      expect(v[at]).toBeCloseTo(0.045, 3);
      expect(v[0]! + v[1]! + v[2]!).toBeCloseTo(10, 12);
      // The current is what any stage in play takes, the leak of an empty one aside.
      const slope = (segmentAt(segment, 0.0101)[2]! - v[2]!) / 1e-4;
      expect(segmentCurrent(segment, 0.01005)).toBeCloseTo(slope + (v[2]! + segmentAt(segment, 0.0101)[2]!) / 2, 4);
    },
  );

  // v2 falls from 9 V to 5 V at 5 s a decay; the current rises from 0.1 A, and passes the leak of 0.3 A at v2 = 7 V, after 5 ln 2 s.
  test("an empty stage comes into play when the current has risen above its leak", () => {
    const chain = [stage(1, 0.3), stage(1, 0, 0.1)];
    const segment = segmentFrom(chain, { kind: "source", voltage: 10, resistance: 10 }, [0, 9]);
    expect(segment.seconds).toBeCloseTo(5 * Math.LN2, 10);
    expect([...segmentAt(segment, 2)]).toEqual([0, expect.closeTo(5 + 4 * Math.exp(-0.4), 12)]);
    expect(segmentCurrent(segment, segment.seconds)).toBeCloseTo(0.3, 12);
  });

  test("every stage empty, and a source that brings less than they leak: nothing moves, the current stays", () => {
    const segment = segmentFrom([stage(1, 2), stage(1, 3)], { kind: "source", voltage: 1, resistance: 1 }, [0, 0]);
    expect([...segmentAt(segment, 50)]).toEqual([0, 0]);
    expect(segmentCurrent(segment, 50)).toBe(1);
    expect(segment.seconds).toBe(Number.POSITIVE_INFINITY);
    expect(segmentCurrent(segmentFrom([stage(1, 2)], held(0), [0]), 5)).toBe(0);
  });

  test("a steady current is steady, whatever the stages do", () => {
    const segment = segmentFrom([stage(1, 0.1, 0.5), stage(2, 0, 1)], steady(1), [1, 2]);
    for (const t of [0, 1, 10]) expect(segmentCurrent(segment, t)).toBe(1);
    expect(segmentAt(segment, 1)[0]).toBeCloseTo(1.8 - 0.8 * Math.exp(-0.5), 12);
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
