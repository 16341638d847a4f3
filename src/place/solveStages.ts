// Finds and certifies the stages of a cross-tied bank: first placing, exchanges, and a proof where the lot is small.
import { board, groupsOf, recount } from "./board.ts";
import { type Bound, matrixBound } from "./boundMatrix.ts";
import { type Constraints, lotRange, mayFormGroup } from "./constraints.ts";
import { descend } from "./descent.ts";
import { type Effort, mayGoOn, settle, share } from "./effort.ts";
import { exactHalves, fitsHalves } from "./exactHalves.ts";
import { exactMatrix, fitsExactSearch } from "./exactMatrix.ts";
import { firstPlacing } from "./firstPlacings.ts";
import { stageGap } from "./gap.ts";
import type { Random } from "./random.ts";
import { shake } from "./shake.ts";
import type { SearchStep, Solution } from "./solution.ts";
import { cutStrings } from "./stringsCut.ts";

export interface StagesTask {
  /** Whole numbers in proportion to capacitance. */
  readonly values: Float64Array;
  readonly rule: Constraints;
  /** Unit indices, those to keep first. */
  readonly order: readonly number[];
  /** A placing that honours the constraints; ignored when there are none. */
  readonly start: readonly (readonly number[])[];
  /** Certified gap at which to stop. */
  readonly stopAt: number;
  /** Go for a proof even when `stopAt` is met? */
  readonly prove: boolean;
}

/** So many trials are spent without looking at the goal: they cost a fraction of a millisecond. */
const ALWAYS = 5_000;
/** The choice of spares is left alone for so many trials, then they join the exchange. */
const BEFORE_SPARES = 60_000;
/** Before a proof, so many trials look for a good placing: it makes the proof shorter. */
const BEFORE_PROOF = 100_000;
/** A first placing worse than this is shaken before it is refined. */
const SHAKE_ABOVE = 1e-4;
const SHAKES_PER_UNIT = 60;

const sumOf = (values: Float64Array, group: readonly number[]): number => group.reduce((sum, i) => sum + values[i]!, 0);

const gapOf = (values: Float64Array, groups: readonly (readonly number[])[]): number =>
  stageGap(
    groups.map((group) => sumOf(values, group)),
    groups.length,
  );

/** Shapes with a closed or direct answer: one stage, one unit a stage, two stages without spares. */
function direct({ values, rule }: StagesTask, work: Effort): Solution | null {
  const proven = (groups: readonly (readonly number[])[]): Solution => {
    const gap = gapOf(values, groups);
    return { groups, gap, lowerBound: gap, boundKind: "exhaustive" };
  };
  if (rule.any) return null;
  // One unit a stage is one string: the best set is a window of neighbours in size.
  if (rule.size === 1) return proven(cutStrings(values, rule.groups, 1)[0]!.map((i) => [i]));
  if (fitsHalves(values.length, rule.groups, rule.size)) return proven(exactHalves(values, work));
  return null;
}

/** The test of the exact search for one stage, or null when the constraints are beyond it. */
function maskTest(rule: Constraints): ((mask: number) => boolean) | undefined | null {
  if (!rule.any) return undefined;
  const labels = new Set(rule.label).size;
  const lots = [...new Set(rule.lot)];
  if (rule.takes.some((t) => t !== undefined) || (labels > 1 && lots.length > 1)) return null;
  const ranges = new Map(
    lots.length > 1
      ? lots.map((lot) => [lot, lotRange(rule.size, rule.lot.filter((l) => l === lot).length, rule.lot.length)])
      : [],
  );
  const test = mayFormGroup(rule, ranges);
  const units = rule.label.map((_, i) => i);
  return (mask) => test(units.filter((i) => mask & (1 << i)));
}

/** Puts groups that hold pinned units where they are pinned. */
function numbered(groups: readonly (readonly number[])[], rule: Constraints): (readonly number[])[] {
  const result: (readonly number[] | undefined)[] = new Array(groups.length).fill(undefined);
  const loose: (readonly number[])[] = [];
  for (const group of groups) {
    const pin = group.map((i) => rule.pinnedTo[i]!).find((g) => g >= 0);
    if (pin === undefined) loose.push(group);
    else result[pin] = group;
  }
  return result.map((group) => group ?? loose.shift()!);
}

export function* solveStages(task: StagesTask, random: Random, work: Effort): Generator<SearchStep, Solution> {
  const { values, rule, stopAt } = task;
  const { groups: stages, size } = rule;
  const quick = direct(task, work);
  if (quick) return quick;
  const bound: Bound = matrixBound(values, { stages, size, whole: true });
  const used = task.order.slice(0, stages * size).sort((a, b) => a - b);
  const first = rule.any
    ? task.start
    : firstPlacing(
        used.map((i) => values[i]!),
        stages,
      ).map((group) => group.map((k) => used[k]!));
  const at = board(values, first, rule.rules);
  let gap = stageGap(at.sums, stages);
  const begun = { gap, slots: Int32Array.from(at.slots) };
  const done = (): Solution => ({ groups: groupsOf(at), gap, lowerBound: bound.gap, boundKind: bound.kind });
  const standing = () => groupsOf(at);
  yield { phase: "first", gap, moves: work.spent, standing };
  const test = task.prove && fitsExactSearch(values.length, size) ? maskTest(rule) : null;
  const target = bound.gap + (test === null ? stopAt : 0);
  const spares = values.length > stages * size;
  if (gap > target && gap > SHAKE_ABOVE) {
    shake(at, SHAKES_PER_UNIT * values.length, random, work);
    gap = stageGap(at.sums, stages);
  }
  const refine = function* (withSpares: boolean, moves: number, goal = target): Generator<SearchStep> {
    const part = share(work, moves);
    const steps = descend(at, { target: goal, spares: withSpares }, random, part);
    for (let step = steps.next(); ; step = steps.next()) {
      gap = step.value;
      if (step.done) break;
      yield { phase: "exchange", gap, moves: work.spent + part.spent, standing };
    }
    settle(work, part);
  };
  if (gap > (task.prove ? bound.gap : target) && mayGoOn(work, 0)) yield* refine(false, ALWAYS, bound.gap);
  if (gap > target && mayGoOn(work, 0)) {
    const quickly = test === null ? Number.POSITIVE_INFINITY : BEFORE_PROOF;
    if (spares) {
      yield* refine(false, Math.min(quickly, BEFORE_SPARES));
      if (gap > target) yield* refine(true, quickly);
    } else yield* refine(false, quickly);
  }
  if (gap > begun.gap) {
    // The effort ran out between the shaking and the refining.
    at.slots.set(begun.slots);
    recount(at);
    gap = begun.gap;
  }
  if (test === null || gap <= bound.gap || !mayGoOn(work, 0)) return done();
  const must = rule.pinnedTo.reduce((mask, group, i) => (group >= 0 ? mask | (1 << i) : mask), 0);
  const part = share(work, Number.POSITIVE_INFINITY);
  const problem = { values, stages, size, inHand: gap, target: bound.gap, allowed: test, must };
  const search = exactMatrix(problem, part);
  let step = search.next();
  for (; !step.done; step = search.next())
    yield { phase: "proof", gap: step.value, moves: work.spent + part.spent, standing };
  settle(work, part);
  const { groups, proven } = step.value;
  gap = step.value.gap;
  const best = groups === null ? groupsOf(at) : numbered(groups, rule);
  if (!proven) return { ...done(), groups: best };
  return { groups: best, gap, lowerBound: gap, boundKind: gap <= bound.gap ? bound.kind : "exhaustive" };
}
