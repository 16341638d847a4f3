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

  test.each([{ rule: "lbnl-thermal" }, { rule: "iec-61010-energy" }, { brief: { touchSafe: "5 kV" } }] as const)(
    "no wait of 0 s at a charged bank, with %o",
    (wishes) => {
      const found = rows({
        ...wishes,
        brief: { dumpResistance: "1 kohm", hold: "30 s", ...("brief" in wishes ? wishes.brief : {}) },
      });
      const waits = [...found].filter(([name]) => name?.startsWith("wait for") || name?.startsWith("by the dump"));
      expect(waits).toHaveLength(2);
      expect(waits[0]?.[0]).toMatch(/^wait for 60 V \(touch-safe by default; /);
      for (const [, value] of waits) expect(value).not.toMatch(/^0 s/);
      expect(waits[1]?.[1]).toMatch(/^1\.052 s, then measure each unit and short it: units may keep 103 V/);
    },
  );

  test("a rule out of its scope is said on the door", () => {
    expect(wordsIn(doorSection(sheetInput({ rule: "nec-460-6" })))).toMatch(/out of its scope/);
    expect(wordsIn(doorSection(sheetInput({ rule: "nec-460-28" })))).not.toMatch(/out of its scope/);
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
