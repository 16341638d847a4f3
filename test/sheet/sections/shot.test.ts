import { describe, expect, test } from "vitest";
import { shotSection } from "../../../src/sheet/sections/shot.ts";
import { BARE, LOAD, sheetInput, tableOf, wordsIn } from "../../support/sheet.ts";

describe("shotSection(input)", () => {
  test("low, nominal and high of each figure, and where all of the energy goes", () => {
    const input = sheetInput({ brief: LOAD });
    const section = shotSection(input);
    const figures = tableOf({ sections: [section] }, "shot-figures").rows;
    expect(figures.map((row) => row[0])).toEqual(["peak current", "time of the peak", "reversal", "action integral"]);
    const { energy } = input.shot!.discharge;
    expect(tableOf({ sections: [section] }, "shot-energy").rows[0]).toEqual(["stored", "500 J"]);
    expect(energy.load + (energy.bank ?? 0) + energy.left).toBeCloseTo(energy.stored, 6);
    expect(section.blocks.some((block) => block.kind === "drawing")).toBe(true);
  });

  test("no load: why there is no shot, and all that it blocks; no table that looks like one", () => {
    const section = shotSection(sheetInput());
    expect(section.blocks).toHaveLength(1);
    expect(wordsIn(section)).toMatch(/no load is in the brief\. It blocks peak current, reversal/);
  });

  test("a figure that is only a bound says so", () => {
    expect(wordsIn(shotSection(sheetInput({ unit: { ...BARE, esr: 0.05 }, brief: LOAD })))).toMatch(
      /is (an upper|a lower) bound/,
    );
  });
});
