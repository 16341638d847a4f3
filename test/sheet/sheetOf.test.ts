import { describe, expect, test } from "vitest";
import { sheetOf } from "../../src/sheet/index.ts";
import { LOAD, largeInput, placedIn, sheetInput } from "../support/sheet.ts";

/** Everything that is printed as text of a sheet. */
const printed = (sheet: ReturnType<typeof sheetOf>): readonly string[] =>
  sheet.sections.flatMap(({ blocks }) =>
    blocks.flatMap((block) => {
      if (block.kind === "text") return [block.text];
      if (block.kind === "list") return [...block.items];
      if (block.kind === "drawing") return [block.words];
      return [
        block.caption,
        ...block.columns.map(({ heading }) => heading),
        ...block.rows.flat().filter((cell) => cell !== null),
      ];
    }),
  );

const SHEETS = [
  sheetInput(),
  sheetInput({ brief: { ...LOAD, dumpResistance: "1 kohm" }, rule: "nfpa-70e-360" }),
  sheetInput({ shape: { ties: "strings" }, brief: LOAD }),
  sheetInput({ shape: { series: 1, parallel: 1, ties: "strings" }, brief: { voltage: "300 V", energy: "10 J" } }),
  largeInput(),
].map((input) => [input.layout.id, input] as const);

describe("sheetOf(input)", () => {
  test.each(SHEETS)("%s: every section once, rows as wide as their table, no number that is none", (_, input) => {
    for (const given of [input, { ...input, placed: placedIn(input) }]) {
      const sheet = sheetOf(given);
      const ids = sheet.sections.map(({ id }) => id);
      expect(new Set(ids).size).toBe(ids.length);
      const tables = sheet.sections.flatMap(({ blocks }) => blocks).filter((block) => block.kind === "table");
      expect(new Set(tables.map(({ id }) => id)).size).toBe(tables.length);
      for (const table of tables)
        expect(table.rows.filter((row) => row.length !== table.columns.length).map((row) => [table.id, row])).toEqual(
          [],
        );
      expect(printed(sheet).filter((words) => /NaN|undefined|Infinity|\[object|unlimited|null/.test(words))).toEqual(
        [],
      );
    }
  });

  test("same input, same sheet; date and revision only when they are given", () => {
    const input = sheetInput({ brief: LOAD });
    expect(JSON.stringify(sheetOf(input))).toBe(JSON.stringify(sheetOf(input)));
    expect(sheetOf(input)).toMatchObject({ date: null, revision: null });
    expect(sheetOf({ ...input, date: "d", revision: "r" })).toMatchObject({ date: "d", revision: "r" });
  });

  test("the cautions all stand at the head, and those of every page in the footer", () => {
    const sheet = sheetOf(sheetInput());
    expect(sheet.cautions).toHaveLength(4);
    expect(sheet.footer).toEqual(["A charged bank can kill.", "This is a calculation.", "Follow the codes in force."]);
  });

  test("the rule that governs is named on the sheet", () => {
    expect(sheetOf(sheetInput()).rule).toBe("the brief's touch-safe voltage");
    expect(sheetOf(sheetInput({ brief: { touchSafeRule: "house rule 7" } })).rule).toMatch(/\(house rule 7\)$/);
    expect(sheetOf(sheetInput({ rule: "nec-460-6" })).rule).toMatch(/^NEC \(NFPA 70\) 460\.6, second hand$/);
  });
});
