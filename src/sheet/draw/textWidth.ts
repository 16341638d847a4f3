// How wide a text gets, by an estimate on the wide side, and how it is broken into lines that fit.
//
// Nobody measures letters here: the reader's sans-serif is unknown. The widths, in parts of the font size, are those of a wide
// common sans-serif, rounded up; assumed, common practice, no source.

const WIDTHS: readonly (readonly [RegExp, number])[] = [
  [/[mwMW@%&+=<>~#^]/, 1],
  [/[ijl.,:;'|!]/, 0.36],
  [/[ft()[\]{}/\\ "r*-]/, 0.45],
  [/[a-z0-9_?$]/, 0.65],
  [/[ -~]/, 0.76],
  [/[\u00a0-\u024f\u0370-\u03ff]/, 0.85],
];
const WIDEST = 1.1;

const letterWidth = (char: string): number => WIDTHS.find(([kind]) => kind.test(char))?.[1] ?? WIDEST;

/** Width of a text in the units of its font size. */
export function textWidth(text: string, size: number): number {
  let sum = 0;
  for (const char of text) sum += letterWidth(char);
  return sum * size;
}

export const CUT = "…";

/** As much of a text as fits, from the front. Takes at least one character, so that breaking always ends. */
function head(text: string, size: number, room: number): string {
  let out = "";
  let used = 0;
  for (const char of text) {
    used += letterWidth(char) * size;
    if (used > room && out !== "") break;
    out += char;
  }
  return out;
}

/** `head`, but ending at a blank where there is one past the middle. */
function lineOf(text: string, size: number, room: number): string {
  if (textWidth(text, size) <= room) return text;
  const most = head(text, size, room);
  const blank = text[most.length] === " " ? most.length : most.lastIndexOf(" ");
  return blank > most.length / 2 ? text.slice(0, blank) : most;
}

export interface Fit {
  readonly size: number;
  readonly room: number;
  /** Most lines; what is left over is cut, and the cut is shown. */
  readonly lines: number;
}

/** A text as lines that fit the room. Range: room > 0, lines >= 1. */
export function fitted(text: string, { size, room, lines }: Fit): readonly string[] {
  const out: string[] = [];
  let rest = text.trim();
  while (rest !== "" && out.length < lines) {
    const line = lineOf(rest, size, room);
    out.push(line);
    rest = rest.slice(line.length).trimStart();
  }
  if (rest !== "") out[lines - 1] = `${head(out[lines - 1]!, size, room - textWidth(CUT, size))}${CUT}`;
  return out;
}
