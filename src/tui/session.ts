// Takes the terminal over and gives it back in every way of ending: quit, signal, hang-up, suspend, exception.

import { MOUSE_OFF } from "./mouse.ts";

/** What of a process is needed; `process` itself fits. */
export interface ProcessPort {
  readonly pid: number;
  readonly platform: string;
  on: (event: string, listener: (fact?: unknown) => void) => unknown;
  off: (event: string, listener: (fact?: unknown) => void) => unknown;
  kill: (pid: number, signal: string) => unknown;
}

export interface SessionOptions {
  readonly process: ProcessPort;
  /** Writes to the terminal at once, so that it is done even if the process ends next. May throw: the terminal may be gone. */
  readonly writeSync: (text: string) => void;
  readonly startInput: () => void;
  readonly stopInput: () => void;
  /** Draw everything again: the screen was someone else's meanwhile. */
  readonly redraw: () => void;
  /** The session is over and the terminal is the user's again. Called once. */
  readonly onEnd: (status: number, trouble: unknown) => void;
}

export interface Session {
  readonly enter: () => void;
  readonly end: (status: number) => void;
  /** Ends because of a fault of ours, which is handed on. */
  readonly fail: (fault?: unknown) => void;
  /** Stops like any program on Ctrl-Z; does nothing where that does not exist. */
  readonly suspend: () => void;
}

/** Alternate screen, clear, hide the cursor, no autowrap, mark pastes. */
export const ENTER = "\x1b[?1049h\x1b[2J\x1b[H\x1b[?25l\x1b[?7l\x1b[?2004h";
/** The way back, in the other order; the plain style first, so that none leaks into the shell. */
export const LEAVE = `\x1b[0m${MOUSE_OFF}\x1b[?7h\x1b[?2004l\x1b[?25h\x1b[?1049l`;

/** Status a shell reports for a death by this signal: 128 and its number. */
const SIGNAL_STATUS: Readonly<Record<string, number>> = { SIGINT: 130, SIGQUIT: 131, SIGTERM: 143, SIGHUP: 129 };
const BUG_STATUS = 70;
/** Signals that win32 does not have. */
const JOB_SIGNALS: readonly string[] = ["SIGCONT", "SIGTSTP"];
/** A stop takes hold within this, and nothing runs while it holds. */
const GO_ON_MS = 250;

export function openSession(options: SessionOptions): Session {
  const { process, writeSync, startInput, stopInput, redraw, onEnd } = options;
  let entered = false;
  let ended = false;
  /** With input paused nothing else keeps the process alive, and it would end on its way back from being stopped. */
  let keepAlive: ReturnType<typeof setInterval> | undefined;

  const write = (text: string): void => {
    try {
      writeSync(text);
    } catch {
      // The terminal is gone; there is nothing left to restore.
    }
  };
  const take = (): void => {
    entered = true;
    write(ENTER);
    startInput();
  };
  const release = (): void => {
    if (!entered) return;
    entered = false;
    stopInput();
    write(LEAVE);
  };
  const end = (status: number, trouble: unknown = null): void => {
    if (ended) return;
    ended = true;
    clearInterval(keepAlive);
    release();
    for (const [event, listener] of listeners) process.off(event, listener);
    onEnd(status, trouble);
  };
  /** Also after a stop that we did not make ourselves: the shell has changed the terminal's mode meanwhile. */
  const resume = (): void => {
    clearInterval(keepAlive);
    if (ended) return;
    if (entered) stopInput();
    else if (process.platform !== "win32") process.on("SIGTSTP", suspend);
    take();
    redraw();
  };
  const suspend = (): void => {
    if (process.platform === "win32" || !entered) return;
    release();
    // With our own listener on it the signal would not stop us.
    process.off("SIGTSTP", suspend);
    clearInterval(keepAlive);
    keepAlive = setInterval(goOn, GO_ON_MS);
    process.kill(process.pid, "SIGTSTP");
  };
  /** Where no shell could wake us the system ignores the stop; then the screens come back by themselves. */
  const goOn = (): void => {
    if (!entered) resume();
  };
  const fail = (error?: unknown): void => end(BUG_STATUS, error ?? new Error("unknown"));
  const listeners: readonly (readonly [string, (fact?: unknown) => void])[] = [
    ...Object.entries(SIGNAL_STATUS).map(([signal, status]) => [signal, () => end(status)] as const),
    ["SIGCONT", resume],
    ["SIGTSTP", suspend],
    ["uncaughtException", fail],
    ["unhandledRejection", fail],
  ];

  return {
    enter: () => {
      for (const [event, listener] of listeners) {
        if (!JOB_SIGNALS.includes(event) || process.platform !== "win32") process.on(event, listener);
      }
      take();
    },
    end: (status) => end(status),
    fail,
    suspend,
  };
}
