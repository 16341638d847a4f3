import { describe, expect, test } from "vitest";
import { factsOf } from "../../../src/sheet/facts.ts";
import { classTable } from "../../../src/sheet/sections/hazardClasses.ts";
import { BARE, sheetInput } from "../../support/sheet.ts";

const rows = (wishes: Parameters<typeof sheetInput>[0] = {}) =>
  new Map(classTable(factsOf(sheetInput(wishes))).rows.map((row) => [row[0], row]));

describe("classTable(facts)", () => {
  test("the charge held against every rule that speaks of this voltage, by hand: 300 uF at 2 kV are 600 mC", () => {
    const charges = classTable(factsOf(sheetInput())).rows.filter((row) => row[0] === "charge held");
    expect(charges.length).toBeGreaterThan(3);
    expect(charges.every((row) => row[1] === "600 mC" && row[3] === "over")).toBe(true);
  });

  test("a charger that runs on has a class of its own, arc blast beside the tier", () => {
    const ran = rows({ brief: { charger: { current: "1 mA", highest: "9 kV" } } }).get("stored energy, charger run on");
    // 300 uF at 9 kV.
    expect(ran?.slice(1)).toEqual(["12.15 kJ", "at 9 kV", "HAZARDOUS by stored energy, ARC BLAST"]);
    expect(rows().get("stored energy, charger run on")?.slice(1)).toEqual([
      null,
      "the charger's highest voltage is not known",
      null,
    ]);
  });

  test("no tolerance: not assessed, and no charge", () => {
    const bare = rows({ unit: BARE });
    expect(bare.get("stored energy, highest voltage")?.slice(1)).toEqual([
      null,
      "not assessed: the tolerance is unknown",
      "not assessed: the tolerance is unknown",
    ]);
    expect(bare.has("charge held")).toBe(false);
  });
});
