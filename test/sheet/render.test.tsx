/** @jsxImportSource preact */
// Attacks on the one place where elements become text.
import { describe, expect, test } from "vitest";
import { rendered } from "../../src/sheet/render.ts";
import { ATTACKS, wellFormed } from "../support/svg.ts";

const HIDDEN = /[\p{Cc}\p{Cf}\p{Cs}\p{Co}\p{Cn}\p{Zl}\p{Zp}]/u;

describe("rendered(vnode)", () => {
  test("a tree becomes markup, the same each time", () => {
    const tree = <p id="a">{"1 < 2"}</p>;
    expect(rendered(tree)).toBe('<p id="a">1 &lt; 2</p>');
    expect(rendered(tree)).toBe(rendered(<p id="a">{"1 < 2"}</p>));
  });

  test.each(ATTACKS)("%j stays text, in content and in an attribute", (attack) => {
    const markup = rendered(
      <p title={attack} data-x={attack}>
        {attack}
        <b>{attack}</b>
      </p>,
    );
    expect(markup.match(/<[a-z/!?][^>]*/gi)?.map((tag) => tag.split(/[\s>]/)[0])).toEqual(["<p", "<b", "</b", "</p"]);
    expect([...markup.matchAll(/\s([a-z-]+)="/g)].map(([, name]) => name)).toEqual(["title", "data-x"]);
    expect(markup.replaceAll("\n", "")).not.toMatch(HIDDEN);
    expect(markup).not.toContain("]]>");
    expect(wellFormed(markup)).toBe(true);
  });

  test("a line break of our own stays", () => {
    expect(rendered(<pre>{"a\nb"}</pre>)).toBe("<pre>a\nb</pre>");
  });
});
