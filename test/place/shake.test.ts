import { describe, expect, test } from "vitest";
import { board, groupsOf, noRules } from "../../src/place/board.ts";
import { effort } from "../../src/place/effort.ts";
import { stageGap } from "../../src/place/gap.ts";
import { toLattice } from "../../src/place/lattice.ts";
import { seeded } from "../../src/place/random.ts";
import { shake } from "../../src/place/shake.ts";
import { capacitances } from "./lots.ts";

const start = () => {
  const { values } = toLattice(capacitances("lots", 60, 2));
  const groups = Array.from({ length: 6 }, (_, g) => Array.from({ length: 10 }, (_, k) => g * 10 + k));
  return board(values, groups, noRules(60));
};

describe("shake(board, moves, random, work)", () => {
  test("lowers the gap of a placing in the order of the lot a hundredfold, keeps every unit, counts its moves", () => {
    const at = start();
    const before = stageGap(at.sums, 6);
    const work = effort(1e6);
    shake(at, 20_000, seeded(1), work);
    expect(stageGap(at.sums, 6)).toBeLessThan(before / 50);
    expect(
      groupsOf(at)
        .flat()
        .sort((a, b) => a - b),
    ).toEqual(Array.from({ length: 60 }, (_, i) => i));
    expect(work.spent).toBe(20_000);
  });
  test("the same seed gives the same placing", () => {
    const [a, b] = [start(), start()];
    shake(a, 5000, seeded(4), effort(1e6));
    shake(b, 5000, seeded(4), effort(1e6));
    expect([...a.slots]).toEqual([...b.slots]);
  });
});
