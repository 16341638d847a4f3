// Source: [methods-derived] A14: (1/0.9)^7.5 with reversal 0.1 -> 0.35 to the 1.6 gives 0.296942464.
import { describe, expect, test } from "vitest";
import { lifeOf } from "../../src/search/life.ts";
import { FILM, shotBrief } from "../support/shotBank.ts";

const unit = { ...FILM, voltage: 2000, reversal: 0.1 };
const own = (life: Record<string, unknown>, more = {}) => shotBrief({ life, ...more });

describe("lifeOf(brief, unit, stress)", () => {
  test("Source: methods A14: the brief's exponents, which beat the catalogue's", () => {
    const brief = own({ voltageExponent: 7.5, reversalExponent: 1.6 });
    const life = lifeOf(brief, unit, { voltage: 1800, reversal: 0.35, rise: 0 });
    expect(life.ratio).toBeCloseTo(0.296942464, 8);
    expect(lifeOf(own({}), unit, { voltage: 1800, reversal: 0.1, rise: 0 }).voltage).toBeCloseTo(0.9 ** -6, 12);
  });

  test("a missing exponent or reference is not assessed, and named", () => {
    const { lifeExponent: _, reversalExponent: __, ...bare } = unit;
    const life = lifeOf(own({}), bare, { voltage: 1800, reversal: 0.35, rise: 0 });
    expect(life).toMatchObject({ ratio: null, missing: ["voltage", "reversal"] });
    expect(lifeOf(own({}), unit, { voltage: null, reversal: 0, rise: 0 })).toMatchObject({
      ratio: null,
      missing: ["voltage"],
    });
  });

  test("less reversal than rated is no gain; temperature counts only by the builder's own halving", () => {
    expect(lifeOf(own({}), unit, { voltage: 2000, reversal: 1e-6, rise: 0 }).ratio).toBe(1);
    const warm = own({ halving: 10, reference: 85 }, { ambient: 50 });
    expect(lifeOf(warm, unit, { voltage: 2000, reversal: 0, rise: 5 }).ratio).toBeCloseTo(8, 12);
    expect(lifeOf(warm, unit, { voltage: 2000, reversal: 0, rise: null }).missing).toEqual(["temperature"]);
    const unplaced = own({ halving: 10, reference: 85 });
    expect(lifeOf(unplaced, unit, { voltage: 2000, reversal: 0, rise: 0 }).missing).toEqual(["temperature"]);
  });
});
