// Text in a terminal's columns: how wide it is, cut, filled and broken into lines.

const WIDE =
  /[\u1100-\u115f\u2e80-\ua4cf\ua960-\ua97c\uac00-\ud7a3\uf900-\ufaff\ufe30-\ufe6f\uff01-\uff60\uffe0-\uffe6\u{1f000}-\u{1faff}\u{20000}-\u{3fffd}]/u;
const NONE = /\p{Mn}|\p{Me}/u;
const PLAIN = /^[\x20-\x7e]*$/;

const cells = (char: string): number => (WIDE.test(char) ? 2 : NONE.test(char) ? 0 : 1);

/** Columns that a text takes; it has no controls in it. */
export function widthOf(text: string): number {
  if (PLAIN.test(text)) return text.length;
  let width = 0;
  for (const char of text) width += cells(char);
  return width;
}

/** Cuts to at most `width` columns; a cut shows as three dots inside them. */
export function cut(text: string, width: number): string {
  if (widthOf(text) <= width) return text;
  const dots = "...".slice(0, width);
  let out = "";
  let used = dots.length;
  for (const char of text) {
    used += cells(char);
    if (used > width) break;
    out += char;
  }
  return out + dots;
}

export type Side = "left" | "right";

/** Fills with blanks to `width` columns. */
export function pad(text: string, width: number, side: Side = "left"): string {
  const fill = " ".repeat(Math.max(0, width - widthOf(text)));
  return side === "left" ? text + fill : fill + text;
}

/** Breaks at blanks into lines of at most `width`; a longer word is broken where it must be. `indent` opens every line. */
export function wrap(text: string, width: number, indent = ""): string {
  const room = Math.max(10, width - indent.length);
  const lines: string[] = [];
  let line = "";
  for (const word of text.split(" ")) {
    let rest = word;
    if (line !== "" && widthOf(line) + 1 + widthOf(rest) <= room) {
      line = `${line} ${rest}`;
      continue;
    }
    if (line !== "") lines.push(line);
    while (widthOf(rest) > room) {
      let head = "";
      for (const char of rest) {
        if (widthOf(head) + cells(char) > room) break;
        head += char;
      }
      lines.push(head);
      rest = rest.slice(head.length);
    }
    line = rest;
  }
  return [...lines, line].map((one) => (indent + one).trimEnd()).join("\n");
}

/** A list entry: a dash, and the text wrapped beside it. */
export function bullet(text: string, width: number, indent = "  "): string {
  const lines = wrap(text, width, `${indent}  `).split("\n");
  return [`${indent}- ${(lines[0] ?? "").trimStart()}`, ...lines.slice(1)].join("\n");
}
