import { describe, expect, test } from "vitest";
import { factsOf } from "../../src/sheet/facts.ts";
import { ruleName, toldRule } from "../../src/sheet/rules.ts";
import { waysDown } from "../../src/sheet/ways.ts";
import { BARE, sheetInput } from "../support/sheet.ts";

describe("factsOf(input)", () => {
  test("V with overshoot, C and R at their high ends, the touch-safe voltage of the brief", () => {
    const input = sheetInput({ brief: { overshoot: "5 %" } });
    const facts = factsOf(input);
    expect(facts.voltage).toBeCloseTo(2100, 9);
    // 1000 uF +20 %, 2 in parallel, 8 in series.
    expect(facts.capacitance).toBeCloseTo(300e-6, 12);
    expect(facts.stored).toBeCloseTo((300e-6 * 2100 ** 2) / 2, 6);
    expect(facts.chain).toBeCloseTo((input.layout.balance?.resistance ?? Number.NaN) * 1.05 * 8, 6);
    expect(facts).toMatchObject({
      chains: 1,
      clear: 60,
      allowed: null,
      rule: "the brief's touch-safe voltage",
      dump: null,
    });
  });

  test("a chosen rule sets level and time, and says how far its text was read", () => {
    const facts = factsOf(sheetInput({ rule: "nec-460-28" }));
    expect(facts).toMatchObject({ clear: 50, allowed: 300 });
    expect(facts.rule).toMatch(/460\.28, from memory: confirm against the text$/);
    expect([ruleName("nfpa-70e-360"), toldRule("nfpa-70e-360")]).toEqual([
      "NFPA 70E Article 360 (2021, 2024)",
      "NFPA 70E Article 360 (2021, 2024), second hand",
    ]);
    expect(toldRule("lbnl-thermal")).not.toMatch(/memory|hand/);
  });

  test("what is not known stays so: no tolerance, no capacitance at its high end, no stored energy, no time", () => {
    const facts = factsOf(sheetInput({ unit: BARE, brief: { dumpResistance: "1 kohm" } }));
    expect(facts).toMatchObject({ capacitance: null, stored: null });
    expect(waysDown(facts, { from: 2000, to: 60 })).toEqual({ chains: null, oneOpen: null, dump: null });
  });
});
