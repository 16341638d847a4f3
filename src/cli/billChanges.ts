// What was taken over from an edited bill, a sentence each.

import { type Bill, type BillChange, visible } from "../order/index.ts";

const quoted = (text: string): string => (text === "" ? "a blank" : JSON.stringify(visible(text)));

function words({ kind, item, line, heading, made, read }: BillChange): string {
  const what = `${visible(item)}${line === "own line" ? "" : ` (${line})`}`;
  switch (kind) {
    case "kept":
      return `${what}, ${heading}: yours is kept, ${quoted(read)} in place of ${quoted(made)}`;
    case "not taken over":
      return `${what}, ${heading}: yours, ${quoted(read)}, was beside another part and is not taken over`;
    case "check again":
      return `${what}: CHECK AGAIN what you chose: ${heading} was ${quoted(read)}, now it is ${quoted(made)}`;
    case "own line":
      return `${what}: your own line is kept`;
    case "put back":
      return `${what}: the line was missing and is put back`;
    case "not counted":
      return `${what}: the bank no longer takes it; what you wrote is kept, at a quantity of 0`;
  }
}

/** Lines for the error stream; none for a bill that was made anew. */
export function changeLines({ changes }: Pick<Bill, "changes">, path: string | undefined): readonly string[] {
  if (changes === undefined || path === undefined) return [];
  const file = visible(path === "-" ? "standard input" : path);
  if (changes.length === 0) return [`${file}: nothing in it is yours; the bill is made anew`];
  return changes.map((change) => `${change.at === null ? file : `${file}:${change.at}`}: ${words(change)}`);
}
