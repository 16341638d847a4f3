// The one table of styles. Every style that means something comes with a word or a mark in the text; none stands alone.

import { type Hue, inkCode, PALETTES, type Palette, type PaletteName } from "./palettes.ts";
import type { Look } from "./terminal.ts";

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

/** What a style does beside its colour. Without colours this is all there is, which NO_COLOR does not ask away. */
const MARKED: Readonly<Record<StyleName, "plain" | "bold" | "inverse">> = {
  plain: "plain",
  title: "bold",
  strong: "bold",
  quiet: "plain",
  focus: "inverse",
  good: "plain",
  warn: "bold",
  bad: "bold",
  key: "bold",
  accent: "plain",
  caution: "bold",
};

/** What colours a style; the focus is inverse, and a colour in it would be a ground that nobody reckoned with. */
const HUES: Readonly<Partial<Record<StyleName, Hue>>> = {
  title: "title",
  key: "title",
  quiet: "quiet",
  good: "good",
  warn: "warn",
  bad: "bad",
  caution: "bad",
  accent: "accent",
};

function codesOf(style: StyleName, palette: Palette | null): Codes {
  const hue = HUES[style];
  const ink = palette === null || hue === undefined ? null : palette[hue];
  const mark = MARKED[style];
  const open = `${mark === "bold" ? "\x1b[1m" : mark === "inverse" ? "\x1b[7m" : ""}${ink === null ? "" : `\x1b[${inkCode(ink)}m`}`;
  const close = `${ink === null ? "" : "\x1b[39m"}${mark === "bold" ? "\x1b[22m" : mark === "inverse" ? "\x1b[27m" : ""}`;
  return { open, close };
}

const STYLES = Object.keys(MARKED) as readonly StyleName[];
const tableOf = (palette: Palette | null) =>
  Object.fromEntries(STYLES.map((style) => [style, codesOf(style, palette)])) as Readonly<Record<StyleName, Codes>>;

/** Every style's codes by palette, made once: rows are drawn at every key. */
const TABLES = Object.fromEntries(
  Object.entries(PALETTES).map(([name, palette]) => [name, tableOf(palette)]),
) as Readonly<Record<PaletteName, ReturnType<typeof tableOf>>>;
const UNCOLOURED = tableOf(null);

/** Text in a style, ready for a row. The text must be safe already. A look that names no palette gets the one for any ground. */
export function styled(
  text: string,
  style: StyleName,
  { colour, palette = "any256" }: Pick<Look, "colour" | "palette">,
): string {
  const codes = (colour ? TABLES[palette] : UNCOLOURED)[style];
  return text === "" || codes.open === "" ? text : codes.open + text + codes.close;
}
