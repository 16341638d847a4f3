import { describe, expect, test } from "vitest";
import { doorSection } from "../../../src/sheet/sections/door.ts";
import { BARE, sheetInput, tableOf, wordsIn } from "../../support/sheet.ts";

const rows = (wishes: Parameters<typeof sheetInput>[0]) =>
  new Map(tableOf({ sections: [doorSection(sheetInput(wishes))] }, "door").rows.map((row) => [row[0], row[1]]));

describe("doorSection(input)", () => {
  test("a page of its own with the volts, the joules, the waits and the stick points", () => {
    expect(doorSection(sheetInput()).ownPage).toBe(true);
    const found = rows({});
    expect([found.get("highest voltage"), found.get("most stored energy")]).toEqual(["2 kV", "600 J"]);
    expect(found.get("stick points, touched in turn")).toBe("9: bars TP0 to TP8");
    expect(found.get("with one bleeder open")).toBe("never");
    // 2 strings of 8: 14 nodes inside, 2 ends.
    expect(rows({ shape: { ties: "strings" } }).get("stick points, touched in turn")).toBe(
      "16: bars TP0 to TP8 and the 14 nodes inside the strings",
    );
  });

  test("people and places are lines to fill in", () => {
    const found = rows({});
    for (const name of ["responsible person", "second person", "emergency call", "where the stick hangs"])
      expect(found.get(name)).toBeNull();
  });

  test("no chain never empties by itself; energy that is not known is said to be so", () => {
    const single = { shape: { series: 1, ties: "strings" }, brief: { voltage: "300 V", energy: "10 J" } } as const;
    expect([...rows(single).values()]).toContain("no chain: NEVER by itself");
    expect(wordsIn(doorSection(sheetInput({ unit: BARE })))).toMatch(/most stored energy is not known/);
  });
});
