import { describe, expect, test } from "vitest";
import { seeded } from "../../src/place/random.ts";

describe("seeded(seed)", () => {
  test("the same seed gives the same sequence, another seed another", () => {
    const [a, b, c] = [seeded(7), seeded(7), seeded(8)];
    const first = Array.from({ length: 5 }, a);
    expect(Array.from({ length: 5 }, b)).toEqual(first);
    expect(Array.from({ length: 5 }, c)).not.toEqual(first);
  });

  test("numbers fill [0, 1) evenly: mean 1/2, variance 1/12", () => {
    const random = seeded(1);
    const draws = Array.from({ length: 100_000 }, random);
    expect(Math.min(...draws.slice(0, 1000))).toBeGreaterThanOrEqual(0);
    expect(draws.every((x) => x >= 0 && x < 1)).toBe(true);
    const mean = draws.reduce((s, x) => s + x, 0) / draws.length;
    expect(mean).toBeCloseTo(0.5, 2);
    expect(draws.reduce((s, x) => s + (x - mean) ** 2, 0) / draws.length).toBeCloseTo(1 / 12, 2);
  });
});
