import { describe, expect, test } from "vitest";
import { choose, subsetBuilder } from "../../src/place/subsetSums.ts";
import { wholes } from "./lots.ts";

describe("choose(n, k)", () => {
  test("handbook values", () => {
    expect([choose(24, 4), choose(30, 6), choose(5, 0), choose(24, 12)]).toEqual([10626, 593775, 1, 2704156]);
  });
});

describe("subsetBuilder(most, deepest).fill(values, count, depth)", () => {
  test("lists hold every subset of each size once, sums rising and equal to their masks", () => {
    const values = wholes(9, 4);
    const { lists, counts } = subsetBuilder(10, 4).fill(values, 9, 4);
    for (let k = 1; k <= 4; k++) {
      expect(counts[k]).toBe(choose(9, k));
      const masks = new Set<number>();
      for (let i = 0; i < counts[k]!; i++) {
        const mask = lists[k]!.masks[i]!;
        masks.add(mask);
        const members = values.filter((_, bit) => mask & (1 << bit));
        expect(members.length).toBe(k);
        expect(lists[k]!.sums[i]).toBe(members.reduce((s, v) => s + v, 0));
        if (i > 0) expect(lists[k]!.sums[i]!).toBeGreaterThanOrEqual(lists[k]!.sums[i - 1]!);
      }
      expect(masks.size).toBe(choose(9, k));
    }
  });

  test("a second fill forgets the first, and fewer values than the depth leave the deep lists empty", () => {
    const builder = subsetBuilder(10, 5);
    builder.fill(wholes(10, 1), 10, 5);
    const { counts } = builder.fill([1, 2], 2, 5);
    expect([...counts]).toEqual([1, 2, 1, 0, 0, 0]);
  });
});
