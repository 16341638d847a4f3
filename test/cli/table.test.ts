import { describe, expect, test } from "vitest";
import { textTable } from "../../src/cli/table.ts";
import { widthOf } from "../../src/cli/wrap.ts";

type Row = { readonly name: string; readonly n: number };
const columns = [
  { heading: "name", cell: (row: Row) => row.name, least: 4 },
  { heading: "n", cell: (row: Row) => String(row.n), side: "right" as const },
  { heading: "more", cell: () => "mmmm", rank: 1 },
  { heading: "extra", cell: () => "eeeee", rank: 2 },
];
const rows = [
  { name: "short", n: 1 },
  { name: "a longer name", n: 1000 },
];
const headings = (width: number): string => textTable(columns, rows, width).split("\n")[0]?.replace(/ +/g, " ") ?? "";

describe("textTable(columns, rows, width)", () => {
  test("aligned, numbers to the right", () => {
    expect(textTable(columns.slice(0, 2), rows, 80)).toBe(
      "name              n\nshort             1\na longer name  1000",
    );
  });

  test("rank 2 leaves first, then the soft column is cut, then rank 1 leaves", () => {
    expect(headings(80)).toBe("name n more extra");
    expect(headings(31)).toBe("name n more");
    expect(headings(20)).toBe("name n more");
    expect(textTable(columns, rows, 20)).toContain("a lon...");
    expect(headings(10)).toBe("name n");
    for (const width of [80, 30, 25, 20, 15, 10])
      for (const line of textTable(columns, rows, width).split("\n")) expect(widthOf(line)).toBeLessThanOrEqual(width);
  });

  test("text of unknown origin tears no row and carries no control", () => {
    const text = textTable(columns, [{ name: "a\nb\u001b[2J\u202ec", n: 1 }], 80);
    expect(text.split("\n")).toHaveLength(2);
    expect(text).toContain("a b\\u{1b}[2J\\u{202e}c");
  });

  test("no rows: the heading alone", () => {
    expect(textTable(columns, [], 80)).toBe("name  n  more  extra");
  });
});
