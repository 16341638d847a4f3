// The cheapest blend that keeps the brief's limits on shot and faults: the settled one if it does, else the next in order of cost.

import { findAccepted } from "./blend/accepted.ts";
import type { FoundBlend } from "./blend/singles.ts";
import { brokenLimit } from "./blendLimits.ts";
import type { BlendWork } from "./blendOptions.ts";
import type { BlendResult, LimitedBlend } from "./blendResult.ts";
import type { Settled } from "./blendSettle.ts";
import type { Brief } from "./brief.ts";
import { hasLimits } from "./limits.ts";

export interface Kept extends Pick<Settled, "proof" | "lowerBound" | "proven" | "found"> {
  readonly limited: LimitedBlend | null;
}

export interface Keeping {
  readonly brief: Brief;
  readonly made: (one: FoundBlend) => Omit<BlendResult, "certificate">;
  readonly stop: (() => boolean) | undefined;
}

/** Blends that are judged, and steps of the walk between them, before it is given up. */
const MOST_JUDGED = 2000;
const WORK = 2e7;

export function keepingLimits(work: BlendWork, settled: Settled, { brief, made, stop }: Keeping): Kept {
  const [cheapest] = settled.found;
  if (cheapest === undefined || !hasLimits(brief)) return { ...settled, limited: null };
  const whole = made(cheapest);
  const broken = brokenLimit(whole, brief);
  if (broken === null) return { ...settled, limited: null };
  const told = { id: whole.id, cost: whole.cost?.total ?? null, broken };
  // Only from a proven least cost can what lies between be counted out.
  const from = settled.proven ? cheapest.cost : (settled.lowerBound ?? 0);
  const keeps = (one: FoundBlend): boolean => brokenLimit(made(one), brief) === null;
  const answer = findAccepted(work.model, from, keeps, {
    work: WORK,
    most: MOST_JUDGED,
    ...(stop === undefined ? {} : { stop }),
  });
  return {
    // The certificate is about the least cost of all, which no limit on the shot lowers; it proves nothing of the one that is kept.
    proof: null,
    lowerBound: Number.isFinite(answer.lowerBound) ? answer.lowerBound : null,
    proven: answer.status !== "stopped",
    found: answer.best === null ? [] : [answer.best],
    limited: { rejected: answer.rejected, cheapest: told },
  };
}
