// Finds and certifies independent strings: cut from the sorted lot, swaps, then a search that can prove the best.
import { stringsBound } from "./boundStrings.ts";
import type { Constraints } from "./constraints.ts";
import { type Effort, mayGoOn, settle, share } from "./effort.ts";
import type { Random } from "./random.ts";
import type { SearchStep, Solution } from "./solution.ts";
import { cutStrings, evenness } from "./stringsCut.ts";
import { descendStrings } from "./stringsDescent.ts";
import { exactStrings } from "./stringsExact.ts";

export interface StringsTask {
  /** In proportion to capacitance. */
  readonly values: Float64Array;
  readonly rule: Constraints;
  /** A placing that honours the constraints; ignored when there are none. */
  readonly start: readonly (readonly number[])[];
  /** Certified gap at which to stop. */
  readonly stopAt: number;
  readonly prove: boolean;
}

/** Trials of swaps before the proof: a hundredth of a second for a small lot. */
const BEFORE_PROOF_PER_UNIT = 4_000;
/** Of the effort, the part left to swaps when the lot is large. */
const SWAP_PART = 0.5;
const SMALL = 40;

export function* solveStrings(task: StringsTask, random: Random, work: Effort): Generator<SearchStep, Solution> {
  const { values, rule, stopAt } = task;
  const { groups: strings, size: series } = rule;
  const elastances = Float64Array.from(values, (c) => 1 / c);
  const bound = stringsBound(values, series, strings);
  const first = rule.any ? task.start : cutStrings(values, series, strings);
  const placed = new Set(first.flat());
  const all = Array.from(values, (_, i) => i);
  const slots = Int32Array.from([...first.flat(), ...all.filter((i) => !placed.has(i))]);
  let groups: readonly (readonly number[])[] = first;
  let least = Math.min(...first.map((group) => evenness(group.map((i) => elastances[i]!))));
  const gapAt = (t: number): number => Math.max(0, series / t - 1);
  const done = (lowerBound: number, proven: boolean): Solution => ({
    groups,
    gap: gapAt(least),
    lowerBound: proven ? gapAt(least) : Math.min(lowerBound, gapAt(least)),
    boundKind: proven ? "exhaustive" : bound.kind,
  });
  const standing = () =>
    Array.from({ length: strings }, (_, s) => Array.from(slots.subarray(s * series, (s + 1) * series)));
  yield { phase: "first", gap: gapAt(least), moves: work.spent, standing };
  if (!rule.any && (series <= 2 || strings === 1)) return done(bound.gap, true);
  const target = bound.gap + (task.prove && values.length <= SMALL ? 0 : stopAt);
  const wanted = series / (1 + target);
  if (least >= wanted) return done(bound.gap, false);
  const small = values.length <= SMALL;
  const swaps = share(work, small ? BEFORE_PROOF_PER_UNIT * values.length : SWAP_PART * work.moves);
  const descent = descendStrings({ series, strings, elastances, rules: rule.rules, slots }, wanted, random, swaps);
  for (let step = descent.next(); ; step = descent.next()) {
    least = step.value;
    if (step.done) break;
    yield { phase: "exchange", gap: gapAt(least), moves: work.spent + swaps.spent, standing };
  }
  settle(work, swaps);
  groups = standing();
  if (rule.any || least >= wanted || !mayGoOn(work, 0)) return done(bound.gap, false);
  const order = all.sort((a, b) => values[a]! - values[b]! || a - b);
  const part = share(work, Number.POSITIVE_INFINITY);
  const falling = Float64Array.from(order, (i) => elastances[i]!);
  const search = exactStrings({ falling, series, strings, inHand: least, target: wanted }, part);
  let step = search.next();
  for (; !step.done; step = search.next())
    yield { phase: "proof", gap: gapAt(step.value), moves: work.spent, standing };
  settle(work, part);
  if (step.value.groups) groups = step.value.groups.map((string) => string.map((k) => order[k]!));
  least = step.value.least;
  return done(bound.gap, step.value.proven && least < wanted);
}
