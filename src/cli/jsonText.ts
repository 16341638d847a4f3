// JSON text to a value, with the place of every key and of the first fault: what the runtime's own reader does not tell.
//
// Grammar as in RFC 8259. Beyond it: a byte-order mark is passed over, a key that stands twice is refused, a number beyond the doubles
// is refused, and nesting stops at 64, so that no text can exhaust the stack. Source: [RFC8259] sections 2 to 8.

import { accepted, type Place, type Read, refused } from "../quantity/index.ts";

export interface JsonText {
  readonly value: unknown;
  /** Where the value of a key stands, by its path ("steady.current"); undefined when there is no such key. */
  readonly placeOf: (path: string) => Place | undefined;
}

const DEEPEST = 64;
const NUMBER = /-?(?:0|[1-9]\d*)(?:\.\d+)?(?:[eE][+-]?\d+)?/y;
const STRING = /"(?:[^"\\\u0000-\u001f]|\\(?:["\\/bfnrt]|u[0-9a-fA-F]{4}))*"/y;
const BLANKS = /[ \t\n\r]*/y;
const WORDS: Readonly<Record<string, unknown>> = { true: true, false: false, null: null };

/** The first fault, thrown through the nested readers and caught in `readJson` alone. */
interface Fault {
  readonly code: string;
  readonly at: number;
  readonly want: string;
}

function placeAt(text: string, at: number, file: string): Place {
  const before = text.slice(0, at);
  return { file, line: before.split("\n").length, column: at - before.lastIndexOf("\n") };
}

/** The word that stands at a fault, at most 40 characters of it. */
function readWhat(text: string, at: number): string {
  if (at >= text.length) return "the end of the text";
  const word = /^(?:"[^"\r\n]{0,40}"?|[^\s,}\]]{1,40}|.)/u.exec(text.slice(at, at + 50))?.[0];
  return word ?? "the end of the line";
}

/** Reads JSON text. Refuses its first fault with line and column, counted from 1. */
export function readJson(source: string, file: string): Read<JsonText> {
  const text = source.charCodeAt(0) === 0xfeff ? source.slice(1) : source;
  if (text.trim() === "")
    return refused({ code: "empty-file", place: { file }, read: "nothing", want: "a JSON object in braces" });
  const offsets = new Map<string, number>();
  let fault: Fault | null = null;
  try {
    const value = scan(text, offsets, (found) => {
      fault = found;
      throw found;
    });
    const placeOf = (path: string): Place | undefined => {
      const at = offsets.get(path);
      return at === undefined ? undefined : placeAt(text, at, file);
    };
    return accepted({ value, placeOf });
  } catch (error) {
    if (fault === null || error !== fault) throw error;
    const { code, at, want } = fault as Fault;
    return refused({ code, place: placeAt(text, at, file), read: readWhat(text, at), want });
  }
}

function scan(text: string, offsets: Map<string, number>, stop: (fault: Fault) => never): unknown {
  let at = 0;
  const no = (want: string, code = "bad-json", where = at): never => stop({ code, at: where, want });
  const match = (pattern: RegExp): string | null => {
    pattern.lastIndex = at;
    const found = pattern.exec(text)?.[0] ?? null;
    at += found?.length ?? 0;
    return found;
  };
  /** A comma (more follows) or the closing mark. */
  const hasMore = (close: string): boolean => {
    const mark = text[at];
    if (mark !== "," && mark !== close) no(`a comma, or ${close}`);
    at++;
    return mark === ",";
  };
  const value = (path: string, depth: number): unknown => {
    match(BLANKS);
    if (depth > DEEPEST) no(`at most ${DEEPEST} levels`, "too-deep");
    offsets.set(path, at);
    const start = text[at];
    const found =
      start === "{" ? object(path, depth) : start === "[" ? list(path, depth) : start === '"' ? string() : plain();
    match(BLANKS);
    return found;
  };
  const string = (): string => {
    const found = match(STRING);
    return found === null ? no("a text that ends in its quote on the same line") : (JSON.parse(found) as string);
  };
  const plain = (): unknown => {
    const begin = at;
    for (const [word, meaning] of Object.entries(WORDS)) {
      if (!text.startsWith(word, at)) continue;
      at += word.length;
      return meaning;
    }
    const digits = match(NUMBER);
    if (digits === null) no("a value: a text in quotes, a number, an object in braces");
    const number = Number(digits);
    return Number.isFinite(number) ? number : no("a finite number", "not-finite", begin);
  };
  const isEmpty = (close: string): boolean => {
    at++;
    match(BLANKS);
    if (text[at] !== close) return false;
    at++;
    return true;
  };
  const list = (path: string, depth: number): unknown[] => {
    const items: unknown[] = [];
    if (isEmpty("]")) return items;
    do items.push(value(`${path}.${items.length}`, depth + 1));
    while (hasMore("]"));
    return items;
  };
  const object = (path: string, depth: number): Record<string, unknown> => {
    const found: Record<string, unknown> = {};
    if (isEmpty("}")) return found;
    do {
      match(BLANKS);
      const begin = at;
      if (text[at] !== '"') no("a key in quotes");
      const key = string();
      if (Object.hasOwn(found, key)) no(`the key ${JSON.stringify(key)} once only`, "duplicate-key", begin);
      match(BLANKS);
      if (text[at] !== ":") no("a colon after the key");
      at++;
      const inner = value(path === "" ? key : `${path}.${key}`, depth + 1);
      // Defined, not assigned: a key named __proto__ is then only a key.
      Object.defineProperty(found, key, { value: inner, enumerable: true, writable: true, configurable: true });
    } while (hasMore("}"));
    return found;
  };
  const whole = value("", 0);
  if (at < text.length) no("the end of the text");
  return whole;
}
