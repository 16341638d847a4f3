import { expect, test } from "vitest";
import { askedSection } from "../../../src/sheet/sections/asked.ts";
import { sheetInput, tableOf, WORDS, wordsIn } from "../../support/sheet.ts";

test("askedSection(input): what was given apart from what is a default, and the remarks", () => {
  const section = askedSection(sheetInput({ words: { ...WORDS, notes: ["No bus was given."] } }));
  expect(tableOf({ sections: [section] }, "asked").rows).toEqual([
    ["energy of one pulse", "500 J", "given"],
    ["derating", "90 %", "default"],
  ]);
  expect(wordsIn(section)).toMatch(/No bus was given/);
  expect(askedSection(sheetInput()).blocks).toHaveLength(1);
});
