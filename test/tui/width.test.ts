// Widths against an outside table, the emulator's own, and East Asian Width by example (UAX 11).
import { expect, test } from "vitest";
import { safeText } from "../../src/tui/text.ts";
import { cellsOf, textWidth } from "../../src/tui/width.ts";
import { Screen } from "../support/screen.ts";

test("cellsOf(char): every character that safeText lets through, below U+FFFF, moves the emulator's cursor by as much", async () => {
  const wrong: string[] = [];
  let chars = 0;
  let some = "";
  const screen = new Screen(60, 1);
  for (let code = 0x20; code <= 0xffff; code += 1) {
    const char = String.fromCharCode(code);
    if ((code < 0xd800 || code > 0xdfff) && safeText(char) === char) {
      some += char;
      chars += 1;
    }
    // A few characters at a time: the cursor tells whether any of them differs.
    if (some.length < 25 && code < 0xffff) continue;
    screen.feed(`\r${some}`);
    await screen.settle();
    if (screen.term.buffer.active.cursorX !== textWidth(some)) wrong.push(some);
    some = "";
  }
  expect(wrong).toEqual([]);
  expect(chars).toBeGreaterThan(40_000);
}, 30_000);

test.each([
  ["a", 1],
  ["µ", 1],
  ["Ω", 1],
  ["⣿", 1],
  ["漢", 2],
  ["ア", 2],
  ["한", 2],
  ["Ａ", 2],
  ["𠀀", 2],
] as const)("cellsOf(%j) is %i", (char, cells) => {
  expect(cellsOf(char)).toBe(cells);
});
