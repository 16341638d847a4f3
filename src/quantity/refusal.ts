// The shape of what we refuse: a stable code, the facts, and where it stood. Words are made in cli/words.ts.

/** Where in the input a fault stands. `line` and `column` count from 1. */
export interface Place {
  readonly file?: string;
  readonly line?: number;
  readonly column?: number;
  /** Heading of a table column, or key path of a brief. */
  readonly field?: string;
}

/**
 * Something the user can mend. `read` is what stood there, `want` what would be accepted,
 * both plain words; a caller shows them, never parses them.
 */
export interface Refusal {
  readonly code: string;
  readonly place: Place;
  readonly read: string;
  readonly want: string;
}

/** Either a value or what was wrong with its input; never both. */
export type Read<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly refusals: readonly Refusal[] };

export const accepted = <T>(value: T): Read<T> => ({ ok: true, value });
export const refused = (...refusals: readonly Refusal[]): Read<never> => ({ ok: false, refusals });
