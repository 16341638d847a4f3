// How light the ground is: from the terminal's answer, from the environment, and unknown when neither says.
import { expect, test } from "vitest";
import { groundOf, groundTold, isDeep, paletteFor } from "../../src/tui/ground.ts";

test.each([
  ["\x1b]11;rgb:0000/0000/0000\x07", "dark"],
  ["\x1b]11;rgb:1e1e/1e1e/1e1e\x1b\\", "dark"],
  ["\x1b]11;rgb:ffff/ffff/ffff\x07", "light"],
  ["\x1b]11;rgb:fd/f6/e3\x07", "light"],
  ["\x1b]11;rgba:f/f/f/f\x07", "light"],
  ["\x1b]11;rgb:8080/8080/8080\x07", "unknown"],
  ["\x1b]10;rgb:ffff/ffff/ffff\x07", null],
  ["\x1b]11;?\x07", null],
  ["\x1b[<0;1;1M", null],
  ["", null],
])("groundTold(%j)", (report, want) => {
  expect(groundTold(report)).toBe(want);
});

test.each([
  [{ COLORFGBG: "15;0" }, "dark"],
  [{ COLORFGBG: "0;15" }, "light"],
  [{ COLORFGBG: "0;default;7" }, "light"],
  [{ COLORFGBG: "0;4" }, "unknown"],
  [{ COLORFGBG: "15;default" }, "unknown"],
  [{ TERM: "linux" }, "dark"],
  [{}, "unknown"],
])("groundOf(%j)", (env, want) => {
  expect(groundOf(env)).toBe(want);
});

test("isDeep(env) and paletteFor(ground, deep)", () => {
  expect([{ TERM: "xterm-256color" }, { COLORTERM: "truecolor" }, { TERM: "xterm" }, {}].map(isDeep)).toEqual([
    true,
    true,
    false,
    false,
  ]);
  expect(paletteFor("dark", true)).toBe("dark256");
  expect(paletteFor("unknown", false)).toBe("any16");
});
