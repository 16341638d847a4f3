import { describe, expect, test } from "vitest";
import { clearingOf } from "../../src/hazard/governing.ts";
import { RULES, type RuleId, ruleOf } from "../../src/hazard/index.ts";
import { applies, type Rule } from "../../src/hazard/rule.ts";
import fc from "../support/property.ts";

const of = (id: RuleId, capacitance: number) => clearingOf(ruleOf(id), capacitance);

describe("clearingOf(rule, capacitance)", () => {
  test("a rule of a voltage clears there, whatever charge it exempts beside it", () => {
    expect(of("iec-60204-residual", 1e-3)).toEqual({ voltage: 60, seconds: 5 });
    expect(of("nec-460-6", 1e-3)).toEqual({ voltage: 50, seconds: 60 });
    expect(of("iec-61010-touch", 1)).toEqual({ voltage: 60, seconds: null });
  });

  // Public answer on IEC 61010-1: at 150 V 45 uC are 300 nF (second hand, with our division).
  test("a rule of charge clears at Q/C: 45 uC of 300 nF at 150 V", () => {
    expect(of("iec-61010-charge", 300e-9).voltage).toBeCloseTo(150, 9);
  });

  test("tiers of energy clear below the lowest tier that bites: 2 mF at 0.25, 1, 100 J", () => {
    // 100 J of 2 mF stand at 316 V, above where that tier ends; 1 J at 31.6 V, below where its tier begins: 100 V.
    expect(of("nfpa-70e-360", 2e-3).voltage).toBe(100);
    // 40 mF: 100 J at 70.7 V, in the first tier already.
    expect(of("nfpa-70e-360", 40e-3).voltage).toBeCloseTo(Math.sqrt(200 / 40e-3), 9);
    expect(of("nfpa-70e-360", 1e-12).voltage).toBeCloseTo(Math.sqrt(0.5 / 1e-12), 0);
  });

  test("a rule of capacitance bites over its whole range of voltages, one of time alone sets no level", () => {
    expect(of("iec-60335-charge", 1e-6).voltage).toBe(42.4);
    expect(of("iec-60335-charge", 0.05e-6).voltage).toBeCloseTo(900, 9);
    expect(of("iec-61010-plug", 1e-3)).toEqual({ voltage: null, seconds: 5 });
    expect(of("absorption-other", 1e-3)).toEqual({ voltage: null, seconds: null });
    expect(of("iec-60950-decay", 1e-3).seconds).toBe(10);
  });

  test("below the clearing voltage no limit of any rule is broken, just above it one is", () => {
    const broken = ({ limits }: Rule, c: number, v: number): boolean => {
      const volts = limits.filter(({ quantity }) => quantity === "voltage");
      return (volts.length > 0 ? volts : limits).some((limit) => {
        if (!applies(limit, v)) return false;
        if (limit.quantity === "voltage") return v > limit.value;
        if (limit.quantity === "charge") return c * v > limit.value;
        if (limit.quantity === "energy") return (c * v * v) / 2 >= limit.value;
        return limit.quantity === "capacitance" && c > limit.value;
      });
    };
    const part = fc.double({ min: 0, max: 1, noNaN: true });
    const power = fc.double({ min: -9, max: 0, noNaN: true });
    fc.assert(
      fc.property(fc.constantFrom<Rule>(...RULES), power, part, (rule, exponent, part) => {
        const c = 10 ** exponent;
        const { voltage } = clearingOf(rule, c);
        if (voltage === null) return;
        const top = Number.isFinite(voltage) ? voltage : 1e6;
        expect(broken(rule, c, top * part * (1 - 1e-9))).toBe(false);
        if (Number.isFinite(voltage)) expect(broken(rule, c, voltage * (1 + 1e-9))).toBe(true);
      }),
    );
  });
});
