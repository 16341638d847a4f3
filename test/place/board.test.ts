import { describe, expect, test } from "vitest";
import { board, exchange, groupsOf, mayExchange, noRules, recount, stageOf } from "../../src/place/board.ts";

const values = Float64Array.from([5, 1, 2, 3, 4]);

describe("board(values, groups, rules)", () => {
  test("slots hold the groups and then the spares; sums are those of the groups", () => {
    const at = board(
      values,
      [
        [0, 1],
        [3, 2],
      ],
      noRules(5),
    );
    expect([...at.slots]).toEqual([0, 1, 3, 2, 4]);
    expect([...at.sums]).toEqual([6, 5]);
    expect([stageOf(at, 0), stageOf(at, 3), stageOf(at, 4)]).toEqual([0, 1, 2]);
  });
  test("exchange keeps the sums right between stages, within one, and with a spare", () => {
    const at = board(
      values,
      [
        [0, 1],
        [3, 2],
      ],
      noRules(5),
    );
    exchange(at, 0, 2);
    exchange(at, 0, 1);
    exchange(at, 3, 4);
    const kept = [...at.sums];
    recount(at);
    expect(kept).toEqual([...at.sums]);
    expect(groupsOf(at)).toEqual([
      [1, 3],
      [0, 4],
    ]);
  });
  test("units of two classes, or pinned ones, do not change places", () => {
    const rules = { classOf: Int32Array.from([0, 0, 1, 1, 0]), classes: 2, fixed: Uint8Array.from([1, 0, 0, 0, 0]) };
    const at = board(
      values,
      [
        [0, 1],
        [3, 2],
      ],
      rules,
    );
    expect(mayExchange(at, 1, 4)).toBe(true);
    expect(mayExchange(at, 1, 2)).toBe(false);
    expect(mayExchange(at, 0, 4)).toBe(false);
  });
});
