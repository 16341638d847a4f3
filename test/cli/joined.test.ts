import { expect, test } from "vitest";
import { JOINED, joinedFacts } from "../../src/cli/joined.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

const bank = (basis: string) => ({ layout: bankOf(), unit: UNIT, brief: briefOf({ basis }) });

test("joinedFacts(bank): only what is joined, and risk only with the statistical basis", () => {
  const joined = { faults: () => [{ id: "unit-short" }], risk: () => ({ exceed: 1e-5, error: 1e-7 }) };
  expect(joinedFacts(bank("worst case"), { faults: null, risk: null })).toEqual({});
  expect(joinedFacts(bank("worst case"), joined)).toEqual({ faults: [{ id: "unit-short" }] });
  expect(joinedFacts(bank("statistical"), joined)).toHaveProperty("risk.exceed", 1e-5);
  for (const key of Object.keys(joinedFacts(bank("statistical")))) expect(Object.keys(JOINED)).toContain(key);
});
