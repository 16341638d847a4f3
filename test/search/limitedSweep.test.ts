import { describe, expect, test } from "vitest";
import { requiredCapacitance } from "../../src/bank/index.ts";
import { assess } from "../../src/search/assess.ts";
import { limitJudge } from "../../src/search/limits.ts";
import { idOf, tiesOf } from "../../src/search/rank.ts";
import { sweep } from "../../src/search/sweep.ts";
import { FAMILIES } from "../support/bank.ts";
import { FILM, shotBrief } from "../support/shotBank.ts";

/** Four invented parts that differ in what binds. */
const PARTS = [
  FILM,
  { ...FILM, part: "small", capacitance: 2e-5, voltage: 1200, peakCurrent: 300, price: 250 },
  { ...FILM, part: "blind", peakCurrent: undefined, price: 500 } as unknown as typeof FILM,
  { ...FILM, part: "few", capacitance: 3e-5, available: 9, price: 300 },
];

function rows(more: Record<string, unknown>) {
  const brief = shotBrief({ maxSeries: 6, maxUnits: 60, ...more });
  const input = { parts: PARTS, families: FAMILIES, brief, required: requiredCapacitance(brief), currency: "EUR" };
  const found = sweep(input);
  const ids = Array.from({ length: found.table.count }, (_, row) => idOf(found.table, PARTS, row));
  return { brief, input, found, ids };
}

describe("the sweep under limits", () => {
  test("limits that bind nowhere change nothing: same layouts, same figures, same refusals", () => {
    const plain = rows({});
    const loose = rows({ maxPeakCurrent: "1 GA", maxFaultEnergy: "1 GJ" });
    expect(loose.ids.toSorted()).toEqual(plain.ids.toSorted());
    expect([...loose.found.table.cost].toSorted()).toEqual([...plain.found.table.cost].toSorted());
    expect(loose.found.refused).toEqual(plain.found.refused);
  });

  test("plainly: for each shape the least parallel count that keeps the limits, and none is left out", () => {
    const { brief, ids } = rows({ maxPeakCurrent: "400 A", maxFaultEnergy: "2 kJ" });
    const judge = limitJudge(brief);
    const unlimited = rows({});
    const least = new Map<string, number>();
    for (let row = 0; row < unlimited.found.table.count; row++) {
      const { part, series, parallel } = unlimited.found.table;
      const key = `${part[row]} ${series[row]}`;
      least.set(key, Math.min(least.get(key) ?? Number.POSITIVE_INFINITY, parallel[row] as number));
    }
    const slow: string[] = [];
    for (const [key, first] of least) {
      const [part = 0, series = 0] = key.split(" ").map(Number);
      const unit = PARTS[part] as (typeof PARTS)[number];
      for (const ties of ["cross-tied", "strings"] as const) {
        for (let parallel = first; parallel * series <= 60; parallel++) {
          if (unit.available !== undefined && parallel * series > unit.available) break;
          if (ties === "cross-tied" && (series === 1 || parallel === 1)) continue;
          const worst = worstOf(unit, { series, parallel, ties }, brief);
          if (worst === null) break;
          if (judge?.({ unit, series, parallel, ties, worst }) !== null) continue;
          slow.push(`${unit.part} ${series}s${parallel}p ${ties}`);
          break;
        }
      }
    }
    expect(ids.toSorted()).toEqual(slow.toSorted());
    expect(ids.length).toBeGreaterThan(4);
  });

  test("more in parallel is tried until the unit's current fits", () => {
    const loose = rows({});
    const { found } = rows({ maxPeakCurrent: "200 A" });
    const single = (table: typeof found.table): number => {
      for (let row = 0; row < table.count; row++)
        if (table.part[row] === 0 && table.series[row] === 1 && tiesOf(table, row) === "strings")
          return table.parallel[row] as number;
      return 0;
    };
    expect(single(loose.found.table)).toBe(1);
    expect(single(found.table)).toBeGreaterThan(5);
  });

  test("a part whose rating is unknown is refused as unknown", () => {
    const { found } = rows({ maxPeakCurrent: "80 %" });
    expect(found.refused.find(({ part }) => part === "blind")).toMatchObject({ reason: "peak-current-unknown" });
  });
});

/** Highest voltage of a unit at rest, from the assessed layout, which has its own way to it; null when it does not hold safely. */
function worstOf(
  unit: (typeof PARTS)[number],
  shape: { readonly series: number; readonly parallel: number; readonly ties: "cross-tied" | "strings" },
  brief: ReturnType<typeof shotBrief>,
): number | null {
  const layout = assess({ unit, layout: { part: unit.part, ...shape }, brief, families: FAMILIES, currency: "EUR" });
  const { charging, holding, even, limit } = layout.share;
  if (shape.series === 1) return even;
  if (charging === null || holding === null || holding > limit * (1 + 1e-9)) return null;
  return Math.max(charging, holding);
}
