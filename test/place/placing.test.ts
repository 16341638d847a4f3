import { expect, test } from "vitest";
import { serialsOf, settled } from "../../src/place/placing.ts";

test("settled(groups, numbered): units in input order; groups too, unless pins number them", () => {
  expect(
    settled(
      [
        [5, 2],
        [1, 4],
      ],
      false,
    ),
  ).toEqual([
    [1, 4],
    [2, 5],
  ]);
  expect(
    settled(
      [
        [5, 2],
        [1, 4],
      ],
      true,
    ),
  ).toEqual([
    [2, 5],
    [1, 4],
  ]);
});

test("serialsOf(units, groups)", () => {
  const lot = ["a", "b"].map((serial) => ({ serial, capacitance: 1 }));
  expect(serialsOf(lot, [[1], [0]])).toEqual([["b"], ["a"]]);
});
