import { describe, expect, test } from "vitest";
import { billToHtml, htmlText } from "../../src/order/html.ts";
import { billOf } from "../../src/order/index.ts";
import { bankOf, briefOf, FAMILIES, UNIT } from "../support/bank.ts";

describe("htmlText(text)", () => {
  test("tags, quotes, entities and unseen characters show as they are", () => {
    expect(htmlText(`<a href="x" o='y'>&amp;\``)).toBe("&lt;a href=&quot;x&quot; o=&#39;y&#39;&gt;&amp;amp;&#96;");
    expect(htmlText("\u202ea")).toBe("\\u{202e}a");
  });
});

describe("billToHtml(bill)", () => {
  test("has one row a line, and only the tags of the table itself", () => {
    const unit = { ...UNIT, part: "</td><script>alert(1)</script>" };
    const brief = briefOf();
    const bill = billOf({
      layout: bankOf({ unit }),
      unit,
      families: FAMILIES,
      brief,
      currency: "EUR",
      cautions: ["<b>"],
    });
    const text = billToHtml(bill);
    expect(text.match(/<tr>/g)).toHaveLength(bill.lines.length + 1);
    const tags = new Set([...text.matchAll(/<\/?([a-z0-9]+)/gi)].map((m) => m[1]));
    expect([...tags].sort()).toEqual(
      [
        "body",
        "h1",
        "head",
        "html",
        "li",
        "meta",
        "p",
        "table",
        "tbody",
        "td",
        "th",
        "thead",
        "title",
        "tr",
        "ul",
      ].sort(),
    );
  });
});
