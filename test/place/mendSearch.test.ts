import { describe, expect, test } from "vitest";
import { type MendTask, mendSearch } from "../../src/place/mendSearch.ts";

const task: MendTask = {
  ties: "cross-tied",
  before: ["10", "12", "11", "11"],
  hole: 0,
  size: 2,
  count: 2,
  spares: ["13", "9"],
  pinned: new Set(),
  capacitance: Number,
  mayReplace: () => true,
  goal: 0,
};

describe("mendSearch(task)", () => {
  test("by hand: 10 comes out of 10+12 | 11+11; the best single spare is 9 (21 against 22), two moves can do no worse", () => {
    const found = mendSearch(task);
    expect(found.get(1)!.bank).toEqual(["9", "12", "11", "11"]);
    // 2 (1/21)/(1/21 + 1/22) - 1 = 1/43.
    expect(found.get(1)!.charging).toBeCloseTo(1 / 43, 12);
    for (const [moves, { bank }] of found) {
      expect(bank.filter((serial, p) => serial !== null && serial !== task.before[p]).length).toBe(moves);
    }
  });
  test("a spare that may not stand there is not put there", () => {
    const found = mendSearch({ ...task, mayReplace: (_, serial) => serial !== "9" });
    expect(found.get(1)!.bank[0]).toBe("13");
  });
});
