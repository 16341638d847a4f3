// Rules of charge against the two worked answers on the methods page and at the edges of their ranges.
import { describe, expect, test } from "vitest";
import { chargeChecks, voltageForCharge } from "../../src/hazard/charge.ts";

const found = (capacitance: number, voltage: number) =>
  Object.fromEntries(chargeChecks({ capacitance, voltage }).map((one) => [`${one.ruleId} ${one.limit}`, one.exceeded]));

describe("chargeChecks({ capacitance, voltage })", () => {
  test("4.4 uF at 80 V holds 352 uC, over 45 uC (a product-safety list's worked answer) and over 60 uC", () => {
    const check = chargeChecks({ capacitance: 4.4e-6, voltage: 80 });
    expect(check.find((one) => one.ruleId === "iec-61010-charge")).toMatchObject({
      exceeded: true,
      limit: 45e-6,
      unit: "C",
    });
    expect(check.find((one) => one.ruleId === "iec-61010-charge")!.value).toBeCloseTo(352e-6, 15);
    expect(found(4.4e-6, 80)["iec-60204-residual 0.00006"]).toBe(true);
  });

  test("0.1 uF is just what is allowed, and no more is; every row names its rule", () => {
    expect(found(1e-7, 100)["iec-60335-charge 1e-7"]).toBe(false);
    expect(found(1.001e-7, 100)["iec-60335-charge 1e-7"]).toBe(true);
    for (const check of chargeChecks({ capacitance: 1e-7, voltage: 100 })) expect(check.ruleId).toMatch(/^iec-/);
  });

  test("nothing held exceeds nothing", () =>
    expect(Object.values(found(1e-3, 0)).some((exceeded) => exceeded)).toBe(false));

  test("a rule that does not speak of the voltage is left out: 0.1 uF from 42.4 V to 450 V, 350 mJ from 15 kV", () => {
    expect(found(1e-6, 42)).not.toHaveProperty("iec-60335-charge 1e-7");
    expect(found(1e-6, 42.4)["iec-60335-charge 1e-7"]).toBe(true);
    expect(found(0.05e-6, 450)["iec-60335-charge 1e-7"]).toBe(false);
    expect(found(1e-9, 451)).not.toHaveProperty("iec-60335-charge 1e-7");
    expect(found(1e-9, 14999)).not.toHaveProperty("iec-61010-energy 0.35");
    expect(found(4e-9, 15001)).toEqual({
      "iec-61010-energy 0.35": true,
      "iec-60335-charge 0.35": true,
      "iec-60204-residual 0.00006": true,
      "iec-60479-fibrillation 0.003": false,
      "iec-60479-fibrillation 0.005": false,
    });
  });

  test("at 15 kV itself both the charge and the energy are asked: the stricter holds", () =>
    expect(found(3.05e-9, 15000)).toMatchObject({ "iec-61010-charge 0.000045": true, "iec-61010-energy 0.35": false }));

  test("no more than is allowed is allowed: 1 uF at 45 V holds just 45 uC", () =>
    expect(found(1e-6, 45)["iec-61010-charge 0.000045"]).toBe(false));

  test("what was from memory says so", () =>
    expect(
      chargeChecks({ capacitance: 1e-9, voltage: 2e4 }).find((one) => one.ruleId === "iec-61010-energy")!.tag,
    ).toBe("memory"));
});

test("voltageForCharge(300 nF, 45 uC) = 150 V (IEC 61010-1 as the methods page works it)", () =>
  expect(voltageForCharge(300e-9, 45e-6)).toBeCloseTo(150, 9));
