// The marks of the trade in ASCII.
import { expect, test } from "vitest";
import { asciiOf } from "../../src/tui/ascii.ts";

test.each([
  ["", ""],
  ["470 µF", "470 uF"],
  ["470 \u03bcF", "470 uF"],
  ["24 kΩ ±5 %", "24 kohm +-5 %"],
  ["4.7 \u2126", "4.7 ohm"],
  ["n × p · x", "n x p . x"],
  ["≤ 25 °C … ²", "<= 25 degC ... ^2"],
  ["─│█░", "-|#."],
  ["⣿⠀", "* "],
  ["éÅñ", "eAn"],
  ["漢", "?"],
])("asciiOf(%j) is %j", (text, want) => {
  expect(asciiOf(text)).toBe(want);
});
