import { describe, expect, test } from "vitest";
import { finish } from "../../src/place/charging.ts";
import { effort } from "../../src/place/effort.ts";
import { exactFront } from "../../src/place/frontExact.ts";
import { everyDivision, stagesGap, stringsGap } from "./brute.ts";
import { wholes } from "./lots.ts";

describe("exactFront(task, work)", () => {
  test.each(["cross-tied", "strings"] as const)("%s: the undominated points of full enumeration, 12 lots", (ties) => {
    for (let seed = 1; seed <= 12; seed++) {
      const values = wholes(8, seed);
      const leaks = wholes(8, seed + 50, 10, 99);
      const points: [number, number][] = [];
      everyDivision(8, { groups: 2, size: 4 }, (groups) => {
        const gap = ties === "cross-tied" ? stagesGap : stringsGap;
        points.push([gap(values, groups), gap(leaks, groups)]);
      });
      const best = points.filter(
        ([c, h]) =>
          !points.some(([c2, h2]) => (c2 < c - 1e-12 && h2 <= h + 1e-12) || (c2 <= c + 1e-12 && h2 < h - 1e-12)),
      );
      const conductances = { known: true, perUnit: Float64Array.from(leaks), perStage: 0 } as const;
      const task = { ties, series: ties === "cross-tied" ? 2 : 4, groups: 2, size: 4, conductances };
      const answer = finish(exactFront({ ...task, values: Float64Array.from(values) }, effort(1e9)));
      expect(answer.complete).toBe(true);
      for (const [c, h] of best) {
        const found = answer.points.some((p) => Math.abs(p.charging - c) < 1e-11 && Math.abs(p.holding - h) < 1e-11);
        expect(found).toBe(true);
      }
      for (const p of answer.points) {
        expect(points.some(([c, h]) => c < p.charging - 1e-11 && h < p.holding - 1e-11)).toBe(false);
      }
    }
  });
});
