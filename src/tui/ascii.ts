// Spells the marks of the trade in ASCII, for terminals that have nothing else.

const SPELLINGS: Readonly<Record<string, string>> = {
  "\u00b5": "u",
  "\u03bc": "u",
  "\u03a9": "ohm",
  "\u2126": "ohm",
  "\u03c4": "tau",
  "\u03b5": "eps",
  "\u0394": "delta",
  "±": "+-",
  "×": "x",
  "·": ".",
  "°": "deg",
  "√": "sqrt",
  "²": "^2",
  "³": "^3",
  "½": "1/2",
  "…": "...",
  "≤": "<=",
  "≥": ">=",
  "≈": "~",
  "≠": "!=",
  "→": "->",
  "←": "<-",
  "↑": "^",
  "↓": "v",
  "−": "-",
  "–": "-",
  "—": "-",
  "─": "-",
  "│": "|",
  "┬": "+",
  "┴": "+",
  "├": "+",
  "┤": "+",
  "┼": "+",
  "┌": "+",
  "┐": "+",
  "└": "+",
  "┘": "+",
  "█": "#",
  "▌": "#",
  "░": ".",
  "▏": "|",
  "✓": "ok",
  "✗": "x",
  "•": "*",
  "‘": "'",
  "’": "'",
  "“": '"',
  "”": '"',
  "€": "EUR",
  "£": "GBP",
  "¥": "JPY",
  ß: "ss",
  ø: "o",
  Ø: "O",
  æ: "ae",
  Æ: "AE",
};

/** Text in ASCII: marks spelt out, accents taken off, braille dots a star, anything else a question mark. */
export function asciiOf(text: string): string {
  let out = "";
  for (const char of text) {
    if (char <= "~") out += char;
    else if (SPELLINGS[char] !== undefined) out += SPELLINGS[char];
    else if (char >= "\u2800" && char <= "\u28ff") out += char === "\u2800" ? " " : "*";
    else {
      const base = char.normalize("NFD").replace(/[^ -~]/g, "");
      out += base === "" ? "?" : base;
    }
  }
  return out;
}
