// Reverse after a dump as a finding: volts, corner, verdict, clamp.
import { describe, expect, test } from "vitest";
import { stageRange } from "../../src/bank/cornersRange.ts";
import { residualAfterDump } from "../../src/bank/residual.ts";

const ranges = (tolerance: number, leakage = 0, stages = 4) =>
  Array.from({ length: stages }, () =>
    stageRange({
      units: 1,
      capacitance: 3300e-6,
      tLow: tolerance,
      tHigh: tolerance,
      leakage,
      insulation: Number.POSITIVE_INFINITY,
      resistance: 24e3,
      q: 0.05,
    }),
  );
const asked = { voltage: 1600, hold: "equalised", allowed: null, polarised: true } as const;

describe("residualAfterDump({ ranges, voltage, hold, allowed, polarised })", () => {
  test("units exactly alike, or no hold: no reverse, pass, no clamp", () => {
    expect(residualAfterDump({ ...asked, ranges: ranges(0) })).toMatchObject({ verdict: "pass", clampNeeded: false });
    const straight = residualAfterDump({ ...asked, ranges: ranges(0.2), hold: "none" });
    expect(straight).toMatchObject({ reverse: 0, forward: 0, verdict: "pass" });
  });

  test("units exactly alike of any number at any voltage: what rounding leaves is no reverse", () => {
    for (const stages of [3, 6, 7, 11])
      for (let volts = 100.1; volts < 2000; volts += 77.7) {
        const found = residualAfterDump({ ...asked, ranges: ranges(0, 0, stages), voltage: volts });
        expect(found).toMatchObject({ verdict: "pass", clampNeeded: false });
      }
  });
  test("methods A3: 133.333 V reverse, 109.091 V forward, the low stage [methods-derived A3]", () => {
    const found = residualAfterDump({ ...asked, ranges: ranges(0.2) });
    expect(found.reverse).toBeCloseTo(133.333333333, 8);
    expect(found.forward).toBeCloseTo(109.090909091, 8);
    expect(found.reverseCorner.words).toBe("stage 1 at -20 %, the rest at +20 %");
  });

  test("polarised without a reverse rating: not assessed, and a clamp", () => {
    expect(residualAfterDump({ ...asked, ranges: ranges(0.2) })).toMatchObject({
      verdict: "not assessed",
      clampNeeded: true,
    });
    expect(residualAfterDump({ ...asked, ranges: ranges(0.2), polarised: false })).toMatchObject({
      verdict: "not assessed",
      clampNeeded: false,
    });
  });

  test("with a rating: fail above it, pass at it", () => {
    expect(residualAfterDump({ ...asked, ranges: ranges(0.2), allowed: 1.5 })).toMatchObject({
      verdict: "fail",
      clampNeeded: true,
    });
    expect(residualAfterDump({ ...asked, ranges: ranges(0.2), allowed: 400 / 3 })).toMatchObject({
      verdict: "pass",
      clampNeeded: false,
    });
  });

  test("a hold that leakage has tilted leaves more reverse than an equalised one", () => {
    const even = residualAfterDump({ ...asked, ranges: ranges(0.2, 1e-3) });
    const held = residualAfterDump({ ...asked, ranges: ranges(0.2, 1e-3), hold: "held" });
    expect(held.reverse).toBeGreaterThan(even.reverse + 10);
  });
});
