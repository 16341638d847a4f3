/** @jsxImportSource preact */
import { expect, test } from "vitest";
import { Foot, PageHead } from "../../../src/sheet/html/frame.tsx";
import { styleOf } from "../../../src/sheet/html/style.ts";
import { rendered } from "../../../src/sheet/render.ts";

test("PageHead: a title that cannot break out, the style as it is, nothing that is fetched", () => {
  const head = rendered(<PageHead title="</title><script>" paper="A4" />);
  expect(head).toContain("<title>&lt;/title>&lt;script></title>");
  expect(head).toContain(`<style>${styleOf("A4")}</style>`);
  expect(head).not.toMatch(/<script|<link|src=|href=/);
  expect(rendered(<PageHead title="x" paper="Letter" narrow />)).toContain(styleOf("Letter", true));
});

test("Foot: the layout and what is said on every page", () => {
  expect(rendered(<Foot layout="a <b>" words={["One.", "Two."]} />)).toBe(
    '<footer class="foot"><p>a &lt;b>. One. Two.</p></footer>',
  );
});
