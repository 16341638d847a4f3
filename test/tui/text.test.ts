// Text made safe to draw, and fitted by cells.

import { describe, expect, test } from "vitest";
import { cutText, drawnText, fitText, safeText, wrapText } from "../../src/tui/text.ts";
import { textWidth } from "../../src/tui/width.ts";
import fc from "../support/property.ts";
import { Screen } from "../support/screen.ts";

describe("safeText(text)", () => {
  test.each([
    ["", ""],
    ["470 µF ±20 %", "470 µF ±20 %"],
    ["a\x1b[31mb", "a[31mb"],
    ["a\x1b]0;owned\x07b", "a]0;ownedb"],
    ["a\x00\x7f\u009bb", "ab"],
    ["a\tb\nc\r\nd", "a b c  d"],
    ["a\u00a0b", "a b"],
    ["a\u2028b", "a b"],
    ["a\u202eb\u202c", "ab"],
    ["a\u2066b\u2069\u200e\u200f\u061c", "ab"],
    ["a\u200b\u200d\ufeff\u00adb", "ab"],
    ["e\u0301", "é"],
    ["x\u0301", "x"],
    ["a\ud800b", "a?b"],
    ["\ue000", "?"],
    ["😀", "?"],
    ["⚡", "?"],
    ["漢字", "漢字"],
    ["\u2126", "Ω"],
  ])("%j is %j", (text, want) => {
    expect(safeText(text)).toBe(want);
  });

  test("any text comes out as wide on a terminal as textWidth says", async () => {
    await fc.assert(
      fc.asyncProperty(fc.string({ unit: "grapheme", maxLength: 20 }), async (text) => {
        const safe = safeText(text);
        const screen = new Screen(80, 2);
        screen.feed(safe);
        await screen.settle();
        expect([safe, screen.term.buffer.active.cursorX]).toEqual([safe, textWidth(safe)]);
      }),
      { numRuns: 400, seed: 3 },
    );
  });

  test("no control, format or combining character is ever left", () => {
    fc.assert(
      fc.property(fc.string({ unit: "binary" }), (text) => {
        expect(safeText(text)).not.toMatch(/[\p{Cc}\p{Cf}\p{Mn}\p{Cs}]/u);
      }),
      { numRuns: 2000, seed: 4 },
    );
  });
});

describe("cutText(text, width), fitText(text, width, side)", () => {
  test.each([
    ["abc", 0, ""],
    ["abc", 1, "…"],
    ["abc", 3, "abc"],
    ["abcd", 3, "ab…"],
    ["漢字", 4, "漢字"],
    ["漢字", 3, "漢…"],
    ["漢字", 2, "…"],
  ])("cutText(%j, %i) is %j", (text, width, want) => {
    expect(cutText(text, width)).toBe(want);
  });
  test.each([
    ["ab", 4, "left", "ab  "],
    ["ab", 4, "right", "  ab"],
    ["漢字", 3, "left", "漢…"],
    ["漢字", 2, "left", "… "],
    ["漢字", 2, "right", " …"],
  ] as const)("fitText(%j, %i, %s) is %j", (text, width, side, want) => {
    expect(fitText(text, width, side)).toBe(want);
  });
  test("fitText is always exactly as wide as asked", () => {
    fc.assert(
      fc.property(fc.string({ unit: "grapheme" }), fc.nat(30), (text, width) => {
        expect(textWidth(fitText(safeText(text), width))).toBe(width);
      }),
      { numRuns: 500, seed: 5 },
    );
  });
});

describe("wrapText(text, width)", () => {
  test.each([
    ["", 5, [""]],
    ["one two", 0, []],
    ["one two", 7, ["one two"]],
    ["one two", 6, ["one", "two"]],
    ["abcdefgh ij", 3, ["abc", "def", "gh", "ij"]],
    ["漢字", 1, ["?", "?", ""]],
  ])("wrapText(%j, %i) is %j", (text, width, want) => {
    expect(wrapText(text, width)).toEqual(want);
  });
});

test("drawnText(text, true) is ASCII whatever comes in", () => {
  fc.assert(
    fc.property(fc.string({ unit: "grapheme" }), (text) => {
      expect(drawnText(text, true)).toMatch(/^[ -~]*$/);
    }),
    { numRuns: 500, seed: 6 },
  );
});
