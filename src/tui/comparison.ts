// Sets layouts side by side: each row a respect, with the best and worst found, how far the others are from it, and whether all agree.
import type { LayoutResult } from "../search/index.ts";
import { RESPECTS, type Respect } from "./respects.ts";

export interface ComparedCell {
  readonly text: string;
  readonly standing: "best" | "worst" | null;
  /** Difference to the best of the row, as a fraction of it; null where there is none to say. */
  readonly beyondBest: number | null;
  /** The same with its sign and unit, "+12.30 EUR"; null likewise. */
  readonly difference: string | null;
}

export interface ComparedRow {
  readonly label: string;
  readonly cells: readonly ComparedCell[];
  /** Every layout shows the same here. */
  readonly agrees: boolean;
  /** Places of the layouts, best first where there is a best, else rising; unknown last, alike as they stand. */
  readonly order: readonly number[];
}

/** Rows that only name the layouts: the heads of the columns say them. */
const NAMING: readonly string[] = ["part", "in series", "in parallel", "ties"];

function orderOf(numbers: readonly (number | null)[], texts: readonly string[], falling: boolean): readonly number[] {
  const places = numbers.map((_, place) => place);
  const isText = numbers.every((number) => number === null);
  return places.sort((a, b) => {
    const [one, other] = [numbers[a] ?? null, numbers[b] ?? null];
    if (isText) return (texts[a] ?? "") < (texts[b] ?? "") ? -1 : (texts[a] ?? "") > (texts[b] ?? "") ? 1 : a - b;
    if (one === null || other === null) return one === other ? a - b : one === null ? 1 : -1;
    return (falling ? other - one : one - other) || a - b;
  });
}

function comparedRow(respect: Respect, layouts: readonly (LayoutResult | null)[]): ComparedRow {
  const { label, text, value, better, amount, isPart = false } = respect;
  const texts = layouts.map((layout) => (layout === null ? "not in catalogue" : text(layout)));
  const agrees = texts.every((one) => one === texts[0]) && texts.length > 0;
  const numbers = layouts.map((layout) => (layout === null || value === undefined ? null : value(layout)));
  const known = numbers.filter((number) => number !== null);
  const [low, high] = [Math.min(...known), Math.max(...known)];
  const ranked = better !== undefined && known.length > 1 && low < high && !agrees;
  const best = better === "low" ? low : high;
  const cells = texts.map((shownText, index): ComparedCell => {
    const number = numbers[index] ?? null;
    const layout = layouts[index] ?? null;
    if (!ranked || number === null || layout === null)
      return { text: shownText, standing: null, beyondBest: null, difference: null };
    const standing = number === best ? "best" : number === (better === "low" ? high : low) ? "worst" : null;
    const gap = number - best;
    return {
      text: shownText,
      standing,
      beyondBest: gap === 0 || best === 0 || isPart ? null : gap / best,
      difference: gap === 0 || amount === undefined ? null : `${gap > 0 ? "+" : "-"}${amount(Math.abs(gap), layout)}`,
    };
  });
  return { label, cells, agrees, order: orderOf(numbers, texts, better === "high") };
}

/** An absent layout is one that the catalogue no longer has. */
export const compareLayouts = (layouts: readonly (LayoutResult | null)[]): readonly ComparedRow[] =>
  RESPECTS.map((respect) => comparedRow(respect, layouts));

/** The rows that a comparison shows, and those folded away because all agree. */
export function foldedRows(
  layouts: readonly (LayoutResult | null)[],
  unfolded: boolean,
): { readonly shown: readonly ComparedRow[]; readonly folded: readonly ComparedRow[] } {
  const all = compareLayouts(layouts);
  const others = all.filter((row) => !NAMING.includes(row.label));
  if (layouts.length < 2) return { shown: others, folded: [] };
  if (unfolded) return { shown: all, folded: [] };
  return { shown: others.filter((row) => !row.agrees), folded: all.filter((row) => row.agrees) };
}
