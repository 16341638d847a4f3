// Values as the screens print them: few figures, limits rounded to the safe side, unknown said as such.
import { type Dimension, formatQuantity, minorDigits, type Verdict } from "../quantity/index.ts";
import type { LayoutResult, Span } from "../search/index.ts";
import type { StyleName } from "./theme.ts";

export const UNKNOWN = "unknown";
export const NOT_ASSESSED = "not assessed";

/** A whole number, thousands apart by commas. By hand: the runtime loads its tables of languages for it, and the first frame would wait. */
export const grouped = (count: number): string => String(count).replace(/\B(?=(\d{3})+$)/g, ",");

const DIGITS = 3;

/** A value at three figures; `otherwise` for null. */
export const shown = (value: number | null, dimension: Dimension, otherwise = UNKNOWN): string =>
  value === null ? otherwise : formatQuantity(value, dimension, { digits: DIGITS });

/** A worst case, rounded up, so that it never looks better than it is. */
export const shownWorst = (value: number | null, dimension: Dimension): string =>
  value === null ? NOT_ASSESSED : formatQuantity(value, dimension, { digits: DIGITS, rounding: "up" });

/** A limit, or what is had at least, rounded down. */
export const shownLimit = (value: number | null, dimension: Dimension): string =>
  value === null ? UNKNOWN : formatQuantity(value, dimension, { digits: DIGITS, rounding: "down" });

export const shownMoney = (amount: number | null, currency: string): string =>
  amount === null ? "no price" : `${amount.toFixed(minorDigits(currency))} ${currency}`;

/** Total cost; "at least" when lines without a price are left out of it. */
export const shownCost = ({ cost }: LayoutResult): string =>
  cost === null ? "no price" : `${cost.unpriced.length > 0 ? "≥ " : ""}${shownMoney(cost.total, cost.currency)}`;

/** "0.82 to 1.22 mF" about a nominal value. */
export const shownSpan = (span: Span, dimension: Dimension): string =>
  span.low === null || span.high === null
    ? `${shown(span.nominal, dimension)} nominal, spread unknown`
    : `${shownLimit(span.low, dimension)} to ${shownWorst(span.high, dimension)}, ${shown(span.nominal, dimension)} nominal`;

/** The highest voltage that any unit may see at rest, V; null when either share is not assessed. */
export const worstVoltage = ({ share }: LayoutResult): number | null =>
  share.charging === null || share.holding === null ? null : Math.max(share.charging, share.holding);

/** Worst unit voltage over its limit; null when not assessed. */
export function shareOfLimit(layout: LayoutResult): number | null {
  const worst = worstVoltage(layout);
  return worst === null || !(layout.share.limit > 0) ? null : worst / layout.share.limit;
}

const SEVERITY: readonly Verdict[] = ["fail", "warn", "not assessed", "pass"];

export const VERDICT_STYLE: Readonly<Record<Verdict, StyleName>> = {
  fail: "bad",
  warn: "warn",
  "not assessed": "accent",
  pass: "good",
};

/** Findings, the worst first, in their own order otherwise. */
export const bySeverity = <T extends { readonly verdict: Verdict }>(findings: readonly T[]): readonly T[] =>
  [...findings].sort((a, b) => SEVERITY.indexOf(a.verdict) - SEVERITY.indexOf(b.verdict));

export interface Summary {
  readonly verdict: Verdict;
  readonly count: number;
}

/** The worst verdict among a layout's findings, and how many have it; no findings at all is not a pass. */
export function worstVerdict({ findings }: Pick<LayoutResult, "findings">): Summary {
  const verdict = bySeverity(findings)[0]?.verdict ?? "not assessed";
  return { verdict, count: findings.filter((finding) => finding.verdict === verdict).length };
}

/** "pass", "2 warn", "1 fail", "3 unknown". */
export function shownVerdict(layout: Pick<LayoutResult, "findings">): string {
  const { verdict, count } = worstVerdict(layout);
  if (verdict === "pass") return "pass";
  return `${count} ${verdict === "not assessed" ? "unknown" : verdict}`;
}

export const shapeOf = ({ series, parallel }: Pick<LayoutResult, "series" | "parallel">): string =>
  `${series}s${parallel}p`;

export const nameOf = (layout: Pick<LayoutResult, "part" | "series" | "parallel" | "ties">): string =>
  `${layout.part} ${shapeOf(layout)} ${layout.ties}`;
