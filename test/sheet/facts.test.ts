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

describe("factsOf(input): a wait is never for more than the usual touch-safe voltage", () => {
  test.each(["lbnl-thermal", "iec-61010-energy"] as const)(
    "%s, which this bank never breaks, shortens nothing",
    (rule) => {
      const facts = factsOf(sheetInput({ rule }));
      expect(facts).toMatchObject({ clear: 60 });
      expect(facts.clearBy).toMatch(/^touch-safe by default; .* is never passed by this bank$/);
    },
  );

  test("a brief's 5 kV, and a rule of 75 V: down to 60 V all the same, and why; a stricter brief or rule goes lower", () => {
    expect(factsOf(sheetInput({ brief: { touchSafe: "5 kV" } }))).toMatchObject({
      clear: 60,
      clearBy: "touch-safe by default; the brief's touch-safe voltage, is never passed by this bank",
    });
    expect(factsOf(sheetInput({ rule: "iec-60831-decay" }))).toMatchObject({ clear: 60, level: 75 });
    expect(factsOf(sheetInput({ rule: "iec-60831-decay", brief: { touchSafe: "30 V" } }))).toMatchObject({
      clear: 30,
      clearBy: expect.stringMatching(/^the brief's touch-safe voltage; IEC 60831-1.*asks only 75 V$/),
    });
    expect(factsOf(sheetInput({ rule: "nec-460-28", brief: { touchSafe: "5 kV" } })).clear).toBe(50);
  });

  test("a rule that gives a time and no level is held to 60 V where the brief is laxer", () => {
    expect(factsOf(sheetInput({ rule: "iec-61010-plug", brief: { touchSafe: "5 kV" } })).level).toBe(60);
  });
});
