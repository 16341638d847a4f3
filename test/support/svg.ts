// Reads a drawing back from its markup: whether it is well-formed, how often a role is drawn, what it says and where.
import { XMLParser, XMLValidator } from "fast-xml-parser";
import type { VNode } from "preact";
import { rendered } from "../../src/sheet/render.ts";

export const svgOf = (figure: { readonly drawing: VNode }): string => rendered(figure.drawing);

/** true, or what is wrong. */
export const wellFormed = (svg: string): true | string => {
  const verdict = XMLValidator.validate(svg);
  return verdict === true ? true : verdict.err.msg;
};

/** How many symbols carry a role. */
export const countRole = (svg: string, role: string): number => svg.split(`class="${role}"`).length - 1;

export interface ShownText {
  readonly text: string;
  readonly x: number;
  readonly y: number;
  readonly size: number;
  readonly anchor: string;
}

interface Node {
  readonly [key: string]: unknown;
}

const PARSER = new XMLParser({ preserveOrder: true, ignoreAttributes: false, trimValues: false, htmlEntities: true });

/** Every text element with its own or inherited size. */
export function textsOf(svg: string): readonly ShownText[] {
  const out: ShownText[] = [];
  const walk = (nodes: readonly Node[], size: number, anchor: string): void => {
    for (const node of nodes) {
      const given = (node[":@"] ?? {}) as Record<string, string>;
      const own = given["@_font-size"] === undefined ? size : Number(given["@_font-size"]);
      const turned = given["@_text-anchor"] ?? anchor;
      for (const [tag, inner] of Object.entries(node)) {
        if (tag === ":@" || !Array.isArray(inner)) continue;
        if (tag !== "text") walk(inner as Node[], own, turned);
        else {
          out.push({
            text: (inner as Node[]).map((part) => String(part["#text"] ?? "")).join(""),
            x: Number(given["@_x"]),
            y: Number(given["@_y"]),
            size: own,
            anchor: turned,
          });
        }
      }
    }
  };
  walk(PARSER.parse(svg) as Node[], 0, "start");
  return out;
}

/** Average width of a letter in parts of the size, as of a common sans-serif; an estimate of its own, apart from the layout's. */
const LETTER = 0.56;

/** Texts that stand out of the viewBox, by that estimate. */
export function outside(svg: string): readonly string[] {
  const [, , width = 0, height = 0] = (/viewBox="([^"]+)"/.exec(svg)?.[1] ?? "").split(" ").map(Number);
  return textsOf(svg)
    .filter(({ text, x, y, size, anchor }) => {
      const wide = [...text].length * LETTER * size;
      const left = anchor === "middle" ? x - wide / 2 : anchor === "end" ? x - wide : x;
      return !(left >= 0 && left + wide <= width && y - size >= 0 && y + size * 0.25 <= height);
    })
    .map(({ text, x, y }) => `${text} at ${x} ${y}`);
}

/** Numbers of path and shapes that a viewer could not draw. */
export const brokenNumbers = (svg: string): readonly string[] =>
  svg.match(/="[^"]*(?:NaN|undefined|Infinity)[^"]*"/g) ?? [];

/** What a file may bring to break a page. */
export const ATTACKS = [
  "<script>alert(1)</script>",
  "</text></svg><script>alert(1)</script>",
  '" onload="alert(1)',
  "' onclick='alert(1)",
  "&lt;b&gt; &amp; &#60;",
  "]]>",
  "<!-- comment -->",
  "<![CDATA[x]]>",
  "javascript:alert(1)",
  "a\u0000b\u0007c\u001b[31m",
  "right\u202eleft\u2066x\u2069",
  "zero\u200bwidth\ufeff",
  "line\u2028break\r\nand\ttab",
  "lone \ud800 surrogate",
  "tag \u{e0041}",
  "{{x}} <%= x %>",
] as const;
