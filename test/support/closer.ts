// Opens the screens on one bank and one screen of it, on a real grid of cells, and closes them again.
import { savedText } from "../../src/tui/saved.ts";
import { openScreens } from "../../src/tui/screens.ts";
import type { State } from "../../src/tui/state.ts";
import { type FakePorts, fakePorts, stateWith } from "./stock.ts";

export const BANK = { part: "flash-a", series: 7, parallel: 4, ties: "cross-tied" } as const;

export interface Opened {
  readonly ports: FakePorts;
  readonly until: (seen: (text: string) => boolean) => Promise<void>;
  readonly type: (text: string) => void;
  /** All that the screen says, scrolled through to its end. */
  readonly all: () => Promise<string>;
  readonly close: () => Promise<void>;
}

export function openCloser(
  size: readonly [number, number],
  state: Partial<State>,
  changes: Parameters<typeof fakePorts>[2] = {},
): Opened {
  const session = savedText(stateWith({ chosen: BANK, ...state }));
  const ports = fakePorts(size[0], size[1], { loadSession: () => session, ...changes });
  const ended = openScreens(ports);
  const type = (text: string): void => ports.stdin.type(text);
  const until = (seen: (text: string) => boolean): Promise<void> => ports.screen.until(seen);
  return {
    ports,
    until,
    type,
    all: async () => {
      type("g");
      await until((text) => !text.includes(" above") && !text.includes("Working"));
      let seen = ports.screen.text();
      while (ports.screen.text().includes(" more below")) {
        const before = ports.screen.text();
        type("\x1b[6~");
        await until((text) => text !== before);
        seen += `\n${ports.screen.text()}`;
      }
      return seen;
    },
    close: async () => {
      ports.process.send("SIGTERM");
      await ended;
    },
  };
}

export const SIZES = [
  [60, 20],
  [80, 24],
  [200, 50],
] as const;

/** Words that a text lacks, blanks and line ends counting as one blank. */
export const missing = (text: string, words: readonly string[]): readonly string[] => {
  const flat = text.replace(/\s+/g, " ");
  return words.filter((word) => !flat.includes(word));
};
