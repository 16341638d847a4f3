import { describe, expect, test } from "vitest";
import { CUT, fitted, textWidth } from "../../../src/sheet/draw/textWidth.ts";
import fc from "../../support/property.ts";

describe("textWidth(text, size)", () => {
  test("nothing is nothing; grows with text and with size", () => {
    expect(textWidth("", 7)).toBe(0);
    expect(textWidth("ab", 7)).toBeGreaterThan(textWidth("a", 7));
    expect(textWidth("ab", 14)).toBeCloseTo(2 * textWidth("ab", 7));
  });

  test("is on the wide side of Helvetica's widths in thousandths of an em (Adobe font metrics, from memory)", () => {
    const helvetica = {
      i: 222,
      "1": 556,
      a: 556,
      m: 833,
      C: 722,
      W: 944,
      ".": 278,
      "+": 584,
      "-": 333,
      " ": 278,
      "@": 1015,
    };
    for (const [char, width] of Object.entries(helvetica))
      expect(textWidth(char, 1000), char).toBeGreaterThanOrEqual(width - 20);
  });
});

describe("fitted(text, { size, room, lines })", () => {
  test("breaks at blanks, and inside a word only where there is no blank", () => {
    expect(fitted("one two three", { size: 10, room: 45, lines: 3 })).toEqual(["one two", "three"]);
    expect(fitted("AAAAAAAA", { size: 10, room: 31, lines: 9 })).toEqual(["AAAA", "AAAA"]);
    expect(fitted("", { size: 10, room: 31, lines: 2 })).toEqual([]);
  });

  test("what is left over is cut, and the cut is seen", () => {
    expect(fitted("AAAAAAAAAA", { size: 10, room: 31, lines: 2 })).toEqual(["AAAA", `AA${CUT}`]);
  });

  test("every line fits, nothing is lost but what a cut says, in any text", () => {
    fc.assert(
      fc.property(fc.string({ unit: "grapheme", maxLength: 80 }), fc.integer({ min: 20, max: 200 }), (text, room) => {
        const rows = fitted(text, { size: 7, room, lines: 99 });
        for (const row of rows) expect(textWidth(row, 7)).toBeLessThanOrEqual(room);
        expect(rows.join("").replace(/\s/g, "")).toBe(text.replace(/\s/g, ""));
        for (const row of fitted(text, { size: 7, room, lines: 1 }))
          expect(textWidth(row, 7)).toBeLessThanOrEqual(room);
      }),
    );
  });
});
