import { describe, expect, test } from "vitest";
import { board, noRules } from "../../src/place/board.ts";
import { finish } from "../../src/place/charging.ts";
import { effort } from "../../src/place/effort.ts";
import { firstPlacing } from "../../src/place/firstPlacings.ts";
import { toLattice } from "../../src/place/lattice.ts";
import { seeded } from "../../src/place/random.ts";
import { bothGaps, holdLevel, stageConductances } from "../../src/place/twoGoals.ts";
import { units } from "./lots.ts";

describe("holdLevel(board, goals, random, work)", () => {
  const lot = units("uniform", 60, 5, 0.5);
  const { values } = toLattice(lot.map((unit) => unit.capacitance));
  const conductances = Float64Array.from(lot, (unit) => unit.leakage!);
  const goals = { conductances, perStage: 0, target: 0, spares: false, moves: 400_000 };

  test("6 x 10, leakage spread 0.5: from over 10 % to under 1 % with charging within 500 ppm", () => {
    const at = board(values, firstPlacing(values, 6), noRules(60));
    expect(bothGaps(at, conductances, 0).holding).toBeGreaterThan(0.1);
    const gaps = finish(holdLevel(at, { ...goals, limit: 5e-4 }, seeded(1), effort(1e9)));
    expect(gaps.charging).toBeLessThanOrEqual(5e-4);
    expect(gaps.holding).toBeLessThan(0.01);
    expect(gaps).toEqual(bothGaps(at, conductances, 0));
  });
  test("a limit that nothing meets leaves the placing within it as it was, or nearer", () => {
    const at = board(values, firstPlacing(values, 6), noRules(60));
    const before = bothGaps(at, conductances, 0);
    const gaps = finish(holdLevel(at, { ...goals, limit: before.charging, moves: 20_000 }, seeded(1), effort(1e9)));
    expect(gaps.charging).toBeLessThanOrEqual(before.charging);
    expect(gaps.holding).toBeLessThanOrEqual(before.holding);
  });
  test("the resistor's conductance is added once a stage", () => {
    const at = board(values, firstPlacing(values, 6), noRules(60));
    const [bare, with5] = [stageConductances(at, conductances, 0), stageConductances(at, conductances, 5)];
    for (let j = 0; j < 6; j++) expect(with5[j]! - bare[j]!).toBeCloseTo(5, 12);
  });
});
