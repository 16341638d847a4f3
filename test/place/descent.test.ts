import { describe, expect, test } from "vitest";
import { board, groupsOf, noRules } from "../../src/place/board.ts";
import { finish } from "../../src/place/charging.ts";
import { descend } from "../../src/place/descent.ts";
import { effort } from "../../src/place/effort.ts";
import { firstPlacing } from "../../src/place/firstPlacings.ts";
import { stageGap } from "../../src/place/gap.ts";
import { toLattice } from "../../src/place/lattice.ts";
import { seeded } from "../../src/place/random.ts";
import { capacitances, KINDS } from "./lots.ts";

const run = (kind: (typeof KINDS)[number], seed: number, moves: number) => {
  const { values } = toLattice(capacitances(kind, 100, seed));
  const at = board(values, firstPlacing(values.subarray(0, 96), 8), noRules(100));
  const work = effort(moves);
  const before = stageGap(at.sums, 8);
  const gap = finish(descend(at, { target: 1e-6, spares: true }, seeded(seed), work));
  return { at, gap, before, work };
};

describe("descend(board, goal, random, work)", () => {
  test.each(KINDS)("%s: 8 x 12 of 100 to 1 ppm within 3 million trials, 10 lots", (kind) => {
    for (let seed = 1; seed <= 10; seed++) {
      const { at, gap } = run(kind, seed, 3e6);
      expect(gap).toBeLessThanOrEqual(1e-6);
      expect(gap).toBe(stageGap(at.sums, 8));
      expect(new Set(groupsOf(at).flat()).size).toBe(96);
    }
  });
  test("never leaves the placing worse than it was, however little it may do", () => {
    for (const moves of [1, 100, 2000]) {
      const { gap, before, work } = run("lots", 3, moves);
      expect(gap).toBeLessThanOrEqual(before);
      expect(work.spent).toBeLessThan(moves + 60_000);
    }
  });
});
