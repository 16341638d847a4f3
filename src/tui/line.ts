// Edits one line of text: a caret, and what the keys do at it. Pure.

export interface Line {
  readonly text: string;
  /** Position of the caret, in characters of `text`, 0 to its length. */
  readonly caret: number;
}

export type LineEdit =
  | { readonly edit: "insert"; readonly text: string }
  | {
      readonly edit: "back" | "delete" | "left" | "right" | "home" | "end" | "clear" | "clearBefore" | "backWord";
    };

/** Longest line taken; what is more is dropped. */
export const LONGEST_LINE = 200;

/** First line of a text, without control characters: what a paste may put into a field. */
export const pasteable = (text: string): string =>
  (text.replace(/^[\r\n]+/, "").split(/[\r\n]/)[0] ?? "").replace(/\t/g, " ").replace(/\p{Cc}/gu, "");

/** Length of the character that ends at, or starts at, a position: 2 for a surrogate pair. */
const before = (text: string, at: number): number =>
  at > 1 && /[\udc00-\udfff]/.test(text[at - 1] ?? "") && /[\ud800-\udbff]/.test(text[at - 2] ?? "")
    ? 2
    : Math.min(at, 1);
const after = (text: string, at: number): number =>
  (text.codePointAt(at) ?? 0) > 0xffff ? 2 : at < text.length ? 1 : 0;

export const lineOf = (text: string): Line => ({ text, caret: text.length });

export function editLine({ text, caret }: Line, edit: LineEdit): Line {
  const head = text.slice(0, caret);
  const tail = text.slice(caret);
  switch (edit.edit) {
    case "insert": {
      const added = pasteable(edit.text).slice(0, Math.max(0, LONGEST_LINE - text.length));
      return { text: head + added + tail, caret: caret + added.length };
    }
    case "back": {
      const size = before(text, caret);
      return { text: head.slice(0, head.length - size) + tail, caret: caret - size };
    }
    case "backWord": {
      const kept = head.replace(/\s*\S*\s*$/, "");
      return { text: kept + tail, caret: kept.length };
    }
    case "delete":
      return { text: head + tail.slice(after(text, caret)), caret };
    case "left":
      return { text, caret: caret - before(text, caret) };
    case "right":
      return { text, caret: caret + after(text, caret) };
    case "home":
      return { text, caret: 0 };
    case "end":
      return { text, caret: text.length };
    case "clear":
      return { text: "", caret: 0 };
    case "clearBefore":
      return { text: tail, caret: 0 };
  }
}
