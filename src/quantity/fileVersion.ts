// The version that a file of ours says it is of: none counts as the first, a later one than is known is refused, never guessed at.

import type { Place, Refusal } from "./refusal.ts";

export interface FileVersion {
  /** What stands under the key `version`. */
  readonly found: unknown;
  /** The newest that is understood, from 1. */
  readonly newest: number;
  readonly place: Place;
}

/** Why a file of this version cannot be read; null when it can. Codes: newer-version, bad-value. */
export function versionFault({ found, newest, place }: FileVersion): Refusal | null {
  if (found === undefined) return null;
  const whole = Number.isInteger(found) && (found as number) >= 1;
  const read = JSON.stringify(found) ?? String(found);
  const upTo = newest === 1 ? "version 1" : `a version from 1 to ${newest}`;
  if (!whole) return { code: "bad-value", place, read, want: `${upTo}, or none` };
  if ((found as number) <= newest) return null;
  return { code: "newer-version", place, read: `version ${read}`, want: `${upTo}; a later program reads this file` };
}
