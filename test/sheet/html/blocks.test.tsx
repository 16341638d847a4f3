/** @jsxImportSource preact */
import { describe, expect, test } from "vitest";
import { BlockView } from "../../../src/sheet/html/blocks.tsx";
import type { Block, Table } from "../../../src/sheet/index.ts";
import { rendered } from "../../../src/sheet/render.ts";

const html = (block: Block): string => rendered(<BlockView block={block} />);
const table = (rows: Table["rows"]): Table => ({
  kind: "table",
  id: "x",
  caption: "A <caption>",
  columns: [{ heading: "name" }, { heading: "value", side: "right" }, { heading: "hand", written: true }],
  rows,
});

describe("BlockView({ block })", () => {
  test("text and lists, escaped", () => {
    expect(html({ kind: "text", text: "a <b> & c" })).toBe("<p>a &lt;b> &amp; c</p>");
    expect(html({ kind: "list", items: ["x", "<y>"] })).toBe("<ul><li>x</li><li>&lt;y></li></ul>");
  });

  test("a table: caption, heads with scope, the first cell names its row, null is a blank to write in", () => {
    const page = html(
      table([
        ["r", "1 V", null],
        [null, "", null],
      ]),
    );
    expect(page).toContain('<table id="t-x"><caption>A &lt;caption></caption>');
    expect(page).toContain('<th scope="col" class="right">value</th><th scope="col" class="written">hand</th>');
    expect(page).toContain('<tr><th scope="row">r</th><td class="figure">1 V</td><td></td></tr>');
    expect(page).toContain('<tr><td></td><td class="none"></td><td></td></tr>');
  });

  test("a word longer than a column is kept wide for may be broken; a figure keeps its unit beside it", () => {
    const page = html(table([["x".repeat(40), "a sentence on the right side", "short"]]));
    expect(page).toContain('<th scope="row" class="long">');
    expect(page).toContain('<td class="right">a sentence');
    expect(page).toContain("<td>short</td>");
  });

  test("a drawing is its figures", () => {
    const props = { id: "c", title: "t", bars: [{ words: "charging", nominal: 1, worst: 2 }], limits: [] };
    expect(html({ kind: "drawing", drawn: { kind: "voltages", props }, words: "w" })).toMatch(
      /^<figure><svg [\s\S]*<figcaption>/,
    );
  });
});
