import { describe, expect, test } from "vitest";
import { cautionsOf } from "../../src/cli/cautions.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

const ids = (...from: Parameters<typeof cautionsOf>): string[] => cautionsOf(...from).map(({ id }) => id);
const brief = briefOf();

describe("cautionsOf(brief, bank)", () => {
  test("without a bank the standing ones and the deference are said", () => {
    expect(ids(brief)).toEqual(expect.arrayContaining(["kills-when-off", "not-approval", "local-codes"]));
    expect(ids(brief)).not.toContain("reverse");
  });

  test("what the bank is adds its own", () => {
    expect(ids(brief, { layout: bankOf(), unit: UNIT })).toEqual(
      expect.arrayContaining(["ends-are-not-units", "reverse"]),
    );
    const oil = { ...UNIT, technology: "oil-paper", polarised: false };
    expect(ids(brief, { layout: bankOf({ unit: oil }), unit: oil })).toContain("old-oil");
    expect(ids(brief, { layout: bankOf({ unit: oil }), unit: oil })).not.toContain("reverse");
    const single = bankOf({ layout: { part: "x", series: 1, parallel: 2, ties: "strings" } });
    expect(ids(brief, { layout: single, unit: UNIT })).not.toContain("ends-are-not-units");
  });

  test("arc blast from 10 kJ", () => {
    const large = bankOf({ layout: { part: "x", series: 8, parallel: 40, ties: "cross-tied" } });
    expect(ids(brief, { layout: large, unit: UNIT })).toContain("blast");
    expect(ids(brief, { layout: bankOf(), unit: UNIT })).not.toContain("blast");
  });
});
