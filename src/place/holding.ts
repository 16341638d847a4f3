// Spends the freedom that charging leaves on holding, whatever the ties.
import { board, groupsOf } from "./board.ts";
import type { Conductances } from "./conductance.ts";
import type { Constraints } from "./constraints.ts";
import { type Effort, mayGoOn, settle, share } from "./effort.ts";
import { levelBoth } from "./levelBoth.ts";
import type { Random } from "./random.ts";
import type { Solution } from "./solution.ts";
import { bothGaps, type Gaps, holdLevel } from "./twoGoals.ts";
import { holdStrings } from "./twoGoalsStrings.ts";
import type { Ties } from "./unit.ts";

export interface HoldingTask {
  readonly ties: Ties;
  readonly values: Float64Array;
  readonly rule: Constraints;
  readonly conductances: Conductances & { readonly known: true };
  readonly limit: number;
  /** Stop at this holding gap. */
  readonly target: number;
  readonly spares: boolean;
  readonly moves: number;
}

export interface Held {
  readonly groups: readonly (readonly number[])[];
  readonly gaps: Gaps;
}

/** From a placing within the charging limit (or near it), the one of least holding gap found within it. */
export function* holdBetter(
  from: readonly (readonly number[])[],
  task: HoldingTask,
  random: Random,
  work: Effort,
): Generator<Gaps, Held> {
  const { values, rule, conductances, limit, target, spares } = task;
  const part = share(work, task.moves);
  const moves = Math.max(1, part.moves);
  const { perUnit, perStage } = conductances;
  const at = board(values, from, rule.rules);
  let gaps: Gaps;
  if (task.ties === "cross-tied") {
    gaps = yield* holdLevel(at, { conductances: perUnit, perStage, limit, target, spares, moves }, random, part);
  } else {
    gaps = yield* holdStrings(
      at.slots,
      {
        series: rule.size,
        strings: rule.groups,
        elastances: Float64Array.from(values, (c) => 1 / c),
        resistances: Float64Array.from(perUnit, (g) => 1 / g),
        rules: rule.rules,
        limit,
        target,
        spares,
        moves,
      },
      random,
      part,
    );
  }
  settle(work, part);
  return { groups: groupsOf(at), gaps };
}

/** Up to `tries` runs of a share of the effort each, until the target is met; the best of them. */
export function* holdAgain(
  from: readonly (readonly number[])[],
  task: HoldingTask,
  { tries, random, work }: { readonly tries: number; readonly random: Random; readonly work: Effort },
): Generator<Gaps, Held> {
  let best = yield* holdBetter(from, task, random, work);
  for (let left = tries - 1; left > 0 && best.gaps.holding > task.target && mayGoOn(work, 0); left--) {
    const next = yield* holdBetter(best.groups, task, random, work);
    if (next.gaps.holding < best.gaps.holding && next.gaps.charging <= task.limit) best = next;
  }
  return best;
}

/** What holding may lose again while charging is levelled to the end: a third, or up to what no leakage meter can tell. */
const CAP_OVER = 1.3;
const CAP_LEAST = 0.0045;
const BOTH_TRIES = 5;
/** Parts of the effort for levelling: where the cap leaves no way down, it is widened and levelling begins again. */
const LEVEL_PARTS = [0.5, 0.5, 1] as const;
const WIDER = 1.6;
/** Above the slack, so much of charging may still be given up for a holding gap this many times better: no meter tells it. */
const UNSEEN = 5e-6;
/** Levelling aims lower, so that what it ends at is still within this. */
const PROMISED = 1e-6;
const FAR_BETTER = 2;

/**
 * Holding as even as it gets without loss of charging: among placings of the same charging gap, and for large cross-tied banks without
 * wishes among those within `slack` of it, by giving up some charging first and levelling it again.
 */
export function* holdFreely(
  from: Solution,
  { slack, ...task }: HoldingTask & { readonly slack: number },
  { random, work }: { readonly random: Random; readonly work: Effort },
): Generator<Gaps, Held> {
  const { values, rule, conductances } = task;
  const same = yield* holdBetter(from.groups, { ...task, limit: from.gap }, random, work);
  if (slack === 0 || task.ties === "strings" || rule.any || !mayGoOn(work, 0)) return same;
  const aim = Math.min(task.target, CAP_LEAST / CAP_OVER);
  const both = yield* holdAgain(from.groups, { ...task, target: aim }, { tries: BOTH_TRIES, random, work });
  const { perUnit, perStage } = conductances;
  let cap = Math.max(CAP_OVER * both.gaps.holding, CAP_LEAST);
  let best = same;
  for (const part of LEVEL_PARTS) {
    const at = board(values, both.groups, rule.rules);
    const mine = share(work, part * (work.moves - work.spent));
    const steps = levelBoth(at, { conductances: perUnit, perStage, cap, target: from.gap + slack }, random, mine);
    for (let step = steps.next(); !step.done; step = steps.next()) yield bothGaps(at, perUnit, perStage);
    settle(work, mine);
    const gaps = bothGaps(at, perUnit, perStage);
    const level = gaps.charging <= Math.max(from.gap + slack, PROMISED);
    if (level && gaps.holding < best.gaps.holding) return { groups: groupsOf(at), gaps };
    const unseen = gaps.charging <= from.gap + UNSEEN && FAR_BETTER * gaps.holding < same.gaps.holding;
    if (unseen && (best === same || gaps.charging < best.gaps.charging)) best = { groups: groupsOf(at), gaps };
    if (!mayGoOn(work, 0)) break;
    cap *= WIDER;
  }
  return best;
}
