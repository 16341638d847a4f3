import { describe, expect, test } from "vitest";
import { board, noRules } from "../../src/place/board.ts";
import { exchangeLists } from "../../src/place/exchangeLists.ts";
import { seeded } from "../../src/place/random.ts";
import { wholes } from "./lots.ts";

const subsets = (values: readonly number[], k: number): number[] => {
  if (k === 0) return [0];
  return values.flatMap((v, i) => subsets(values.slice(i + 1), k - 1).map((s) => s + v));
};

describe("exchangeLists(board).nearest(one, other, class, depth, wanted)", () => {
  test("finds the exchange nearest to the wanted transfer, as trying all of them does", () => {
    for (let seed = 1; seed <= 40; seed++) {
      const lot = wholes(16, seed, 100, 999);
      const groups = [0, 1].map((g) => Array.from({ length: 8 }, (_, k) => g * 8 + k));
      const lists = exchangeLists(board(Float64Array.from(lot), groups, noRules(16)), seeded(1));
      const wanted = (seed * 37) % 200;
      const found = lists.nearest(0, 1, 0, 3, wanted);
      let best = Number.POSITIVE_INFINITY;
      for (let k = 1; k <= 3; k++) {
        for (const out of subsets(lot.slice(0, 8), k)) {
          for (const into of subsets(lot.slice(8), k)) best = Math.min(best, Math.abs(into - out - wanted));
        }
      }
      expect(Math.abs(found.gain - wanted)).toBe(best);
      const bits = (mask: number, stage: number) =>
        Array.from({ length: 10 }, (_, b) => b)
          .filter((b) => mask & (1 << b))
          .map((b) => lot[lists.slot(stage, 0, b)]!);
      const gain =
        bits(found.maskOther, 1).reduce((s, v) => s + v, 0) - bits(found.maskOne, 0).reduce((s, v) => s + v, 0);
      expect(gain).toBe(found.gain);
      expect(bits(found.maskOne, 0).length).toBe(found.size);
    }
  });

  test("no free units of a class: no exchange", () => {
    const rules = { classOf: Int32Array.from([0, 0, 1, 1]), classes: 2, fixed: Uint8Array.from([0, 0, 0, 0]) };
    const lists = exchangeLists(
      board(
        Float64Array.from([1, 2, 3, 4]),
        [
          [0, 1],
          [2, 3],
        ],
        rules,
      ),
      seeded(1),
    );
    expect(lists.nearest(0, 1, 0, 2, 1).size).toBe(0);
  });
});
