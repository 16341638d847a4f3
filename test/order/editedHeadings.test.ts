import { describe, expect, test } from "vitest";
import { plainWord, readHeadings } from "../../src/order/editedHeadings.ts";

const at = { file: "bill.csv", line: 1 };
const codes = (cells: readonly string[]) => {
  const read = readHeadings(cells, at);
  return read.ok ? [] : read.refusals.map(({ code, place }) => [code, place.column ?? null]);
};

describe("readHeadings(cells, at)", () => {
  test("without item or line it is no bill; a heading twice is refused by its column, also an own one", () => {
    expect(codes([])).toEqual([
      ["missing-heading", null],
      ["missing-heading", null],
    ]);
    expect(codes(["item", "value"])).toEqual([["missing-heading", null]]);
    expect(codes(["item", "line", "shelf", "Shelf"])).toEqual([["duplicate-heading", 4]]);
    expect(codes(["item", "line", "mark", "mark"])).toEqual([["duplicate-heading", 4]]);
  });

  test("known columns by their heading in any order and case, blanks passed over, the rest the builder's own", () => {
    const read = readHeadings(["Line", "", "who  buys", "ITEM", "mark", "'=shelf"], at);
    expect(read.ok && read.value.columns.map(({ column, index }) => [column.key, index])).toEqual([
      ["line", 0],
      ["item", 3],
    ]);
    expect(read.ok && read.value.extra).toEqual([
      { heading: "who  buys", index: 2 },
      { heading: "=shelf", index: 5 },
    ]);
    expect(read.ok && [read.value.mark, read.value.count]).toEqual([4, 6]);
  });

  test("no mark is no fault", () => {
    const read = readHeadings(["item", "line"], at);
    expect(read.ok && read.value.mark).toBe(-1);
  });
});

test("plainWord(text): case and blanks do not count", () => {
  expect(plainWord("  Unit \n Price ")).toBe("unit price");
});
