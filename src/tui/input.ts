// Owns standard input while the screens are up: raw mode, decoding, and the wait that tells Escape from a sequence.
import { StringDecoder } from "node:string_decoder";
import { type InputEvent, makeTokeniser } from "./tokens.ts";

/** The part of a terminal's input stream that is used. */
export interface TerminalInput {
  readonly isTTY?: boolean;
  setRawMode?: (on: boolean) => unknown;
  on: (event: "data" | "end" | "close" | "error", listener: (data: Buffer | string) => void) => unknown;
  off: (event: "data" | "end" | "close" | "error", listener: (data: Buffer | string) => void) => unknown;
  resume: () => unknown;
  pause: () => unknown;
}

export interface InputSource {
  readonly start: () => void;
  /** Gives the terminal back: cooked mode, stream paused, nothing held. */
  readonly stop: () => void;
}

export interface InputSourceOptions {
  readonly stdin: TerminalInput;
  readonly onEvent: (event: InputEvent) => void;
  /** The terminal is gone: end of input, or an error reading it. */
  readonly onGone: () => void;
}

/** How long a lone Escape waits for the rest of a sequence: longer than a slow line's gap, shorter than a hand notices. */
export const ESCAPE_WAIT_MS = 40;
/** How long an unfinished paste may be silent before it is taken as whole. */
export const PASTE_WAIT_MS = 1000;

/** Turns a terminal's input stream into events, between `start` and `stop`. */
export function openInput({ stdin, onEvent, onGone }: InputSourceOptions): InputSource {
  let decoder = new StringDecoder("utf8");
  let tokens = makeTokeniser();
  let timer: ReturnType<typeof setTimeout> | undefined;
  let running = false;

  const send = (events: readonly InputEvent[]): void => {
    for (const event of events) if (running) onEvent(event);
  };
  const wait = (): void => {
    clearTimeout(timer);
    const pending = tokens.pending();
    if (pending === "nothing") return;
    timer = setTimeout(() => send(tokens.flush()), pending === "escape" ? ESCAPE_WAIT_MS : PASTE_WAIT_MS);
  };
  const onData = (data: Buffer | string): void => {
    send(tokens.push(typeof data === "string" ? data : decoder.write(data)));
    if (running) wait();
  };
  const gone = (): void => {
    if (running) onGone();
  };

  return {
    start: () => {
      if (running) return;
      running = true;
      decoder = new StringDecoder("utf8");
      tokens = makeTokeniser();
      stdin.setRawMode?.(true);
      stdin.on("data", onData);
      for (const event of ["end", "close", "error"] as const) stdin.on(event, gone);
      stdin.resume();
    },
    stop: () => {
      if (!running) return;
      running = false;
      clearTimeout(timer);
      stdin.off("data", onData);
      for (const event of ["end", "close", "error"] as const) stdin.off(event, gone);
      try {
        stdin.setRawMode?.(false);
      } catch {
        // The terminal may be gone already; there is no mode left to restore.
      }
      stdin.pause();
    },
  };
}
