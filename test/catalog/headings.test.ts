// Headings bound to columns: order, units, the quick way, and what is told of a heading that nobody asked for.
import { describe, expect, test } from "vitest";
import { above, type Column, text } from "../../src/catalog/column.ts";
import { bindHeadings } from "../../src/catalog/headings.ts";
import { codesOf, got } from "../pulse/near.ts";

const COLUMNS: readonly Column[] = [
  { heading: "currency", key: "currency", type: { kind: "currency" } },
  { heading: "price", key: "price", type: { kind: "price" } },
  { heading: "capacitance", also: ["cap"], key: "capacitance", type: above("capacitance", 1e-12, 10), required: true },
  { heading: "note", key: "note", type: text(20) },
];
const bind = (...cells: string[]) => bindHeadings(cells, COLUMNS, { file: "t.csv", line: 1 });

describe("bindHeadings(cells, columns, at)", () => {
  test("blank headings are nothing; what is bound comes in the order of the columns, currency before price", () => {
    const { bound, notes } = got(bind("price", "", "Cap [nF]", "currency"));
    expect(bound.map((b) => [b.column.key, b.index, b.slot])).toEqual([
      ["currency", 3, 0],
      ["price", 0, 1],
      ["capacitance", 2, 2],
    ]);
    expect(notes).toEqual([]);
  });
  test("the quick way is for quantities by whole decades alone", () => {
    const quick = (heading: string) => got(bind(heading, "note")).bound.map((b) => b.quick);
    expect(quick("cap [uF]")).toEqual([{ suffix: "e-6", least: 1e-12, most: 10 }, null]);
    expect(quick("cap")).toEqual([null, null]);
  });
  test("a heading near to a known one is told with it, and costs nothing", () => {
    const [note] = got(bind("cap", "nota")).notes;
    expect(note?.place).toEqual({ file: "t.csv", line: 1, column: 2 });
    expect(note?.want).toContain('perhaps "note"');
  });
  test("nothing at all: the required one is missing, and no headings were read", () => {
    const read = bind();
    expect(codesOf(read)).toEqual(["missing-heading"]);
    expect(read.ok ? "" : read.refusals[0]?.read).toBe("no headings");
  });
});
