// One plain sentence about two layouts: what the one buys, and what for.
import type { LayoutResult } from "../search/index.ts";
import { RESPECTS, type Respect } from "./respects.ts";
import { shownVerdict, worstVerdict } from "./values.ts";

interface Gain {
  readonly words: string;
  /** How much it is, relative to the other side: what is told first. */
  readonly weight: number;
}

/** Most gains told of one side. */
const MOST = 4;

/** What `better` has over `other` in one respect; null when it has nothing, or either is unknown. */
function gainOf(respect: Respect, better: LayoutResult, other: LayoutResult): Gain | null {
  const { gain, value, amount, isPart = false } = respect;
  const [a, b] = [value?.(better) ?? null, value?.(other) ?? null];
  if (gain === undefined || amount === undefined || a === null || b === null) return null;
  // What prints alike is alike: a sentence must not tell of a difference that the table does not show.
  if (respect.text(better) === respect.text(other)) return null;
  const gap = respect.better === "low" ? b - a : a - b;
  if (!(gap > 0)) return null;
  const part = isPart ? gap : b === 0 ? Number.POSITIVE_INFINITY : gap / Math.abs(b);
  const percent = isPart || !Number.isFinite(part) ? "" : ` (${Number((part * 100).toPrecision(2))} %)`;
  return { words: gain.replace("{}", `${amount(gap, better)}${percent}`), weight: part };
}

const gains = (better: LayoutResult, other: LayoutResult): readonly string[] =>
  RESPECTS.map((respect) => gainOf(respect, better, other))
    .filter((gain) => gain !== null)
    .sort((a, b) => b.weight - a.weight)
    .slice(0, MOST)
    .map(({ words }) => words);

const listed = (words: readonly string[]): string =>
  words.length < 2 ? (words[0] ?? "") : `${words.slice(0, -1).join(", ")} and ${words.at(-1)}`;

const SEVERITY = ["pass", "not assessed", "warn", "fail"] as const;

/** A bank whose checks come out worse is told first of all: no saving makes up for it. */
function checkWords(a: LayoutResult, b: LayoutResult, names: readonly [string, string]): string {
  const [one, other] = [worstVerdict(a).verdict, worstVerdict(b).verdict];
  if (one === other) return "";
  const worse = SEVERITY.indexOf(one) > SEVERITY.indexOf(other) ? 0 : 1;
  return `Checks: ${names[worse]} has ${shownVerdict(worse === 0 ? a : b)}, ${names[1 - worse]} ${shownVerdict(worse === 0 ? b : a)}. `;
}

/** "A costs 12.30 EUR (18 %) less; B takes 1.2 L (20 %) less room." The names stand for the layouts, in this order. */
export function tradeSentence(a: LayoutResult, b: LayoutResult, names: readonly [string, string]): string {
  const [first, second] = [gains(a, b), gains(b, a)];
  const [one, other] = names;
  const lead = checkWords(a, b, names);
  if (first.length === 0 && second.length === 0)
    return `${lead}${one} and ${other} come out alike in all that is known of both.`;
  if (second.length === 0) return `${lead}${one} ${listed(first)}; ${other} is better in nothing compared here.`;
  if (first.length === 0) return `${lead}${other} ${listed(second)}; ${one} is better in nothing compared here.`;
  return `${lead}${one} ${listed(first)}; ${other} ${listed(second)}.`;
}
