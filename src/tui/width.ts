// How many cells a character takes. Text on screen is first cut down to characters on which terminals agree (text.ts).

/** First and last code point of each run of characters two cells wide: East Asian Wide and Fullwidth, symbols apart. */
const WIDE: readonly (readonly [number, number])[] = [
  [0x1100, 0x115f],
  [0x2e80, 0x2e99],
  [0x2e9b, 0x2ef3],
  [0x2f00, 0x2fd5],
  [0x2ff0, 0x303e],
  [0x3041, 0x3096],
  [0x309b, 0x30ff],
  [0x3105, 0x312f],
  [0x3131, 0x318e],
  [0x3190, 0x31e3],
  [0x31f0, 0x321e],
  [0x3220, 0x3247],
  [0x3250, 0x4dbf],
  [0x4e00, 0xa48c],
  [0xa490, 0xa4c6],
  [0xac00, 0xd7a3],
  [0xf900, 0xfaff],
  [0xfe30, 0xfe52],
  [0xfe54, 0xfe66],
  [0xfe68, 0xfe6b],
  [0xff01, 0xff60],
  [0xffe0, 0xffe6],
  [0x20000, 0x2fffd],
  [0x30000, 0x3fffd],
];

/** Between Hangul and the first radicals stand rules, blocks and braille, which nearly every row has. */
const isWideCode = (code: number): boolean =>
  code < 0x2e80 ? code <= 0x115f : WIDE.some(([first, last]) => code >= first && code <= last);

/** Cells of one code point that text.ts lets through: 2 for East Asian wide characters, else 1. */
export function cellsOf(char: string): 1 | 2 {
  const code = char.codePointAt(0) ?? 0;
  return code >= 0x1100 && isWideCode(code) ? 2 : 1;
}

/** Cells of a text that text.ts let through; no escape sequences in it. */
export function textWidth(text: string): number {
  let width = 0;
  for (const char of text) width += cellsOf(char);
  return width;
}
