// When nothing fits because of the limits on the shot: how little each single limit would have to give, all else as asked.

import type { Capacitor } from "../catalog/index.ts";
import { roundTo } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { LIMIT_KEYS, type RatedLimit } from "./limitKeys.ts";
import { limitClaims } from "./limits.ts";
import { idOf, tiesOf } from "./rank.ts";
import type { Change } from "./result.ts";
import { type SweepInput, sweep } from "./sweep.ts";

type LimitKey = (typeof LIMIT_KEYS)[number];

/** Bisection ends within this part of the limit. */
const CLOSE = 1e-4;

/** The brief with one limit at another value, or without it. */
function withLimit(brief: Brief, key: LimitKey, value: number | null): Brief {
  const { [key]: limit, ...rest } = brief;
  if (value === null || limit === undefined) return rest as Brief;
  return { ...brief, [key]: typeof limit === "number" ? value : { ...(limit as RatedLimit), value } };
}

/** A figure, the layout that has it, and all parts that fit there: with a tighter limit no others can. */
interface Best {
  readonly figure: number;
  readonly layout: string;
  readonly parts: readonly Capacitor[];
}

/** The best figure of one limit among the layouts that fit with it at `value` (null: left out); null when none fits or none has one. */
function bestAt(input: SweepInput, key: LimitKey, value: number | null): Best | null {
  const asked = input.brief[key] as number | RatedLimit;
  const { table } = sweep({ ...input, brief: withLimit(input.brief, key, value) });
  const parts = input.parts.filter((_, index) => table.part.subarray(0, table.count).includes(index));
  let best: Best | null = null;
  for (let row = 0; row < table.count; row++) {
    const unit = input.parts[table.part[row] as number] as Capacitor;
    const shape = {
      series: table.series[row] as number,
      parallel: table.parallel[row] as number,
      ties: tiesOf(table, row),
    };
    const worst = (table.stress[row] as number) * unit.voltage;
    const claim = limitClaims(input.brief, { unit, worst, ...shape })?.find((one) => one.key === key);
    if (claim === undefined || claim.value === null || claim.limit === null) continue;
    const relative = typeof asked === "object" && asked.kind === "part";
    const figure = relative ? (asked.value * claim.value) / claim.limit : claim.value;
    const better = best === null || (key === "minLife" ? figure > best.figure : figure < best.figure);
    if (better) best = { figure, layout: idOf(table, input.parts, row), parts };
  }
  return best;
}

/**
 * The least that one limit must give. Without it the search ends at the first parallel count that the others allow, where more
 * in parallel might give less, so the limit is closed in on from there until a little less fits nothing.
 */
function leastChange(input: SweepInput, key: LimitKey): Change | null {
  const asked = input.brief[key] as number | RatedLimit | undefined;
  if (asked === undefined) return null;
  const from = typeof asked === "number" ? asked : asked.value;
  let best = bestAt(input, key, null);
  if (best === null) return null;
  let [no, yes] = [from, best.figure];
  while (Math.abs(yes - no) > CLOSE * Math.max(Math.abs(yes), Math.abs(no))) {
    const middle = no > 0 && yes > 0 ? Math.sqrt(no * yes) : (no + yes) / 2;
    const found: Best | null = bestAt({ ...input, parts: best.parts }, key, middle);
    if (found === null) no = middle;
    else {
      // a figure may lie beyond the limit by the slack of a fit
      yes = key === "minLife" ? Math.max(middle, found.figure) : Math.min(middle, found.figure);
      best = found;
    }
  }
  const note = typeof asked === "object" && asked.kind === "part" ? "rating" : "";
  const to = roundTo(best.figure, 4, key === "minLife" ? "down" : "up");
  return { field: key, from, to, layout: best.layout, note };
}

/** For each limit set, the value that would do alone. */
export const limitChanges = (input: SweepInput): readonly Change[] =>
  LIMIT_KEYS.map((key) => leastChange(input, key)).filter((change): change is Change => change !== null);
