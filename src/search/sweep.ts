// Tries every part, every series count and both ties, and keeps what does the job: exhaustive.
//
// With a wish of the first few, the parts are gone through in passes, an even sample first: what it finds makes the sieve for the rest.

import type { Capacitor } from "../catalog/index.ts";
import { frontRows } from "./front.ts";
import { sweepLimited } from "./limitedSweep.ts";
import { hasLimits } from "./limits.ts";
import { isProtected } from "./protection.ts";
import type { RefusedPart } from "./result.ts";
import { riskJudge } from "./risk.ts";
import { sieveOf, type Wanted } from "./sieve.ts";
import { strongOf } from "./strong.ts";
import type { Judge, Reason, SweepInput } from "./sweepKinds.ts";
import { type Run, sweepPart } from "./sweepPart.ts";
import { type LayoutTable, newTable } from "./table.ts";

export { leastSeries, type SweepInput } from "./sweepKinds.ts";

export interface Sweep {
  /** All layouts that fit, or with a `wanted` those that may matter to it: the first of the order and the whole front. */
  readonly table: LayoutTable;
  /** How many fit, kept or not. */
  readonly count: number;
  readonly refused: readonly RefusedPart[];
}

export interface SweepOptions {
  /** End at the first layout that fits, for asking whether anything does. */
  readonly stopAtFirst?: boolean;
  /** Keep only what may matter; without it everything is kept. */
  readonly wanted?: Wanted | null;
}

/** At least so many parts are tried before the sieve is made. */
const FIRST_PARTS = 64;
/** Each pass over the parts takes so many times those of the pass before, and its sieve knows what that found. */
const PASS = 8;

/** Runs the whole search. */
export function sweep(input: SweepInput, { stopAtFirst = false, wanted = null }: SweepOptions = {}): Sweep {
  const { parts, brief } = input;
  const table = newTable(Math.max(256, Math.min(parts.length, wanted === null ? 1 << 17 : FIRST_PARTS) * 32));
  const judge = input.judge ?? (brief.basis === "statistical" ? riskJudge(brief, input.lot) : null);
  if (hasLimits(brief) || isProtected(brief)) return sweepByLimits(input, { table, judge, stopAtFirst });
  const run: Run = { input, judge, table, sieve: null, count: 0 };
  const reasons: (Reason | null)[] = new Array(parts.length).fill(null);
  let stride = 1;
  let done = 0;
  if (wanted !== null) while (parts.length / (stride * PASS) >= FIRST_PARTS) stride *= PASS;
  let sample: readonly number[] = [];
  for (let seen = 0; stride >= 1; seen = stride, stride /= PASS) {
    if (wanted !== null && table.count > 0) {
      if (seen > 0 && sample.length === 0) sample = Array.from({ length: table.count }, (_, i) => i);
      run.sieve = sieveOf(
        table,
        strongOf(table, { candidates: frontRows(table), tried: sample, ahead: parts.length * 20 }),
        wanted,
      );
    }
    for (let i = 0; i < parts.length; i += stride) {
      if (seen > 0 && i % seen === 0) continue;
      reasons[i] = sweepPart(run, i);
      input.progress?.(++done, parts.length);
      if (stopAtFirst && run.count > 0) break;
    }
  }
  const refused: RefusedPart[] = [];
  reasons.forEach((reason, i) => {
    if (reason !== null) refused.push({ part: (parts[i] as Capacitor).part, ...reason });
  });
  return { table, count: run.count, refused };
}

/** The search under limits on shot, fault and life: each layout is worked out in full. */
function sweepByLimits(
  input: SweepInput,
  { table, judge, stopAtFirst }: { readonly table: LayoutTable; readonly judge: Judge; readonly stopAtFirst: boolean },
): Sweep {
  const limited = sweepLimited(input, table, judge);
  const refused: RefusedPart[] = [];
  for (const [i, unit] of input.parts.entries()) {
    const reason = limited(i);
    input.progress?.(i + 1, input.parts.length);
    if (reason !== null) refused.push({ part: unit.part, ...reason });
    if (stopAtFirst && table.count > 0) break;
  }
  return { table, count: table.count, refused };
}
