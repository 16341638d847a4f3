import { describe, expect, test } from "vitest";
import { improveText } from "../../src/cli/improveText.ts";
import { type Improve, improve } from "../../src/search/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";

const input = { result: bankOf(), unit: UNIT, brief: briefOf(), families: FAMILIES, currency: "EUR" };

describe("improveText(improve, currency, width)", () => {
  test("every cause with its volts and what was tried; derating is information, no advice", () => {
    const text = improveText(improve(input) as Improve, "EUR", 80);
    for (const cause of ["capacitance tolerance", "leakage", "resistor tolerance", "overshoot", "derating"])
      expect(text).toContain(cause);
    expect(text).toMatch(/capacitance tolerance +[\d.]+ V +[\d.]+ % +to 10 %/);
    expect(text.replace(/\s+/g, " ")).toMatch(/its row is information, no advice/);
    expect(text).not.toMatch(/NaN|null|undefined/);
    expect(Math.max(...text.split("\n").map((line) => line.length))).toBeLessThanOrEqual(80);
  });

  test("unknown leakage is unknown, and so is what is free", () => {
    const { leakage: _l, ...dark } = UNIT;
    const text = improveText(improve({ ...input, unit: dark, result: bankOf({ unit: dark }) }) as Improve, "EUR", 80);
    expect(text).toMatch(/leakage +unknown/);
    expect(text.replace(/\s+/g, " ")).toMatch(/what is free is unknown/);
  });
});
