// Values as they stand in a drawing: formatted, or a blank to fill in with its unit.
import { DIMENSIONS, type Dimension, type FormatOptions, formatQuantity } from "../../quantity/index.ts";

/** A line to write on. */
export const BLANK = "________";

/** `4.125 mF`; not known: a blank before the unit; without end: in words. */
export function shownOrBlank(
  value: number | null,
  dimension: Dimension,
  options: FormatOptions = { digits: 3 },
): string {
  if (value === null || Number.isNaN(value)) return `${BLANK} ${DIMENSIONS[dimension].symbol}`.trim();
  return formatQuantity(value, dimension, options);
}

/** Words of the user's, or a blank. */
export const wordsOrBlank = (words: string | null): string => (words === null || words.trim() === "" ? BLANK : words);

/** "1 unit", "3 units". */
export const counted = (count: number, one: string, more = `${one}s`): string => `${count} ${count === 1 ? one : more}`;
