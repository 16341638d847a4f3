import { describe, expect, test } from "vitest";
import { RULES } from "../../../src/hazard/index.ts";
import { factsOf } from "../../../src/sheet/facts.ts";
import { ruleTable } from "../../../src/sheet/sections/hazardRules.ts";
import { BARE, sheetInput } from "../../support/sheet.ts";

const rows = (wishes: Parameters<typeof sheetInput>[0] = {}) => {
  const input = sheetInput(wishes);
  return ruleTable(input, factsOf(input)).rows;
};

describe("ruleTable(input, facts)", () => {
  test("one row a rule, each as wide as the table; a rule of time alone has no level", () => {
    expect(rows()).toHaveLength(RULES.length);
    const plug = rows().find((row) => row[0]?.includes("6.10.3"));
    expect(plug?.slice(3)).toEqual(["no level", "no level", "no level", "no level", "5 s"]);
  });

  test("a level that the bank never reaches is cleared at once: 350 mJ above 15 kV of a bank at 2 kV", () => {
    const row = rows({ brief: { dumpResistance: "1 kohm" } }).find((one) => one[2]?.startsWith("Above 15 kV"));
    expect(row?.slice(3, 7)).toEqual(["15 kV", "0 s", "0 s", "0 s"]);
  });

  test("no tolerance: levels and times are blanks, what the rule gives still stands", () => {
    const row = rows({ unit: BARE }).find((one) => one[0]?.includes("460.6"));
    expect(row?.slice(3)).toEqual([null, "no chain", "no chain", null, "60 s"]);
  });
});
