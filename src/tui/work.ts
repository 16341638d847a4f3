// What is the user's work on the screens, what has been tried in it, and what differs between two states of it, in words.
import type { Overrides } from "../catalog/index.ts";
import type { Ranking } from "../search/index.ts";
import { FIELDS } from "./fields.ts";
import type { Arrangement } from "./ports.ts";

/** What a step back brings back. */
export interface Work {
  /** Text of the brief's fields by key. */
  readonly values: Readonly<Record<string, string>>;
  readonly extra: Readonly<Record<string, unknown>>;
  readonly pins: readonly Arrangement[];
  readonly chosen: Arrangement | null;
  readonly rank: Ranking;
  readonly frontOnly: boolean;
  /** Values of the catalogue set by hand: text by heading by part. */
  readonly overrides: Overrides;
}

export interface History {
  readonly past: readonly Work[];
  readonly future: readonly Work[];
  /** What the last change was typed into: more typing there is the same change. */
  readonly typing: string | null;
}

export const NO_HISTORY: History = { past: [], future: [], typing: null };

/** One brief that was planned. Cost in the major unit; null is unpriced or, with no best, nothing that fits. */
export interface Tried {
  readonly values: Work["values"];
  readonly extra: Work["extra"];
  /** What changed since the one before. */
  readonly words: string;
  readonly best: string | null;
  readonly cost: number | null;
  readonly currency: string | null;
  readonly units: number | null;
  /** Worst unit voltage over its limit. */
  readonly load: number | null;
  /** The cost of the chosen bank under this brief. */
  readonly chosenCost: number | null;
}

const shown = (text: string | undefined): string => ((text ?? "").trim() === "" ? "blank" : (text as string));

/** What differs between two states of the work, in words: "Charge voltage 2.2 kV to 2.4 kV, the pins". */
export function differenceWords(before: Work, after: Work): string {
  const fields = FIELDS.filter(({ key }) => (before.values[key] ?? "") !== (after.values[key] ?? "")).map(
    ({ key, label }) => `${label} ${shown(before.values[key])} to ${shown(after.values[key])}`,
  );
  const rest = [
    ...(before.extra === after.extra ? [] : ["what else the brief says"]),
    ...(before.pins === after.pins ? [] : ["the pins"]),
    ...(before.chosen === after.chosen ? [] : ["the chosen bank"]),
    ...(before.rank === after.rank ? [] : [`order by ${before.rank} to ${after.rank}`]),
    ...(before.overrides === after.overrides ? [] : ["values set by hand"]),
    ...(before.frontOnly === after.frontOnly ? [] : ["which layouts are listed"]),
  ];
  return [...fields, ...rest].join(", ");
}
