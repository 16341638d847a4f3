import { describe, expect, test } from "vitest";
import { gapFinding, holdingUnknown, mixedParts, outlierFinding, wildFinding } from "../../src/place/flags.ts";

describe("findings of a placing", () => {
  test("gapFinding: pass up to the floor, warn above it, margin of the floor still free", () => {
    expect(gapFinding("charging", 0.001, 0.002)).toMatchObject({ verdict: "pass", margin: 0.5, unit: "1" });
    expect(gapFinding("holding", 0.003, 0.002)).toMatchObject({ verdict: "warn", state: "holding" });
  });
  test("holdingUnknown: not assessed, with the serials", () => {
    const finding = holdingUnknown({ known: false, why: "missing", serials: ["a", "b"] });
    expect(finding).toMatchObject({ id: "place.leakage-missing", verdict: "not assessed", value: null });
    expect(finding.note).toContain("a, b");
  });
  test("wildFinding says which, with and without, and whether a median unit was supposed", () => {
    const finding = wildFinding({ serial: "U9", withUnit: 0.05, without: 0.001, supposed: true });
    expect(finding).toMatchObject({ id: "place.wild-unit", value: 0.05, limit: 0.001 });
    expect(finding.note).toMatch(/U9.*median/);
  });
  test("outlierFinding carries the unit of its quantity", () => {
    const outlier = { serial: "U9", quantity: "leakage", value: 2e-3, low: 0, high: 1e-3 } as const;
    expect(outlierFinding(outlier, true)).toMatchObject({ unit: "A", state: "holding", margin: -1 });
  });
  test("mixedParts: one finding for all groups with two parts, none when alike", () => {
    const lot = ["x", "x", "y", "y"].map((part, i) => ({ serial: String(i), capacitance: 1, part }));
    expect(
      mixedParts(lot, [
        [0, 1],
        [2, 3],
      ]),
    ).toEqual([]);
    expect(
      mixedParts(lot, [
        [0, 2],
        [1, 3],
      ])[0],
    ).toMatchObject({ id: "place.mixed-parts", value: 2 });
  });
});
