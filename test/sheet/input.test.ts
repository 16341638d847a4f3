import { expect, test } from "vitest";
import { sheetOf } from "../../src/sheet/index.ts";
import { BARE, sheetInput, WORDS } from "../support/sheet.ts";

test("a SheetInput of which nothing is known but the unit's capacitance and rating still makes a sheet, of blanks", () => {
  const empty = { ...WORDS, asked: [], findings: [], cautions: [] };
  const sheet = sheetOf(sheetInput({ unit: BARE, words: empty, faults: [], currency: null }));
  expect(sheet.sections).toHaveLength(20);
  const cells = sheet.sections
    .flatMap(({ blocks }) => blocks)
    .flatMap((block) => (block.kind === "table" ? block.rows.flat() : []));
  expect(cells.filter((cell) => cell === null).length).toBeGreaterThan(400);
  expect(cells.filter((cell) => /NaN|undefined|Infinity|unlimited/.test(cell ?? ""))).toEqual([]);
});
