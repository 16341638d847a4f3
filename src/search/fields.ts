// The readers of one value of the brief: a number in SI or text with a unit, a whole number, a word of a list.

import * as z from "zod";
import { accepted, type Dimension, example, formatQuantity, nearestWord, parseQuantity } from "../quantity/index.ts";

export interface Range {
  readonly least: number;
  readonly most: number;
  /** The least value itself is not allowed. */
  readonly open?: boolean;
}

const rangeWords = (dimension: Dimension, { least, most, open }: Range): string =>
  `${open ? "above" : "from"} ${formatQuantity(least, dimension)} to ${formatQuantity(most, dimension)}`;

/** A number in SI or text with a unit, within a range. */
export function quantity(dimension: Dimension, range: Range) {
  return z
    .union([z.number(), z.string()])
    .transform((raw, context): number => {
      const reject = (read: string, want: string): never => {
        context.addIssue({ code: "custom", message: want, params: { read } });
        return z.NEVER;
      };
      const read = typeof raw === "number" ? accepted(raw) : parseQuantity(raw, dimension);
      if (!read.ok) return reject(JSON.stringify(raw), read.refusals[0]?.want ?? example(dimension));
      const value = read.value;
      const bareFraction = dimension === "fraction" && (typeof raw === "number" || /^[\d.,\s]+$/.test(raw));
      const shown = bareFraction ? `${raw}, that is ${formatQuantity(value, "fraction")}` : JSON.stringify(raw);
      if (
        !Number.isFinite(value) ||
        value < range.least ||
        value > range.most ||
        (range.open && value === range.least)
      ) {
        const hint = bareFraction && value > range.most ? `; for ${raw} percent write "${raw} %"` : "";
        return reject(shown, `${rangeWords(dimension, range)}${hint}`);
      }
      return value;
    })
    .describe(`${example(dimension)} or a number in SI; ${rangeWords(dimension, range)}`);
}

/** A whole number, also as text (flags are text). */
export function whole(least: number, most: number) {
  return z
    .union([z.number(), z.string()])
    .transform((raw, context): number => {
      const value = typeof raw === "number" ? raw : /^\s*\d+\s*$/.test(raw) ? Number(raw) : Number.NaN;
      if (Number.isInteger(value) && value >= least && value <= most) return value;
      context.addIssue({
        code: "custom",
        message: `a whole number from ${least} to ${most}`,
        params: { read: JSON.stringify(raw) },
      });
      return z.NEVER;
    })
    .describe(`a whole number from ${least} to ${most}`);
}

/** Greatest value of each kind of electrical quantity that the arithmetic was checked with. */
const MOST = {
  resistance: 1e9,
  inductance: 1e3,
  length: 1e3,
  time: 1e9,
  current: 1e9,
  voltage: 1e7,
  power: 1e12,
} as const;
type Checked = keyof typeof MOST;

/** A quantity from zero up. */
export const fromZero = (dimension: Checked) => quantity(dimension, { least: 0, most: MOST[dimension] });

/** A quantity above zero. */
export const above = (dimension: Checked) => quantity(dimension, { least: 0, most: MOST[dimension], open: true });

/** A part of one, "5 %" or 0.05. */
export const part = (most = 1) => quantity("fraction", { least: 0, most });

/** A plain number, also as text (flags are text). */
export const plain = (range: Range) => quantity("count", range);

/** One word of a list, in any case, with hyphen or space; a near one is named. */
export function word<Word extends string>(words: readonly Word[]) {
  return z
    .string()
    .transform((raw, context): Word => {
      const tidy = raw
        .trim()
        .toLowerCase()
        .replace(/[\s_-]+/g, " ");
      const found = words.find((one) => one.replace(/-/g, " ") === tidy);
      if (found !== undefined) return found;
      const near = nearestWord(tidy, words);
      const list = words.map((one) => `"${one}"`).join(", ");
      const message = near === null ? list : `perhaps "${near}"; one of ${list}`;
      context.addIssue({ code: "custom", message, params: { read: JSON.stringify(raw) } });
      return z.NEVER;
    })
    .describe(words.map((one) => `"${one}"`).join(", "));
}

/** yes or no, also as JSON's true and false. */
export const yesNo = z.union([z.boolean(), z.string()]).transform((raw, context): boolean => {
  if (raw === true || raw === "yes" || raw === "true") return true;
  if (raw === false || raw === "no" || raw === "false") return false;
  context.addIssue({ code: "custom", message: "yes or no", params: { read: JSON.stringify(raw) } });
  return z.NEVER;
});
