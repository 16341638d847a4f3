import { describe, expect, test } from "vitest";
import { flagQuantity, readPlaceFlags } from "../../src/cli/placeFlags.ts";

describe("flagQuantity(text, flag, dimension)", () => {
  test("zero, negative, a whole and no number are refused; a fraction reads as per cent or plain", () => {
    for (const text of ["0", "-1 %", "100 %", "1", "few"])
      expect(flagQuantity(text, "--uncertainty", "fraction")).toMatchObject({
        code: "bad-value",
        place: { field: "--uncertainty" },
      });
    expect(flagQuantity("0.3 %", "--u", "fraction")).toBeCloseTo(0.003, 12);
    expect(flagQuantity("1.5 kV", "--v", "voltage")).toBe(1500);
  });
});

describe("readPlaceFlags(flags)", () => {
  test("the default goal is charging; every fault is told at once", () => {
    expect(readPlaceFlags({})).toEqual({ choices: { goal: "charging" }, faults: [] });
    const { faults } = readPlaceFlags({
      goal: "holding",
      seed: "-1",
      moves: "many",
      outliers: "drop",
      leakageAt: "5 A",
    });
    expect(faults.map((fault) => fault.place.field).sort()).toEqual([
      "--goal",
      "--leakage-at",
      "--moves",
      "--outliers",
      "--seed",
    ]);
    expect(readPlaceFlags({ moves: "2e8", seed: "7", lots: "apart" }).choices).toMatchObject({
      moves: 2e8,
      seed: 7,
      lots: "apart",
    });
  });
});
