// Tables: which columns stay, how wide they are, and rows of exactly that width.
import { describe, expect, test } from "vitest";
import { type Column, columnsFor, headingRow, snug, tableRow, widen } from "../../src/tui/columns.ts";
import { drawRow, span } from "../../src/tui/row.ts";

const column = (title: string, width: number, priority: number, side: "left" | "right" = "left"): Column<string> => ({
  title,
  width,
  priority,
  side,
  cell: (text) => span(text),
});
const columns = [column("a", 4, 0), column("b", 6, 2, "right"), column("c", 3, 1)];
const titles = (list: readonly Column<string>[]) => list.map(({ title }) => title);

describe("columnsFor(columns, width)", () => {
  test.each([
    [0, ["a"]],
    [7, ["a"]],
    [8, ["a", "c"]],
    [14, ["a", "c"]],
    [15, ["a", "b", "c"]],
  ])("in %i cells keeps %j", (width, want) => {
    expect(titles(columnsFor(columns, width))).toEqual(want);
  });
});

test("widen gives the rest to one column, up to its most", () => {
  expect(widen(columns, "a", 20, 99).map(({ width }) => width)).toEqual([9, 6, 3]);
  expect(widen(columns, "a", 20, 5).map(({ width }) => width)).toEqual([5, 6, 3]);
  expect(widen(columns, "a", 3, 99).map(({ width }) => width)).toEqual([4, 6, 3]);
});

test("snug narrows to the longest cell or the title, never widens", () => {
  expect(snug(columns, ["xx"]).map(({ width }) => width)).toEqual([2, 2, 2]);
  expect(snug(columns, []).map(({ width }) => width)).toEqual([1, 1, 1]);
  expect(snug(columns, ["x".repeat(50)]).map(({ width }) => width)).toEqual([4, 6, 3]);
  expect(snug(columns, ["\x1b\u202e漢"]).map(({ width }) => width)).toEqual([2, 2, 2]);
});

test("rows are as wide as their columns, whatever is in them", () => {
  const look = { colour: false, ascii: false };
  expect(drawRow(headingRow(columns), 80, look)).toBe("a         b c  ");
  expect(drawRow(tableRow(columns, "漢字漢字"), 80, look)).toBe("漢…   漢字… 漢…");
  expect(drawRow(tableRow(columns, "\x1b[2Jx"), 80, look)).toBe("[2Jx   [2Jx [2…");
});
