import { describe, expect, test } from "vitest";
import { finish } from "../../src/place/charging.ts";
import { constrainedStart } from "../../src/place/constrainedStart.ts";
import { constraintsOf } from "../../src/place/constraints.ts";
import { effort } from "../../src/place/effort.ts";
import { seeded } from "../../src/place/random.ts";
import type { PlaceRequest } from "../../src/place/request.ts";
import { solveStrings } from "../../src/place/solveStrings.ts";
import { bestGap, stringsGap } from "./brute.ts";
import { wholes } from "./lots.ts";

const solve = (lot: readonly number[], request: Omit<PlaceRequest, "ties">, moves = 3e6) => {
  const measured = lot.map((capacitance, i) => ({ serial: String(i), capacitance }));
  const rule = constraintsOf(measured, { ...request, ties: "strings" });
  const values = Float64Array.from(lot);
  const start = rule.any
    ? constrainedStart(
        rule,
        lot.map((_, i) => i),
        values,
      )
    : { ok: true as const, groups: [] };
  if (!start.ok) throw new Error(start.why);
  return finish(solveStrings({ values, rule, start: start.groups, stopAt: 0, prove: true }, seeded(1), effort(moves)));
};

describe("solveStrings(task, random, work)", () => {
  test("the optimum of full enumeration, proven, 60 lots with and without spares", () => {
    for (let seed = 1; seed <= 60; seed++) {
      const lot = wholes(9 + (seed % 2), seed);
      const made = solve(lot, { series: 3, parallel: 3 });
      expect(made.gap).toBeCloseTo(bestGap(lot, { groups: 3, size: 3 }, stringsGap), 11);
      expect(made.gap - made.lowerBound).toBeLessThan(1e-12);
    }
  });
  test("units all alike share evenly; one in series has gap 0", () => {
    expect(solve([5, 5, 5, 5, 5, 5], { series: 3, parallel: 2 }).gap).toBeCloseTo(0, 14);
    expect(solve([5, 6, 7], { series: 1, parallel: 3 }).gap).toBe(0);
  });
  test("a pinned unit stays in its string", () => {
    const made = solve(wholes(12, 3), { series: 3, parallel: 4, pins: [{ serial: "7", group: 3 }] });
    expect(made.groups[3]).toContain(7);
    expect(made.lowerBound).toBeLessThanOrEqual(made.gap);
  });
});
