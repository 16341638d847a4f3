import { describe, expect, test } from "vitest";
import { governedLines, governedOf } from "../../src/sheet/governed.ts";
import { BARE, sheetInput } from "../support/sheet.ts";

const verdicts = (wishes: Parameters<typeof sheetInput>[0]) =>
  governedOf(sheetInput(wishes)).map(({ id, verdict }) => [id, verdict]);

describe("governedOf(input)", () => {
  test("the rule's own time judges the bleed: over it fails, a dump within it warns", () => {
    expect(verdicts({ rule: "iec-60204-residual" })).toEqual([["rule-time", "fail"]]);
    expect(verdicts({ rule: "iec-60204-residual", brief: { dumpResistance: "1 kohm" } })).toEqual([
      ["rule-time", "warn"],
    ]);
    expect(verdicts({ rule: "iec-60204-residual", unit: BARE })).toEqual([["rule-time", "not assessed"]]);
    expect(verdicts({})).toEqual([]);
  });
  test("a rule for lower voltages is out of its scope at 2 kV, and a touch-safe voltage over 60 V is told", () => {
    expect(verdicts({ rule: "nec-460-6" })[0]).toEqual(["rule-scope", "warn"]);
    expect(verdicts({ brief: { touchSafe: "5 kV" } })).toEqual([["touch-safe-high", "warn"]]);
  });
});

describe("governedLines(input)", () => {
  test("a line only where the rule does not speak of this bank", () => {
    expect(governedLines(sheetInput({ rule: "nec-460-6" })).join()).toMatch(/460\.6.*2 kV.*out of its scope/);
    expect([governedLines(sheetInput({ rule: "nec-460-28" })), governedLines(sheetInput())]).toEqual([[], []]);
  });
});
