// The one table of styles. Every style that means something comes with a word or a mark in the text; none stands alone.

export type StyleName =
  | "plain"
  | "title"
  | "strong"
  | "quiet"
  | "focus"
  | "good"
  | "warn"
  | "bad"
  | "key"
  | "accent"
  | "caution";

interface Codes {
  readonly open: string;
  readonly close: string;
}

const NONE: Codes = { open: "", close: "" };
const BOLD: Codes = { open: "\x1b[1m", close: "\x1b[22m" };
const INVERSE: Codes = { open: "\x1b[7m", close: "\x1b[27m" };
const coloured = (n: number): Codes => ({ open: `\x1b[${n}m`, close: "\x1b[39m" });
const both = (a: Codes, b: Codes): Codes => ({ open: a.open + b.open, close: b.close + a.close });

/** With colours: the terminal's own sixteen, which its owner chose to be legible; never yellow or white, lost on light grounds. */
const COLOURED: Readonly<Record<StyleName, Codes>> = {
  plain: NONE,
  title: both(BOLD, coloured(36)),
  strong: BOLD,
  quiet: coloured(90),
  focus: INVERSE,
  good: coloured(32),
  warn: both(BOLD, coloured(35)),
  bad: both(BOLD, coloured(31)),
  key: both(BOLD, coloured(36)),
  accent: coloured(36),
  caution: both(BOLD, coloured(31)),
};

/** Without colours: bold and inverse only, which NO_COLOR does not ask away. */
const UNCOLOURED: Readonly<Record<StyleName, Codes>> = {
  plain: NONE,
  title: BOLD,
  strong: BOLD,
  quiet: NONE,
  focus: INVERSE,
  good: NONE,
  warn: BOLD,
  bad: BOLD,
  key: BOLD,
  accent: NONE,
  caution: BOLD,
};

/** Text in a style, ready for a row. The text must be safe already. */
export function styled(text: string, style: StyleName, colour: boolean): string {
  const codes = (colour ? COLOURED : UNCOLOURED)[style];
  return text === "" || codes.open === "" ? text : codes.open + text + codes.close;
}
