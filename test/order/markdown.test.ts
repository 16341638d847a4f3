import { describe, expect, test } from "vitest";
import { billOf } from "../../src/order/index.ts";
import { billToMarkdown, markdownText } from "../../src/order/markdown.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";

describe("markdownText(text)", () => {
  test("pipes, backticks, HTML, emphasis and links show as they are", () => {
    expect(markdownText("a|b")).toBe("a\\|b");
    expect(markdownText("`x`")).toBe("\\`x\\`");
    expect(markdownText("<script>&")).toBe("&lt;script&gt;&amp;");
    expect(markdownText("[a](b) *c* _d_ \\")).toBe("\\[a\\]\\(b\\) \\*c\\* \\_d\\_ \\\\");
    expect(markdownText("https://x")).toBe("https&#58;//x");
    expect(markdownText("a\nb")).toBe("a b");
  });
});

describe("billToMarkdown(bill)", () => {
  test("every row of the table has the same number of cells, whatever the part is called", () => {
    const unit = { ...UNIT, part: "a|b`<img src=x onerror=alert(1)>\nc", note: "x || y" };
    const brief = briefOf();
    const bill = billOf({
      layout: bankOf({ unit }),
      unit,
      families: FAMILIES,
      brief,
      currency: "EUR",
      cautions: ["Beware."],
    });
    const text = billToMarkdown(bill);
    const rows = text.split("\n").filter((line) => line.startsWith("|"));
    expect(rows).toHaveLength(bill.lines.length + 2);
    for (const row of rows) expect(row.replace(/\\\|/g, "").split("|").length).toBe(20 + 2);
    expect(text).not.toContain("<img");
    expect(text).toContain("- Beware.");
    expect(text).toMatch(/Purchase cost of the priced lines: [\d.]+ EUR/);
  });
});
