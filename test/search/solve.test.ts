// The owner of javascript-lp-solver: each known trap of 1.0.3 as the package falls into it, and as the owner answers.
import engine from "javascript-lp-solver";
import { describe, expect, test } from "vitest";
import type { Program, ProgramColumn, ProgramRow } from "../../src/search/blend/program.ts";
import { solveLinear, solveWhole } from "../../src/search/solve.ts";
import { chance } from "../support/blendInstances.ts";

const open = Number.POSITIVE_INFINITY;
const whole = (cost: number, most = open): ProgramColumn => ({ cost, most, whole: true });
const free = (cost: number, most = open): ProgramColumn => ({ cost, most, whole: false });
const atLeast = (least: number, ...values: number[]): ProgramRow => ({
  terms: values.map((v, at) => [at, v] as const),
  least,
  most: open,
});
const atMost = (most: number, ...values: number[]): ProgramRow => ({
  terms: values.map((v, at) => [at, v] as const),
  least: -open,
  most,
});
const program = (columns: ProgramColumn[], ...rows: ProgramRow[]): Program => ({ columns, rows });

/** The package as a caller would first use it. */
const raw = (model: object): Record<string, unknown> =>
  (engine as unknown as { Solve: (m: object) => Record<string, unknown> }).Solve(model);

