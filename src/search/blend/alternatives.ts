// Other good blends: the cheapest of each different kind, within a stated share of the cheapest of all.
import { isFittingBlend, tidyCounts } from "./evaluate.ts";
import type { BlendLimits } from "./findBlend.ts";
import type { BlendCount, BlendModel } from "./model.ts";
import { searchUnder } from "./searchUnder.ts";
import type { FoundBlend } from "./singles.ts";

export interface AlternativesWanted {
  /** Least cost known to be the cheapest, whole minor units. */
  readonly cheapest: number;
  /** How much dearer an alternative may be: 0.05 is 5 %. */
  readonly within: number;
  /** Most alternatives, the cheapest of all included. */
  readonly most: number;
  /** What makes two blends the same in kind; unless told, the set of options used. Suppliers, ties, parts are other choices. */
  readonly kindOf?: (counts: readonly BlendCount[]) => string;
}

export interface Alternative extends FoundBlend {
  readonly kind: string;
}

export interface Alternatives {
  /** Cheapest first, one a kind. */
  readonly blends: readonly Alternative[];
  /** False when the limits ended the search: there may be others, and cheaper ones of these kinds. */
  readonly complete: boolean;
}

export const optionsUsed = (counts: readonly BlendCount[]): string => counts.map(({ option }) => option).join("+");

/** The cheapest blend of each kind, as many as wanted. Each uses no option that it could leave out. */
export function findAlternatives(
  model: BlendModel,
  wanted: AlternativesWanted,
  limits: BlendLimits = {},
): Alternatives {
  const kindOf = wanted.kindOf ?? optionsUsed;
  const highest = Math.floor(wanted.cheapest * (1 + wanted.within) + 1e-9) + 1;
  const byKind = new Map<string, Alternative>();
  const threshold = (): number => {
    if (byKind.size < wanted.most) return highest;
    const costs = [...byKind.values()].map(({ cost }) => cost).sort((a, b) => a - b);
    return Math.min(highest, costs[wanted.most - 1]!);
  };
  const complete = searchUnder(
    model,
    highest,
    (found, cost) => {
      const counts = tidyCounts(found);
      const kind = kindOf(counts);
      const known = byKind.get(kind);
      if ((known === undefined || cost < known.cost) && isFittingBlend(model, counts))
        byKind.set(kind, { kind, counts, cost });
      return threshold();
    },
    limits,
  );
  const blends = [...byKind.values()]
    .sort((a, b) => a.cost - b.cost || (a.kind < b.kind ? -1 : 1))
    .slice(0, wanted.most);
  return { blends, complete };
}
