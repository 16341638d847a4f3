// The flags that only the paper has, read into choices, every fault told.

import { accepted, nearestWord, type Read, type Refusal, refused } from "../quantity/index.ts";
import type { Earth, Paper, SheetInput } from "../sheet/index.ts";
import { GOVERNING } from "./governing.ts";
import type { PlaceFlags } from "./placeFlags.ts";

export type SheetFlags = PlaceFlags & {
  readonly fuses?: string;
  readonly paper?: string;
  readonly date?: string;
  readonly revision?: string;
  readonly rule?: string;
  readonly earth?: string;
};

export interface SheetChoices extends Pick<SheetInput, "date" | "revision" | "rule" | "earth"> {
  readonly paper: Paper;
}

const EARTHS: readonly Earth[] = ["negative", "positive", "none", "unknown"];
const PAPERS: readonly Paper[] = ["A4", "Letter"];

/** Longest date or revision: it stands in one cell. */
const LONGEST = 60;

function among<T extends string>(flag: string, text: string, choices: readonly T[]): Read<T> {
  const found = choices.find((one) => one.toLowerCase() === text.trim().toLowerCase());
  if (found !== undefined) return accepted(found);
  const near = nearestWord(text, choices);
  const want = `${near === null ? "" : `perhaps ${JSON.stringify(near)}; `}one of ${choices.join(", ")}`;
  return refused({ code: "bad-choice", place: { field: flag }, read: JSON.stringify(text), want });
}

/** Written as it is given, so that the sheet has no clock; a blank is not one. */
function words(flag: string, text: string | undefined): Read<string | null> {
  if (text === undefined) return accepted(null);
  if (text.trim() === "")
    return refused({ code: "empty", place: { field: flag }, read: JSON.stringify(text), want: "words to print" });
  if (text.length > LONGEST)
    return refused({ code: "too-long", place: { field: flag }, read: text, want: `at most ${LONGEST} characters` });
  return accepted(text.trim());
}

/** Flags that speak of measured units say nothing without any. */
function unmeasured(flags: SheetFlags): readonly Refusal[] {
  if (flags.measured !== undefined) return [];
  const given = [
    ["--positions", flags.positions],
    ["--uncertainty", flags.uncertainty],
    ["--leakage-at", flags.leakageAt],
  ] as const;
  return given.flatMap(([field, text]): readonly Refusal[] =>
    text === undefined
      ? []
      : [
          {
            code: "contradiction",
            place: { field },
            read: JSON.stringify(text),
            want: "--measured beside it: it speaks of measured units",
          },
        ],
  );
}

/** What the flags choose. The negative end at earth is the usual way, assumed and said where nothing is chosen. */
export function readSheetFlags(flags: SheetFlags): Read<SheetChoices> {
  const paper = among("--paper", flags.paper ?? "A4", PAPERS);
  const earth = among("--earth", flags.earth ?? "negative", EARTHS);
  const rule = flags.rule === undefined ? accepted(null) : among("--rule", flags.rule, GOVERNING);
  const date = words("--date", flags.date);
  const revision = words("--revision", flags.revision);
  const unused = unmeasured(flags);
  if (unused.length === 0 && paper.ok && earth.ok && rule.ok && date.ok && revision.ok)
    return accepted({
      paper: paper.value,
      earth: earth.value,
      rule: rule.value,
      date: date.value,
      revision: revision.value,
    });
  return refused(
    ...unused,
    ...[paper, earth, rule, date, revision].flatMap((read): readonly Refusal[] => (read.ok ? [] : read.refusals)),
  );
}
