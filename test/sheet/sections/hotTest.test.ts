import { describe, expect, test } from "vitest";
import { METER, predictedShares } from "../../../src/sheet/predict.ts";
import { hotTestSection } from "../../../src/sheet/sections/hotTest.ts";
import { BARE, placedIn, sheetInput, tableOf, wordsIn } from "../../support/sheet.ts";

const bands = (input: ReturnType<typeof sheetInput>) => tableOf({ sections: [hotTestSection(input)] }, "hot-test").rows;

describe("hotTestSection(input)", () => {
  test("10, 25, 50, 75, 100 % of V: a band and a blank for every stage, the band never narrower than predicted", () => {
    const bare = sheetInput();
    const input = { ...bare, placed: placedIn(bare) };
    const predicted = predictedShares(input);
    for (const [i, row] of bands(input).entries()) {
      expect(row[0]).toBe(`stage ${i + 1}`);
      for (const [k, step] of [0.1, 0.25, 0.5, 0.75, 1].entries()) {
        const [low, high] = row[1 + 2 * k]!.split(" to ").map(Number) as [number, number];
        const volts = 2000 * step;
        expect(low).toBeLessThanOrEqual(predicted[i]!.low! * volts - METER.absolute + 1e-9);
        expect(high).toBeGreaterThanOrEqual(predicted[i]!.high! * volts + METER.absolute - 1e-9);
        expect(low).toBeGreaterThan(predicted[i]!.low! * volts - METER.absolute - 0.1001);
        expect(predicted[i]!.share * volts > low && predicted[i]!.share * volts < high).toBe(true);
        expect(row[2 + 2 * k]).toBeNull();
      }
    }
  });

  test("not measured: the whole tolerance, 173.9 V to 352.9 V... of 2 kV over eight stages at +-20 %", () => {
    // methods 1.2: 2000 (0.8)/(8 + 6 * 0.2) and 2000 (1.2)/(8 - 6 * 0.2), with half a per cent and 0.1 V of a meter.
    const [low, high] = bands(sheetInput())[0]![9]!.split(" to ").map(Number) as [number, number];
    expect(low).toBeCloseTo(((2000 * 0.8) / 9.2) * 0.995 - 0.1, 0);
    expect(high).toBeCloseTo(((2000 * 1.2) / 6.8) * 1.005 + 0.1, 0);
  });

  test("the holding prediction is that of the measured units; without their leakage the worst case, and that is said", () => {
    const bare = sheetInput();
    const placed = placedIn(bare);
    expect(wordsIn(hotTestSection({ ...bare, placed }))).toMatch(
      /measured units in their places, is predicted at 260 V/,
    );
    const open = wordsIn(hotTestSection({ ...bare, placed: { ...placed, holding: null } }));
    expect(open).toMatch(/by the whole tolerance: leakage was not measured on every unit/);
    expect(open).not.toMatch(/260 V/);
  });

  test("strings are read unit by unit", () => {
    expect(bands(sheetInput({ shape: { ties: "strings" } })).map((row) => row[0])).toContain("C2.8");
  });

  test("no tolerance: no band to accept by, so the cells are blanks", () => {
    expect(bands(sheetInput({ unit: BARE })).every((row) => row.slice(1).every((cell) => cell === null))).toBe(true);
  });

  test("the steps name the bank's voltage; the unit's limit and a finite hold are said", () => {
    const section = hotTestSection(sheetInput({ brief: { hold: "30 s" } }));
    expect(tableOf({ sections: [section] }, "hot-steps").rows.map((row) => row.slice(0, 3))).toEqual([
      ["10 %", "200 V", "25 V"],
      ["25 %", "500 V", "62.5 V"],
      ["50 %", "1 kV", "125 V"],
      ["75 %", "1.5 kV", "187.5 V"],
      ["100 %", "2 kV", "250 V"],
    ]);
    expect(wordsIn(section)).toMatch(/No unit may pass 360 V/);
    expect(wordsIn(section)).toMatch(/Hold at 100 %: 30 s/);
  });
});
