// Starts the screens on catalogues that were read and files that can be written: fills the ports and opens.
import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import type { Files } from "../cli/index.ts";
import { saveBill } from "./billFile.ts";
import { formValues } from "./briefInput.ts";
import { catalogEngine } from "./catalogEngine.ts";
import type { ScreenPorts, StockFacts } from "./ports.ts";
import { openScreens } from "./screens.ts";

export interface StartOptions {
  readonly parts: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  readonly stock: StockFacts;
  /** A brief as parsed from JSON; what is no object counts as none. */
  readonly brief: unknown;
  /** The brief beats the one saved last time. */
  readonly briefFirst?: boolean;
  readonly files: Files;
  /** Where brief and pins are kept between runs; null keeps nothing. */
  readonly sessionFile: string | null;
  readonly terminal: Pick<ScreenPorts, "stdin" | "stdout" | "writeSync" | "process" | "env" | "complain" | "ascii">;
}

/** The ports of the screens on real files. */
export function portsOn(options: StartOptions): ScreenPorts {
  const { parts, families, stock, brief, briefFirst = false, files, sessionFile, terminal } = options;
  const why = (refusals: readonly { readonly code: string; readonly want: string }[]): string =>
    refusals.map(({ code, want }) => `${code.replaceAll("-", " ")}; needed: ${want}`).join(". ");
  return {
    ...terminal,
    ...formValues(brief),
    briefFirst,
    engine: catalogEngine({ parts, families, files }),
    stock,
    loadSession: () => {
      const read = sessionFile === null ? null : files.read(sessionFile);
      return read?.ok ? read.value : null;
    },
    saveSession: (text) => {
      const written = sessionFile === null ? null : files.write(sessionFile, text, true);
      return written === null || written.ok ? null : why(written.refusals);
    },
    keepSession: () => {
      if (sessionFile === null) return null;
      const read = files.read(sessionFile);
      const kept = read.ok ? files.write(`${sessionFile}.unread`, read.value, true) : read;
      return kept.ok ? `${sessionFile}.unread` : null;
    },
    exportBill: (bill, path, replace) => saveBill(files, bill, path, replace),
  };
}

export const startScreens = (options: StartOptions): Promise<number> => openScreens(portsOn(options));
