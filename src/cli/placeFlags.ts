// The flags that only `place` has: read into numbers and choices, every fault told.

import { type Dimension, nearestWord, parseQuantity, type Refusal } from "../quantity/index.ts";
import type { BankFlags } from "./checked.ts";

export type PlaceFlags = BankFlags & {
  readonly measured?: string;
  readonly uncertainty?: string;
  readonly leakageUncertainty?: string;
  readonly leakageAt?: string;
  readonly unitLimit?: string;
  readonly seed?: string;
  readonly moves?: string;
  readonly pins?: readonly string[];
  readonly rooms?: readonly string[];
  readonly lots?: string;
  readonly outliers?: string;
  readonly goal?: string;
  readonly stopAtFloor?: boolean;
  readonly front?: boolean;
  readonly positions?: string;
  readonly without?: string;
  readonly output?: string;
  readonly format?: string;
  readonly force?: boolean;
};

export interface PlaceChoices {
  readonly uncertainty?: number;
  readonly leakageUncertainty?: number;
  readonly leakageAt?: number;
  readonly unitLimit?: number;
  readonly seed?: number;
  readonly moves?: number;
  readonly lots?: "mix" | "apart";
  readonly outliers?: "reject" | "keep";
  readonly goal: "charging" | "both";
}

const CHOICES = { lots: ["mix", "apart"], outliers: ["reject", "keep"], goal: ["charging", "both"] } as const;

const QUANTITIES: readonly (readonly [key: keyof PlaceChoices & keyof PlaceFlags, flag: string, of: Dimension])[] = [
  ["uncertainty", "--uncertainty", "fraction"],
  ["leakageUncertainty", "--leakage-uncertainty", "fraction"],
  ["leakageAt", "--leakage-at", "voltage"],
  ["unitLimit", "--unit-limit", "voltage"],
];

/** A quantity above zero from a flag; a fraction is below `most`, by default one. */
export function flagQuantity(text: string, flag: string, dimension: Dimension, most = 1): number | Refusal {
  const read = parseQuantity(text, dimension);
  const ceiling = dimension === "fraction" ? most : Number.POSITIVE_INFINITY;
  if (read.ok && read.value > 0 && read.value < ceiling) return read.value;
  const want = read.ok
    ? dimension === "fraction"
      ? `above 0 and below ${most * 100} %`
      : "more than 0"
    : (read.refusals[0]?.want ?? "a number");
  return { code: "bad-value", place: { field: flag }, read: JSON.stringify(text), want };
}

/** What the flags choose, and every fault of them. */
export function readPlaceFlags(flags: PlaceFlags): {
  readonly choices: PlaceChoices;
  readonly faults: readonly Refusal[];
} {
  const found: Record<string, unknown> = { goal: "charging" };
  const faults: Refusal[] = [];
  for (const [key, flag, dimension] of QUANTITIES) {
    const text = flags[key];
    if (typeof text !== "string") continue;
    const value = flagQuantity(text, flag, dimension);
    if (typeof value === "number") found[key] = value;
    else faults.push(value);
  }
  for (const key of ["lots", "outliers", "goal"] as const) {
    const text = flags[key];
    if (text === undefined) continue;
    const among: readonly string[] = CHOICES[key];
    if (among.includes(text)) found[key] = text;
    else {
      const near = nearestWord(text, among);
      const want = `${near === null ? "" : `perhaps ${JSON.stringify(near)}; `}${among.join(" or ")}`;
      faults.push({ code: "bad-choice", place: { field: `--${key}` }, read: JSON.stringify(text), want });
    }
  }
  for (const [key, most] of [
    ["seed", 2 ** 31],
    ["moves", 1e12],
  ] as const) {
    const text = flags[key];
    if (text === undefined) continue;
    const value = /^\d+(e\d{1,2})?$/i.test(text) ? Number(text) : Number.NaN;
    if (value <= most) found[key] = value;
    else {
      const want = `a whole number up to ${most}`;
      faults.push({ code: "bad-count", place: { field: `--${key}` }, read: JSON.stringify(text), want });
    }
  }
  return { choices: found as unknown as PlaceChoices, faults };
}
