import { describe, expect, test } from "vitest";
import { visible, visibleJson, visibleLines } from "../../src/order/index.ts";
import { UNSAFE } from "../support/fakePorts.ts";

describe("visible(text)", () => {
  test("leaves plain and accented text, units and signs alone", () => {
    for (const text of ["", "470 µF", "Änderung 2 Ω ≤ 5 °C", "電解", "a-b_c=(1)"]) expect(visible(text)).toBe(text);
  });

  test("writes controls, direction marks, zero-width characters, tags and lone surrogates out", () => {
    expect(visible("a\u001b[31mb")).toBe("a\\u{1b}[31mb");
    expect(visible("a\u009bb\u0007\u0000")).toBe("a\\u{9b}b\\u{7}\\u{0}");
    expect(visible("a\u202eb\u2066c\u200b\u200d\ufeff")).toBe("a\\u{202e}b\\u{2066}c\\u{200b}\\u{200d}\\u{feff}");
    expect(visible("a\u{e0041}\ud800")).toBe("a\\u{e0041}\\u{d800}");
    expect(visible("a\ufe0f\u2028b")).toBe("a\\u{fe0f}\\u{2028}b");
  });

  test("line breaks and tabs become blanks, a carriage return alone is written out", () => {
    expect(visible("a\r\nb\nc\td\re")).toBe("a b c d\\u{d}e");
  });

  test("every code point below U+3000 comes out safe, and a second pass changes nothing", () => {
    for (let code = 0; code < 0x3000; code++) {
      const once = visible(`x${String.fromCodePoint(code)}y`);
      expect(UNSAFE.test(once), code.toString(16)).toBe(false);
      expect(visible(once)).toBe(once);
    }
  });

  test("visibleJson(json) hides nothing and reads back to the same value", () => {
    const value = { "\u202ek": "a\u009b31m\u200b\ufeff\u{e0041}\ud800 µ 電\u0007\n", list: ["\u2066", 1] };
    for (const indent of [0, 2]) {
      const json = visibleJson(JSON.stringify(value, null, indent));
      expect(UNSAFE.test(json.replaceAll("\n", ""))).toBe(false);
      expect(json).toContain("µ 電");
      expect(JSON.parse(json)).toEqual(value);
    }
  });

  test("visibleLines(text) keeps its own line breaks", () => {
    expect(visibleLines("a\u001b\nb")).toBe("a\\u{1b}\nb");
  });
});
