// Savings against the plan itself, run with the value changed by hand; the shares against what must add up.
import { describe, expect, test } from "vitest";
import type { Capacitor } from "../../src/catalog/index.ts";
import { type ImproveInput, improve } from "../../src/search/improve.ts";
import { assess, type Brief, plan } from "../../src/search/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";

const brief = briefOf({ energy: "2 kJ", overshoot: "3 %" });
const layout = { part: UNIT.part, series: 9, parallel: 9, ties: "cross-tied" as const };
const inputOf = (more: Partial<ImproveInput> = {}): ImproveInput => ({
  result: assess({ unit: UNIT, layout, brief, families: FAMILIES, currency: "EUR" }),
  unit: UNIT,
  brief,
  families: FAMILIES,
  currency: "EUR",
  ...more,
});
const rowOf = (input: ImproveInput, cause: string) => improve(input)?.causes.find((one) => one.cause === cause);

/** The cheapest cross-tied layout of a plan. */
function cheapestOf(unit: Capacitor, asked: Brief, families = FAMILIES) {
  const planned = plan({ brief: asked, parts: [unit], families, limit: 0 });
  if (!planned.ok) throw new Error("the plan must be understood");
  const best = planned.value.layouts.find((one) => one.ties === "cross-tied" || one.parallel === 1 || one.series === 1);
  return best && { units: best.units, cost: best.cost?.total };
}

describe("improve(input)", () => {
  test("null for one in series and for an unknown tolerance", () => {
    const { tolerance: _t, ...wide } = UNIT;
    expect(improve(inputOf({ unit: wide }))).toBeNull();
    const one = bankOf({ layout: { part: "x", series: 1, parallel: 3, ties: "strings" } });
    expect(improve(inputOf({ result: one }))).toBeNull();
  });

  test("even share, all causes and what is free add up to the full rating", () => {
    const found = improve(inputOf());
    const eaten = found?.causes.reduce((sum, { volts }) => sum + (volts ?? Number.NaN), 0) as number;
    expect((found?.even ?? 0) + eaten + (found?.free ?? 0)).toBeCloseTo(400, 9);
    const shares = found?.causes.reduce((sum, { share }) => sum + (share ?? Number.NaN), 0) as number;
    expect(shares).toBeCloseTo(1 - (found?.free as number) / (400 - (found?.even as number)), 9);
  });

  test("each saving is that of a plan with the value changed by hand", () => {
    const changed: readonly (readonly [string, ReturnType<typeof cheapestOf>])[] = [
      ["capacitance tolerance", cheapestOf({ ...UNIT, tolerance: { low: 0.1, high: 0.1 } }, brief)],
      ["leakage", cheapestOf({ ...UNIT, leakage: 5e-5 }, brief)],
      [
        "resistor tolerance",
        cheapestOf(
          UNIT,
          brief,
          FAMILIES.map((one) => ({ ...one, tolerance: 0.01 })),
        ),
      ],
      ["overshoot", cheapestOf(UNIT, { ...brief, overshoot: 0 })],
      ["derating", cheapestOf(UNIT, { ...brief, derating: 1 })],
    ];
    const now = cheapestOf(UNIT, brief);
    expect(improve(inputOf())?.baseline).toMatchObject({ units: now?.units, cost: now?.cost });
    let saving = 0;
    for (const [cause, then] of changed) {
      const row = rowOf(inputOf(), cause);
      expect(row?.found, cause).toMatchObject({ units: then?.units, cost: then?.cost });
      expect(row?.saves?.units, cause).toBe((now?.units as number) - (then?.units as number));
      expect(row?.saves?.cost, cause).toBeCloseTo((now?.cost as number) - (then?.cost as number), 9);
      if ((row?.saves?.units ?? 0) > 0) saving++;
    }
    expect(saving).toBeGreaterThanOrEqual(2);
  });

  test("what is as tight as it is tried, or unknown, has nothing to tighten", () => {
    const tight = inputOf({
      families: FAMILIES.map((one) => ({ ...one, tolerance: 0.01 })),
      brief: { ...brief, overshoot: 0 },
    });
    expect(rowOf(tight, "resistor tolerance")).toMatchObject({ tightened: null, saves: null });
    expect(rowOf(tight, "overshoot")).toMatchObject({ tightened: null, volts: 0 });
    const { leakage: _l, ...dark } = UNIT;
    expect(rowOf(inputOf({ unit: dark }), "leakage")).toMatchObject({ volts: null, share: null, tightened: null });
    const film = { ...dark, insulation: 1e8 };
    expect(rowOf(inputOf({ unit: film }), "leakage")?.tightened).toMatchObject({
      quantity: "insulation doubled",
      to: 2e8,
    });
  });

  test("nothing fits as things are: no baseline, no saving, but what would then fit is named", () => {
    const few = inputOf({ brief: { ...brief, maxSeries: 8 } });
    const found = improve(few);
    expect(found?.baseline).toBeNull();
    expect(found?.causes.every(({ saves }) => saves === null)).toBe(true);
    expect(rowOf(few, "derating")?.found?.series).toBe(8);
  });

  test("without prices units alone are told", () => {
    const { price: _p, ...free } = UNIT;
    const row = rowOf(inputOf({ unit: free, currency: null }), "derating");
    expect(row?.saves?.cost).toBeNull();
    expect(row?.saves?.units).toBeGreaterThan(0);
  });
});
