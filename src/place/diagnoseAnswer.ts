// From weights to words: suspects by place and kind, explanations that still count, and the worst stage under any of them.
import { faultyCourse } from "./diagnoseFaults.ts";
import type { Course, StageModel } from "./diagnoseModel.ts";
import type { Explanation } from "./diagnoseNext.ts";
import type { GoOn, Suspect } from "./diagnoseRequest.ts";
import type { Weighed } from "./diagnoseWeigh.ts";

const LISTED = 0.01;
/** An explanation this likely counts when it is asked whether it is safe to go on. */
export const COUNTS = 0.02;

/** Hypotheses of one kind at one place are one suspect. */
export function gather(weighed: readonly Weighed[], chance: (weight: number) => number): Suspect[] {
  const suspects = new Map<string, Suspect & { readonly top: number }>();
  for (const { hypothesis, size, weight } of weighed) {
    const { position, kind } = hypothesis;
    const key = `${position} ${kind}`;
    const before = suspects.get(key);
    const likelihood = chance(weight) + (before?.likelihood ?? 0);
    const better = before === undefined || weight > before.top;
    suspects.set(key, {
      position,
      kind,
      likelihood,
      size: better ? size : before.size,
      top: better ? weight : before.top,
    });
  }
  return [...suspects.values()]
    .filter((s) => s.likelihood >= LISTED)
    .sort((a, b) => b.likelihood - a.likelihood)
    .map(({ top: _, ...suspect }) => suspect);
}

/** Explanations that still count, likeliest first. */
export function likely(
  weighed: readonly Weighed[],
  chance: (weight: number) => number,
  sound: { readonly chance: number },
): Explanation[] {
  const all: (Explanation & { readonly p: number })[] = weighed.map(({ hypothesis, size, weight }) => ({
    hypothesis,
    size,
    p: chance(weight),
  }));
  all.push({ hypothesis: null, size: 1, p: sound.chance });
  return all
    .filter(({ p }) => p >= COUNTS)
    .sort((a, b) => b.p - a.p)
    .map(({ p: _, ...explanation }) => explanation);
}

const INSTANTS = 12;

export interface Step {
  readonly stages: readonly StageModel[];
  readonly course: Course;
  readonly bank: number;
  readonly seconds: number;
}

/** The worst stage under any of the explanations, from the end of the charge to `seconds` later. */
export function worstOf(
  explanations: readonly Explanation[],
  { stages, course, bank, seconds }: Step,
): Omit<GoOn, "safe"> {
  const times = Array.from({ length: INSTANTS + 1 }, (_, k) => (seconds * k * k) / INSTANTS ** 2);
  let worst = { worst: 0, position: 0 };
  for (const { hypothesis, size } of explanations) {
    const supposed = hypothesis === null ? course : faultyCourse(course, hypothesis, size);
    for (const { volts } of supposed(stages, bank, times)) {
      for (const [position, v] of volts.entries()) {
        if (Math.abs(v) > worst.worst) worst = { worst: Math.abs(v), position };
      }
    }
  }
  return worst;
}
