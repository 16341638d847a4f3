// Cuts what the terminal sends into keys, pastes and reports, however the bytes were chunked on the way.
import { type InputEvent, key, readOne, report } from "./sequences.ts";

export type { InputEvent } from "./sequences.ts";

/** What the tokeniser still waits for: nothing, the rest of an escape sequence, or the end of a paste. */
export type Pending = "nothing" | "escape" | "paste";

export interface Tokeniser {
  readonly push: (chunk: string) => readonly InputEvent[];
  /** The line has been quiet: what is held is all there is. */
  readonly flush: () => readonly InputEvent[];
  readonly pending: () => Pending;
}

const PASTE_START = "\x1b[200~";
const PASTE_END = "\x1b[201~";
/** A paste is cut here: no field takes more, and a lost end mark must not eat the memory. */
const LONGEST_PASTE = 1 << 20;

/** A fresh tokeniser. Cutting its input at other places never changes the events, only when they come. */
export function makeTokeniser(): Tokeniser {
  let held = "";
  /** Text of the paste under way; null outside one. */
  let paste: string | null = null;

  const readPaste = (into: InputEvent[]): boolean => {
    const end = held.indexOf(PASTE_END);
    const body = end < 0 ? held.slice(0, Math.max(0, held.length - PASTE_END.length + 1)) : held.slice(0, end);
    paste = ((paste ?? "") + body).slice(0, LONGEST_PASTE);
    held = held.slice(end < 0 ? body.length : end + PASTE_END.length);
    if (end < 0) return false;
    into.push({ kind: "paste", text: paste });
    paste = null;
    return true;
  };

  const drain = (): InputEvent[] => {
    const events: InputEvent[] = [];
    while (held !== "") {
      if (paste !== null) {
        if (!readPaste(events)) break;
        continue;
      }
      const step = readOne(held);
      if (step === null) break;
      const isPaste = held.startsWith(PASTE_START) && step.took === PASTE_START.length;
      held = held.slice(step.took);
      if (isPaste) paste = "";
      else events.push(step.event);
    }
    return events;
  };

  return {
    push: (chunk) => {
      held += chunk;
      return drain();
    },
    flush: () => {
      if (paste !== null) {
        const text = (paste + held).slice(0, LONGEST_PASTE);
        paste = null;
        held = "";
        return [{ kind: "paste", text }];
      }
      const rest = held;
      held = "";
      if (rest === "") return [];
      if (rest === "\x1b") return [key("escape")];
      if (rest.length === 2 && rest[0] === "\x1b") return [key(`alt+${rest[1]}`)];
      return [report(rest)];
    },
    pending: () => (paste !== null ? "paste" : held === "" ? "nothing" : "escape"),
  };
}
