import { describe, expect, test } from "vitest";
import { governedFindings, inScope, TOUCH_SAFE } from "../../src/hazard/governed.ts";

const bank = { voltage: 1100, allowed: null, chains: 100, dump: null } as const;

describe("inScope(rule, voltage)", () => {
  // Ranges as the rows of the decay rules tell them; NEC 460.6 by its older edition, the safe side.
  test.each([
    ["nec-460-6", 600, 601],
    ["iec-60831-decay", 1000, 1001],
    ["lbnl-thermal", 99, 100],
    ["nec-460-28", 600, 599],
    ["iec-60871-decay", 1000, 999],
    ["iec-61010-energy", 15e3, 14.9e3],
  ] as const)("%s speaks of %d V and not of %d V", (rule, within, beyond) => {
    expect([inScope(rule, within), inScope(rule, beyond)]).toEqual([true, false]);
  });
  test("a rule without a range speaks of every voltage", () => {
    expect([inScope("iec-61010-touch", 1), inScope("iec-60204-residual", 1e5)]).toEqual([true, true]);
    expect(TOUCH_SAFE).toBe(60);
  });
});

describe("governedFindings(bank)", () => {
  test("beyond its scope a rule warns with its edge; within it nothing is said", () => {
    expect(governedFindings({ ...bank, rule: "nec-460-6" })).toMatchObject([
      { id: "rule-scope", verdict: "warn", value: 1100, limit: 600, note: expect.stringMatching(/OUT OF ITS SCOPE/) },
    ]);
    expect(governedFindings({ ...bank, rule: "nec-460-28" })).toEqual([]);
  });
  test("time: the chains pass, at the limit too; the dump alone warns; neither fails; not known is not assessed", () => {
    const of = (chains: number | null, dump: number | null) =>
      governedFindings({ ...bank, rule: "nec-460-28", allowed: 300, chains, dump })[0]?.verdict;
    expect([of(300, null), of(301, 2), of(301, null), of(301, 301), of(Number.POSITIVE_INFINITY, null)]).toEqual([
      "pass",
      "warn",
      "fail",
      "fail",
      "fail",
    ]);
    expect(of(null, 2)).toBe("not assessed");
  });
});
