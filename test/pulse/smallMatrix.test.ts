// Small matrices: products by hand, the exponential by what is known of it.
import { expect, test } from "vitest";
import { exponential, identity, multiply, transform } from "../../src/pulse/smallMatrix.ts";

test("identity, multiply, transform: by hand", () => {
  expect([...identity(2)]).toEqual([1, 0, 0, 1]);
  const [a, b] = [Float64Array.of(1, 2, 3, 4), Float64Array.of(0, 1, 1, 5)];
  expect([...multiply(a, b, 2)]).toEqual([2, 11, 4, 23]);
  expect([...transform(a, Float64Array.of(5, 7), 2)]).toEqual([19, 43]);
});

test("exponential(a, size, time): a turn, a decay, a nilpotent, and exp(A) exp(-A) = 1 far from small", () => {
  const turn = exponential(Float64Array.of(0, -1, 1, 0), 2, 2);
  expect(turn[0]).toBeCloseTo(Math.cos(2), 13);
  expect(turn[2]).toBeCloseTo(Math.sin(2), 13);
  expect(exponential(Float64Array.of(-3), 1, 10)[0]! / Math.exp(-30)).toBeCloseTo(1, 10);
  expect([...exponential(Float64Array.of(0, 1, 0, 0), 2, 4)]).toEqual([1, 4, 0, 1]);
  const a = Float64Array.of(0.3, -2, 5, 1, 0.2, 0, -1, 4, -0.7);
  const there = multiply(exponential(a, 3, 1.5), exponential(a, 3, -1.5), 3);
  for (const [at, value] of there.entries()) expect(value).toBeCloseTo(at % 4 === 0 ? 1 : 0, 9);
});
