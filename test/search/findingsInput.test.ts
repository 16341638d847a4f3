// The input of the findings: its corners are those of the same bank, and all findings come from it in their order.
import { expect, test } from "vitest";
import { findingsOf } from "../../src/search/findings.ts";
import type { Cornered } from "../../src/search/findingsInput.ts";
import { cornersOf } from "../../src/search/index.ts";
import { bankOf, findingsInput } from "../support/bank.ts";

test("the corner behind the worst charging voltage gives that voltage", () => {
  const input: Cornered = findingsInput();
  expect(input.corners.charging?.voltage).toBeCloseTo(input.result.share.charging as number, 9);
  expect(input.corners).toEqual(cornersOf(input));
});

test("an assessed layout carries just the findings of its own input", () => {
  expect(findingsOf(findingsInput())).toEqual(bankOf().findings);
  expect(
    bankOf()
      .findings.map((f) => f.id)
      .slice(0, 3),
  ).toEqual(["charging-share", "holding-share", "balance-power"]);
});
