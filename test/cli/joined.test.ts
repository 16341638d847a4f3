import { expect, test } from "vitest";
import { joinedFacts } from "../../src/cli/joined.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

test("joinedFacts(bank): the fault table, each with the keys that a check promises", () => {
  const { faults } = joinedFacts({ layout: bankOf(), unit: UNIT, brief: briefOf() });
  expect(faults.map(({ id }) => id)).toEqual(expect.arrayContaining(["unit-short", "unit-open"]));
  for (const fault of faults) {
    expect(fault).toHaveProperty("worstVoltage");
    expect(fault).toHaveProperty("energyIntoUnit");
    expect(fault).toHaveProperty("peakCurrent");
    expect(["pass", "warn", "fail", "not assessed"]).toContain(fault.verdict);
  }
});

test("joinedFacts(bank): one shorted cross-tied with the charger on leaves V/(n - 1) on each of the rest", () => {
  const { faults } = joinedFacts({ layout: bankOf(), unit: UNIT, brief: briefOf() });
  expect(faults.find(({ id }) => id === "unit-short")?.worstVoltage).toBeCloseTo(2000 / 7, 6);
});
