import { describe, expect, test } from "vitest";
import { faultSection } from "../../../src/sheet/sections/faults.ts";
import { BARE, LOAD, sheetInput, tableOf, wordsIn } from "../../support/sheet.ts";

describe("faultSection(input)", () => {
  test("the eight faults of the engine, each with what stops it; figures as they are there", () => {
    const input = sheetInput({ brief: LOAD });
    const { rows } = tableOf({ sections: [faultSection(input)] }, "faults");
    expect(rows.map((row) => row[0])).toEqual(input.faults.map(({ id }) => id.replaceAll("-", " ")));
    const short = rows[0]!;
    // methods 8: with the charger on the others stand at V/(n - 1) at least; one neighbour pours its own energy in.
    expect(Number.parseFloat(short[2]!)).toBeGreaterThanOrEqual(2000 / 7);
    expect(short[5]).not.toBe("");
  });

  test("a peak that is a bound says so; one that nothing known limits is a blank", () => {
    const bound = tableOf({ sections: [faultSection(sheetInput({ unit: { ...BARE, esr: 0.05 } }))] }, "faults").rows;
    expect(bound[0]?.[4]).toMatch(/\(upper bound\)$/);
    const bare = faultSection(sheetInput({ unit: BARE }));
    expect(tableOf({ sections: [bare] }, "faults").rows[0]?.[4]).toBeNull();
    expect(wordsIn(bare)).toMatch(/whether a shorted unit bursts is not assessed/);
    expect(wordsIn(bare)).toMatch(/No fuse catalogue was given/);
  });
});
