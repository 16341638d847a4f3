// The shape of a finding: every verdict and every state of a bank can be written, and nothing else.
import { describe, expect, expectTypeOf, test } from "vitest";
import type { BankState, Finding, Verdict } from "../../src/quantity/finding.ts";

describe("Finding", () => {
  test("verdicts and states are these", () => {
    expectTypeOf<Verdict>().toEqualTypeOf<"pass" | "warn" | "fail" | "not assessed">();
    expectTypeOf<BankState>().toEqualTypeOf<"charging" | "holding" | "dumped" | "pulse" | "faulted" | "stored">();
  });
  test("an unknown value is null and survives JSON as null, not as zero", () => {
    const one: Finding = {
      id: "x",
      state: "stored",
      verdict: "not assessed",
      value: null,
      limit: 5,
      margin: null,
      unit: "V",
      source: "x",
      note: "",
    };
    expect(JSON.parse(JSON.stringify(one))).toEqual(one);
  });
});
