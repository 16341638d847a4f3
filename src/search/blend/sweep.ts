// Cost against volume, mass or units: the cheapest blend under a ceiling that is drawn in step by step, each step proven.
import { blendTotals } from "./evaluate.ts";
import { type BlendLimits, findBlend } from "./findBlend.ts";
import { leastAmount } from "./loosen.ts";
import type { BlendCount, BlendModel } from "./model.ts";
import type { CeilingName } from "./pool.ts";

export interface SweepPoint {
  /** Ceiling under which this blend is the cheapest. */
  readonly ceiling: number;
  /** What the blend takes of the row, and what it costs. */
  readonly amount: number;
  readonly cost: number;
  readonly counts: readonly BlendCount[];
  /** False when the search was stopped: the cost lies between lowerBound and cost. */
  readonly proven: boolean;
  readonly lowerBound: number;
}

/**
 * The front of cost and one row, from the cheapest blend to the least amount, at most `points` ceilings, evenly apart.
 * Blends that a cheaper or equal one with no larger amount beats are left out. Fewer points come back when the limits end it.
 */
export function sweepFront(
  model: BlendModel,
  row: CeilingName,
  points: number,
  limits: BlendLimits = {},
): readonly SweepPoint[] {
  const found: SweepPoint[] = [];
  const look = (ceiling: number): SweepPoint | null => {
    const answer = findBlend({ ...model, ceilings: { ...model.ceilings, [row]: ceiling } }, limits);
    if (answer.best === null) return null;
    const { counts, cost } = answer.best;
    const point = {
      ceiling,
      amount: blendTotals(model, counts)![row],
      cost,
      counts,
      proven: answer.status === "optimal",
      lowerBound: answer.lowerBound,
    };
    found.push(point);
    return point;
  };
  const first = look(model.ceilings[row]);
  if (first === null) return [];
  const least = leastAmount(model, row, limits).amount ?? first.amount;
  // The loosest ceiling that leaves the last blend out comes next, unless the even step is tighter still.
  let last = first;
  for (let at = 1; at < points && last.amount > least * (1 + 1e-7); at += 1) {
    const even = first.amount + ((least - first.amount) * at) / (points - 1);
    const ceiling = at === points - 1 ? least : Math.min(even, last.amount * (1 - 1e-6));
    const next = look(Math.max(ceiling, least));
    if (next === null) break;
    last = next;
  }
  return found.filter(
    (point, at) =>
      !found.some(
        (other, place) =>
          other.cost <= point.cost &&
          other.amount <= point.amount &&
          (other.cost < point.cost || other.amount < point.amount || place < at),
      ),
  );
}