describe("traps: the package is still wrong, the owner is right", () => {
  test("T1: presolve forgets the cost of a column that its rows fix", () => {
    const model = {
      optimize: "cost",
      opType: "min",
      constraints: { a: { max: -3 }, b: { max: 3 } },
      variables: { x: { cost: 5, a: -1, b: 1 } },
    };
    expect(raw(model).result).toBe(0);
    expect(solveLinear(program([free(5)], atMost(-3, -1), atMost(3, 1)))).toMatchObject({
      status: "optimal",
      cost: 15,
    });
  });

  test("T1c: a binary forced on costs what it costs", () => {
    const model = {
      optimize: "cost",
      opType: "min",
      constraints: { a: { max: -1 } },
      variables: { y: { cost: 25, a: -1 } },
      binaries: { y: 1 },
    };
    expect(raw(model).result).toBe(0);
    expect(solveWhole(program([whole(25, 1)], atMost(-1, -1)))).toMatchObject({
      status: "claimed",
      cost: 25,
      values: [1],
    });
  });

  test("T2: a part that weighs nothing does not make a ceiling impossible", () => {
    // x is fixed by its rows, which leaves y with a coefficient of 0 as the only free term of the mass row.
    const raw0 = raw({
      optimize: "cost",
      opType: "min",
      constraints: { need: { min: 2 }, fix: { max: 0 }, mass: { max: 5 } },
      variables: { x: { cost: 1, fix: 1, mass: 1, need: 1 }, y: { cost: 2, need: 1, mass: 0 } },
    });
    const answer = solveWhole(program([whole(1), whole(2)], atLeast(2, 1, 1), atMost(0, 1), atMost(5, 1, 0)));
    expect(answer).toMatchObject({ status: "claimed", cost: 4, values: [0, 2] });
    expect([true, false]).toContain(raw0.feasible);
  });

  test("T3: unrestricted columns cannot be asked for", () => {
    const model = {
      optimize: "cost",
      opType: "min",
      constraints: { a: { max: -5 } },
      variables: { x: { cost: 0, a: 1 }, y: { cost: 0, a: 1 } },
      unrestricted: { x: 1, y: 1 },
    };
    expect(raw(model).feasible).toBe(false);
    // The shape of a programme has no lower bound but 0; the same sum is rightly impossible with it.
    expect(solveLinear(program([free(0), free(0)], atMost(-5, 1, 1)))).toMatchObject({ status: "infeasible" });
  });

  test("T4: a need of 5 nF of 1 nF parts takes five", () => {
    const model = {
      optimize: "cost",
      opType: "min",
      constraints: { c: { min: 5e-9 } },
      variables: { x: { cost: 1, c: 1e-9 } },
      ints: { x: 1 },
    };
    expect(raw(model).x ?? 0).toBe(0);
    expect(solveWhole(program([whole(1)], atLeast(5e-9, 1e-9)))).toMatchObject({ status: "claimed", cost: 5 });
  });

  test("T4c: a need of 100 uF of 1 nF parts takes 100,000", () => {
    const model = {
      optimize: "cost",
      opType: "min",
      constraints: { c: { min: 1e-4 } },
      variables: { x: { cost: 1, c: 1e-9 } },
      ints: { x: 1 },
    };
    expect(raw(model).feasible).toBe(false);
    expect(solveWhole(program([whole(1)], atLeast(1e-4, 1e-9)))).toMatchObject({ status: "claimed", cost: 100_000 });
  });

  test("T5: a tiny quotient is not passed over", () => {
    const model = {
      optimize: "x",
      opType: "max",
      constraints: { a: { max: 1e-4 }, b: { max: 1 } },
      variables: { x: { x: 1, a: 1e5, b: 1 } },
    };
    expect(raw(model).result).toBe(1);
    const answer = solveLinear(program([free(-1)], atMost(1e-4, 1e5)));
    if (answer.status !== "optimal") throw new Error(answer.status);
    expect(answer.values[0]! / 1e-9).toBeCloseTo(1, 6);
  });

  test("T6, T7: no name of ours can clash: goal, rows and columns are numbered inside", () => {
    const clash = {
      optimize: "cost",
      opType: "min",
      constraints: { cost: { max: 15 }, need: { min: 10 } },
      variables: { x: { cost: 1, need: 1 }, result: { cost: 2, need: 1 } },
    };
    expect(raw({ ...clash, variables: { result: { cost: 3, need: 5 } }, ints: { result: 1 } }).result).not.toBe(6);
    // A budget on the goal itself, the row that the package drops.
    const budget = (most: number) => solveWhole(program([whole(20)], atLeast(10, 1), atMost(most, 20)));
    expect(budget(200)).toMatchObject({ status: "claimed", cost: 200 });
    expect(budget(199)).toEqual({ status: "claimed infeasible" });
  });

  test("T8: always the minimum", () => {
    expect(solveLinear(program([free(2, 9)], atLeast(3, 1)))).toMatchObject({ status: "optimal", cost: 6 });
  });

  test("T9d: no whole solution of 2x - 4y = 7: never a claim of one, and unknown when the time ran out", () => {
    let now = 0;
    const answer = solveWhole(
      program([whole(1, 1000), whole(1, 1000)], {
        terms: [
          [0, 2],
          [1, -4],
        ],
        least: 7,
        most: 7,
      }),
      {
        milliseconds: 100,
        clock: () => {
          now += 100;
          return now;
        },
      },
    );
    expect(answer).toEqual({ status: "unknown", why: "time" });
  });

  test("T10, T13: an answer as late as the limit is unknown, whatever it says; one in time counts", () => {
    const easy = program([whole(1)], atLeast(2.5, 1));
    const late = (step: number) => {
      let now = 0;
      return solveWhole(easy, { milliseconds: 1000, clock: () => (now += step) });
    };
    expect(late(1000)).toEqual({ status: "unknown", why: "time" });
    expect(late(951)).toEqual({ status: "unknown", why: "time" });
    expect(late(10)).toMatchObject({ status: "claimed", cost: 3 });
  });

  test("T11, T12: one goal, and no incremental mode: random whole programmes agree with trying everything", () => {
    const random = chance(11);
    const draw = (n: number): number => 1 + Math.floor(random() * n);
    for (let at = 0; at < 300; at += 1) {
      const n = 1 + draw(2);
      const costs = Array.from({ length: n }, () => draw(20));
      const brings = costs.map(() => draw(9));
      const takes = costs.map(() => draw(9) - 1);
      const [need, room] = [draw(30), draw(40)];
      let best = open;
      const go = (k: number, cost: number, got: number, used: number): void => {
        if (k === n) {
          if (got >= need && used <= room) best = Math.min(best, cost);
          return;
        }
        for (let x = 0; x <= 6; x += 1) go(k + 1, cost + x * costs[k]!, got + x * brings[k]!, used + x * takes[k]!);
      };
      go(0, 0, 0, 0);
      const answer = solveWhole(
        program(
          costs.map((cost) => whole(cost, 6)),
          atLeast(need, ...brings),
          atMost(room, ...takes),
        ),
      );
      if (best === open) expect(answer).toEqual({ status: "claimed infeasible" });
      else expect(answer).toMatchObject({ status: "claimed", cost: best });
    }
  });
});

