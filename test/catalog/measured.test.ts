// Measured lots: the fixtures, and the flaws that a lot may have.
import { readFileSync } from "node:fs";
import { resolve } from "node:path";
import { describe, expect, test } from "vitest";
import { readMeasured } from "../../src/catalog/measured.ts";

const lot = (file: string) => {
  const made = readMeasured(readFileSync(resolve(import.meta.dirname, "../../fixtures/units", file), "utf8"), file);
  if (!made.ok) throw new Error(JSON.stringify(made.refusals));
  return made.value;
};

describe("readMeasured(text, file)", () => {
  test("no serial column, no capacitance column: refused by name", () => {
    const made = readMeasured("serial\na\n", "m.csv");
    expect(!made.ok && made.refusals.map((r) => `${r.code} ${r.place.field}`)).toEqual(["missing-heading capacitance"]);
  });
  test("lot-200.csv: 200 units, no fault, about 330 uF each", () => {
    const { units, faults } = lot("lot-200.csv");
    expect([units.length, faults]).toEqual([200, []]);
    for (const u of units) expect(Math.abs(u.capacitance / 330e-6 - 1)).toBeLessThan(0.21);
  });
  test("lot-40-capacitance-only.csv: leakage unknown, not zero", () =>
    expect(lot("lot-40-capacitance-only.csv").units.every((u) => u.leakage === undefined)).toBe(true));
  test("lot-gap.csv: the unit without a reading is lost and told, with its line", () => {
    const { units, faults } = lot("lot-gap.csv");
    expect(units.length).toBe(199);
    expect(faults.map((f) => `${f.code} ${f.place.line} ${f.place.field}`)).toEqual(["missing-value 75 capacitance"]);
  });
  test("lot-duplicate.csv: the second of a serial is lost and told, with the line of the first", () => {
    const { units, faults } = lot("lot-duplicate.csv");
    expect(units.length).toBe(199);
    expect(faults.map((f) => `${f.code} ${f.place.line}`)).toEqual(["duplicate-serial 156"]);
    expect(faults[0]?.want).toContain("line 55");
  });
  test("an uncertainty of 0.3 % is 0.003; of 60 % refused", () => {
    const made = readMeasured("serial,capacitance [uF],uncertainty [%]\na,330,0.3\nb,330,60\n", "m.csv");
    expect(made.ok && made.value.units.map((u) => u.uncertainty)).toEqual([0.003]);
    expect(made.ok && made.value.faults.map((f) => f.code)).toEqual(["out-of-range"]);
  });
});
