// What the bank gives and bears at rest, as findings: worked by hand on a bank of eight in series, two in parallel.
import { describe, expect, test } from "vitest";
import { balanceLoad, bleed, energy, steadySupply } from "../../src/search/dutyFindings.ts";
import { bankOf, briefOf, findingsInput, UNIT } from "../support/bank.ts";

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
