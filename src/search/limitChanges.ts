// When nothing fits because of the limits on the shot: what each limit would have to be, all else as asked.

import type { Capacitor } from "../catalog/index.ts";
import { roundTo } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { LIMIT_KEYS, type RatedLimit } from "./limitKeys.ts";
import { limitClaims } from "./limits.ts";
import { idOf, tiesOf } from "./rank.ts";
import type { Change } from "./result.ts";
import { type SweepInput, sweep } from "./sweep.ts";

type LimitKey = (typeof LIMIT_KEYS)[number];

/** The best figure that any layout without this one limit has; null when none fits even so, or none has a figure. */
function withoutLimit(input: SweepInput, key: LimitKey): Change | null {
  const { [key]: limit, ...rest } = input.brief;
  if (limit === undefined) return null;
  const { table } = sweep({ ...input, brief: rest as Brief });
  const asked = typeof limit === "number" ? limit : (limit as RatedLimit);
  const relative = typeof asked === "object" && asked.kind === "part";
  let best: Change | null = null;
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
    const exact = relative ? (asked.value * claim.value) / claim.limit : claim.value;
    const to = roundTo(exact, 4, key === "minLife" ? "down" : "up");
    const better = best === null || (key === "minLife" ? to > best.to : to < best.to);
    const from = typeof asked === "number" ? asked : asked.value;
    if (better) best = { field: key, from, to, layout: idOf(table, input.parts, row), note: relative ? "rating" : "" };
  }
  return best;
}

/** For each limit set, the value that would do alone. */
export const limitChanges = (input: SweepInput): readonly Change[] =>
  LIMIT_KEYS.map((key) => withoutLimit(input, key)).filter((change): change is Change => change !== null);
