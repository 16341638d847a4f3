// The owner of HiGHS: whole answers checked again, time limits honest, memory given back.
import { describe, expect, test } from "vitest";
import { runForm } from "../../src/search/blend/blendPrograms.ts";
import { isProgramPoint, type Program } from "../../src/search/blend/program.ts";
import { highsMemory, solveWithHighs } from "../../src/search/highs.ts";
import { inventInstance } from "../support/blendInstances.ts";

const open = Number.POSITIVE_INFINITY;
const whole = (cost: number, most = open) => ({ cost, most, whole: true });

describe("solveWithHighs", () => {
  test("no columns: answered without the engine, which throws on them", async () => {
    expect(await solveWithHighs({ columns: [], rows: [] })).toEqual({
      status: "optimal",
      values: [],
      cost: 0,
      bound: 0,
    });
    expect(await solveWithHighs({ columns: [], rows: [{ terms: [], least: 1, most: open }] })).toEqual({
      status: "infeasible",
    });
  });

  test("no rows, and zero terms", async () => {
    expect(await solveWithHighs({ columns: [whole(2, 3)], rows: [] })).toMatchObject({ status: "optimal", cost: 0 });
    const zero: Program = {
      columns: [whole(1), whole(2)],
      rows: [
        {
          terms: [
            [0, 0],
            [1, 1],
          ],
          least: 2,
          most: open,
        },
      ],
    };
    expect(await solveWithHighs(zero)).toMatchObject({ status: "optimal", cost: 4, values: [0, 2] });
  });

  test("a two-column cover that an earlier core got wrong costs 9", async () => {
    // 2a + 3b >= 8 at 3 and 4: 1a + 2b costs 11, 4a 12, b alone three times 12. 9 needs 3a or a cheaper b.
    const cover: Program = {
      columns: [whole(3), whole(5)],
      rows: [
        {
          terms: [
            [0, 3],
            [1, 4],
          ],
          least: 9,
          most: open,
        },
      ],
    };
    expect(await solveWithHighs(cover)).toMatchObject({ status: "optimal", cost: 9, values: [3, 0] });
  });

  test("the gap is zero: a better point one part in 20,000 away is found (the engine's own default is 1 in 10,000)", async () => {
    const near: Program = {
      columns: [whole(20_000, 1), whole(19_999, 1)],
      rows: [
        {
          terms: [
            [0, 1],
            [1, 1],
          ],
          least: 1,
          most: 1,
        },
      ],
    };
    expect(await solveWithHighs(near)).toMatchObject({ status: "optimal", cost: 19_999, values: [0, 1] });
  });

  test("fractions, and what cannot be", async () => {
    const half: Program = {
      columns: [{ cost: 1, most: open, whole: false }],
      rows: [{ terms: [[0, 2]], least: 1, most: open }],
    };
    expect(await solveWithHighs(half)).toMatchObject({ status: "optimal", cost: 0.5 });
    expect(
      await solveWithHighs({ ...half, rows: [...half.rows, { terms: [[0, 1]], least: -open, most: 0.4 }] }),
    ).toEqual({ status: "infeasible" });
    const unbounded: Program = { columns: [{ cost: -1, most: open, whole: false }], rows: half.rows };
    expect(await solveWithHighs(unbounded)).toMatchObject({ status: "unknown", why: "engine", values: null });
  });

  test("out of time: unknown, with a checked point or none, and a bound that is true", async () => {
    const { model } = inventInstance({
      parts: 100,
      seed: 9008,
      maxTypes: 6,
      energy: [20, 200],
      stock: 0.3,
      mostStrings: 400,
      ceiling: 0.95,
    });
    const { program } = runForm(model);
    const answer = await solveWithHighs(program, { seconds: 0.02 });
    if (answer.status !== "unknown") throw new Error(`a busy or a very fast machine: ${answer.status}`);
    expect(answer.why).toBe("time");
    if (answer.values !== null) expect(isProgramPoint(program, answer.values)).toBe(true);
    if (answer.bound !== null) expect(answer.bound).toBeLessThanOrEqual(9_374_122 + 0.5);
  });

  test("a hundred models in a row leave the engine's memory as it was", async () => {
    const { model } = inventInstance({ parts: 20, seed: 3, mostStrings: 20 });
    const { program } = runForm(model);
    const half: Program = { ...program, columns: program.columns.map((column) => ({ ...column, whole: false })) };
    const some = async (count: number) => {
      for (let at = 0; at < count; at += 1) expect((await solveWithHighs(half)).status).toBe("optimal");
      return highsMemory();
    };
    const before = await some(20);
    expect(await some(100)).toBe(before);
  }, 30_000);
});
