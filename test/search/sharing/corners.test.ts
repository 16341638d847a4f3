// The corners named in a plan against those of the whole chain over all its stages, found by the bank layer.
import { describe, expect, test } from "vitest";
import { chargingCorners, dumpedCorners, holdingCorners, stageRange } from "../../../src/bank/index.ts";
import { cornersOf, NO_CORNERS } from "../../../src/search/sharing/corners.ts";
import { bankOf, briefOf, UNIT } from "../../support/bank.ts";

const unit = { ...UNIT, tolerance: { low: 0.1, high: 0.2 } };

describe("cornersOf(bank)", () => {
  test("one in series has none", () => {
    const result = bankOf({ layout: { part: "x", series: 1, parallel: 2, ties: "strings" } });
    expect(cornersOf({ result, unit, brief: briefOf() })).toEqual(NO_CORNERS);
  });

  test("for ever, both ties: volts and words are those of the whole chain of n stages", () => {
    for (const ties of ["cross-tied", "strings"] as const) {
      const result = bankOf({ unit, layout: { part: "x", series: 8, parallel: 3, ties } });
      const corners = cornersOf({ result, unit, brief: briefOf() });
      const balance = result.balance as NonNullable<typeof result.balance>;
      const range = stageRange({
        units: ties === "cross-tied" ? 3 : 1,
        capacitance: unit.capacitance,
        tLow: 0.1,
        tHigh: 0.2,
        leakage: 1e-4,
        insulation: Number.POSITIVE_INFINITY,
        resistance: balance.resistance,
        q: balance.tolerance,
      });
      const chain = Array.from({ length: 8 }, () => range);
      const charging = chargingCorners(chain, 2000).highest;
      expect(corners.charging?.voltage).toBeCloseTo(charging.voltage, 9);
      expect(corners.charging?.words).toBe("stage 1 at -10 %, the rest at +20 %");
      expect(charging.words).toBe("stage 1 at -10 %, the rest at +20 %");
      expect(corners.dumped?.voltage).toBeCloseTo(dumpedCorners(chain, 2000, "equalised").lowest.voltage, 9);
      const held = dumpedCorners(chain, 2000, "held").lowest;
      expect(corners.dumpedFromHold?.voltage).toBeCloseTo(held.voltage, 6);
      expect(corners.dumpedFromHold?.words).toBe(held.words);
      const holding = holdingCorners(chain, 2000).highest;
      const worst = Math.max(holding.voltage, charging.voltage);
      expect(corners.holding?.voltage).toBeCloseTo(worst, 6);
      if (holding.voltage > charging.voltage) {
        expect(corners.holding?.words).toMatch(
          /^stage 1 with no leakage, the rest with the greatest leakage; stage 1 resistor at \+5 %/,
        );
        expect(corners.holding?.hold).toBe(Number.POSITIVE_INFINITY);
      } else expect(corners.holding?.hold).toBe(0);
    }
  });

  test("unknown tolerance: nothing is named; unknown leakage: only what charging and equal sharing give", () => {
    const { tolerance: _t, ...wide } = unit;
    expect(cornersOf({ result: bankOf(), unit: wide, brief: briefOf() })).toEqual(NO_CORNERS);
    const { leakage: _l, ...dark } = unit;
    const corners = cornersOf({ result: bankOf({ unit: dark }), unit: dark, brief: briefOf() });
    expect(corners.holding).toBeNull();
    expect(corners.dumpedFromHold).toBeNull();
    expect(corners.charging?.voltage).toBeGreaterThan(250);
  });
});
