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

describe("reverse(input)", () => {
  const low = WORST - 250;
  test("polarised without a reverse rating: not assessed, never passed, and a clamp is named", () => {
    const found = reverse(findingsInput());
    expect(found).toMatchObject({ verdict: "not assessed", limit: null });
    expect(found.value).toBeCloseTo(low, 9);
    expect(found.note).toContain("clamp diode");
  });
  test("with a rating it warns above and passes within", () => {
    expect(reverse(findingsInput({ unit: { ...UNIT, reverseVoltage: 2 } })).verdict).toBe("warn");
    expect(reverse(findingsInput({ unit: { ...UNIT, reverseVoltage: 110 } })).verdict).toBe("pass");
  });
  test("not polarised: judged by the unit's own limit", () =>
    expect(reverse(findingsInput({ unit: { ...UNIT, polarised: false } }))).toMatchObject({
      verdict: "pass",
      limit: 360,
    }));
});
