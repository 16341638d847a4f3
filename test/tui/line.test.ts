// One line of text under the keys: the ends first, then the middle, then what a paste may bring.

import { describe, expect, test } from "vitest";
import { editLine, type LineEdit, LONGEST_LINE, lineOf, pasteable } from "../../src/tui/line.ts";
import fc from "../support/property.ts";

/** "ab|c": the caret is the bar. */
const at = (shown: string) => ({ text: shown.replace("|", ""), caret: shown.indexOf("|") });
const seen = ({ text, caret }: { text: string; caret: number }) => `${text.slice(0, caret)}|${text.slice(caret)}`;

describe("editLine(line, edit)", () => {
  test.each([
    ["|", "back", "|"],
    ["|", "delete", "|"],
    ["|", "left", "|"],
    ["|", "right", "|"],
    ["|", "backWord", "|"],
    ["|abc", "back", "|abc"],
    ["abc|", "delete", "abc|"],
    ["|abc", "left", "|abc"],
    ["abc|", "right", "abc|"],
    ["ab|c", "back", "a|c"],
    ["a|bc", "delete", "a|c"],
    ["ab|c", "left", "a|bc"],
    ["a|bc", "right", "ab|c"],
    ["ab|c", "home", "|abc"],
    ["a|bc", "end", "abc|"],
    ["ab|c", "clear", "|"],
    ["ab|c", "clearBefore", "|c"],
    ["2.4 kJ|", "backWord", "2.4|"],
    ["2.4  |", "backWord", "|"],
    ["😀|", "back", "|"],
    ["a|😀", "delete", "a|"],
    ["a😀|", "left", "a|😀"],
    ["a|😀", "right", "a😀|"],
  ] as const)("%j %s is %j", (before, edit, after) => {
    expect(seen(editLine(at(before), { edit } as LineEdit))).toBe(after);
  });

  test("insert goes in at the caret, one line of it, without control characters", () => {
    expect(seen(editLine(at("a|b"), { edit: "insert", text: "x" }))).toBe("ax|b");
    expect(seen(editLine(at("|"), { edit: "insert", text: "2.4\tkJ\x1b[31m\nq" }))).toBe("2.4 kJ[31m|");
  });

  test(`a line takes at most ${LONGEST_LINE} characters`, () => {
    const full = editLine(lineOf(""), { edit: "insert", text: "9".repeat(5000) });
    expect(full.text.length).toBe(LONGEST_LINE);
    expect(editLine(full, { edit: "insert", text: "1" })).toEqual(full);
  });

  test("whatever the keys, the caret stays in the text and no control character gets in", () => {
    const edits = fc.oneof(
      fc.constantFrom<LineEdit>(
        { edit: "back" },
        { edit: "delete" },
        { edit: "left" },
        { edit: "right" },
        { edit: "home" },
        { edit: "end" },
        { edit: "backWord" },
        { edit: "clearBefore" },
      ),
      fc.string({ unit: "grapheme" }).map((text): LineEdit => ({ edit: "insert", text })),
    );
    fc.assert(
      fc.property(fc.array(edits, { maxLength: 40 }), (list) => {
        const line = list.reduce(editLine, lineOf(""));
        expect(line.caret).toBeGreaterThanOrEqual(0);
        expect(line.caret).toBeLessThanOrEqual(line.text.length);
        expect(line.text).not.toMatch(/\p{Cc}/u);
      }),
      { numRuns: 500, seed: 21 },
    );
  });
});

test.each([
  ["", ""],
  ["\n2.4 kJ\r\n", "2.4 kJ"],
  ["a\nb", "a"],
  ["a\u0085b", "ab"],
])("pasteable(%j) is %j", (text, want) => {
  expect(pasteable(text)).toBe(want);
});
