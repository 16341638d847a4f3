// Clamp duty of an arrangement: by hand for equal sharing, against the bank layer's chain states after an endless hold.
import { describe, expect, test } from "vitest";
import { clampOf } from "../../../src/search/sharing/clamp.ts";
import { cornersOf } from "../../../src/search/sharing/corners.ts";
import { bankOf, briefOf, UNIT } from "../../support/bank.ts";

const tied = (more: Record<string, unknown> = {}, unit = UNIT) => {
  const brief = briefOf(more);
  const result = bankOf({ unit, brief });
  return { result, unit, brief, share: result.share };
};

describe("clampOf(bank)", () => {
  test("none for film, for one in series, and where the reverse rating covers even the hold's own unequal sharing", () => {
    expect(clampOf({ ...tied(), unit: { ...UNIT, polarised: false } })).toBeNull();
    const one = bankOf({ layout: { part: "x", series: 1, parallel: 2, ties: "strings" } });
    expect(clampOf({ ...tied(), result: one })).toBeNull();
    const least = -(cornersOf(tied()).dumpedFromHold?.voltage as number);
    expect(clampOf(tied({}, { ...UNIT, reverseVoltage: least * 1.0001 }))).toBeNull();
    expect(clampOf(tied({}, { ...UNIT, reverseVoltage: least * 0.9999 }))).not.toBeNull();
  });

  test("short hold, dump resistor of 100 ohm: U = (n - 1)(V/n)(1 - C_lo/C_hi), surge U/R, action C U^2/(2 R)", () => {
    const clamp = clampOf(tied({ hold: "10 s", dumpResistance: "100 ohm" }));
    const rest = 7 * 250 * (1 - 0.8 / 1.2);
    expect(clamp?.count).toBe(8);
    expect(clamp?.surgeCurrent).toBeCloseTo(rest / 100, 9);
    expect(clamp?.action).toBeCloseTo(((2 * 1.2e-3) / 7) * (rest ** 2 / 200), 9);
    expect(clamp?.through).toEqual({ kind: "dump resistor", ohms: 100 });
    expect(clamp?.reverseVoltage).toBe(
      Math.max(tied({ hold: "10 s" }).share.charging ?? 0, tied({ hold: "10 s" }).share.holding ?? 0),
    );
  });

  test("after an endless hold the leaky stage begins lower, so the diode carries more", () => {
    const short = clampOf(tied({ hold: "10 s", dumpResistance: "100 ohm" }));
    const long = clampOf(tied({ dumpResistance: "100 ohm" }));
    expect(long?.before?.victim).toBeLessThan(250);
    expect((long?.before?.victim ?? 0) + 7 * (long?.before?.others ?? 0)).toBeCloseTo(2000, 6);
    expect(long?.surgeCurrent).toBeGreaterThan(short?.surgeCurrent ?? 0);
  });

  test("nothing known to limit the dump: unknown, never zero; ESR alone limits it and says so", () => {
    expect(clampOf(tied())).toMatchObject({ surgeCurrent: null, action: null, through: null });
    const esr = clampOf(tied({}, { ...UNIT, esr: 0.1 }));
    expect(esr?.through).toEqual({ kind: "units' ESR", ohms: 0.1 });
    expect(esr?.surgeCurrent).toBeGreaterThan(100);
  });

  test("unknown tolerance: count alone; unknown leakage: no reverse rating is claimed; unknown polarity is told", () => {
    const { tolerance: _t, ...wide } = UNIT;
    expect(clampOf(tied({}, wide))).toMatchObject({ count: 8, surgeCurrent: null, before: null });
    const { leakage: _l, ...dark } = UNIT;
    expect(clampOf(tied({}, dark))?.reverseVoltage).toBeNull();
    const { polarised: _p, ...maybe } = UNIT;
    expect(clampOf(tied({}, maybe))?.polarityKnown).toBe(false);
  });
});
