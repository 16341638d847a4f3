import { describe, expect, test } from "vitest";
import { finish } from "../../src/place/charging.ts";
import { constrainedStart } from "../../src/place/constrainedStart.ts";
import { constraintsOf } from "../../src/place/constraints.ts";
import { effort } from "../../src/place/effort.ts";
import { seeded } from "../../src/place/random.ts";
import type { PlaceRequest } from "../../src/place/request.ts";
import { solveStages } from "../../src/place/solveStages.ts";
import { bestGap, everyDivision, stagesGap } from "./brute.ts";
import { wholes } from "./lots.ts";

const solve = (lot: readonly number[], request: Omit<PlaceRequest, "ties">, marks?: readonly string[], moves = 3e6) => {
  const measured = lot.map((capacitance, i) => ({
    serial: String(i),
    capacitance,
    ...(marks ? { lot: marks[i]! } : {}),
  }));
  const rule = constraintsOf(measured, { ...request, ties: "cross-tied" });
  const values = Float64Array.from(lot);
  const order = lot.map((_, i) => i);
  const start = rule.any ? constrainedStart(rule, order, values) : { ok: true as const, groups: [] };
  if (!start.ok) throw new Error(start.why);
  const task = { values, rule, order, start: start.groups, stopAt: 0, prove: true };
  return finish(solveStages(task, seeded(1), effort(moves)));
};

describe("solveStages(task, random, work)", () => {
  test("one stage, one unit a stage, two stages: direct and proven", () => {
    expect(solve([3, 1, 2], { series: 1, parallel: 3 })).toMatchObject({ gap: 0, lowerBound: 0 });
    const single = solve([10, 20, 21, 22, 40], { series: 3, parallel: 1 });
    expect(single.groups.flat().sort()).toEqual([1, 2, 3]);
    expect(solve([4, 5, 6, 7, 8, 10], { series: 2, parallel: 3 }).gap).toBe(0);
  });

  test("pins: the optimum of full enumeration under them, and each unit where it is pinned, 40 lots", () => {
    for (let seed = 1; seed <= 40; seed++) {
      const lot = wholes(9, seed);
      const pins = [
        { serial: "0", group: 2 },
        { serial: "1", group: 2 },
        { serial: "5", group: 0 },
      ];
      const made = solve(lot, { series: 3, parallel: 3, pins });
      let best = Number.POSITIVE_INFINITY;
      everyDivision(9, { groups: 3, size: 3 }, (groups) => {
        const of = (i: number) => groups.findIndex((g) => g.includes(i));
        if (of(0) === of(1) && of(5) !== of(0)) best = Math.min(best, stagesGap(lot, groups));
      });
      expect(made.gap).toBeCloseTo(best, 12);
      expect(made.lowerBound).toBeCloseTo(best, 12);
      expect(made.groups[2]).toEqual(expect.arrayContaining([0, 1]));
      expect(made.groups[0]).toContain(5);
    }
  });

  test.each(["mix", "apart"] as const)("lots %s: the optimum of full enumeration under it, 30 lots", (lots) => {
    const marks = ["A", "B", "A", "B", "A", "B", "A", "A", "A"];
    for (let seed = 1; seed <= 30; seed++) {
      const lot = wholes(9, seed);
      const made = solve(lot, { series: 3, parallel: 3, lots }, marks);
      let best = Number.POSITIVE_INFINITY;
      everyDivision(9, { groups: 3, size: 3 }, (groups) => {
        const inA = groups.map((g) => g.filter((i) => marks[i] === "A").length);
        const fine = lots === "mix" ? inA.every((n) => n === 2) : inA.every((n) => n === 0 || n === 3);
        if (fine) best = Math.min(best, stagesGap(lot, groups));
      });
      expect(made.gap).toBeCloseTo(best, 12);
    }
  });

  test("short of effort it still answers, and never claims a bound above the optimum", () => {
    for (let seed = 1; seed <= 20; seed++) {
      const lot = wholes(10, seed, 900, 1100);
      const made = solve(lot, { series: 5, parallel: 2 }, undefined, 50);
      const best = bestGap(lot, { groups: 5, size: 2 }, stagesGap);
      expect(made.gap).toBeGreaterThanOrEqual(best - 1e-12);
      expect(made.lowerBound).toBeLessThanOrEqual(best + 1e-12);
    }
  });
});
