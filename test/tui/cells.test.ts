// Rows of styled text as cells.
import { expect, test } from "vitest";
import { isUnseenOnBlanks, rowCells } from "../../src/tui/cells.ts";

const short = (row: string, columns = 80): string =>
  rowCells(row, columns)
    .map((c) => `${c.text || "_"}${c.style === "" ? "" : `{${c.style}}`}`)
    .join("");

test.each([
  ["", true],
  ["1;36", true],
  ["90", true],
  ["7", false],
  ["4", false],
  ["9", false],
  ["41", false],
  ["100", false],
  ["38;5;7", false],
])("isUnseenOnBlanks(%j) is %s", (style, want) => {
  expect(isUnseenOnBlanks(style)).toBe(want);
});

test.each([
  ["", ""],
  ["ab", "ab"],
  ["\x1b[1ma\x1b[22mb", "a{1}b"],
  ["\x1b[36m\x1b[1ma\x1b[0mb", "a{1;36}b"],
  ["\x1b[1;36ma\x1b[39mb", "a{1;36}b{1}"],
  ["\x1b[1m\x1b[2ma\x1b[22mb", "a{1;2}b"],
  ["\x1b[7m \x1b[27m ", " {7} "],
  ["\x1b[38;5;208ma\x1b[48;2;1;2;3mb\x1b[39;49mc", "a{38;5;208}b{38;5;208;48;2;1;2;3}c"],
  ["\x1b[94ma\x1b[103mb", "a{94}b{94;103}"],
  ["\x1b[ma", "a"],
  ["漢a", "漢_a"],
  ["\x1b[31m漢\x1b[39m", "漢{31}_{31}"],
  ["\x1b[1m a\x1b[22m", " a{1}"],
  // anything but a style is dropped to its letters
  ["\x1b[2Ja", "[2Ja"],
  ["a\tb", "a b"],
])("rowCells(%j) is %j", (row, want) => {
  expect(short(row)).toBe(want);
});

test("rowCells(row, columns) stops at the edge, and leaves off a wide character that would stick out", () => {
  expect(short("abcd", 3)).toBe("abc");
  expect(short("ab漢", 3)).toBe("ab");
  expect(short("a漢", 3)).toBe("a漢_");
  expect(short("abc", 0)).toBe("");
});
