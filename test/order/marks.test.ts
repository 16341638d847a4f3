import { describe, expect, test } from "vitest";
import { toBeChosen } from "../../src/order/chosenLine.ts";
import { cellText } from "../../src/order/columns.ts";
import { BILL_VERSION, BUILDERS_COLUMNS, isChanged, marked, markVersion, plainCell } from "../../src/order/marks.ts";

const line = marked(toBeChosen({ item: "lug", line: "lugs", needed: 32, note: "Two to each unit." }));

describe("marks", () => {
  test("markVersion(mark): no mark is null, any other version is read", () => {
    expect(["", "abc", "v.x", "v1", "v2.0", line.mark].map(markVersion)).toEqual([
      null,
      null,
      null,
      null,
      2,
      BILL_VERSION,
    ]);
  });

  test("isChanged(mark, key, cell): nothing as written, each cell alone when another text stands there", () => {
    for (const column of BUILDERS_COLUMNS) {
      const cell = cellText(line, column);
      expect(isChanged(line.mark, column.key, cell), column.heading).toBe(false);
      expect(isChanged(line.mark, column.key, ` ${cell} `), column.heading).toBe(false);
      expect(isChanged(line.mark, column.key, `${cell}x`), column.heading).toBe(true);
    }
    expect(isChanged(line.mark, "purchase", "12")).toBe(false);
  });

  test("plainCell(text): blanks are one, unseen characters are seen", () => {
    expect(plainCell("  a \n b\u200b ")).toBe("a b\\u{200b}");
  });

  test("20,000 prices from 0.01 up have 20,000 sums", () => {
    const marks = new Set(Array.from({ length: 20_000 }, (_, i) => marked({ ...line, unitPrice: (i + 1) / 100 }).mark));
    // Of 2e8 pairs among 2e9 sums one meets by chance in ten such runs; these are always the same.
    expect(marks.size).toBe(20_000);
  });
});
