// Makes any text safe to draw: no control, no invisible and no direction marks, only characters whose width is agreed on.
import { asciiOf } from "./ascii.ts";
import { cellsOf, textWidth } from "./width.ts";

/** Stands for a character that cannot be drawn with a known width. */
const UNDRAWABLE = "?";

const SPACES = /[\t\n\v\f\r\u0085\u00a0\u1680\u2000-\u200a\u2028\u2029\u202f\u205f]/g;
/** Control, direction (bidirectional) and other format characters, joiners, variation selectors, tags. */
const UNSEEN = /[\p{Cc}\p{Cf}\p{Mn}\p{Me}\u115f\u1160\u3164\uffa0]/gu;
/** Lone surrogates, private use, unassigned, and what one terminal draws in one cell and another in two: pictures, rare signs. */
const UNSURE =
  /[\p{Cs}\p{Co}\p{Cn}\p{Mc}\p{Emoji_Presentation}\u06de\u1161-\u11ff\u2630-\u2637\u268a-\u268f\u31e4-\u31ef\u3248-\u324f\u4dc0-\u4dff\ua960-\ua97f\ud7b0-\ud7ff\ufe10-\ufe19\u{10000}-\u{1ffff}]/gu;

/** What nearly all rows are made of: the classes above are slow to be built, and the first frame needs none of them. */
const PLAIN = /^[ -~±µ·×Ω…≤≥─│█\u2800-\u28ff]*$/;

/**
 * Text fit to draw. Composed first (e and an acute accent become one character), so that few marks are lost.
 * Numbers keep their order: direction marks are removed, not obeyed.
 */
export function safeText(text: string): string {
  if (PLAIN.test(text)) return text;
  return text.normalize("NFC").replace(SPACES, " ").replace(UNSEEN, "").replace(UNSURE, UNDRAWABLE);
}

/** `safeText`, in ASCII where the terminal has no more. */
export const drawnText = (text: string, ascii: boolean): string => (ascii ? asciiOf(safeText(text)) : safeText(text));

/** Cuts safe text to `width` cells; a cut is shown by the mark, which is inside the width. */
export function cutText(text: string, width: number, mark = "…"): string {
  if (width <= 0) return "";
  if (text.length <= width && textWidth(text) <= width) return text;
  if (textWidth(text) <= width) return text;
  const room = width - textWidth(mark);
  if (room < 0) return cutText(text, width, "");
  let out = "";
  let used = 0;
  for (const char of text) {
    const cells = cellsOf(char);
    if (used + cells > room) break;
    out += char;
    used += cells;
  }
  return out + mark;
}

export type Side = "left" | "right";

/** Cuts or fills safe text to exactly `width` cells, kept at the given side. */
export function fitText(text: string, width: number, side: Side = "left", mark = "…"): string {
  const cut = cutText(text, width, mark);
  const fill = " ".repeat(Math.max(0, width - textWidth(cut)));
  return side === "left" ? cut + fill : fill + cut;
}

/** Breaks safe text at spaces into lines of at most `width` cells; a longer word is broken where it must be. */
export function wrapText(text: string, width: number): readonly string[] {
  if (width <= 0) return [];
  const lines: string[] = [];
  let line = "";
  for (const word of text.split(" ")) {
    let rest = word;
    const joined = line === "" ? rest : `${line} ${rest}`;
    if (textWidth(joined) <= width) {
      line = joined;
      continue;
    }
    if (line !== "") lines.push(line);
    while (textWidth(rest) > width) {
      const head = cutText(rest, width, "") || (rest.match(/./u)?.[0] ?? rest);
      lines.push(textWidth(head) <= width ? head : UNDRAWABLE);
      rest = rest.slice(head.length);
    }
    line = rest;
  }
  return [...lines, line];
}
