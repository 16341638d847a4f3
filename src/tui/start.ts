// Starts the screens on catalogues that were read and files that can be written: fills the ports and opens.
import type { Files } from "../cli/index.ts";
import { accepted, type Read } from "../quantity/index.ts";
import { formValues } from "./briefInput.ts";
import type { ScreenPorts, StockFacts } from "./ports.ts";
import { openScreens } from "./screens.ts";
import type { ReadStock } from "./workshop.ts";

export interface StartOptions {
  /** Reads the catalogues; called once the first frame stands. */
  readonly read: () => Promise<Read<ReadStock>>;
  /** Calls back when one of them changes on disk. */
  readonly watch: ScreenPorts["watch"];
  /** Opens a thread for long work; absent: none. */
  readonly thread?: ScreenPorts["thread"];
  /** What is known of them before. */
  readonly stock: StockFacts;
  /** A brief as parsed from JSON; what is no object counts as none. */
  readonly brief: unknown;
  /** The brief beats the one saved last time. */
  readonly briefFirst?: boolean;
  readonly files: Files;
  /** Where brief and pins are kept between runs; null keeps nothing. */
  readonly sessionFile: string | null;
  readonly terminal: Pick<
    ScreenPorts,
    "stdin" | "stdout" | "writeSync" | "process" | "env" | "complain" | "ascii" | "ground"
  >;
}

/** The ports of the screens on real files. */
export function portsOn(options: StartOptions): ScreenPorts {
  const { stock, brief, briefFirst = false, files, sessionFile, terminal } = options;
  const why = (refusals: readonly { readonly code: string; readonly want: string }[]): string =>
    refusals.map(({ code, want }) => `${code.replaceAll("-", " ")}; needed: ${want}`).join(". ");
  return {
    ...terminal,
    ...formValues(brief),
    briefFirst,
    open: async () => {
      const [read, { workshopOn }] = await Promise.all([options.read(), import("./workshop.ts")]);
      return read.ok ? accepted(workshopOn(read.value, files)) : read;
    },
    watch: options.watch,
    thread: options.thread,
    stock,
    loadSession: () => {
      const read = sessionFile === null ? null : files.read(sessionFile);
      if (read === null || read.ok) return read?.value ?? null;
      // A file that is there and is no text: nothing that could be read, and something to keep.
      return read.refusals.some(({ code }) => code === "not-utf8") ? "" : null;
    },
    saveSession: (text) => {
      const written = sessionFile === null ? null : files.write(sessionFile, text, true);
      return written === null || written.ok ? null : why(written.refusals);
    },
    keepSession: () => {
      if (sessionFile === null) return null;
      const kept = files.move(sessionFile, `${sessionFile}.unread`);
      return kept.ok ? kept.value : null;
    },
  };
}

export const startScreens = (options: StartOptions): Promise<number> => openScreens(portsOn(options));
