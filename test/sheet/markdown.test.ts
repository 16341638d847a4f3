import { describe, expect, test } from "vitest";
import { type Block, type Sheet, sheetOf } from "../../src/sheet/index.ts";
import { sheetToMarkdown } from "../../src/sheet/markdown.ts";
import { ATTACKS } from "../support/attack.ts";
import { LOAD, sheetInput } from "../support/sheet.ts";

const of = (...blocks: readonly Block[]): Sheet => ({
  title: "T",
  layout: "L",
  rule: "R",
  date: null,
  revision: "B",
  program: "P",
  cautions: ["C"],
  footer: ["F."],
  sections: [{ id: "s", title: "S", blocks }],
});
const body = (...blocks: readonly Block[]): string =>
  /## S\n\n([\s\S]*)\n\n---\n/.exec(sheetToMarkdown(of(...blocks)))?.[1] ?? "";

describe("sheetToMarkdown(sheet)", () => {
  test("head with blanks, cautions, sections, the footer at the end", () => {
    const text = sheetToMarkdown(of({ kind: "text", text: "x" }));
    expect(text).toMatch(/^# Build sheet: T\n/);
    expect(text).toContain("| L | R | B | \\_\\_\\_\\_\\_\\_ | P |");
    expect(text).toContain("\n- C\n");
    expect(text).toMatch(/\n---\n\nF\.\n$/);
  });

  test("a table: its caption, its heads, numbers on the right, blanks to fill in", () => {
    const columns = [{ heading: "a" }, { heading: "b", side: "right" as const }];
    expect(body({ kind: "table", id: "t", caption: "Cap", columns, rows: [["x", null]] })).toBe(
      "**Cap**\n\n| a | b |\n| --- | ---: |\n| x | \\_\\_\\_\\_\\_\\_ |",
    );
  });

  test("a drawing is its words", () => {
    const props = { id: "c", title: "Chart", bars: [], limits: [] };
    expect(body({ kind: "drawing", drawn: { kind: "voltages", props }, words: "1 V." })).toBe(
      "*Chart* (drawn in the HTML sheet). 1 V.",
    );
  });

  test.each(ATTACKS.map((attack) => [JSON.stringify(attack), attack]))(
    "%s stays text in a cell, a paragraph and a list",
    (_, attack) => {
      const columns = [{ heading: "a" }];
      const text = body(
        { kind: "text", text: attack },
        { kind: "list", items: [attack] },
        { kind: "table", id: "t", caption: attack, columns, rows: [[attack]] },
      );
      expect(text).not.toMatch(/</);
      expect(text).not.toMatch(/(^|[^\\])[[\]`]/);
      expect(text).not.toMatch(/^(#|=|>|\d+[.)]|!\[)/m);
      expect(text).not.toMatch(/https?:/i);
      // Two lines of a table's head and one row, whatever stood in the cell.
      expect(text.split("\n").filter((line) => line.startsWith("|"))).toHaveLength(3);
      for (const line of text.split("\n").filter((line) => line.startsWith("|")))
        expect(line.replace(/\\./g, "").match(/\|/g)).toHaveLength(2);
    },
  );

  test("every table of a real sheet has rows as wide as its head", () => {
    const lines = sheetToMarkdown(sheetOf(sheetInput({ brief: LOAD }))).split("\n");
    let width = 0;
    for (const [i, line] of lines.entries()) {
      if (!line.startsWith("|")) continue;
      const cells = line.replace(/\\./g, "").split("|").length;
      if (!lines[i - 1]?.startsWith("|")) width = cells;
      expect(cells).toBe(width);
    }
    expect(width).toBeGreaterThan(2);
  });
});
