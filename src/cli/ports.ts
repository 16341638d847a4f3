// What a command needs from outside: where its text goes, how wide it may be, and the files.

import type { Files } from "./files.ts";

export interface Ports {
  readonly out: (text: string) => void;
  readonly err: (text: string) => void;
  /** Width of the terminal; 80 where there is none. */
  readonly columns: number;
  readonly files: Files;
  /** Folder of the catalogues that come with the program. */
  readonly catalogs: string;
  /** Long counting beside the main thread; absent: in it, silent, not to be interrupted. */
  readonly background?: {
    /** File of the worker thread. */
    readonly entry: URL;
    /** The error stream is a terminal: progress is shown. */
    readonly terminal: boolean;
    /** Calls back at the user's interrupt, until the function that it gives is called. */
    readonly onInterrupt: (stop: () => void) => () => void;
  };
}

/** Narrowest and widest text that is laid out for; a terminal beyond them gets the nearer one. */
const NARROWEST = 40;
const WIDEST = 240;

/** Width to lay text out for: the terminal's, else that of COLUMNS, else 80. */
export function textWidth(terminal: number | undefined, environment: string | undefined): number {
  const given = /^\d{1,5}$/.test(environment ?? "") ? Number(environment) : 0;
  const wanted = terminal || given || 80;
  return Math.min(WIDEST, Math.max(NARROWEST, wanted));
}
