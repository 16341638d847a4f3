// dormandPrince: the order of the step and of its dense output, measured on y' = y.
import { describe, expect, test } from "vitest";
import { pieceOf, type Slope, scratchOf, step, within } from "../../src/pulse/dormandPrince.ts";

const growth: Slope = (_x, y, out) => {
  out[0] = y[0]!;
};

/** Errors of the step's end, of its middle by dense output, and of its own estimate. */
function errorsOf(h: number): { end: number; middle: number; estimate: number } {
  const s = scratchOf(1);
  const y = Float64Array.of(1);
  growth(0, y, s.k[0]!);
  step(growth, { x: 0, h }, y, s);
  const piece = pieceOf({ x: 0, h }, y, s);
  return {
    end: Math.abs(s.next[0]! - Math.exp(h)),
    middle: Math.abs(within(piece, 0.5, new Float64Array(1))[0]! - Math.exp(h / 2)),
    estimate: Math.abs(s.error[0]!),
  };
}

describe("step(slope, at, y, scratch)", () => {
  test("a step of nothing moves nothing", () => {
    expect(errorsOf(0)).toEqual({ end: 0, middle: 0, estimate: 0 });
  });

  // One step of a fifth-order method errs as h^6, its dense output (fourth order) and its estimate as h^5.
  test("halving the step divides the end error by 2^6, the dense error and the estimate by 2^5", () => {
    const [wide, close] = [errorsOf(0.1), errorsOf(0.05)];
    expect(Math.log2(wide.end / close.end)).toBeCloseTo(6, 0);
    expect(Math.log2(wide.middle / close.middle)).toBeCloseTo(5, 0);
    expect(Math.log2(wide.estimate / close.estimate)).toBeCloseTo(5, 0);
  });
});

describe("within(piece, theta, out)", () => {
  test("meets the step at both ends", () => {
    const s = scratchOf(1);
    const y = Float64Array.of(2);
    growth(0, y, s.k[0]!);
    step(growth, { x: 0, h: 0.3 }, y, s);
    const piece = pieceOf({ x: 0, h: 0.3 }, y, s);
    const out = new Float64Array(1);
    expect(within(piece, 0, out)[0]).toBe(2);
    expect(within(piece, 1, out)[0]).toBeCloseTo(s.next[0]!, 15);
  });
});
