import { describe, expect, test } from "vitest";
import { parseQuantity } from "../../../src/quantity/index.ts";
import { placedSection, sparesShown } from "../../../src/sheet/sections/placed.ts";
import { placedIn, sheetInput, tableOf, wordsIn } from "../../support/sheet.ts";

describe("placedSection(input)", () => {
  test("measured: every unit in its place with its serial and seven figures of its capacitance, the spares apart", () => {
    const bare = sheetInput();
    const placed = placedIn(bare);
    const section = placedSection({ ...bare, placed });
    const { rows } = tableOf({ sections: [section] }, "places");
    expect(rows).toHaveLength(16);
    expect(rows[2]?.slice(0, 2)).toEqual(["C2.1", placed.groups[1]?.[0]]);
    for (const [i, row] of rows.entries()) {
      const read = parseQuantity(row[2] as string, "capacitance");
      expect(read.ok && read.value / placed.positions[i]!.capacitance).toBeCloseTo(1, 6);
    }
    expect(tableOf({ sections: [section] }, "spares").rows.map((row) => row[0])).toEqual(["spare", "spare"]);
  });

  test("more spares than the sheet lists are counted, and none asked for is left out", () => {
    const bare = sheetInput();
    const placed = placedIn(bare);
    const spare = placed.positions.at(-1)!;
    const many = { ...placed, positions: [...placed.positions, ...Array.from({ length: 30 }, () => spare)] };
    const section = placedSection({ ...bare, placed: many });
    expect(tableOf({ sections: [section] }, "spares").rows).toHaveLength(12);
    expect(wordsIn(section)).toMatch(/20 more measured units are in none of these places/);
    expect(sparesShown(sheetInput({ brief: { spares: 15 } }))).toBe(15);
  });

  test("not measured: a line to fill in for every unit, and what that blocks", () => {
    const section = placedSection(sheetInput());
    const { rows } = tableOf({ sections: [section] }, "places");
    expect(rows.every((row) => row[0] !== null && row.slice(1).every((cell) => cell === null))).toBe(true);
    expect(wordsIn(section)).toMatch(/no unit can be traced/);
  });
});
