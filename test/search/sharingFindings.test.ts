// How the voltage divides, as findings: worked by hand on a bank of eight in series, two in parallel, units of 20 %.
import { describe, expect, test } from "vitest";
import { chargingRisk, chargingShare, holdingShare, reverse } from "../../src/search/sharingFindings.ts";
import { bankOf, briefOf, findingsInput, UNIT } from "../support/bank.ts";

const WORST = (2000 * 1.2) / (1.2 + 7 * 0.8);

describe("chargingShare(input)", () => {
  test("one low, seven high: 352.94 V of 360 V passes", () =>
    expect(chargingShare(findingsInput())).toMatchObject({
      verdict: "pass",
      value: WORST,
      limit: 360,
      state: "charging",
    }));
  test("above the limit it fails, at a stated risk it warns", () => {
    const brief = briefOf({ voltage: "2.1 kV" });
    expect(chargingShare(findingsInput({ brief })).verdict).toBe("fail");
    const risked = briefOf({ voltage: "2.1 kV", basis: "statistical" });
    expect(chargingShare(findingsInput({ brief: risked })).verdict).toBe("warn");
  });
  test("tolerance unknown: not assessed, and the widest that would pass is told", () => {
    const { tolerance: _known, ...unit } = UNIT;
    const found = chargingShare(findingsInput({ unit }));
    expect(found).toMatchObject({ verdict: "not assessed", value: null, margin: null });
    expect(found.note).toMatch(/Up to \+-2\d/);
  });
});

describe("chargingRisk(input)", () => {
  test("only with the statistical basis; its error counts against it", () => {
    expect(chargingRisk(findingsInput())).toEqual([]);
    const brief = briefOf({ basis: "statistical", risk: 1e-3 });
    const result = { ...bankOf({ brief }), risk: { exceed: 9.9e-4, error: 2e-5, law: "uniform" } };
    expect(chargingRisk(findingsInput({ brief, result }))[0]).toMatchObject({ verdict: "fail", limit: 1e-3 });
  });
});

describe("holdingShare(input)", () => {
  test("leakage unknown: not assessed, with what it would take", () => {
    const { leakage: _known, ...unit } = UNIT;
    const found = holdingShare(findingsInput({ unit }));
    expect(found.verdict).toBe("not assessed");
    expect(found.note).toContain("measure the leakage");
  });
  test("no resistor, held for ever: the whole voltage may come to one unit", () => {
    const result = bankOf({ balance: { kind: "none" } });
    expect(holdingShare(findingsInput({ result }))).toMatchObject({ verdict: "fail", value: 2000 });
  });
});

describe("the words of holdingShare(input)", () => {
  test("for ever, the start highest: the end's own corner is named, which leakage and resistors set and capacitance does not", () => {
    const unit = { ...UNIT, tolerance: { low: 0.1, high: 0.5 } };
    const found = holdingShare(findingsInput({ unit }));
    expect(found.value).toBeLessThan(chargingShare(findingsInput({ unit })).value as number);
    expect(found.note).toContain("stage 1 with no leakage, the rest with the greatest leakage");
    expect(found.note).toContain("resistor at +5 %");
    expect(found.note).not.toContain("-10 %");
  });
});

describe("reverse(input)", () => {
  const low = WORST - 250;
  const short = briefOf({ hold: "1 s" });
  const shortly = (unit = UNIT) =>
    reverse(findingsInput({ unit, brief: short, result: bankOf({ unit, brief: short }) }));
  test("polarised without a reverse rating: not assessed, never passed, and a clamp is named", () => {
    const found = shortly();
    expect(found).toMatchObject({ verdict: "not assessed", limit: null });
    expect(found.value).toBeCloseTo(low, 9);
    expect(found.note).toContain("clamp diode");
  });
  test("with a rating it warns above and passes within", () => {
    expect(shortly({ ...UNIT, reverseVoltage: 2 }).verdict).toBe("warn");
    expect(shortly({ ...UNIT, reverseVoltage: 110 }).verdict).toBe("pass");
  });
  test("not polarised: judged by the unit's own limit", () =>
    expect(reverse(findingsInput({ unit: { ...UNIT, polarised: false } }))).toMatchObject({
      verdict: "pass",
      limit: 360,
    }));

  // 900 V on 3s4p of 1 mF +-2 %, 3 mA at worst, 8.8 kohm +-5 %: v = (V/(2 R_hi) - 4 I)/(1/R_lo + 1/(2 R_hi)) = 211.2 V, of 308.05 V charged.
  const leaky = {
    ...UNIT,
    voltage: 450,
    capacitance: 1e-3,
    tolerance: { low: 0.02, high: 0.02 },
    leakage: 3e-3,
    reverseVoltage: 10,
  };
  const layout = { part: "x", series: 3, parallel: 4, ties: "cross-tied" } as const;
  const held = (hold: string) => {
    const brief = briefOf({ voltage: "900 V", hold });
    const balance = { kind: "fixed", resistance: 8800, tolerance: 0.05 } as const;
    const result = bankOf({ unit: leaky, brief, layout, balance });
    expect(result.share.leftAfterDump).toBeCloseTo(8.054, 3);
    return reverse(findingsInput({ unit: leaky, brief, result }));
  };
  test("held for ever, unequal leakage decides: 96.8 V against 10 V warns, though equal sharing leaves 8.05 V", () => {
    const found = held("for ever");
    expect(found).toMatchObject({ verdict: "warn", limit: 10 });
    expect(found.value).toBeCloseTo(96.84, 1);
    expect(found.note).toContain("endless hold with unequal leakage");
    expect(found.note).toContain("From equal sharing it would be 8.054 V");
  });
  test("a finite hold is judged by its own course: more after 300 s than after 10 s, less than for ever", () => {
    const [little, more] = [held("10 s"), held("300 s")];
    expect(more).toMatchObject({ verdict: "warn" });
    // Two stages of 8.16 mF in all against 3.92 mF: tau = (C_lo + C_hi/2)/(1/R_lo + 1/(2 R_hi)).
    const [rLow, rHigh] = [8360, 9240];
    const g = 1 / rLow + 1 / (2 * rHigh);
    const tau = (3.92e-3 + 4.08e-3 / 2) / g;
    const end = (900 / (2 * rHigh) - 0.012) / g;
    const start = (900 * 1.02) / (1.02 + 1.96);
    expect(more.value).toBeCloseTo((start - end) * -Math.expm1(-300 / tau), 2);
    expect(more.value).toBeLessThan(held("for ever").value as number);
    expect(little.value).toBeLessThan(more.value as number);
    expect(more.note).toContain("300 s of hold");
  });
  test("unknown leakage: what equal sharing leaves cannot pass for the whole, unless all that a stage is charged to would", () => {
    const { leakage: _l, ...dark } = { ...leaky, technology: "film", polarised: true } as typeof leaky;
    const brief = briefOf({ voltage: "900 V" });
    const input = (reverseVoltage: number) => {
      const unit = { ...dark, reverseVoltage };
      return findingsInput({ unit, brief, result: bankOf({ unit, brief, layout, balance: { kind: "none" } }) });
    };
    const { corners } = input(10);
    expect(reverse({ ...input(10), corners: { ...corners, dumpedFromHold: null } }).verdict).toBe("not assessed");
    expect(reverse({ ...input(400), corners: { ...corners, dumpedFromHold: null } }).verdict).toBe("pass");
  });
});
