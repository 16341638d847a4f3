// The modes of a fed chain, against a general eigenvalue routine and against what they must satisfy.
import { EigenvalueDecomposition, Matrix } from "ml-matrix";
import { describe, expect, test } from "vitest";
import { sourceModes } from "../../src/bank/courseModes.ts";
import { streamState, uniformFrom } from "../../src/bank/random.ts";

const draw = uniformFrom(streamState(11, 0));

/** Rows of slopes summed over the modes, each times rate^power. */
function moment(modes: ReturnType<typeof sourceModes>, i: number, power: number): number {
  const width = modes.rates.length;
  let sum = 0;
  for (let k = 0; k < width; k++) sum += modes.slopes[i * width + k]! * modes.rates[k]! ** power;
  return sum;
}

describe("sourceModes({ rates, weights, slopes, resistance })", () => {
  test("one stage on a source: 1/(R C) and its own rate together", () => {
    const modes = sourceModes({ rates: [3], weights: [2], slopes: [5], resistance: 4 });
    expect([...modes.rates]).toEqual([3.5]);
    expect(modes.slopes[0]).toBeCloseTo(5, 14);
  });

  test("held, all rates zero: a steady drift and nothing else", () => {
    const modes = sourceModes({ rates: [0, 0, 0], weights: [1, 1, 1], slopes: [2, -1, -1], resistance: 0 });
    expect([...modes.rates]).toEqual([0]);
    expect([...modes.slopes]).toEqual([2, -1, -1]);
  });

  test("stages of one rate apart from what moves them all: what is equal to rounding leaves no drift of its own", () => {
    // Slopes in the very ratio of the weights, but for the last digit: one mode alone, in which all move together.
    const weights = [1, 3, 7];
    const modes = sourceModes({
      rates: [0, 0, 0],
      weights,
      slopes: weights.map((w) => w * 0.1 * (1 + 2e-16)),
      resistance: 5,
    });
    const width = modes.rates.length;
    for (let i = 0; i < 3; i++) for (let k = 1; k < width; k++) expect(modes.slopes[i * width + k]).toBe(0);
    expect(modes.rates[0]).toBeCloseTo(11 / 5, 12);
  });

  test("eigenvalues agree with ml-matrix to 1e-9, fed through a resistor, 100 random chains", () => {
    for (let k = 0; k < 100; k++) {
      const n = 1 + (k % 8);
      const weights = Array.from({ length: n }, () => 0.2 + draw());
      const rates = Array.from({ length: n }, () => 3 * draw());
      if (n > 3) rates[1] = rates[0]!;
      const resistance = 0.1 + draw();
      const slopes = weights.map(() => draw() - 0.5);
      const modes = sourceModes({ rates, weights, slopes, resistance });
      const symmetric = Array.from({ length: n }, (_, r) =>
        Array.from(
          { length: n },
          (_, c) => (r === c ? rates[r]! : 0) + Math.sqrt(weights[r]! * weights[c]!) / resistance,
        ),
      );
      const outside = new EigenvalueDecomposition(new Matrix(symmetric), { assumeSymmetric: true }).realEigenvalues;
      const ours = [...modes.rates].sort((a, b) => a - b);
      const theirs = [...outside].sort((a, b) => a - b);
      for (const [i, value] of ours.entries()) expect(value).toBeCloseTo(theirs[i]!, 9);
      expect(ours).toHaveLength(n);
    }
  });

  test("the modes add up to the slopes, and their next derivative to the equation's, over 8 decades of rates", () => {
    for (let k = 0; k < 200; k++) {
      const n = 2 + (k % 12);
      const weights = Array.from({ length: n }, () => 10 ** (2 * draw()));
      const rates = Array.from({ length: n }, () => 10 ** (8 * draw() - 4));
      for (let i = 1; i < n; i++) if (draw() < 0.2) rates[i] = rates[i - 1]! * (draw() < 0.5 ? 1 : 1 + 1e-10);
      const resistance = k % 2 === 0 ? 0 : 10 ** (4 * draw() - 2);
      const slopes = weights.map(() => draw() - 0.5);
      if (resistance === 0) slopes[0]! -= slopes.reduce((sum, slope) => sum + slope, 0);
      const modes = sourceModes({ rates, weights, slopes, resistance });
      const sum = slopes.reduce((all, slope) => all + slope, 0);
      const decay = slopes.reduce((all, slope, i) => all + rates[i]! * slope, 0);
      const weight = weights.reduce((all, w) => all + w, 0);
      const feed = resistance === 0 ? decay / weight : -sum / resistance;
      const fastest = Math.max(...modes.rates);
      for (let i = 0; i < n; i++) {
        expect(moment(modes, i, 0)).toBeCloseTo(slopes[i]!, 9);
        const bend = rates[i]! * slopes[i]! - weights[i]! * feed;
        expect(Math.abs(moment(modes, i, 1) - bend) / fastest).toBeLessThan(1e-9);
      }
    }
  });
});
