// The respects of a comparison: every one reads any layout, and what is told in a sentence can be measured.
import { expect, test } from "vitest";
import type { LayoutResult } from "../../src/search/index.ts";
import { RESPECTS } from "../../src/tui/respects.ts";
import { BRIEF, engine } from "../support/stock.ts";

test("RESPECTS: a text for every layout; a gain has an amount, a value and a better end; labels are apart", () => {
  const read = engine.readBrief(BRIEF);
  if (!read.ok) throw new Error("brief");
  const layout = engine.check(read.value, { part: "film-d", series: 3, parallel: 40, ties: "strings" }) as LayoutResult;
  for (const { text, gain, amount, value, better } of RESPECTS) {
    expect(text(layout)).not.toBe("");
    if (gain !== undefined)
      expect([typeof amount, typeof value, typeof better]).toEqual(["function", "function", "string"]);
    if (gain !== undefined) expect(gain).toContain("{}");
  }
  expect(new Set(RESPECTS.map(({ label }) => label)).size).toBe(RESPECTS.length);
});
