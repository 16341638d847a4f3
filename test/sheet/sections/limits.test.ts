import { describe, expect, test } from "vitest";
import { limitRows, limitsSection } from "../../../src/sheet/sections/limits.ts";
import { LOAD, sheetInput, wordsIn } from "../../support/sheet.ts";

const of = (wishes: Parameters<typeof sheetInput>[0]) =>
  new Map(limitRows(sheetInput(wishes)).map(([name, value]) => [name, value]));

describe("limitRows(input)", () => {
  test("the highest voltages, the hold as asked, the waits of each way alone", () => {
    const found = of({ brief: { hold: "30 s", dumpResistance: "1 kohm" } });
    expect(found.get("highest charge voltage, with overshoot")).toBe("2 kV");
    expect(found.get("highest voltage of any unit")).toBe("360 V");
    expect(found.get("longest hold")).toBe("30 s");
    expect(found.get("wait before approach, dump alone")).toMatch(/^1\.052 s, then measure each unit/);
    expect(found.get("wait before approach, bleed chains alone")).toMatch(/ (s|min|h)$/);
  });

  test("shots an hour round down; what no load or charger tells is a blank", () => {
    const charged = sheetInput({ brief: { ...LOAD, charger: { current: "50 mA" } } });
    const hourly = Number.parseFloat(
      of({ brief: { ...LOAD, charger: { current: "50 mA" } } }).get("fastest rate by the charger") ?? "",
    );
    expect(hourly).toBe(Math.floor(charged.shot!.highestRate! * 3600));
    expect(of({}).get("fastest rate by the charger")).toBeNull();
    expect(of({}).get("peak current, predicted")).toBeNull();
    expect(of({ brief: { rate: "0.01 Hz", ambient: "25 degC" } }).get("rate asked")).toBe("36 an hour");
  });

  test("reversal is the high end of its spread and says so; no rule makes a wait of nought", () => {
    const input = sheetInput({ brief: LOAD });
    const [name, value] = limitRows(input).find(([label]) => label.startsWith("reversal"))!;
    expect(name).toMatch(/high end of the spread/);
    expect(Number.parseFloat(value ?? "")).toBeGreaterThanOrEqual(input.shot!.envelope.reversal.high! * 100 - 1e-9);
    const lax = of({ rule: "lbnl-thermal", brief: { dumpResistance: "1 kohm" } });
    for (const way of ["dump alone", "bleed chains alone"])
      expect(lax.get(`wait before approach, ${way}`)).not.toMatch(/^0 s/);
  });

  test("limitsSection(input) says that a blank is not no limit", () => {
    expect(wordsIn(limitsSection(sheetInput()))).toMatch(/A blank limit is not no limit/);
  });
});
