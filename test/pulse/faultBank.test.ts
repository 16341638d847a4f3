// faultBank: the worst before a fault, and the corner of the tolerance.
import { describe, expect, test } from "vitest";
import { cornerShare, shortCaseOf, worstBefore } from "../../src/pulse/faultBank.ts";
import { tied } from "./faultBanks.ts";
import { near } from "./near.ts";

test("worstBefore(bank) is the higher of charging and holding; an unknown holding does not count as zero volts above", () => {
  expect(worstBefore(tied)).toBe(400);
  expect(worstBefore({ ...tied, worstHolding: 440 })).toBe(440);
  expect(shortCaseOf({ ...tied, worstHolding: 440 }).worst).toBe(440);
});

describe("cornerShare(bank, counts)", () => {
  test("without tolerance it is the even share", () => {
    expect(cornerShare(tied, { units: 1, others: 1, stages: 2 })).toBeCloseTo(1600 / 3, 10);
  });

  test("worked: four stages of +-20 % put a third of the voltage on one, 533.333 V", () => {
    const wide = { ...tied, unit: { ...tied.unit, toleranceLow: 0.2, toleranceHigh: 0.2 } };
    near(cornerShare(wide, { units: 1, others: 1, stages: 3 }), 533.333333);
  });
});
