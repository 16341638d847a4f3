import { describe, expect, test } from "vitest";
import cases from "../../fixtures/placing/cases.json" with { type: "json" };
import { placingFront, undominated } from "../../src/place/front.ts";
import { units } from "./lots.ts";

const m1 = cases.cases.find((c) => c.id.startsWith("M1"))!;

describe("undominated(points)", () => {
  test("keeps charging rising and holding falling; a tie keeps one", () => {
    const p = (charging: number, holding: number) => ({ charging, holding });
    expect(undominated([p(2, 2), p(1, 3), p(3, 2), p(2, 4), p(4, 1)])).toEqual([p(1, 3), p(2, 2), p(4, 1)]);
  });
});

describe("placingFront(units, request)", () => {
  test("M1, 4 x 4 of 16: the proven least holding gap under each charging limit, and the proven balanced point", () => {
    const lot = m1.C.map((c, i) => ({ serial: String(i), capacitance: c * 1e-7, leakage: m1.leakage_uA[i]! * 1e-6 }));
    const read = placingFront(lot, { series: 4, parallel: 4, ties: "cross-tied" });
    if (!read.ok) throw new Error(read.refusals[0]!.code);
    const { points, balanced, exact } = read.value;
    expect(exact).toBe(true);
    for (const known of m1.two_objective!.min_static_given_dynamic) {
      const under = points.filter((p) => p.charging * 1e6 <= known.dynamic_limit_ppm);
      expect(under.at(-1)!.holding * 1e6).toBeCloseTo(known.static_gap_ppm, 4);
      expect(under.at(-1)!.charging * 1e6).toBeCloseTo(known.gap_ppm, 6);
    }
    const point = points[balanced]!;
    expect(Math.max(point.charging, point.holding) * 1e6).toBeCloseTo(m1.two_objective!.minimax.value_ppm, 4);
  });

  test("a larger lot: both gaps monotone along the front, the balanced point the least of the greater gaps", () => {
    const read = placingFront(units("uniform", 60, 2, 0.5), { series: 6, parallel: 10, ties: "cross-tied" });
    if (!read.ok) throw new Error(read.refusals[0]!.code);
    const { points, balanced, exact } = read.value;
    expect(exact).toBe(false);
    for (let i = 1; i < points.length; i++) {
      expect(points[i]!.charging).toBeGreaterThan(points[i - 1]!.charging);
      expect(points[i]!.holding).toBeLessThan(points[i - 1]!.holding);
    }
    const greater = points.map((p) => Math.max(p.charging, p.holding));
    expect(greater[balanced]).toBe(Math.min(...greater));
    expect(points[0]!.holding).toBeGreaterThan(5 * points.at(-1)!.holding);
  });

  test("leakage missing: refused, not guessed", () => {
    const read = placingFront(units("uniform", 6, 1), { series: 2, parallel: 3, ties: "cross-tied" });
    expect(read.ok ? "" : read.refusals[0]!.code).toBe("place.no-front");
  });
});
