import { describe, expect, test } from "vitest";
import { dutyFigures } from "../../../src/sheet/sections/figuresDuty.ts";
import { bledInElement } from "../../../src/sheet/sections/resistors.ts";
import { BARE, FAMILIES_KNOWN, LOAD, RATED, sheetInput } from "../../support/sheet.ts";

const find = (name: RegExp, wishes: Parameters<typeof sheetInput>[0] = {}) =>
  dutyFigures(sheetInput(wishes)).find((row) => name.test(row[1]));

describe("dutyFigures(input)", () => {
  test("the action through a shorted unit: what its one neighbour can drive, E/R of its loop", () => {
    const input = sheetInput();
    const worst = Math.max(input.layout.share.charging ?? 0, input.layout.share.holding ?? 0);
    const action = (1.2 * RATED.capacitance * worst ** 2) / 2 / 0.05;
    const printed = Number.parseFloat(find(/action integral/)?.[2] ?? "");
    expect(printed / action).toBeCloseTo(1, 3);
    expect(find(/action integral/, { unit: BARE })?.slice(2)).toEqual([
      null,
      "needs the units' ESR, and neighbours that feed it",
    ]);
  });

  test("a balancing element's watts, volts and joules of what it is rated for", () => {
    const { layout } = sheetInput();
    const balance = layout.balance!;
    const percent = (name: RegExp, wishes = {}) => Number.parseFloat(find(name, wishes)?.[2] ?? "");
    expect(percent(/watts of rated/)).toBeCloseTo((balance.powerEach / 2) * 100, 1);
    expect(percent(/volts of rated/)).toBeCloseTo((balance.voltageEach / 500) * 100, 1);
    const joules = bledInElement(sheetInput(), balance.elements)!;
    expect(joules).toBeGreaterThan(600 / (balance.positions * balance.elements));
    // Printed to four figures, rounded up.
    const printed = percent(/joules of rated/, { families: FAMILIES_KNOWN });
    expect(printed).toBeGreaterThanOrEqual((joules / 8) * 100);
    expect(printed).toBeLessThan((joules / 8) * 100.1);
    expect(find(/joules of rated/)?.slice(2)).toEqual([null, "the pulse rating is not known"]);
  });

  test("spacing and shots used are read on the built bank: blanks that say where they come from", () => {
    expect(find(/spacing/)?.[2]).toBeNull();
    expect(find(/shots used/)?.slice(2)).toEqual([null, "10000 rated; from the shot log"]);
    expect(find(/peak current of a unit/, { brief: LOAD })?.[2]).toMatch(/A$/);
  });
});
