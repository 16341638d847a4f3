import { describe, expect, test } from "vitest";
import { place } from "../../src/place/place.ts";
import { replacements } from "../../src/place/replacements.ts";
import { stagesGap } from "./brute.ts";
import { units } from "./lots.ts";

describe("replacements(units, request, placing)", () => {
  const lot = units("uniform", 15, 4);
  const request = { series: 3, parallel: 4, ties: "cross-tied" } as const;
  const placed = place(lot, request);
  if (!placed.ok) throw new Error("refused");
  const table = replacements(lot, request, placed.value);

  test("every fitted unit with every spare, best first, gaps as charge division gives them", () => {
    expect(table.size).toBe(12);
    const values = lot.map((unit) => unit.capacitance);
    const index = (serial: string) => lot.findIndex((unit) => unit.serial === serial);
    for (const [serial, rows] of table) {
      expect(rows.map((row) => row.spare).sort()).toEqual([...placed.value.spares].sort());
      for (const [k, row] of rows.entries()) {
        const groups = placed.value.groups.map((g) => g.map((s) => index(s === serial ? row.spare : s)));
        expect(row.charging).toBeCloseTo(stagesGap(values, groups), 12);
        expect(row.change).toBeCloseTo(row.charging - placed.value.charging.gap, 12);
        if (k > 0) expect(row.charging).toBeGreaterThanOrEqual(rows[k - 1]!.charging);
      }
    }
  });
  test("a spare of another size group is named but not allowed", () => {
    const sized = lot.map((unit) => ({ ...unit, group: placed.value.spares[0] === unit.serial ? "tall" : "short" }));
    const rows = replacements(sized, request, placed.value).get(placed.value.groups[0]![0]!)!;
    expect(rows.at(-1)).toMatchObject({ spare: placed.value.spares[0], allowed: false });
    expect(rows[0]!.allowed).toBe(true);
  });
});
