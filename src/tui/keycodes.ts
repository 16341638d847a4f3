// The tables that turn a terminal's key sequences into names of keys.

/** Last letter of `ESC [ ... letter` and of `ESC O letter`. */
export const FINAL_LETTERS: Readonly<Record<string, string>> = {
  A: "up",
  B: "down",
  C: "right",
  D: "left",
  E: "begin",
  F: "end",
  H: "home",
  P: "f1",
  Q: "f2",
  R: "f3",
  S: "f4",
};

/** Number of `ESC [ number ~`. Two numbers for one key: terminals disagree. */
export const TILDE_NUMBERS: Readonly<Record<string, string>> = {
  1: "home",
  2: "insert",
  3: "delete",
  4: "end",
  5: "pageup",
  6: "pagedown",
  7: "home",
  8: "end",
  11: "f1",
  12: "f2",
  13: "f3",
  14: "f4",
  15: "f5",
  17: "f6",
  18: "f7",
  19: "f8",
  20: "f9",
  21: "f10",
  23: "f11",
  24: "f12",
};

/** The Linux console's own `ESC [ [ letter`. */
export const CONSOLE_LETTERS: Readonly<Record<string, string>> = { A: "f1", B: "f2", C: "f3", D: "f4", E: "f5" };

/** Number pad in application mode, `ESC O letter`: what the key types. */
export const PAD_LETTERS: Readonly<Record<string, string>> = {
  X: "=",
  j: "*",
  k: "+",
  l: ",",
  m: "-",
  n: ".",
  o: "/",
  p: "0",
  q: "1",
  r: "2",
  s: "3",
  t: "4",
  u: "5",
  v: "6",
  w: "7",
  x: "8",
  y: "9",
};

/** Control characters that have a key of their own. Backspace sends 0x7f or 0x08, by terminal. */
export const CONTROL_KEYS: Readonly<Record<string, string>> = {
  "\x00": "ctrl+space",
  "\x08": "backspace",
  "\x09": "tab",
  "\x0a": "enter",
  "\x0d": "enter",
  "\x1c": "ctrl+\\",
  "\x1d": "ctrl+]",
  "\x1e": "ctrl+^",
  "\x1f": "ctrl+_",
  "\x7f": "backspace",
};

/** Code points that `ESC [ code ; modifiers u` uses for keys that type nothing. */
export const CODE_KEYS: Readonly<Record<number, string>> = {
  9: "tab",
  13: "enter",
  27: "escape",
  32: "space",
  127: "backspace",
};

/** Modifier parameter (1 + shift 1 + alt 2 + ctrl 4) as the prefix of a key's name. */
export function modifierPrefix(parameter: number): string {
  const bits = Number.isInteger(parameter) && parameter > 0 ? parameter - 1 : 0;
  return `${bits & 4 ? "ctrl+" : ""}${bits & 2 ? "alt+" : ""}${bits & 1 ? "shift+" : ""}`;
}
