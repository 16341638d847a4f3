import { describe, expect, test } from "vitest";
import { dangerFigures } from "../../../src/sheet/sections/figuresDanger.ts";
import { BARE, sheetInput } from "../../support/sheet.ts";

const of = (wishes: Parameters<typeof sheetInput>[0] = {}) => dangerFigures(sheetInput(wishes));

describe("dangerFigures(input)", () => {
  test("energy at the highest voltage with its class; run on, only where the charger's highest is known", () => {
    expect(of()[0]).toEqual([
      "1",
      "stored energy at the highest voltage",
      "600 J",
      "hazardous from 250 mJ, NFPA 70E Article 360 (2021, 2024)",
    ]);
    expect(of({ brief: { charger: { current: "1 mA", highest: "2.2 kV" } } })[1]?.slice(2)).toEqual([
      "726 J",
      "2.2 kV",
    ]);
    expect(of({ unit: BARE })[0]?.slice(2)).toEqual([null, null]);
  });

  test("times by each way against what the rule gives", () => {
    const times = of({ rule: "iec-60204-residual", brief: { dumpResistance: "1 kohm" } }).filter(
      ([number]) => number === "2",
    );
    expect(times.map((row) => row[3])).toEqual([
      "5 s allowed by the rule for 60 V",
      "5 s allowed by the rule for 60 V",
      "5 s allowed by the rule for 60 V",
      "60 V",
    ]);
    expect(times[1]?.[2]).toBe("never");
    expect(times[2]?.[2]).toMatch(/^1\.052 s, then measure each unit/);
  });

  test("the ways to empty it are counted, and their proof is a blank", () => {
    expect(
      of({ brief: { dumpResistance: "1 kohm" } })
        .slice(-2)
        .map((row) => row[2]),
    ).toEqual(["2", null]);
  });
});
