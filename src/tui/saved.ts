// The brief, the pins and where one was, as text to keep and back; text that cannot be trusted gives nothing.

import { FIELDS } from "./fields.ts";
import { LONGEST_LINE } from "./line.ts";
import type { Arrangement } from "./ports.ts";
import { RANKS } from "./ranks.ts";
import { MOST_PINS, SCREENS, type State } from "./state.ts";

const VERSION = 1;

export type SavedPart = Pick<
  State,
  "values" | "extra" | "pins" | "chosen" | "rank" | "frontOnly" | "screen" | "selected"
>;

export const savedText = (state: State): string => {
  const { values, extra, pins, chosen, rank, frontOnly, screen, selected } = state;
  return `${JSON.stringify({ version: VERSION, values, extra, pins, chosen, rank, frontOnly, screen, selected }, null, 2)}\n`;
};

const isCount = (value: unknown): value is number =>
  Number.isInteger(value) && (value as number) >= 1 && (value as number) <= 1e6;

function arrangement(value: unknown): Arrangement | null {
  if (typeof value !== "object" || value === null) return null;
  const { part, series, parallel, ties } = value as Record<string, unknown>;
  if (typeof part !== "string" || part === "" || part.length > 1000 || !isCount(series) || !isCount(parallel))
    return null;
  return ties === "cross-tied" || ties === "strings" ? { part, series, parallel, ties } : null;
}

const oneOf = <T extends string>(list: readonly T[], value: unknown, otherwise: T): T =>
  list.find((item) => item === value) ?? otherwise;

/** Whether a later version of this program wrote it: then it is no ruin. */
export const isNewer = (text: string): boolean => {
  const version = /^\s*\{\s*"version"\s*:\s*(\d{1,9})\b/.exec(text)?.[1];
  return version !== undefined && Number(version) > VERSION;
};

/** Null when the text is not what `savedText` writes; single parts that are odd fall back to their beginnings. */
export function readSaved(text: string): SavedPart | null {
  let raw: unknown;
  try {
    raw = JSON.parse(text);
  } catch {
    return null;
  }
  if (typeof raw !== "object" || raw === null) return null;
  const saved = raw as Record<string, unknown>;
  if (saved.version !== VERSION || typeof saved.values !== "object" || saved.values === null) return null;
  const given = saved.values as Record<string, unknown>;
  const values: Record<string, string> = {};
  for (const { key } of FIELDS) {
    const value = Object.hasOwn(given, key) ? given[key] : undefined;
    if (typeof value === "string") values[key] = value.slice(0, LONGEST_LINE);
  }
  const pins = Array.isArray(saved.pins) ? saved.pins.map(arrangement).filter((pin) => pin !== null) : [];
  const extra = saved.extra;
  return {
    values,
    // Read again by the brief's own schema at every plan, so that nothing here is believed.
    extra: typeof extra === "object" && extra !== null && !Array.isArray(extra) ? { ...extra } : {},
    pins: pins.slice(0, MOST_PINS),
    chosen: arrangement(saved.chosen),
    rank: oneOf(RANKS, saved.rank, "cost"),
    frontOnly: saved.frontOnly === true,
    screen: oneOf(SCREENS, saved.screen, "brief"),
    selected: typeof saved.selected === "string" ? saved.selected : null,
  };
}
