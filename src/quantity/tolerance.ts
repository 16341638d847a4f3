// Tolerances: "20 %", "+-20 %", "-10/+50 %" and the letters of IEC 60062, as fractions below and above nominal.
//
// Source: [IEC60062] letters (F, K, M, Z read second hand, the rest from memory; letters are not uniform between makers, so we print the figures).

import type { Scale } from "./dimension.ts";
import { parseQuantity } from "./parse.ts";
import { accepted, type Read, refused } from "./refusal.ts";

/** Fractions: a unit lies between nominal (1 - low) and nominal (1 + high). Range: 0 <= low < 1, 0 <= high <= 1. */
export interface Tolerance {
  readonly low: number;
  readonly high: number;
}

const even = (t: number): Tolerance => ({ low: t, high: t });

export const TOLERANCE_LETTERS: Readonly<Record<string, Tolerance>> = {
  E: even(0.00005),
  L: even(0.0001),
  P: even(0.0002),
  W: even(0.0005),
  B: even(0.001),
  C: even(0.0025),
  D: even(0.005),
  F: even(0.01),
  G: even(0.02),
  H: even(0.03),
  J: even(0.05),
  K: even(0.1),
  M: even(0.2),
  N: even(0.3),
  Q: { low: 0.1, high: 0.3 },
  T: { low: 0.1, high: 0.5 },
  S: { low: 0.2, high: 0.5 },
  Z: { low: 0.2, high: 0.8 },
};

const WANT =
  'a tolerance such as "20 %", "+-20 %", "-10/+50 %" or a letter such as M, below 100 % downwards and at most 100 % upwards';
const PAIR = /^([+\-−])\s*([\d.,]+)\s*%?\s*[/;\s]\s*([+\-−])\s*([\d.,]+)\s*(%?)$/u;
const ZERO_PAIR = /^0\s*\/\s*\+\s*([\d.,]+\s*%?)$/u;

/** The two sides as written, each with the percent sign of the pair; null when both point the same way. */
function sides(cell: string): readonly [low: string, high: string] | null {
  const pair = PAIR.exec(cell);
  if (pair) {
    const [, sign, first, otherSign, second, percent] = pair;
    if ((sign === "+") === (otherSign === "+")) return null;
    const [low, high] = sign === "+" ? [second, first] : [first, second];
    return [`${low}${percent}`, `${high}${percent}`];
  }
  const zero = ZERO_PAIR.exec(cell);
  if (zero) return ["0 %", `${zero[1]}`];
  const body = cell.replace(/^(\+\/?-|±|\+\/−)/u, "");
  return [body, body];
}

/** Reads a tolerance; a bare number takes the scale of its heading (`bare`), null refuses it. */
export function parseTolerance(
  text: string,
  bare: Scale | null,
  decimalComma: boolean | "never" = false,
): Read<Tolerance> {
  const cell = text.trim();
  const no = (code: string): Read<never> => refused({ code, place: {}, read: JSON.stringify(text), want: WANT });
  const letter = Object.hasOwn(TOLERANCE_LETTERS, cell) ? TOLERANCE_LETTERS[cell] : undefined;
  if (letter) return accepted(letter);
  const written = sides(cell);
  if (written === null) return no("bad-tolerance");
  const side = (digits: string): Read<number> => parseQuantity(digits, "fraction", { bare, decimalComma });
  const [low, high] = [side(written[0]), side(written[1])];
  if (!low.ok) return no(low.refusals[0]?.code === "missing-unit" ? "missing-unit" : "bad-tolerance");
  if (!high.ok) return no(high.refusals[0]?.code === "missing-unit" ? "missing-unit" : "bad-tolerance");
  // A sign that is left stands in both sides alike, so the lower one tells.
  if (low.value < 0 || low.value >= 1 || high.value > 1) return no("tolerance-range");
  return accepted({ low: low.value, high: high.value });
}
