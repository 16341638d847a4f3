// What each needed quantity costs when it is bought at its cheapest: runs of quantities that cost and bring the same.

import { type PurchaseTerms, purchase } from "../../catalog/index.ts";

/** Needing from `from` to `to` pieces costs `cost` and brings `bought`. */
export interface CostStep {
  readonly from: number;
  readonly to: number;
  readonly bought: number;
  /** Whole minor units of the currency; null: no price. */
  readonly cost: number | null;
}

/** Quantities looked at, at most: a ladder further up tells nothing more. */
const MOST_LOOKED_AT = 4000;

/** How far a ladder goes: half again past what is needed, and past the next price break where one is within twice. */
function reach(terms: PurchaseTerms, needed: number): number {
  const next = (terms.priceBreaks ?? []).map(({ from }) => from).find((from) => from > needed && from <= 2 * needed);
  return Math.min(MOST_LOOKED_AT, Math.max(Math.ceil(needed * 1.5), (next ?? 0) + 1, 4));
}

/** The ladder of one part from 1 piece to past `needed`; it ends where no more can be had. Range: needed >= 1. */
export function costSteps(terms: PurchaseTerms, needed: number): readonly CostStep[] {
  const steps: CostStep[] = [];
  for (let quantity = 1; quantity <= reach(terms, needed); quantity += 1) {
    const found = purchase(terms, quantity);
    if (found === null) break;
    const last = steps.at(-1);
    if (last !== undefined && last.cost === found.cost && last.bought === found.bought) {
      steps[steps.length - 1] = { ...last, to: quantity };
    } else steps.push({ from: quantity, to: quantity, bought: found.bought, cost: found.cost });
  }
  return steps;
}
