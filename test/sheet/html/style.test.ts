import { expect, test } from "vitest";
import { PAPERS, styleOf } from "../../../src/sheet/html/style.ts";

test("styleOf(paper): the paper's own page, and nothing that escaping would change or a browser would fetch", () => {
  for (const paper of PAPERS) {
    expect(styleOf(paper)).toContain(`size: ${paper} portrait`);
    expect(styleOf(paper)).not.toMatch(/["'&<]|url\(|@import|expression/);
  }
  const [css] = PAPERS.map((paper) => styleOf(paper)) as [string];
  for (const rule of [
    "table-footer-group",
    "table-header-group",
    "break-inside: avoid",
    "break-before: page",
    "break-after: avoid",
  ])
    expect(css).toContain(rule);
  expect([...css].filter((c) => c === "{")).toHaveLength([...css].filter((c) => c === "}").length);
  // Black on white: no other colour is named.
  expect(css.replaceAll("#door", "").replaceAll("#limits", "")).not.toMatch(/#(?!fff\b|000\b)/);
});
