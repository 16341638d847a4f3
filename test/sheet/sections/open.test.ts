import { describe, expect, test } from "vitest";
import { openPoints, openSection } from "../../../src/sheet/sections/open.ts";
import { BARE, LOAD, placedIn, RATED, sheetInput, tableOf, WORDS } from "../../support/sheet.ts";

const missing = (input: ReturnType<typeof sheetInput>) => openPoints(input).map(([name]) => name);

describe("openPoints(input)", () => {
  test("of a bare unit nothing is passed over, and each says what it blocks", () => {
    const names = missing(sheetInput({ unit: BARE }));
    expect(names).toEqual(
      expect.arrayContaining([
        "tolerance of the unit",
        "leakage or insulation of the unit",
        "polarity of the unit",
        "ESR of the unit",
        "ESL of the unit",
        "energy that a case contains",
        "load in the brief",
        "dump resistance",
        "bleed resistor",
        "serials and measured capacitances",
      ]),
    );
    expect(openPoints(sheetInput({ unit: BARE })).every(([, blocks]) => blocks !== "")).toBe(true);
  });

  test("what is known is not asked for", () => {
    const bare = sheetInput({
      unit: RATED,
      brief: {
        ...LOAD,
        dumpResistance: "1 kohm",
        charger: { current: "1 mA", highest: "2.2 kV" },
        bus: { resistance: "1 mohm", inductance: "10 nH" },
      },
      words: { ...WORDS, switch: "drop 2 V" },
    });
    const names = missing({ ...bare, placed: placedIn(bare) });
    expect(names).toEqual([
      "fuse of each unit or string",
      "torque and lugs of the terminals",
      "case potential of the units",
    ]);
    expect(missing(sheetInput({ brief: { charger: { current: "1 mA" } } }))).toContain(
      "highest voltage of the charger",
    );
    expect(missing(sheetInput({ earth: "unknown" }))).toContain("earthed end");
  });

  test("openSection(input) leaves room to settle each", () => {
    const { rows } = tableOf({ sections: [openSection(sheetInput())] }, "open");
    expect(rows.every((row) => row[2] === null && row[3] === null)).toBe(true);
  });
});
