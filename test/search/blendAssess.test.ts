// The bank that groups of strings make: sums, shares of the charge, the worst group, the money.
import { describe, expect, test } from "vitest";
import { assess } from "../../src/search/assess.ts";
import { assessBlend, kindOf } from "../../src/search/blendAssess.ts";
import { partsOf, priced, termsOf, workOf } from "../support/blendLab.ts";
import { briefOf } from "../support/labParts.ts";

const brief = briefOf({ energy: 500, voltage: 1200, ageing: 0.05 });
const parts = partsOf(
  { capacitance: 470, voltage: 450, supplier: "North", price: 7, leakage: 300 },
  { capacitance: 330, voltage: 350, tolerance: "-10/+50", supplier: "South", "on hand": 20, price: 4 },
  { capacitance: 100, voltage: 1600, price: 60, supplier: "North" },
);
const terms = termsOf(brief, priced, 250);
const { types } = workOf(parts, brief);
const groups = types.map((type, at) => ({ type, strings: [3, 2, 4][at]! }));
const blend = assessBlend({ groups, terms, currency: "EUR" });
const alone = blend.strings.map(({ part, series, parallel, ties }) =>
  assess({
    unit: parts.find((unit) => unit.part === part)!,
    layout: { part, series, parallel, ties },
    brief,
    families: priced,
    currency: "EUR",
  }),
);

describe("assessBlend({groups, terms, currency})", () => {
  test("each group is the layout that `check` would assess, its findings of the whole bank left out", () => {
    expect(blend.strings.map(({ id }) => id)).toEqual(alone.map(({ id }) => id));
    for (const [at, one] of blend.strings.entries()) {
      expect(one.share).toEqual(alone[at]!.share);
      expect(one.balance).toEqual(alone[at]!.balance);
      const ids = one.findings.map(({ id }) => id);
      expect(ids).toContain("charging-share");
      expect(
        ids.filter((id) => ["pulse-energy", "bleed", "energy-class", "arc-blast", "recovery"].includes(id)),
      ).toEqual([]);
    }
  });
  test("capacitance, units, volume and mass add up; energy follows", () => {
    for (const key of ["low", "nominal", "high"] as const) {
      const sum = alone.reduce((total, one) => total + one.capacitance[key]!, 0);
      expect(blend.capacitance[key]).toBeCloseTo(sum, 12);
      expect(blend.energy[key]).toBeCloseTo((sum * 1200 ** 2) / 2, 6);
    }
    expect(blend.units).toBe(alone.reduce((sum, { units }) => sum + units, 0));
    expect(blend.volume).toBeCloseTo(
      alone.reduce((sum, { volume }) => sum + volume!, 0),
      12,
    );
    expect(blend.mass).toBeCloseTo(
      alone.reduce((sum, { mass }) => sum + mass!, 0),
      12,
    );
  });
  test("shares of the charge: one in all nominally, and each low end with the others high", () => {
    expect(blend.strings.reduce((sum, one) => sum + one.chargeShare.nominal, 0)).toBeCloseTo(1, 12);
    const [a, b, c] = alone.map(({ capacitance }) => capacitance);
    expect(blend.strings[0]!.chargeShare.low).toBeCloseTo(a!.low! / (a!.low! + b!.high! + c!.high!), 12);
    expect(blend.strings[0]!.chargeShare.high).toBeCloseTo(a!.high! / (a!.high! + b!.low! + c!.low!), 12);
  });
  test("the worst group is the one nearest its limit", () => {
    const nearest = Math.max(...alone.map(({ share }) => share.charging! / share.limit));
    expect(blend.share.charging!.value / blend.share.charging!.limit).toBeCloseTo(nearest, 12);
    expect(blend.stress).toBe(Math.max(...alone.map(({ stress }) => stress!)));
  });
  test("money: every line, a fee for each part that is bought", () => {
    const bought = alone.filter(({ purchase }) => purchase.capacitors!.bought > 0).length;
    expect(bought).toBe(2);
    const cents = alone.reduce((sum, { cost }) => sum + Math.round(cost!.total * 100), 0) + 250 * bought;
    expect(blend.cost).toMatchObject({
      total: cents / 100,
      lines: (250 * bought) / 100,
      currency: "EUR",
      unpriced: [],
    });
    expect(blend.suppliers).toBe(1);
    expect(blend.strings.map(({ fromHand, bought }) => [fromHand > 0, bought > 0])).toEqual([
      [false, true],
      [true, false],
      [false, true],
    ]);
  });
  test("findings of the whole: all the energy judged together", () => {
    const energy = blend.findings.find(({ id }) => id === "pulse-energy")!;
    expect(energy).toMatchObject({ value: blend.energy.low, limit: 500, verdict: "pass" });
    expect(blend.findings.find(({ id }) => id === "bleed")!.verdict).toBe("warn");
  });
  test("without a currency there is no cost; an unknown size is unknown for the whole", () => {
    const some = workOf(partsOf({ diameter: "" }), brief).types.map((type) => ({ type, strings: 1 }));
    expect(assessBlend({ groups: some, terms: termsOf(brief), currency: null })).toMatchObject({
      cost: null,
      volume: null,
    });
  });
});

test("kindOf(groups): parts and ties, in any order the same", () => {
  expect(kindOf(groups)).toBe(kindOf([...groups].reverse()));
  expect(kindOf(groups)).toMatch(/^a (cross-tied|strings) \+ b (cross-tied|strings) \+ c strings$/);
});
