import { describe, expect, test } from "vitest";
import { bullet, cut, pad, widthOf, wrap } from "../../src/cli/wrap.ts";
import fc from "../support/property.ts";

describe("widthOf(text)", () => {
  test("plain 1, East Asian wide 2, combining 0", () => {
    expect([widthOf(""), widthOf("abc µΩ"), widthOf("電"), widthOf("e\u0301"), widthOf("🔥")]).toEqual([0, 6, 2, 1, 2]);
  });
});

describe("cut(text, width), pad(text, width, side)", () => {
  test("a cut shows as dots inside the width", () => {
    expect(cut("abcdef", 6)).toBe("abcdef");
    expect(cut("abcdef", 5)).toBe("ab...");
    expect(cut("abcdef", 2)).toBe("..");
    expect(cut("abcdef", 0)).toBe("");
    expect(widthOf(cut("電電電電", 6))).toBeLessThanOrEqual(6);
  });

  test("fills left or right", () => {
    expect([pad("a", 3), pad("a", 3, "right"), pad("abcd", 3)]).toEqual(["a  ", "  a", "abcd"]);
  });
});

describe("wrap(text, width, indent)", () => {
  test("no line is wider than the width, no letter is lost (any text)", () => {
    fc.assert(
      fc.property(fc.string({ maxLength: 200 }), fc.integer({ min: 20, max: 80 }), (text, width) => {
        const plain = text.replace(/[^ -~]/g, "x");
        const lines = wrap(plain, width, "  ").split("\n");
        for (const line of lines) expect(widthOf(line)).toBeLessThanOrEqual(width);
        expect(lines.join("").replace(/ /g, "")).toBe(plain.replace(/ /g, ""));
      }),
      { seed: 3, numRuns: 300 },
    );
  });

  test("a word longer than the width is broken", () => {
    expect(wrap("x".repeat(25), 12)).toBe(`${"x".repeat(12)}\n${"x".repeat(12)}\nx`);
  });
});

test("bullet(text, width): later lines stand under the first word", () => {
  expect(bullet("one two three four", 14)).toBe("  - one two\n    three four");
});
