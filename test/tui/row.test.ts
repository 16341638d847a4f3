// Rows composed of spans: never wider than the screen, the right part first to give way.
import { describe, expect, test } from "vitest";
import { drawRow, rowOf, span } from "../../src/tui/row.ts";

const look = { colour: false, ascii: false };

describe("drawRow(row, columns, look)", () => {
  test("cuts at the edge with a mark", () => {
    expect(drawRow(rowOf(span("abc"), span("def")), 6, look)).toBe("abcdef");
    expect(drawRow(rowOf(span("abc"), span("def")), 5, look)).toBe("abcd…");
    expect(drawRow(rowOf(span("abc"), span("def")), 5, { ...look, ascii: true })).toBe("abcd~");
    expect(drawRow(rowOf(span("abc")), 0, look)).toBe("");
  });
  test("puts the right part at the right edge, or leaves it off", () => {
    const row = { left: [span("left")], right: [span("right")] };
    expect(drawRow(row, 12, look)).toBe("left   right");
    expect(drawRow(row, 10, look)).toBe("left right");
    expect(drawRow(row, 9, look)).toBe("left");
  });
  test("makes text safe, and spells it in ASCII before it measures", () => {
    expect(drawRow(rowOf(span("a\x1b[31m\u202eb")), 20, look)).toBe("a[31mb");
    expect(drawRow(rowOf(span("24 kΩ")), 20, { ...look, ascii: true })).toBe("24 kohm");
    expect(drawRow(rowOf(span("24 kΩ")), 6, { ...look, ascii: true })).toBe("24 ko~");
  });
  test("styles with colour and without: no colour code under NO_COLOR", () => {
    expect(drawRow(rowOf(span("x", "bad")), 5, { colour: true, ascii: false, palette: "light16" })).toBe(
      "\x1b[1m\x1b[31mx\x1b[39m\x1b[22m",
    );
    expect(drawRow(rowOf(span("x", "good")), 5, { colour: true, ascii: false, palette: "dark256" })).toBe(
      "\x1b[38;5;114mx\x1b[39m",
    );
    expect(drawRow(rowOf(span("x", "bad")), 5, look)).toBe("\x1b[1mx\x1b[22m");
    expect(drawRow(rowOf(span("x", "good")), 5, look)).toBe("x");
  });
});
