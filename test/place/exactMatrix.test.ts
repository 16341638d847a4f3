import { describe, expect, test } from "vitest";
import { finish } from "../../src/place/charging.ts";
import { effort } from "../../src/place/effort.ts";
import { exactMatrix, fitsExactSearch } from "../../src/place/exactMatrix.ts";
import { bestGap, everyDivision, stagesGap } from "./brute.ts";
import { wholes } from "./lots.ts";

const solve = (values: readonly number[], stages: number, size: number, more: object = {}) =>
  finish(
    exactMatrix(
      { values: Float64Array.from(values), stages, size, inHand: Number.POSITIVE_INFINITY, target: 0, ...more },
      effort(1e8),
    ),
  );

describe("exactMatrix(problem, work)", () => {
  test("equals full enumeration on 400 small lots, with and without spares", () => {
    const shapes = [
      [2, 3, 0],
      [3, 2, 0],
      [3, 3, 0],
      [4, 2, 0],
      [5, 2, 0],
      [2, 3, 2],
      [3, 2, 3],
      [2, 4, 1],
    ] as const;
    for (let seed = 1; seed <= 400; seed++) {
      const [stages, size, spares] = shapes[seed % shapes.length]!;
      const values = wholes(stages * size + spares, seed).map((v, i) => (seed % 5 === 0 && i < 2 ? 2 * v : v));
      const answer = solve(values, stages, size);
      expect(answer.proven).toBe(true);
      expect(answer.gap).toBeCloseTo(bestGap(values, { groups: stages, size }, stagesGap), 12);
      expect(stagesGap(values, answer.groups!)).toBeCloseTo(answer.gap, 12);
    }
  });

  test("equals full enumeration on 60 lots in two heaps of uneven count, 12 units: what the bound on the fullest stages is for", () => {
    for (let seed = 1; seed <= 60; seed++) {
      const [stages, size] = seed % 2 === 0 ? [4, 3] : [3, 4];
      const high = 1 + (seed % 11);
      const values = wholes(12, seed, 960, 990).map((v, i) => (i < high ? v + 60 + (seed % 3) * 200 : v));
      const answer = solve(values, stages, size);
      expect(answer.proven).toBe(true);
      expect(answer.gap).toBeCloseTo(bestGap(values, { groups: stages, size }, stagesGap), 12);
    }
  });

  test("a test of what may share a stage is honoured: no two of the first three units together", () => {
    for (let seed = 1; seed <= 30; seed++) {
      const values = wholes(9, seed);
      const allowed = (mask: number) => [0b011, 0b101, 0b110].every((pair) => (mask & pair) !== pair);
      let best = Number.POSITIVE_INFINITY;
      everyDivision(9, { groups: 3, size: 3 }, (groups) => {
        if (groups.some((g) => g.filter((i) => i < 3).length > 1)) return;
        best = Math.min(best, stagesGap(values, groups));
      });
      expect(solve(values, 3, 3, { allowed }).gap).toBeCloseTo(best, 12);
    }
  });

  test("units that must be used are used", () => {
    const values = [100, 100, 100, 100, 170];
    expect(solve(values, 2, 2).gap).toBe(0);
    const forced = solve(values, 2, 2, { must: 0b10000 });
    expect(forced.groups!.flat()).toContain(4);
  });

  test("nothing better than what is in hand: proven, no groups; out of effort: not proven", () => {
    const held = solve([1, 5, 6, 2, 4, 6, 3, 3, 6], 3, 3, { inHand: 1e-9, target: 1e-9 });
    expect(held).toMatchObject({ groups: null, proven: true });
    const values = Float64Array.from(wholes(24, 3, 9000, 11000));
    const short = finish(exactMatrix({ values, stages: 8, size: 3, inHand: 0.5, target: 0 }, effort(3000)));
    expect(short.proven).toBe(false);
  });
});

describe("fitsExactSearch(units, size)", () => {
  test("by the number of subsets and of bits", () => {
    expect(fitsExactSearch(24, 4)).toBe(true);
    expect(fitsExactSearch(32, 2)).toBe(false);
    expect(fitsExactSearch(31, 10)).toBe(false);
  });
});
