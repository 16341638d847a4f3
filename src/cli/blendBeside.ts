// A blend beside the cheapest layout of one part: what the one costs more than the other.

import { visible } from "../order/index.ts";
import type { BlendResult, LayoutResult } from "../search/index.ts";
import { money } from "./layoutText.ts";

/** One sentence or two; null where either has no price or the currencies differ. */
export function besideWords(
  best: Pick<BlendResult, "cost">,
  single: Pick<LayoutResult, "id" | "cost"> | undefined,
): string | null {
  if (!single?.cost || !best.cost || single.cost.currency !== best.cost.currency) return null;
  const apart = single.cost.total - best.cost.total;
  const { currency } = best.cost;
  const unlike =
    single.cost.unpriced.length !== best.cost.unpriced.length ? " Not all of their lines have a price." : "";
  const words =
    apart > 0
      ? `The cheapest layout of one part, ${visible(single.id)}, costs ${money(apart, currency)} more.`
      : apart === 0
        ? `The cheapest layout of one part, ${visible(single.id)}, costs the same.`
        : `A layout of one part, ${visible(single.id)}, costs ${money(-apart, currency)} less: it has more in series than is needed, or something of it is not assessed, which a blend leaves out.`;
  return words + unlike;
}
