import { describe, expect, test } from "vitest";
import { bleedTime } from "../../../src/hazard/index.ts";
import { cutAt, drawable, timeAt, until } from "../../../src/sheet/draw/bleedCurves.ts";
import fc from "../../support/property.ts";

const exponential = (voltage: number, tau: number, end: number) => [
  { time: 0, voltage },
  { time: end, voltage: voltage * Math.exp(-end / tau) },
];

describe("timeAt(points, level)", () => {
  test("is the hazard layer's bleed time for one time constant, and R C ln(V/Vs) of any text book", () => {
    const points = exponential(2200, 113, 1200);
    expect(timeAt(points, 60)).toBeCloseTo(113 * Math.log(2200 / 60), 9);
    expect(timeAt(points, 60)).toBeCloseTo(
      bleedTime({ capacitance: 1e-3, resistance: 113e3, voltage: 2200, safeVoltage: 60 }),
      6,
    );
  });

  test("there from the start, never there, nothing to go by", () => {
    expect(timeAt(exponential(50, 10, 60), 60)).toBe(0);
    expect(timeAt(exponential(2200, 113, 10), 60)).toBeNull();
    expect(timeAt([], 60)).toBeNull();
    expect(
      timeAt(
        [
          { time: 0, voltage: 100 },
          { time: 9, voltage: 100 },
        ],
        60,
      ),
    ).toBeNull();
  });

  test("any number of points on one exponential give the same time", () => {
    fc.assert(
      fc.property(fc.integer({ min: 2, max: 60 }), fc.double({ min: 1, max: 1e4, noNaN: true }), (count, tau) => {
        const times = Array.from({ length: count }, (_, index) => (index * 5 * tau) / (count - 1));
        const points = times.map((time) => ({ time, voltage: 1000 * Math.exp(-time / tau) }));
        expect(timeAt(points, 60)! / tau).toBeCloseTo(Math.log(1000 / 60), 9);
      }),
    );
  });
});

test("drawable(points): up to the first that a log scale cannot show", () => {
  expect(
    drawable([
      { time: 0, voltage: 5 },
      { time: 1, voltage: 0 },
      { time: 2, voltage: 3 },
    ]),
  ).toHaveLength(1);
  expect(drawable([{ time: 0, voltage: Number.NaN }])).toEqual([]);
  expect(drawable([{ time: Number.POSITIVE_INFINITY, voltage: 1 }])).toEqual([]);
});

test("cutAt(points, level): ends on the level; keeps what does not get there", () => {
  const cut = cutAt(exponential(2200, 100, 1000), 30);
  expect(cut.at(-1)!.voltage).toBe(30);
  expect(cut.at(-1)!.time).toBeCloseTo(100 * Math.log(2200 / 30));
  expect(cutAt(exponential(2200, 100, 10), 30)).toHaveLength(2);
  expect(cutAt(exponential(20, 100, 10), 30)).toEqual([{ time: 0, voltage: 30 }]);
});

test("until(points, time): ends at the time, on the curve", () => {
  const points = exponential(1000, 10, 50);
  expect(until(points, 20).at(-1)!.voltage).toBeCloseTo(1000 * Math.exp(-2));
  expect(until(points, 99)).toEqual(points);
  expect(until([{ time: 5, voltage: 1 }], 2)).toEqual([]);
});
