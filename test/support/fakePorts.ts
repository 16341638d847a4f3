// Ports that keep what was printed; files are real unless a text is laid over a path.
import { resolve } from "node:path";
import { filesOn, type Ports } from "../../src/cli/index.ts";

export const ROOT = resolve(import.meta.dirname, "../..");
export const at = (path: string): string => resolve(ROOT, path);

export interface Kept extends Ports {
  readonly printed: () => string;
  readonly told: () => string;
  readonly written: ReadonlyMap<string, string>;
}

export function fakePorts(texts: Readonly<Record<string, string>> = {}, columns = 80): Kept {
  const real = filesOn();
  let out = "";
  let err = "";
  const written = new Map<string, string>();
  return {
    out: (text) => {
      out += text;
    },
    err: (text) => {
      err += text;
    },
    columns,
    catalogs: at("catalogs"),
    files: {
      read: (path) => {
        const text = texts[path];
        return text === undefined ? real.read(path) : { ok: true, value: text };
      },
      write: (path, text) => {
        written.set(path, text);
        return { ok: true, value: path };
      },
      move: real.move,
      watch: real.watch,
    },
    printed: () => out,
    told: () => err,
    written,
  };
}

/** Control, direction and other unseen characters that must never reach a terminal; line breaks are the table's own. */
export const UNSAFE = /[^\n\P{C}]|[\u2028\u2029\u202a-\u202e\u2066-\u2069\u200b-\u200f]/u;
