import { expect, test } from "vitest";
import { chargingWorst } from "../../src/bank/index.ts";
import { leastSeries } from "../../src/search/sweepKinds.ts";

test("leastSeries(voltage, limit, tolerance): the least count whose worst share holds, an exact fit included", () => {
  expect(leastSeries(400, 400, null)).toBe(1);
  expect(leastSeries(800, 400, null)).toBe(2);
  expect(leastSeries(801, 400, null)).toBe(3);
  const tolerance = { low: 0.2, high: 0.2 };
  const n = leastSeries(1600, 400, tolerance);
  expect(chargingWorst(1600, n, tolerance)).toBeLessThanOrEqual(400);
  expect(chargingWorst(1600, n - 1, tolerance)).toBeGreaterThan(400);
  expect(leastSeries(1e12, 1e-3, tolerance)).toBeGreaterThan(1e9);
});
