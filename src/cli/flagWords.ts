// The words that an option takes, where it takes words of a list: for completions and the manual. Each command still reads its own.

import { BILL_FORMATS } from "../order/index.ts";
import { BASES, RANKINGS } from "../search/index.ts";
import { GOVERNING } from "./governing.ts";

export const SHELLS = ["bash", "zsh", "fish"] as const;
export type Shell = (typeof SHELLS)[number];

const WORDS: Readonly<Record<string, readonly string[]>> = {
  "--balance": ["none"],
  "--basis": BASES,
  "--bus-metal": ["copper", "aluminium"],
  "--bus-shape": ["flat bars", "wire pair", "coax"],
  "--charger": ["on", "off"],
  "--earth": ["negative", "positive", "none", "unknown"],
  "--paper": ["A4", "Letter"],
  "--rule": GOVERNING,
  "--distribution": ["uniform", "normal"],
  "--goal": ["charging", "both"],
  "--hold": ["for ever"],
  "--lamp-gas": ["xenon", "krypton"],
  "--lots": ["mix", "apart"],
  "--outliers": ["reject", "keep"],
  "--rank": RANKINGS,
  "--ties": ["cross-tied", "strings"],
};

/** Formats differ by what is written. */
const FORMATS: Readonly<Record<string, readonly string[]>> = {
  order: BILL_FORMATS,
  place: ["text", "csv", "json"],
  sheet: ["html", "md", "json"],
  labels: ["html", "json"],
};

/** Empty where a value is free. */
export const wordsOf = (command: string, long: string): readonly string[] =>
  (long === "--format" ? FORMATS[command] : WORDS[long]) ?? [];
