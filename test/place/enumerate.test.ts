import { describe, expect, test } from "vitest";
import { finish } from "../../src/place/charging.ts";
import { arrangements, divisions } from "../../src/place/enumerate.ts";
import { everyDivision } from "./brute.ts";

describe("arrangements(units, groups, size)", () => {
  test("handbook numbers: 16 units in 4 fours 2,627,625 ways, 9 in 3 threes 280, 6 in 3 pairs 15", () => {
    expect([arrangements(16, 4, 4), arrangements(9, 3, 3), arrangements(6, 3, 2), arrangements(5, 2, 2)]).toEqual([
      2627625, 280, 15, 15,
    ]);
  });
});

describe("divisions(shape, visit, goOn)", () => {
  test.each([
    [9, 3, 3],
    [8, 2, 3],
    [7, 3, 2],
    [6, 2, 3],
    [5, 5, 1],
    [5, 1, 3],
    [7, 2, 2],
  ])("%i units, %i groups of %i: each division once, the same set as the plain recursion", (units, groups, size) => {
    const key = (masks: readonly number[]) => [...masks].sort((a, b) => a - b).join(",");
    const seen = new Set<string>();
    let calls = 0;
    const complete = finish(
      divisions(
        { units, groups, size },
        (masks) => {
          seen.add(key([...masks]));
          calls++;
        },
        () => true,
      ),
    );
    const plain = new Set<string>();
    everyDivision(units, { groups, size }, (made) => {
      plain.add(key(made.map((g) => g.reduce((m, i) => m | (1 << i), 0))));
    });
    expect(complete).toBe(true);
    expect(calls).toBe(seen.size);
    expect(calls).toBe(arrangements(units, groups, size));
    expect(seen).toEqual(plain);
  });
  test("ends early when told to", () => {
    expect(
      finish(
        divisions(
          { units: 12, groups: 3, size: 4 },
          () => {},
          () => false,
        ),
      ),
    ).toBe(false);
  });
});
