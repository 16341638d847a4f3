import { expect, test } from "vitest";
import { SHEET_FORMATS, sheetOf, sheetText } from "../../src/sheet/index.ts";
import { sheetInput } from "../support/sheet.ts";

test("sheetText(sheet, format): both formats, each ending in a line break", () => {
  const sheet = sheetOf(sheetInput());
  const [html, md] = SHEET_FORMATS.map((format) => sheetText(sheet, format)) as [string, string];
  expect(html).toMatch(/^<!DOCTYPE html>\n<html lang="en">[\s\S]*<\/html>\n$/);
  expect(md).toMatch(/^# Build sheet: [\s\S]*\n$/);
  for (const { title } of sheet.sections) expect(md).toContain(`## ${title.replace(/[()]/g, "\\$&")}`);
});
