import { expect, test } from "vitest";
import { cornerLines } from "../../src/cli/cornerLines.ts";
import { cornersOf } from "../../src/search/index.ts";
import { NO_CORNERS } from "../../src/search/sharing/corners.ts";
import { bankOf, briefOf, UNIT } from "../support/bank.ts";

test("cornerLines(corners, width): a line each, the reverse one below zero and rounded away from it; none for what is not assessed", () => {
  const corners = cornersOf({ result: bankOf(), unit: UNIT, brief: briefOf() });
  const text = cornerLines(corners, 80).join("\n");
  expect(text).toMatch(/worst, charging +353 V: stage 1 at -20 %, the rest at \+20 %/);
  expect(text).toMatch(/worst, dumped +-\d[\d.]* V from equal sharing/);
  const shown = Number(/dumped +(-[\d.]+) V from equal/.exec(text)?.[1]);
  expect(shown).toBeLessThanOrEqual(corners.dumped?.voltage as number);
  expect(text).toMatch(/from an endless\s+hold/);
  expect(cornerLines(NO_CORNERS, 80)).toEqual([]);
});
