import { expect, test } from "vitest";
import { revisionSection, shotLogSection } from "../../../src/sheet/sections/records.ts";
import { sheetInput, tableOf } from "../../support/sheet.ts";

test("shotLogSection() is numbered lines to fill in", () => {
  const { rows } = tableOf({ sections: [shotLogSection()] }, "shot-log");
  expect(rows.map((row) => row[0])).toEqual(Array.from({ length: 24 }, (_, i) => `${i + 1}`));
  expect(rows.every((row) => row.slice(1).every((cell) => cell === null))).toBe(true);
});

test("revisionSection(input): date and revision as given, blanks when not: no clock is read", () => {
  const first = (input: ReturnType<typeof sheetInput>) =>
    tableOf({ sections: [revisionSection(input)] }, "revisions").rows[0];
  expect(first(sheetInput({ date: "2 March", revision: "B" }))).toEqual(["B", "2 March", null, null, null, null]);
  expect(first(sheetInput())).toEqual([null, null, null, null, null, null]);
});
