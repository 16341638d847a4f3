// The climb finds tops that are known beforehand.
import { expect, test } from "vitest";
import { climb } from "../../../src/search/blend/ellipsoid.ts";

const peak = (top: readonly number[], live: readonly number[]) => ({
  look: (at: Float64Array, slope: Float64Array): number => {
    top.forEach((t, row) => {
      slope[row] = t > at[row]! ? 1 : -1;
    });
    return -top.reduce((sum, t, row) => sum + Math.abs(t - at[row]!), 0);
  },
  live,
  enough: Number.POSITIVE_INFINITY,
  fine: 1e-6,
});

test.each([
  ["one price", [3], [0]],
  ["two prices", [3, 0.5], [0, 1]],
  ["three prices", [3, 0.5, 7], [0, 1, 2]],
])("climb: the top of -|x - t|, %s", (_, top, live) => {
  const found = climb(
    peak(top, live),
    top.map(() => 2),
    10,
    600,
  );
  expect(found.value).toBeGreaterThan(-1e-3);
});

test("climb keeps prices at or above 0 and leaves dead rows alone", () => {
  const found = climb(peak([-4, 2, 9], [0, 1]), [1, 1, 1], 10, 300);
  expect(found.at[0]!).toBeGreaterThanOrEqual(0);
  expect(found.at[0]!).toBeLessThan(0.01);
  expect(found.at[1]!).toBeCloseTo(2, 2);
  expect(found.at[2]).toBe(1);
});

test("climb stops when the value is enough", () => {
  let looks = 0;
  const hill = peak([3, 3], [0, 1]);
  climb({ ...hill, enough: -100, look: (at, slope) => ++looks && hill.look(at, slope) }, [0, 0], 10, 100);
  expect(looks).toBe(1);
});
