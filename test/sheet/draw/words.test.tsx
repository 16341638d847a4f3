/** @jsxImportSource preact */
// Tests of words as markup.
import { describe, expect, test } from "vitest";
import { Drawing } from "../../../src/sheet/draw/drawing.tsx";
import type { Said } from "../../../src/sheet/draw/ink.ts";
import { AllWords } from "../../../src/sheet/draw/words.tsx";
import { rendered } from "../../../src/sheet/render.ts";
import { ATTACKS, textsOf, wellFormed } from "../../support/svg.ts";

const markup = (words: readonly Said[], title = "t"): string =>
  rendered(
    <Drawing id="a" title={title} description={title} height={20}>
      <AllWords words={words} />
    </Drawing>,
  );

describe("AllWords({ words })", () => {
  test.each(ATTACKS)("%j is shown as text", (attack) => {
    const svg = markup(
      [
        { x: 1, y: 9, text: attack },
        { x: 1, y: 9, text: attack, room: 30, lines: 4 },
      ],
      attack,
    );
    expect(wellFormed(svg)).toBe(true);
    expect(new Set([...svg.matchAll(/<([a-z!?]+)/gi)].map(([, tag]) => tag))).toEqual(
      new Set(["svg", "title", "desc", "g", "text"]),
    );
  });

  test("breaks into lines that follow each other, and marks a cut", () => {
    const texts = textsOf(markup([{ x: 1, y: 9, text: "one two three four", room: 36, lines: 2 }]));
    expect(texts.map(({ text }) => text)).toEqual(["one two", "three…"]);
    expect(texts[1]!.y).toBeGreaterThan(texts[0]!.y);
  });

  test("each text keeps its own look", () => {
    const texts = textsOf(
      markup([
        { x: 1, y: 9, text: "a", size: 7 },
        { x: 2, y: 9, text: "b", anchor: "end", size: 9, bold: true },
        { x: 3, y: 9, text: "c", size: 7 },
        { x: 4, y: 9, text: "d" },
      ]),
    );
    expect(texts.map(({ text, size, anchor }) => `${text} ${size} ${anchor}`).sort()).toEqual([
      "a 7 start",
      "b 9 end",
      "c 7 start",
      "d 7.5 start",
    ]);
    expect(markup([])).not.toContain("<g");
  });
});
