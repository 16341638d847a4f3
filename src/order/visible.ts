// Text of unknown origin made harmless to terminals and paper: what cannot be seen is written out as \u{...}.
//
// Written out are controls (C0, C1, delete), line and paragraph separators, direction marks, zero-width and other format characters,
// tags, lone surrogates, private use and unassigned code points. A line break or tab becomes a blank in one-line text.

const PLAIN = /^[\x20-\x7e]*$/;
const HIDDEN =
  /\p{Cc}|\p{Cf}|\p{Cs}|\p{Co}|\p{Cn}|\p{Zl}|\p{Zp}|\p{Variation_Selector}|\u034f|\u115f|\u1160|\u17b4|\u17b5|\u3164|\uffa0/gu;

const escaped = (char: string): string => `\\u{${(char.codePointAt(0) ?? 0).toString(16)}}`;

/** One line of text that can be shown anywhere. Idempotent. */
export function visible(text: string): string {
  if (PLAIN.test(text)) return text;
  return text.replace(/\r\n|[\n\t]/g, " ").replace(HIDDEN, escaped);
}

const unicodeEscape = (char: string): string =>
  Array.from({ length: char.length }, (_, i) => `\\u${char.charCodeAt(i).toString(16).padStart(4, "0")}`).join("");

/** JSON text in which no character is hidden: each stands as the \u escape that reads back to it. Line breaks between values stay. */
export const visibleJson = (json: string): string =>
  // JSON.stringify leaves direction marks and the controls from U+007F up as they are.
  json.replace(/[^\x20-\x7e\n]+/g, (run) => run.replace(HIDDEN, unicodeEscape));

/** `visible`, line by line, for text of our own that carries pieces of unknown origin. */
export const visibleLines = (text: string): string => text.split("\n").map(visible).join("\n");
