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
}
