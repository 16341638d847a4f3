// What is said about the inputs: rows lost, columns passed over, what was assumed because nothing was given.

import type { Refusal } from "../quantity/index.ts";
import type { Settings } from "./settings.ts";
import type { Stock } from "./stock.ts";
import { refusalWords } from "./words.ts";

/** Faults told one by one in text; the rest is counted. */
const TOLD = 12;

export const withWords = (refusal: Refusal): Refusal & { readonly words: string } => ({
  ...refusal,
  words: refusalWords(refusal),
});

/** The `inputs` part of a JSON result. */
export function inputsJson(settings: Settings, { sources, families }: Stock): unknown {
  return {
    brief: settings.file,
    flags: settings.flags,
    catalogues: sources.map(({ faults, notes, ...source }) => ({
      ...source,
      faults: faults.map(withWords),
      notes: notes.map(withWords),
    })),
    assumed: families.filter((family) => family.assumed).map((family) => family.family),
  };
}

/** Lines for the error stream: what was lost, with its place. */
export function faultLines({ sources }: Stock): readonly string[] {
  return sources.flatMap(({ file, faults, notes }) => {
    const told = [...faults, ...notes].slice(0, TOLD).map(refusalWords);
    const rest = faults.length + notes.length - told.length;
    return rest > 0 ? [...told, `${file}: and ${rest} more; see them with: joulewright parts ${file}`] : told;
  });
}

/** Sentences for the text of a plan. */
export function inputSentences({ sources, families }: Stock): readonly string[] {
  const lost = sources.reduce((sum, source) => sum + source.faults.length, 0);
  return [
    ...(lost > 0
      ? [`${lost} ${lost === 1 ? "fault costs its row" : "faults cost their rows"}: those parts were not searched.`]
      : []),
    ...(families.some((family) => family.assumed)
      ? [
          "No resistor catalogue was given: balancing resistors are of an assumed family (E24, 5 %, 2 W, 350 V), unpriced.",
        ]
      : []),
  ];
}
