// The brief's limits on shot, fault and life in a blend: each group beside the others, and the cheapest blend that keeps them.

import type { Capacitor } from "../catalog/index.ts";
import type { Finding } from "../quantity/index.ts";
import type { BlendResult, BrokenLimit } from "./blendResult.ts";
import type { Brief } from "./brief.ts";
import { leakOf } from "./candidate.ts";
import { LIMIT_KEYS } from "./limitKeys.ts";
import { LIMIT_NAMES, limitFindings } from "./limits.ts";
import type { LayoutResult } from "./result.ts";

const PREFIX = "limit-";

export const isLimitFinding = ({ id }: Finding): boolean => id.startsWith(PREFIX);

/** Worst voltage of a unit before a fault, V; not finite where it is unknown. */
function worstOf({ stress, series }: LayoutResult, unit: Capacitor): number {
  const known = stress !== null && (series === 1 || leakOf(unit) !== null);
  return known && stress !== null ? stress * unit.voltage : Number.POSITIVE_INFINITY;
}

/** The limit findings of each group beside the others, in the order of the groups. */
export function groupLimits(
  layouts: readonly LayoutResult[],
  units: readonly Capacitor[],
  brief: Brief,
): readonly (readonly Finding[])[] {
  const groups = layouts.map(({ series, parallel, ties }, at) => ({ unit: units[at]!, series, parallel, ties }));
  return layouts.map((layout, at) => {
    const others = groups.filter((_, place) => place !== at);
    const beside = others.length === 0 ? undefined : { others };
    return limitFindings(brief, { ...groups[at]!, worst: worstOf(layout, groups[at]!.unit), beside });
  });
}

/** Null when every group is proven to keep every limit. */
export function brokenLimit(blend: Pick<BlendResult, "strings">, brief: Brief): BrokenLimit | null {
  const asked = LIMIT_KEYS.filter((key) => brief[key] !== undefined);
  for (const { part, findings } of blend.strings) {
    for (const key of asked) {
      const finding = findings.find(({ id }) => id === `${PREFIX}${LIMIT_NAMES[key]}`);
      if (finding?.verdict === "pass") continue;
      const { value = null, limit = null, unit = "1", verdict = "not assessed" } = finding ?? {};
      return { part, limit: LIMIT_NAMES[key], value, allowed: limit, unit, open: verdict !== "fail" };
    }
  }
  return null;
}
