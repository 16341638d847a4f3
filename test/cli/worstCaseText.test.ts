import { expect, test } from "vitest";
import { worstCaseText } from "../../src/cli/worstCaseText.ts";
import { type PlanResult, plan } from "../../src/search/index.ts";
import { briefOf, FAMILIES, UNIT } from "../support/bank.ts";

const planned = (basis: string): PlanResult => {
  const read = plan({ brief: briefOf({ basis, risk: 1e-3, energy: "2 kJ" }), parts: [UNIT], families: FAMILIES });
  if (!read.ok) throw new Error("the plan must be understood");
  return read.value;
};

test("worstCaseText(result): units and money apart, by the plan's own figures; silent otherwise; nothing fits is said", () => {
  expect(worstCaseText(planned("worst case"))).toBe("");
  const result = planned("statistical");
  const [best, worst] = [result.layouts[0], result.worstCase];
  expect(worst?.units).toBeGreaterThan(best?.units ?? 0);
  const text = worstCaseText(result);
  expect(text).toContain(`${worst?.units} units (${(worst?.units ?? 0) - (best?.units ?? 0)} fewer here)`);
  expect(text).toContain(`${((worst?.cost?.total ?? 0) - (best?.cost?.total ?? 0)).toFixed(2)} EUR less here`);
  expect(worstCaseText({ ...result, worstCase: null })).toMatch(/nothing fits/);
});