describe("guards", () => {
  test("more columns than asked for are refused, and terms too far apart", () => {
    expect(
      solveWhole(
        program(
          Array.from({ length: 251 }, () => whole(1)),
          atLeast(1, 1),
        ),
      ),
    ).toEqual({ status: "unknown", why: "size" });
    expect(solveWhole(program([whole(1), whole(1)], atLeast(1, 1)), { mostColumns: 1 })).toEqual({
      status: "unknown",
      why: "size",
    });
    expect(solveWhole(program([whole(1), whole(1)], atLeast(1, 1, 1e-9)))).toEqual({ status: "unknown", why: "scale" });
    expect(solveLinear(program([free(1)], atLeast(1, 1e-3), atMost(1, 1e9)))).toMatchObject({ status: "unknown" });
  });

  test("an unbounded goal is no answer", () => {
    expect(solveLinear(program([free(-1)], atLeast(1, 1)))).toEqual({ status: "unknown", why: "check" });
    expect(solveWhole(program([whole(-1)], atLeast(1, 1)))).not.toMatchObject({ status: "claimed" });
  });

  test("an empty row that cannot hold", () => {
    expect(solveWhole(program([whole(1)], atLeast(1, 0)))).toEqual({ status: "claimed infeasible" });
    expect(solveLinear(program([free(1)], atLeast(1, 0)))).toEqual({ status: "infeasible", missing: 1 });
  });
});

describe("linear programmes", () => {
  test("solveLinear: a textbook diet with its shadow prices, worked by hand", () => {
    // min 3a + 2b with a + b >= 4, a + 3b >= 6, a <= 3: the corner a = 3, b = 1 costs 11, and 8 at a = 0, b = 4. The rows
    // a + b >= 4 binds alone at b = 4: one more of it costs 2.
    const answer = solveLinear(program([free(3, 3), free(2)], atLeast(4, 1, 1), atLeast(6, 1, 3)));
    if (answer.status !== "optimal") throw new Error(answer.status);
    expect(answer.cost).toBeCloseTo(8, 6);
    expect(answer.prices[0]).toBeCloseTo(2, 6);
    expect(answer.prices[1]).toBeCloseTo(0, 6);
  });

  test("solveLinear: a ceiling's price is negative: one more unit of room lowers the cost", () => {
    // 10 needed, of parts that bring 1 for 5 without volume or 1 for 2 with volume 1; room for 4: 4 x 2 + 6 x 5 = 38.
    const answer = solveLinear(program([free(5), free(2)], atLeast(10, 1, 1), atMost(4, 0, 1)));
    if (answer.status !== "optimal") throw new Error(answer.status);
    expect(answer.cost).toBeCloseTo(38, 6);
    expect(answer.prices[1]).toBeCloseTo(-3, 6);
    expect(answer.prices[0]).toBeCloseTo(5, 6);
    expect(answer.bound).toBeCloseTo(38, 5);
  });

  test("solveLinear: prices are right by finite difference in SI units, 100 random mixes", () => {
    const random = chance(5);
    let checked = 0;
    for (let at = 0; at < 100; at += 1) {
      const n = 3 + Math.floor(random() * 4);
      const columns = Array.from({ length: n }, () => free(100 + Math.floor(900 * random()), 2 + 8 * random()));
      const farads = columns.map(() => 1e-6 * (1 + 9 * random()));
      const cubic = columns.map(() => 1e-4 * (1 + 9 * random()));
      const mix = (need: number, room: number) =>
        solveLinear(program(columns, atLeast(need, ...farads), atMost(room, ...cubic)));
      const [need, room] = [5e-5 * (0.5 + random()), 4e-3 * (0.5 + random())];
      const here = mix(need, room);
      if (here.status !== "optimal") continue;
      const more = mix(need, room * 1.0001);
      const less = mix(need, room * 0.9999);
      if (more.status !== "optimal" || less.status !== "optimal") continue;
      checked += 1;
      const slopes = [(more.cost - here.cost) / (room * 1e-4), (here.cost - less.cost) / (room * 1e-4)];
      const size = Math.abs(here.cost / room);
      expect(here.prices[1]!).toBeGreaterThanOrEqual(Math.min(...slopes) - 1e-3 * size);
      expect(here.prices[1]!).toBeLessThanOrEqual(Math.max(...slopes) + 1e-3 * size);
    }
    expect(checked).toBeGreaterThan(30);
  });

  test("solveLinear: impossible is proven by what is missing", () => {
    expect(solveLinear(program([free(1, 3)], atLeast(4, 1)))).toMatchObject({ status: "infeasible" });
    expect(solveLinear(program([free(1)], atLeast(4, 1), atMost(3, 1)))).toMatchObject({ status: "infeasible" });
  });
});
