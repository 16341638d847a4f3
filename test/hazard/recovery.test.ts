// Recovery voltage against the figures of the methods page, 3.5.
import { describe, expect, test } from "vitest";
import { recovery } from "../../src/hazard/recovery.ts";

describe("recovery({ soak, capacitance, polarised })", () => {
  test("nothing soaked, nothing back", () =>
    expect(recovery({ soak: 0, capacitance: 1, polarised: true })).toMatchObject({
      low: 0,
      high: 0,
      hazardous: false,
    }));

  test("electrolytics from 1600 V: 160 V to 240 V, as the methods page has it, marked second hand", () => {
    const back = recovery({ soak: 1600, capacitance: 825e-6, polarised: true });
    expect([back.low, back.high, back.tag, back.ruleId]).toEqual([160, 240, "second hand", "absorption-electrolytic"]);
    expect(back.energy).toBeCloseTo((825e-6 * 240 ** 2) / 2, 9);
    expect(back.hazardous).toBe(true);
  });

  test("others: up to 10 %, with no least known", () =>
    expect(recovery({ soak: 1600, capacitance: 825e-6, polarised: false })).toMatchObject({
      low: null,
      high: 160,
      ruleId: "absorption-other",
    }));

  test("15 % of 60 V on 10 mF is no hazard by stored energy", () =>
    expect(recovery({ soak: 60, capacitance: 0.01, polarised: true }).hazardous).toBe(false));
});
