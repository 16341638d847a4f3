import { describe, expect, test } from "vitest";
import { effort } from "../../src/place/effort.ts";
import { exactHalves, fitsHalves } from "../../src/place/exactHalves.ts";
import { bestGap, stagesGap } from "./brute.ts";
import { wholes } from "./lots.ts";

describe("exactHalves(values, work)", () => {
  test("equals full enumeration for 2 to 12 units, 120 lots", () => {
    for (let seed = 1; seed <= 120; seed++) {
      const size = 1 + (seed % 6);
      const values = wholes(2 * size, seed, 1000, 9999);
      const groups = exactHalves(Float64Array.from(values), effort(1e9));
      expect(groups.map((g) => g.length)).toEqual([size, size]);
      expect(stagesGap(values, groups)).toBeCloseTo(bestGap(values, { groups: 2, size }, stagesGap), 12);
    }
  });
  test("only two stages without spares fit, up to 32 units", () => {
    expect([fitsHalves(24, 2, 12), fitsHalves(25, 2, 12), fitsHalves(24, 3, 8), fitsHalves(34, 2, 17)]).toEqual([
      true,
      false,
      false,
      false,
    ]);
  });
});
