// Files that are read once and remembered, for a command of several parts that each read the same input.

import type { Read } from "../quantity/index.ts";
import type { Files } from "./files.ts";

/** The same files; a path asked for again gives the text it gave before, standard input too. */
export function readOnce(files: Files): Files {
  const kept = new Map<string, Read<string>>();
  return {
    ...files,
    read: (path) => {
      const found = kept.get(path) ?? files.read(path);
      kept.set(path, found);
      return found;
    },
  };
}
