// The cost of the cheapest blend as the need grows: a staircase, each step with the need up to which its blend is the cheapest.
import { blendTotals, capacityNeeded } from "./evaluate.ts";
import { type BlendLimits, findBlend } from "./findBlend.ts";
import type { BlendCount, BlendModel } from "./model.ts";

export interface LadderStep {
  /** Needs, F, for which the cost is the least: above `from` (for the first step: from it on) up to `to`. */
  readonly from: number;
  readonly to: number;
  readonly cost: number;
  readonly counts: readonly BlendCount[];
  readonly proven: boolean;
}

export interface Ladder {
  readonly steps: readonly LadderStep[];
  /** `complete`: up to the end asked for; `out of reach`: no blend brings more than the last step; `cut`: there are more steps. */
  readonly end: "complete" | "out of reach" | "cut";
}

/**
 * Steps from one need to another. The cheapest blend for a need stays it for every need up to its own capacitance, for cost
 * never falls as the need grows: so each search gives a whole step.
 */
export function costLadder(
  model: BlendModel,
  { from, to, most }: { readonly from: number; readonly to: number; readonly most: number },
  limits: BlendLimits = {},
): Ladder {
  const steps: LadderStep[] = [];
  let need = from;
  while (need <= to) {
    if (steps.length >= most || limits.stop?.()) return { steps, end: "cut" };
    const answer = findBlend({ ...model, requirement: need }, limits);
    if (answer.best === null) return { steps, end: answer.status === "infeasible" ? "out of reach" : "cut" };
    const { cost, counts } = answer.best;
    const proven = answer.status === "optimal";
    // A need that the tolerance lets this capacitance meet is met by it.
    const reach = Math.max(need, blendTotals(model, counts)!.capacity);
    const last = steps[steps.length - 1];
    if (last !== undefined && last.cost === cost)
      steps[steps.length - 1] = { ...last, to: reach, proven: last.proven && proven };
    else steps.push({ from: last?.to ?? from, to: reach, cost, counts, proven });
    need = beyond(reach);
  }
  return { steps, end: "complete" };
}

/** The least need that a capacitance does not meet. */
const beyond = (capacity: number): number => {
  let need = (capacity * capacity) / capacityNeeded(capacity);
  while (capacityNeeded(need) <= capacity) need *= 1 + 2 ** -50;
  return need;
};
