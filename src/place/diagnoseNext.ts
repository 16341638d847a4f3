// The next measurement: the reading that tells the two likeliest explanations apart, or what to measure with the bank dead.
import type { MeterModel } from "./diagnoseEvidence.ts";
import { type FaultKind, faultyCourse, type Hypothesis } from "./diagnoseFaults.ts";
import { type Course, conductanceOf, type StageModel } from "./diagnoseModel.ts";

export interface Explanation {
  /** Null: a sound bank. */
  readonly hypothesis: Hypothesis | null;
  readonly size: number;
}

export type NextMeasurement =
  | {
      readonly action: "read stage";
      readonly position: number;
      /** s after the charge. */
      readonly seconds: number;
      /** V that the first and the second explanation would have it read. */
      readonly expect: readonly [number, number];
    }
  | { readonly action: "read after a hold"; readonly seconds: number }
  | { readonly action: "check the meter" }
  | {
      readonly action: "with the bank dead";
      readonly position: number;
      readonly measure: "capacitance" | "leakage" | "resistor" | "polarity";
    }
  | { readonly action: "change the leads and read again"; readonly position: number };

/** Fewer standard deviations than this do not settle it. */
const SETTLES = 4;
const FRACTIONS = [0, 0.1, 0.3, 1, 3] as const;

/** The slowest time constant by which the stages move towards their holding share, s; infinite when nothing conducts. */
export const slowestTime = (stages: readonly StageModel[]): number =>
  Math.max(
    ...stages.map((stage) =>
      conductanceOf(stage) > 0 ? stage.capacitance / conductanceOf(stage) : Number.POSITIVE_INFINITY,
    ),
  );

const DEAD: Readonly<Record<FaultKind, "capacitance" | "leakage" | "resistor" | "polarity" | null>> = {
  "low capacitance": "capacitance",
  "high capacitance": "capacitance",
  leaky: "leakage",
  "resistor open": "resistor",
  "resistor wrong value": "resistor",
  "meter lead swapped": null,
  "reversed unit": "polarity",
};

export interface NextQuestion {
  readonly stages: readonly StageModel[];
  readonly course: Course;
  readonly meter: MeterModel;
  readonly bank: number;
  /** Latest reading so far, s. */
  readonly latest: number;
}

/** A reading that parts the two by more than the meter's doubt, soonest first; null when none does. */
function parting([a, b]: readonly [Explanation, Explanation], question: NextQuestion): NextMeasurement | null {
  const { stages, course, meter, bank } = question;
  const slow = slowestTime(stages);
  const times = FRACTIONS.map((f) => f * (Number.isFinite(slow) ? slow : 3600));
  const run = ({ hypothesis, size }: Explanation) =>
    (hypothesis === null ? course : faultyCourse(course, hypothesis, size))(stages, bank, times);
  const [left, right] = [run(a), run(b)];
  for (const [k, seconds] of times.entries()) {
    const parted = stages.map((_, i) => {
      const doubt = Math.hypot(left[k]!.volts[i]! * meter.relative, meter.absolute) * Math.SQRT2;
      return Math.abs(left[k]!.volts[i]! - right[k]!.volts[i]!) / doubt;
    });
    const position = parted.indexOf(Math.max(...parted));
    if (parted[position]! > SETTLES) {
      return {
        action: "read stage",
        position,
        seconds,
        expect: [left[k]!.volts[position]!, right[k]!.volts[position]!],
      };
    }
  }
  return null;
}

/**
 * `likely`: explanations, likeliest first. One alone is confirmed with the bank dead; a sound bank that was never held long enough to
 * show its leakage is to be read again after a hold.
 */
export function nextMeasurement(likely: readonly Explanation[], question: NextQuestion): NextMeasurement | null {
  const [first, second] = likely;
  if (first === undefined) return null;
  if (second !== undefined) {
    const read = parting([first, second], question);
    if (read) return read;
  }
  const { hypothesis } = first.hypothesis === null && second !== undefined ? second : first;
  if (hypothesis === null) {
    const slow = slowestTime(question.stages);
    return Number.isFinite(slow) && question.latest < 0.3 * slow
      ? { action: "read after a hold", seconds: slow }
      : null;
  }
  const measure = DEAD[hypothesis.kind];
  if (measure === null) return { action: "change the leads and read again", position: hypothesis.position };
  return { action: "with the bank dead", position: hypothesis.position, measure };
}
