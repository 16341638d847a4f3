// Reads one key or one report from the beginning of what the terminal sent.
import {
  CODE_KEYS,
  CONSOLE_LETTERS,
  CONTROL_KEYS,
  FINAL_LETTERS,
  modifierPrefix,
  PAD_LETTERS,
  TILDE_NUMBERS,
} from "./keycodes.ts";

/**
 * `key` is the key's name with its modifiers in the order ctrl, alt, shift ("ctrl+c", "shift+tab", "pageup", "a");
 * `text` is what it types, empty for a key that types nothing.
 */
export type InputEvent =
  | { readonly kind: "key"; readonly key: string; readonly text: string }
  | { readonly kind: "paste"; readonly text: string }
  /** Anything else the terminal said: mouse, focus, an answer, an unknown sequence. Never typed into a field. */
  | { readonly kind: "report"; readonly text: string };

/** Longest control sequence believed; past it, it is not one. */
const LONGEST_SEQUENCE = 64;
export const key = (name: string, text = ""): InputEvent => ({ kind: "key", key: name, text });
export const report = (text: string): InputEvent => ({ kind: "report", text });

/** One event and how many characters it took; null: more must come first. */
export type Step = { readonly took: number; readonly event: InputEvent } | null;

function controlKey(char: string): InputEvent {
  const named = CONTROL_KEYS[char];
  if (named !== undefined) return key(named);
  return key(`ctrl+${String.fromCharCode(char.charCodeAt(0) + 0x60)}`);
}

function typedKey(code: number, prefix: string): InputEvent {
  const named = CODE_KEYS[code];
  if (named !== undefined && named !== "space") return key(prefix + named);
  if (code < 32 || code > 0x10ffff) return report(`code ${code}`);
  const char = String.fromCodePoint(code);
  const plain = prefix === "" || prefix === "shift+";
  if (plain) return key(char === " " ? "space" : char, char);
  return key(prefix + (char === " " ? "space" : char));
}

/** A whole `ESC [ parameters letter`. */
function controlSequence(text: string): InputEvent {
  const final = text.at(-1) ?? "";
  const parameters = text.slice(2, -1);
  if (!/^[\d;:]*$/.test(parameters)) return report(text);
  const [first = "", second = "", third = ""] = parameters.split(";");
  const prefix = modifierPrefix(Number.parseInt(second || "1", 10));
  if (final === "~" && first === "27" && third !== "") return typedKey(Number.parseInt(third, 10), prefix);
  if (final === "~" || final === "^") {
    const named = TILDE_NUMBERS[first];
    return named === undefined ? report(text) : key((final === "^" ? "ctrl+" : prefix) + named);
  }
  if (final === "u" && first !== "") return typedKey(Number.parseInt(first, 10), prefix);
  if (final === "Z") return key("shift+tab");
  const named = FINAL_LETTERS[final];
  // A cursor report "ESC [ row ; column R" shares its letter with F3, which always says 1 first.
  if (named === undefined || !(first === "" || first === "1")) return report(text);
  return key(prefix + named);
}

function readControlSequence(text: string): Step {
  if (text[2] === "[") {
    if (text.length < 4) return null;
    const named = CONSOLE_LETTERS[text[3] ?? ""];
    return { took: 4, event: named === undefined ? report(text.slice(0, 4)) : key(named) };
  }
  for (let i = 2; i < text.length; i += 1) {
    const code = text.charCodeAt(i);
    if (code >= 0x40 && code <= 0x7e) return { took: i + 1, event: controlSequence(text.slice(0, i + 1)) };
    // A broken sequence ends before what broke it, so that a Ctrl-C after half a sequence is still a Ctrl-C.
    if (code < 0x20 || code > 0x7e || i >= LONGEST_SEQUENCE) return { took: i, event: report(text.slice(0, i)) };
  }
  return null;
}

/** `ESC ] ... BEL` and its kin: answers to questions, swallowed whole. */
function readStringSequence(text: string): Step {
  for (let i = 2; i < text.length; i += 1) {
    if (text[i] === "\x07") return { took: i + 1, event: report(text.slice(0, i + 1)) };
    if (text[i] === "\x1b") {
      if (i + 1 >= text.length) return null;
      const took = text[i + 1] === "\\" ? i + 2 : i;
      return { took, event: report(text.slice(0, took)) };
    }
    if ((text.charCodeAt(i) < 0x20 && text[i] !== "\t") || i >= 4096)
      return { took: i, event: report(text.slice(0, i)) };
  }
  return null;
}

function readEscape(text: string): Step {
  const next = text[1];
  if (next === undefined) return null;
  if (next === "[") return readControlSequence(text);
  if (next === "]" || next === "P" || next === "_" || next === "^" || next === "X") return readStringSequence(text);
  if (next === "O") {
    const letter = text[2];
    if (letter === undefined) return null;
    const named = letter === "M" ? "enter" : FINAL_LETTERS[letter];
    if (named !== undefined) return { took: 3, event: key(named) };
    const typed = PAD_LETTERS[letter];
    if (typed !== undefined) return { took: 3, event: key(typed, typed) };
    return { took: 2, event: key("alt+O") };
  }
  if (next === "\x7f" || next === "\x08") return { took: 2, event: key("alt+backspace") };
  if (next < " ") return { took: 1, event: key("escape") };
  const code = text.codePointAt(1) ?? 0;
  if (code >= 0xd800 && code <= 0xdbff && text.length < 3) return null;
  const char = String.fromCodePoint(code);
  return { took: 1 + char.length, event: key(`alt+${char === " " ? "space" : char}`) };
}

/** The first event of a text that is not empty. */
export function readOne(text: string): Step {
  const char = text[0] ?? "";
  if (char === "\x1b") return readEscape(text);
  if (char < " " || char === "\x7f") return { took: 1, event: controlKey(char) };
  const code = text.codePointAt(0) ?? 0;
  if (code >= 0xd800 && code <= 0xdbff && text.length < 2) return null;
  if ((code >= 0x80 && code < 0xa0) || (code >= 0xd800 && code <= 0xdfff)) return { took: 1, event: report(char) };
  const typed = String.fromCodePoint(code);
  return { took: typed.length, event: key(typed === " " ? "space" : typed, typed) };
}
