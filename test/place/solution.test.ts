import { expect, test } from "vitest";
import { isOptimal } from "../../src/place/solution.ts";

test("isOptimal(solution): the gap equals its lower bound to 1e-12", () => {
  expect(isOptimal({ gap: 1e-4, lowerBound: 1e-4 })).toBe(true);
  expect(isOptimal({ gap: 1e-4, lowerBound: 1e-4 - 1e-11 })).toBe(false);
});
