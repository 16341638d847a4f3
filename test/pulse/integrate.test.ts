// integrate: order, tolerance, watches and the limit of steps, against functions with known answers.
import { describe, expect, test } from "vitest";
import { within } from "../../src/pulse/dormandPrince.ts";
import { integrate, type Problem } from "../../src/pulse/integrate.ts";

/** y'' = -y from y = 0, y' = 1: sin x, cos x. */
const circle = (more: Partial<Problem>): Problem => ({
  slope: (_x, y, out) => {
    out[0] = y[1]!;
    out[1] = -y[0]!;
  },
  from: 0,
  to: 10,
  start: Float64Array.of(0, 1),
  firstStep: 0.01,
  tolerance: 1e-10,
  floors: Float64Array.of(1, 1),
  watches: [],
  maxSteps: 10000,
  ...more,
});

describe("integrate(problem)", () => {
  test("an empty range leaves the start as it was", () => {
    const course = integrate(circle({ to: 0 }));
    expect(course.ended).toBe("end");
    expect([...course.y]).toEqual([0, 1]);
  });

  test("says that it ran out of steps, never passing off a part as the whole", () => {
    expect(integrate(circle({ maxSteps: 3 })).ended).toBe("steps");
  });

  test("a slope that is not a number ends in steps, not in an answer", () => {
    const course = integrate(circle({ slope: (_x, _y, out) => void out.fill(Number.NaN), maxSteps: 50 }));
    expect(course.ended).toBe("steps");
    expect(course.x).toBe(0);
  });

  test("follows sin x to ten turns of the tolerance", () => {
    const course = integrate(circle({}));
    expect(course.x).toBe(10);
    expect(Math.abs(course.y[0]! - Math.sin(10))).toBeLessThan(1e-9);
    expect(Math.abs(course.y[1]! - Math.cos(10))).toBeLessThan(1e-9);
  });

  test("a stopping watch ends at the crossing: sin x falls through zero at pi", () => {
    const course = integrate(circle({ watches: [{ value: (_x, y) => y[0]!, direction: -1, stops: true }] }));
    expect(course.ended).toBe("watch");
    expect(Math.abs(course.x - Math.PI)).toBeLessThan(2e-10);
    expect(Math.abs(course.y[0]!)).toBeLessThan(1e-10);
  });

  test("a noted watch tells each place and goes on", () => {
    const course = integrate(circle({ watches: [{ value: (_x, y) => y[1]!, direction: -1, stops: false }] }));
    expect(course.hits.map((hit) => hit.x)).toHaveLength(2);
    expect(Math.abs(course.hits[1]!.x - 2.5 * Math.PI)).toBeLessThan(1e-8);
    expect(course.ended).toBe("end");
  });

  test("halving the tolerance by 1e4 costs about 1e4^(1/5) more steps: fifth order", () => {
    const steps = (tolerance: number): number => integrate(circle({ tolerance, to: 100 })).steps;
    const ratio = steps(1e-11) / steps(1e-7);
    expect(ratio).toBeGreaterThan(5.3);
    expect(ratio).toBeLessThan(7.5);
  });

  test("the dense pieces agree with sin x between the steps", () => {
    const { pieces } = integrate(circle({}));
    const worst = pieces.map((piece) => {
      const y = within(piece, 0.37, new Float64Array(2));
      return Math.abs(y[0]! - Math.sin(piece.x + 0.37 * piece.h));
    });
    expect(Math.max(...worst)).toBeLessThan(3e-9);
  });
});
