import { describe, expect, test } from "vitest";
import { noRules } from "../../src/place/board.ts";
import { finish } from "../../src/place/charging.ts";
import { effort } from "../../src/place/effort.ts";
import { seeded } from "../../src/place/random.ts";
import { holdStrings } from "../../src/place/twoGoalsStrings.ts";
import { everyDivision, stringsGap } from "./brute.ts";
import { wholes } from "./lots.ts";

describe("holdStrings(slots, goals, random, work)", () => {
  test("the least holding gap of full enumeration within the charging limit, 20 lots of 3 strings of 3", () => {
    for (let seed = 1; seed <= 20; seed++) {
      const values = wholes(9, seed, 90, 110);
      const leaks = wholes(9, seed + 9, 10, 60);
      const start = [
        [0, 1, 2],
        [3, 4, 5],
        [6, 7, 8],
      ];
      const limit = stringsGap(values, start) + 1e-12;
      let best = Number.POSITIVE_INFINITY;
      everyDivision(9, { groups: 3, size: 3 }, (groups) => {
        if (stringsGap(values, groups) <= limit) best = Math.min(best, stringsGap(leaks, groups));
      });
      const slots = Int32Array.from(start.flat());
      const inverse = (list: readonly number[]) => Float64Array.from(list, (v) => 1 / v);
      const gaps = finish(
        holdStrings(
          slots,
          {
            series: 3,
            strings: 3,
            elastances: inverse(values),
            resistances: inverse(leaks),
            rules: noRules(9),
            limit,
            target: 0,
            spares: false,
            moves: 60_000,
          },
          seeded(seed),
          effort(1e9),
        ),
      );
      expect(gaps.holding).toBeCloseTo(best, 11);
      expect(gaps.charging).toBeLessThanOrEqual(limit);
    }
  });
});
