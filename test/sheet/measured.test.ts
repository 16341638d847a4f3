import { describe, expect, test } from "vitest";
import { measuredOf } from "../../src/sheet/measured.ts";
import { placedIn, sheetInput } from "../support/sheet.ts";

describe("measuredOf(input)", () => {
  test.each(["cross-tied", "strings"] as const)("%s: groups and bank by hand of the units that stand there", (ties) => {
    const bare = sheetInput({ shape: { ties } });
    const placed = placedIn(bare);
    const found = measuredOf({ ...bare, placed })!;
    const of = (group: number) => placed.positions.filter((p) => p.group === group).map((p) => p.capacitance);
    const parts = Array.from({ length: ties === "cross-tied" ? 8 : 2 }, (_, g) => of(g + 1));
    const groups = parts.map((values) =>
      ties === "cross-tied" ? values[0]! + values[1]! : 1 / values.reduce((all, c) => all + 1 / c, 0),
    );
    const bank = ties === "cross-tied" ? 1 / groups.reduce((all, c) => all + 1 / c, 0) : groups[0]! + groups[1]!;
    expect(found.groups).toEqual(groups.map((c) => expect.closeTo(c, 12)));
    expect(found.bank / bank).toBeCloseTo(1, 12);
    expect(found.doubt).toBeCloseTo(0.004 + 2 * Math.hypot(0.003, 0.003), 12);
  });

  test("units that were not measured have none", () => {
    expect(measuredOf(sheetInput())).toBeNull();
  });
});
