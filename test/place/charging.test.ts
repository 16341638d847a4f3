import { describe, expect, test } from "vitest";
import { finish, solveCharging } from "../../src/place/charging.ts";
import { constraintsOf } from "../../src/place/constraints.ts";
import { effort } from "../../src/place/effort.ts";
import { toLattice } from "../../src/place/lattice.ts";
import { seeded } from "../../src/place/random.ts";
import { units } from "./lots.ts";

describe("solveCharging(task) and finish(steps)", () => {
  test("the same lot is per cents apart as strings and parts per million as stages", () => {
    const lot = units("uniform", 24, 2);
    const { values } = toLattice(lot.map((unit) => unit.capacitance));
    const gap = (ties: "cross-tied" | "strings") =>
      finish(
        solveCharging(
          {
            ties,
            values,
            rule: constraintsOf(lot, { series: 4, parallel: 4, ties }),
            order: lot.map((_, i) => i),
            start: [],
            stopAt: 0,
            prove: true,
          },
          seeded(1),
          effort(3e6),
        ),
      ).gap;
    expect(gap("cross-tied")).toBeLessThan(1e-5);
    expect(gap("strings")).toBeGreaterThan(1e-3);
  });
});
