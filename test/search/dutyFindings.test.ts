// What the bank gives and bears at rest, as findings: worked by hand on a bank of eight in series, two in parallel.
import { describe, expect, test } from "vitest";
import { balanceLoad, bleed, energy, steadySupply } from "../../src/search/dutyFindings.ts";
import { bankOf, briefOf, FAMILIES, findingsInput, UNIT } from "../support/bank.ts";

describe("energy(input)", () => {
  test("0.8 of 250 uF at 2 kV: 400 J do not make 500 J, nominal 500 J do", () => {
    expect(energy(findingsInput())).toMatchObject({ verdict: "fail", limit: 500 });
    expect(energy(findingsInput()).value).toBeCloseTo(400, 9);
    expect(energy(findingsInput({ brief: briefOf({ basis: "nominal" }) })).verdict).toBe("pass");
  });
});

describe("steadySupply(input)", () => {
  test("nothing steady asked: no finding", () => expect(steadySupply(findingsInput())).toEqual([]));
  test("I/(f r V) = 50 uF is met by 200 uF; 0.5 A at 1 Hz wants 250 uF and is not", () => {
    const ask = (current: number) =>
      steadySupply(findingsInput({ brief: briefOf({ steady: { current, frequency: 1 } }) }))[0];
    expect(ask(0.1)).toMatchObject({ verdict: "pass", limit: 5e-5 });
    expect(ask(0.5)).toMatchObject({ verdict: "fail", limit: 2.5e-4 });
  });
});

describe("balanceLoad(input)", () => {
  test("without a resistor nothing is said", () =>
    expect(balanceLoad(findingsInput({ result: bankOf({ balance: { kind: "none" } }) }))).toEqual([]));
  test("watts against the derated rating, volts against the working voltage", () => {
    const [watts, volts] = balanceLoad(findingsInput());
    expect(watts).toMatchObject({ id: "balance-power", limit: 1, verdict: "pass" });
    expect(volts).toMatchObject({ id: "balance-voltage", limit: 500, verdict: "pass" });
  });
  test("the charging share is borne first: over the element's volts and watts it warns and says for how long", () => {
    // 550 V on two cells of 1 mF -10/+50 %: one stands at 550 x 1.5/2.4 = 343.75 V before it falls to its holding share.
    const unit = { ...UNIT, voltage: 450, capacitance: 1e-3, tolerance: { low: 0.1, high: 0.5 }, leakage: 1e-6 };
    const brief = briefOf({ voltage: "550 V" });
    const result = bankOf({
      unit,
      brief,
      layout: { part: "x", series: 2, parallel: 1, ties: "strings" },
      balance: { kind: "fixed", resistance: 80e3, tolerance: 0.05 },
    });
    const family = { ...FAMILIES[0]!, voltage: 300 };
    const elements = result.balance?.elements ?? 0;
    expect(elements).toBe(2);
    const found = balanceLoad(findingsInput({ unit, brief, result, family: { ...family, voltage: 160 } }));
    expect(found.map(({ id }) => id)).toEqual([
      "balance-power",
      "balance-voltage",
      "balance-power-start",
      "balance-voltage-start",
    ]);
    const [held, , watts, volts] = found;
    expect(held?.verdict).toBe("pass");
    expect(watts?.value).toBeCloseTo(343.75 ** 2 / 76e3 / 2, 9);
    expect(volts).toMatchObject({ state: "charging", verdict: "warn", limit: 160 });
    expect(volts?.value).toBeCloseTo(343.75 / 2, 9);
    // tau = (0.9 mF + 1.5 mF) x 84 kohm / 2 = 100.8 s.
    expect(volts?.note).toContain("time constant of up to 101 s");
    const hot = balanceLoad(findingsInput({ unit, brief, result, family: { ...family, power: 1.2 } }));
    expect(hot[2]).toMatchObject({ id: "balance-power-start", verdict: "warn", limit: 0.6 });
  });
  test("tolerance unknown: what it bears at first is not assessed, never passed", () => {
    const { tolerance: _t, ...unit } = UNIT;
    const result = bankOf();
    const dark = { ...result, share: { ...result.share, charging: null } };
    const found = balanceLoad(findingsInput({ unit, result: dark }));
    expect(found.slice(2).map(({ verdict }) => verdict)).toEqual(["not assessed", "not assessed"]);
  });
});

describe("bleed(input)", () => {
  test("a time with no limit given is not assessed, never passed", () =>
    expect(bleed(findingsInput())).toMatchObject({ verdict: "not assessed", limit: null }));
  test("no chain at all warns", () =>
    expect(bleed(findingsInput({ result: bankOf({ balance: { kind: "none" } }) }))).toMatchObject({
      verdict: "warn",
      value: null,
    }));
  test("tolerance unknown: the longest time is not known", () => {
    const { tolerance: _known, ...unit } = UNIT;
    expect(bleed(findingsInput({ unit }))).toMatchObject({ verdict: "not assessed", value: null });
  });
});
