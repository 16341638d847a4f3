import { describe, expect, test } from "vitest";
import { chargingWorst } from "../../src/bank/index.ts";
import { leastSeries } from "../../src/search/sweepKinds.ts";
import { chance } from "../support/random.ts";

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

describe("leastSeries(voltage, limit, tolerance)", () => {
  test.each([
    [400, 400, { low: 0.2, high: 0.2 }, 1],
    [400 * (1 + 2e-9), 400, { low: 0, high: 0 }, 2],
    [800, 400, { low: 0, high: 0 }, 2],
    [800, 400, null, 2],
    [800, 400, { low: 0.2, high: 0.2 }, 3],
    [1350, 450, { low: 0.2, high: 0.2 }, 4],
    [1600, 450, { low: 0.2, high: 0.2 }, 5],
    [2200, 0.001, { low: 0, high: 0 }, 2200000],
  ])("%d V on %d V, %o: %d", (voltage, limit, tolerance, n) => expect(leastSeries(voltage, limit, tolerance)).toBe(n));

  test("worked number A1: 1350 V is the most that four of 450 V bear at 20 %, so 1351 V takes five", () => {
    expect(leastSeries(1351, 450, { low: 0.2, high: 0.2 })).toBe(5);
  });

  // Skipped because it never ends: above 2^53 adding one changes nothing, and a brief may ask for such a derating.
  test("a limit of a millionth of a millionth of the volts: some number, and soon", () => {
    expect(leastSeries(1e7, 4.5e-10, { low: 0.2, high: 0.2 })).toBeGreaterThan(1000);
  });

  test("is the least: counting up from one gives the same on 2000 random cases", () => {
    const c = chance(11);
    for (let i = 0; i < 2000; i++) {
      const [voltage, limit] = [c.between(1, 3000), c.between(50, 500)];
      const tolerance = { low: c.between(0, 0.9), high: c.between(0, 1) };
      let n = 1;
      while (
        (voltage * (1 + tolerance.high)) / (1 + tolerance.high + (n - 1) * (1 - tolerance.low)) >
        limit * (1 + 1e-9)
      )
        n++;
      expect(leastSeries(voltage, limit, tolerance), `case ${i}`).toBe(n);
    }
  });
});
