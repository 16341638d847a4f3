// The trail: every brief that was tried, what changed, and what the best layout then cost.
import type { State } from "./state.ts";
import { differenceWords, type Tried, type Work } from "./work.ts";

/** Longest trail; the oldest go first. */
export const LONGEST_TRAIL = 200;

/** One and the same, so that nothing differs in it. */
const NO_PINS: Work["pins"] = [];
const NO_OVERRIDES: Work["overrides"] = {};

const asWork = ({ values, extra }: Pick<Tried, "values" | "extra">): Work => ({
  values,
  extra,
  pins: NO_PINS,
  chosen: null,
  rank: "cost",
  frontOnly: false,
  overrides: NO_OVERRIDES,
});

const pricedCost = (cost: { readonly total: number; readonly unpriced: readonly string[] } | null): number | null =>
  cost === null || cost.unpriced.length > 0 ? null : cost.total;

/** The state with what was just answered at the end of its trail. Typing on in one field replaces what its half-typed text gave. */
export function withTried(state: State): State {
  const { answer, values, extra, trail, trailTyping } = state;
  if (answer?.kind !== "planned") return state;
  const last = trail.at(-1);
  // Lists by another order have another first; the trail tells the cheapest only when cost leads.
  const [best] = answer.plan.layouts;
  const typing = state.history.typing;
  const joins = typing !== null && typing === trailTyping && trail.length > 1;
  const before = joins ? trail.at(-2) : last;
  if (last !== undefined && last.values === values && last.extra === extra) return state;
  const words = before === undefined ? "the brief at the start" : differenceWords(asWork(before), asWork(state));
  if (before !== undefined && words === "") return state;
  const worst =
    best === undefined || best.share.charging === null || best.share.holding === null
      ? null
      : Math.max(best.share.charging, best.share.holding) / best.share.limit;
  const entry: Tried = {
    values,
    extra,
    words,
    best: best?.id ?? null,
    cost: best === undefined ? null : pricedCost(best.cost),
    currency: best?.cost?.currency ?? null,
    units: best?.units ?? null,
    load: worst,
    chosenCost: answer.chosen === null ? null : pricedCost(answer.chosen.cost),
  };
  const kept = joins ? trail.slice(0, -1) : trail;
  return { ...state, trail: [...kept, entry].slice(-LONGEST_TRAIL), trailTyping: typing };
}
