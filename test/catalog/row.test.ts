// One row by the columns of its table: values in slots, every fault placed, a row too long refused whole.
import { describe, expect, test } from "vitest";
import { above, type Column, text } from "../../src/catalog/column.ts";
import { bindHeadings } from "../../src/catalog/headings.ts";
import { readRow } from "../../src/catalog/row.ts";
import { got } from "../pulse/near.ts";

const COLUMNS: readonly Column[] = [
  { heading: "part", key: "part", type: text(20), required: true },
  { heading: "capacitance", key: "capacitance", type: above("capacitance", 1e-12, 10) },
  { heading: "note", key: "note", type: text(20) },
];
const { bound } = got(bindHeadings(["note", "capacitance [uF]", "part"], COLUMNS, { file: "t.csv", line: 1 }));

function read(cells: readonly string[], decimalComma: boolean | "never" = "never") {
  const faults: string[] = [];
  const row = readRow(cells, 7, { bound, decimalComma, headings: 3, width: 3 }, (refusal, place) =>
    faults.push(`${refusal.code} ${place.line}:${place.column} ${place.field ?? ""}`.trim()),
  );
  return { row, faults };
}

describe("readRow(cells, line, table, fault)", () => {
  test("values stand in the order of the columns asked for; a blank is undefined", () =>
    expect(read(["", "4.7", "a"]).row).toEqual({ line: 7, values: ["a", 4.7e-6, undefined] }));
  test("every fault of a lost row is told, at its own column", () => {
    const { row, faults } = read(["n".repeat(21), "x", ""]);
    expect(row).toBeNull();
    expect(faults.map((f) => f.split(" ")[1]).sort()).toEqual(["7:1", "7:2", "7:3"]);
  });
  test("cells beyond the headings: blank ones pass, a filled one loses the row", () => {
    expect(read(["", "1", "a", "", ""]).row).not.toBeNull();
    expect(read(["", "1", "a", "", "b"])).toEqual({ row: null, faults: ["row-too-long 7:4"] });
  });
  test.each([".5", "5.", "1e-3", "0x10", "1.2.3", "٣"])(
    "%s takes the slow way: read by its own rules, never as NaN",
    (cell) => {
      const value = read(["", cell, "a"]).row?.values[1];
      expect(value === undefined || Number.isFinite(value)).toBe(true);
    },
  );
  test("the quick way keeps the range", () => expect(read(["", "20000000", "a"]).faults[0]).toContain("out-of-range"));
});
