// The check of an answer that both engines' owners lean on.
import { expect, test } from "vitest";
import {
  isProgramPoint,
  type Program,
  programCost,
  relaxed,
  roundedValues,
} from "../../../src/search/blend/program.ts";

const program: Program = {
  columns: [
    { cost: 3, most: 5, whole: true },
    { cost: 2, most: Number.POSITIVE_INFINITY, whole: false },
  ],
  rows: [
    {
      terms: [
        [0, 1],
        [1, 1],
      ],
      least: 4,
      most: 10,
    },
    {
      terms: [
        [0, 1],
        [1, -1],
      ],
      least: Number.NEGATIVE_INFINITY,
      most: 0,
    },
  ],
};

test("isProgramPoint: inside, on the edge, and outside each bound and row", () => {
  expect(isProgramPoint(program, [2, 2])).toBe(true);
  expect(isProgramPoint(program, [2, 2 - 1e-9])).toBe(true);
  expect(isProgramPoint(program, [1, 2.9])).toBe(false);
  expect(isProgramPoint(program, [3, 2.9])).toBe(false);
  expect(isProgramPoint(program, [5, 6])).toBe(false);
  expect(isProgramPoint(program, [6, 6])).toBe(false);
  expect(isProgramPoint(program, [-1, 6])).toBe(false);
  expect(isProgramPoint(program, [1.5, 6])).toBe(false);
  expect(isProgramPoint(program, [Number.NaN, 6])).toBe(false);
});

test("roundedValues: near whole numbers are rounded, others are not an answer", () => {
  expect(roundedValues(program, [1.9999999, 2.5])).toEqual([2, 2.5]);
  expect(roundedValues(program, [1.99, 2.5])).toBeNull();
  expect(roundedValues(program, [Number.NaN, 2.5])).toBeNull();
});

test("programCost and relaxed", () => {
  expect(programCost(program, [2, 3])).toBe(12);
  expect(relaxed(program).columns.some(({ whole }) => whole)).toBe(false);
});
