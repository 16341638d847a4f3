import { describe, expect, test } from "vitest";
import { COVERAGE, dueAfter } from "../../src/place/driftDue.ts";
import { driftLine } from "../../src/place/driftFit.ts";
import { seeded } from "../../src/place/random.ts";
import { normal } from "./lots.ts";

const LOST = { ofStart: -0.2, ofSlope: -1, limit: 0 };
const lineOf = (values: readonly number[], sigma: number, step = 100) => {
  const line = driftLine(values.map((value, k) => ({ at: k * step, value, sigma })));
  if (line === null) throw new Error();
  return line;
};

describe("dueAfter(line, wear)", () => {
  test("a certain line: 1 % in 100 is 20 % in 2000", () => {
    const { best, soonest, latest } = dueAfter(lineOf([1, 0.99], 1e-9), LOST);
    for (const when of [best, soonest, latest]) expect(when).toBeCloseTo(2000, 2);
  });

  test("both ends of the interval satisfy D^2 = z^2 var D", () => {
    const line = lineOf([1, 0.985, 0.974, 0.961], 0.003);
    const { best, soonest, latest } = dueAfter(line, LOST);
    if (best === null || soonest === null || latest === null) throw new Error();
    expect(soonest < best && best < latest).toBe(true);
    for (const d of [soonest, latest]) {
      const margin = -0.2 * line.start - line.slope * d;
      const variance = 0.04 * line.startVariance + 2 * 0.2 * d * line.covariance + d ** 2 * line.slopeVariance;
      expect(margin ** 2).toBeCloseTo(COVERAGE ** 2 * variance, 9);
    }
  });

  test("a drift within the doubt has no latest; one the other way is never due; one used up at the start is due at once", () => {
    expect(dueAfter(lineOf([1, 0.998], 0.003), LOST)).toMatchObject({ best: expect.closeTo(10_000, 6), latest: null });
    expect(dueAfter(lineOf([1, 1.001], 0.003), LOST)).toMatchObject({
      best: null,
      soonest: expect.any(Number),
      latest: null,
    });
    expect(dueAfter(lineOf([1, 1.05], 0.0001), LOST)).toEqual({ best: null, soonest: null, latest: null });
    expect(dueAfter(lineOf([2, 2.1], 0.0001), { ofStart: 1, ofSlope: 1, limit: 1.5 }).soonest).toBe(0);
  });

  // The interval is exact for normal errors: of 2,000 simulated units 95 % must hold the true day.
  test("95 % of simulated intervals hold the truth", () => {
    const random = seeded(5);
    let held = 0;
    const units = 2000;
    for (let k = 0; k < units; k++) {
      const line = driftLine(
        [0, 200, 400, 600].map((at) => ({ at, value: 1 - 5e-5 * at + 0.004 * normal(random), sigma: 0.004 })),
      );
      if (line === null) throw new Error();
      // The line's variances are raised only, never lowered, by the scatter of four readings: cover is a little above 95 %.
      const { soonest, latest } = dueAfter(line, LOST);
      if (soonest !== null && soonest <= 4000 && (latest === null || latest >= 4000)) held++;
    }
    expect(held / units).toBeGreaterThan(0.94);
    expect(held / units).toBeLessThan(0.99);
  });
});
