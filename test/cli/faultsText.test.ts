import { expect, test } from "vitest";
import { faultsText } from "../../src/cli/faultsText.ts";
import { joinedFacts } from "../../src/cli/joined.ts";
import { widthOf } from "../../src/cli/wrap.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

test("faultsText(faults, width): one row a fault, unknown peaks said, within the width", () => {
  const { faults } = joinedFacts({ layout: bankOf(), unit: UNIT, brief: briefOf() });
  const text = faultsText(faults, 80);
  for (const { id } of faults) expect(text).toContain(id.replaceAll("-", " "));
  for (const line of text.split("\n")) expect(widthOf(line)).toBeLessThanOrEqual(80);
  expect(text).toMatch(/unknown/);
  expect(text).toMatch(/after the hold/);
  expect(text.replace(/\s+/g, " ")).toMatch(/its own [\d.]+ \w*J, [\d.]+ \w*J from others; both at most/);
  expect(text).not.toMatch(/NaN|null|undefined/);
});
