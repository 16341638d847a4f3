// The short names that parts carry in a schematic: R, K, D counted through, one of each of the rest.

import type { SchematicProps } from "./schematicProps.ts";

export interface PartNames {
  /** In the order of the props. */
  readonly isolation: readonly string[];
  readonly dumpRelay: string;
  readonly dump: string;
  readonly bleeds: readonly string[];
  readonly clamp: string;
}

/** Names of what surrounds the bank; the bank's own parts carry the number of their stage or unit. */
export function partNames({ isolation, dump, bleeds }: SchematicProps): PartNames {
  const counts = { R: 0, K: 0, D: 0 };
  const next = (letter: keyof typeof counts): string => {
    counts[letter] += 1;
    return `${letter}${counts[letter]}`;
  };
  const letters = { resistor: "R", relay: "K", diode: "D" } as const;
  const named = isolation.map(({ kind }) => next(letters[kind]));
  const [dumpRelay, dumpName] = dump === null ? ["", ""] : [next("K"), next("R")];
  return { isolation: named, dumpRelay, dump: dumpName, bleeds: bleeds.map(() => next("R")), clamp: next("D") };
}

/** "C1.1", or "C1.1 to C6.10". */
export function spanOf(letters: string, first: string, last: string): string {
  return first === last ? `${letters}${first}` : `${letters}${first} to ${letters}${last}`;
}
