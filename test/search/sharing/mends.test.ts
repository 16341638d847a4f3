// Each mend must mend, and a little less of it must not; the resistor's tolerance also against the closed form of methods 2.2.
import { describe, expect, test } from "vitest";
import { balanceMends, balances } from "../../../src/search/sharing/mends.ts";
import { briefOf, FAMILIES, UNIT } from "../../support/bank.ts";

const wide = FAMILIES.map((family) => ({ ...family, tolerance: 0.2 }));
const input = {
  // 1 %: the units share well, so only the resistors' spread is in the way. Limit 252 V for 250 V even.
  unit: { ...UNIT, voltage: 280, tolerance: { low: 0.001, high: 0.001 } },
  brief: briefOf(),
  families: wide,
  shape: { series: 8, parallel: 2, ties: "cross-tied" as const },
};

describe("balanceMends(input)", () => {
  test("null when a resistor does it, or the leakage is unknown", () => {
    expect(balanceMends({ ...input, unit: UNIT, families: FAMILIES })).toBeNull();
    const { leakage: _l, ...dark } = input.unit;
    expect(balanceMends({ ...input, unit: dark })).toBeNull();
    expect(balances({ ...input, unit: dark })).toBeNull();
  });

  test("each alone mends it, and one step less does not", () => {
    const mends = balanceMends(input);
    const { series, tolerance, voltage } = mends as { series: number; tolerance: number; voltage: number };
    expect(balances({ ...input, shape: { ...input.shape, series } })).toBe(true);
    expect(balances({ ...input, shape: { ...input.shape, series: series - 1 } })).toBe(false);
    const of = (q: number) => input.families.map((family) => ({ ...family, tolerance: q }));
    expect(balances({ ...input, families: of(tolerance) })).toBe(true);
    expect(balances({ ...input, families: of(tolerance + 2e-4) })).toBe(false);
    expect(balances({ ...input, brief: { ...input.brief, voltage } })).toBe(true);
    expect(balances({ ...input, brief: { ...input.brief, voltage: voltage * 1.002 } })).toBe(false);
  });

  test("where a risk judges the charging, a wide capacitance does not stand in the way of the resistor's mend", () => {
    const unit = { ...input.unit, tolerance: { low: 0.2, high: 0.2 } };
    expect(balanceMends({ ...input, unit })).toMatchObject({ tolerance: null });
    const mends = balanceMends({ ...input, unit, brief: briefOf({ basis: "statistical" }) });
    expect(mends?.tolerance).toBe(balanceMends(input)?.tolerance);
  });

  test("Source: methods 2.2: the widest q is under (n V_lim - V)/(V + (n - 2) V_lim), where no R at all is left", () => {
    const edge = (8 * 252 - 2000) / (2000 + 6 * 252);
    const tolerance = balanceMends(input)?.tolerance as number;
    expect(tolerance).toBeLessThanOrEqual(edge);
    expect(tolerance).toBeGreaterThan(0);
  });
});
