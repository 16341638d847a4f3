// What the worst case would have taken instead of the statistical best.

import { visible } from "../order/index.ts";
import type { PlanResult } from "../search/index.ts";
import { money } from "./layoutText.ts";

/** One sentence; empty when the plan was not statistical. */
export function worstCaseText({ brief, layouts, worstCase }: PlanResult): string {
  const best = layouts[0];
  if (worstCase === undefined || best === undefined) return "";
  const risk = `At a risk of ${brief.risk}: ${best.units} units.`;
  if (worstCase === null) return `${risk} With no risk, by the worst case, nothing fits.`;
  const fewer = worstCase.units - best.units;
  const units = fewer === 0 ? "as many" : fewer > 0 ? `${fewer} fewer here` : `${-fewer} more here`;
  const [a, b] = [best.cost, worstCase.cost];
  const saved = a && b && a.currency === b.currency ? b.total - a.total : null;
  const cost = b === null ? "no price" : money(b.total, b.currency);
  const less = saved === null ? "" : `, ${money(Math.abs(saved), b?.currency)} ${saved >= 0 ? "less" : "more"} here`;
  return `${risk} With no risk, by the worst case: ${visible(worstCase.id)}, ${worstCase.units} units (${units}), ${cost}${less}.`;
}
