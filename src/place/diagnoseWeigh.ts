/*
 * Weighs every single fault against the readings.
 *
 *   P(fault | y) ~ odds(fault) * integral of p(y | fault, size) p(size) d size,  p(size) even in ln(size)
 * The integral by Laplace's method about the best size. The covariance is that of the sound bank first; for the faults that come near,
 * it is made anew about each of them. Source: [MacKay2003] ch. 27, 28.
 */
import { power } from "../quantity/index.ts";
import { covariance, observed, predicted, type Question } from "./diagnoseEvidence.ts";
import { faultyCourse, type Hypothesis, hypotheses, SOUND_ODDS } from "./diagnoseFaults.ts";
import type { Course } from "./diagnoseModel.ts";
import { excess, logDensity, whiten } from "./gaussian.ts";

export interface Weighed {
  readonly hypothesis: Hypothesis;
  /** Best size; 1 where the fault has none. */
  readonly size: number;
  /** ln of odds times the probability of the readings. */
  readonly weight: number;
  /** How far the readings stand from this fault at its best, in standard deviations of chi-squared. */
  readonly excess: number;
}

export interface Weighing {
  readonly sound: { readonly weight: number; readonly excess: number };
  readonly faults: readonly Weighed[];
}

const GRID = 24;
const REFINE = 24;
const GOLDEN = (Math.sqrt(5) - 1) / 2;
/** Positions whose faults are all weighed with their own covariance. */
const NEAR_POSITIONS = 3;
/** Sizes are not told apart more finely than this, in ln(size). */
const FINEST = 1e-4;

type Lower = readonly (readonly number[])[];

/** ln p(y | fault, size). */
type LogLikelihood = (size: number) => number;

/** The likeliest size of a fault. */
interface Peak {
  readonly size: number;
  /** ln of the integral over ln(size). */
  readonly integral: number;
}

const sizesOnGrid = (from: number, to: number): number[] =>
  Array.from({ length: GRID }, (_, k) => from * power(to / from, k / (GRID - 1)));

/** The integral as a mean over a coarse grid: enough where the readings do not point at this fault. */
function coarsePeak(log: LogLikelihood, from: number, to: number): Peak {
  const sizes = sizesOnGrid(from, to);
  const values = sizes.map(log);
  const top = Math.max(...values);
  const mean = values.reduce((sum, v) => sum + Math.exp(v - top), 0) / GRID;
  return { size: sizes[values.indexOf(top)]!, integral: top + Math.log(mean) };
}

/** The integral by Laplace's method about the best size, found by golden section from the best of the grid. */
function finePeak(log: LogLikelihood, from: number, to: number): Peak {
  const span = Math.log(to / from);
  const sizes = sizesOnGrid(from, to).map(Math.log);
  const values = sizes.map((s) => log(Math.exp(s)));
  const top = values.indexOf(Math.max(...values));
  let [low, high] = [sizes[Math.max(0, top - 1)]!, sizes[Math.min(GRID - 1, top + 1)]!];
  let [left, right] = [high - GOLDEN * (high - low), low + GOLDEN * (high - low)];
  let [atLeft, atRight] = [log(Math.exp(left)), log(Math.exp(right))];
  for (let k = 0; k < REFINE; k++) {
    if (atLeft >= atRight) {
      [high, right, atRight] = [right, left, atLeft];
      left = high - GOLDEN * (high - low);
      atLeft = log(Math.exp(left));
    } else {
      [low, left, atLeft] = [left, right, atRight];
      right = low + GOLDEN * (high - low);
      atRight = log(Math.exp(right));
    }
  }
  let best = (low + high) / 2;
  let peak = log(Math.exp(best));
  if (values[top]! > peak) [best, peak] = [sizes[top]!, values[top]!];
  // The width where the likelihood has fallen by a half in ln: sigma of the peak taken as normal, at least the finest.
  const fallen = (direction: 1 | -1): number => {
    let reach = FINEST;
    while (reach < span && peak - log(Math.exp(best + direction * reach)) < 0.5) reach *= 1.6;
    return Math.min(reach, span);
  };
  const width = (fallen(1) + fallen(-1)) / 2;
  const share = Math.min(1, (Math.sqrt(2 * Math.PI) * width) / span);
  return { size: Math.exp(best), integral: peak + Math.log(share) };
}

/** Weighs the sound bank and every single fault. `course` is that of the sound bank. */
export function weigh(question: Question, course: Course, polarised: boolean): Weighing {
  const { stages, rows } = question;
  const y = observed(rows);
  const list = hypotheses(stages, polarised);
  const residuals = (f: readonly number[]): number[] => y.map((v, k) => v - f[k]!);
  const soundLower = covariance(course, question);
  const soundResiduals = residuals(predicted(course, stages, rows));
  const square = (lower: Lower, r: readonly number[]): number => whiten(lower, r).reduce((s, z) => s + z * z, 0);

  // The grid of sizes is gone through up to three times for one fault: what would be read is kept.
  const kept = new Map<Hypothesis, Map<number, readonly number[]>>(list.map((hypothesis) => [hypothesis, new Map()]));
  const misfit = (hypothesis: Hypothesis, size: number): readonly number[] => {
    const mine = kept.get(hypothesis)!;
    const known = mine.get(size) ?? residuals(predicted(faultyCourse(course, hypothesis, size), stages, rows));
    mine.set(size, known);
    return known;
  };

  const weighOne = (hypothesis: Hypothesis, lower: Lower, peakOf: typeof finePeak): Weighed => {
    const log: LogLikelihood = (size) => logDensity(lower, misfit(hypothesis, size));
    const { sizes } = hypothesis;
    const single = sizes.kind === "one" ? sizes.at : 1;
    const { size, integral } =
      sizes.kind === "range" ? peakOf(log, sizes.from, sizes.to) : { size: single, integral: log(single) };
    const freedom = Math.max(1, y.length - (sizes.kind === "range" ? 1 : 0));
    return {
      hypothesis,
      size,
      weight: Math.log(hypothesis.odds) + integral,
      excess: excess(square(lower, misfit(hypothesis, size)), freedom),
    };
  };

  const first = list.map((hypothesis) => weighOne(hypothesis, soundLower, coarsePeak));
  const bestAt = stages.map((_, i) =>
    Math.max(...first.filter((w) => w.hypothesis.position === i).map((w) => w.weight)),
  );
  const near = new Set([...bestAt.keys()].sort((a, b) => bestAt[b]! - bestAt[a]!).slice(0, NEAR_POSITIONS));
  const faults = first.map((coarse): Weighed => {
    const { hypothesis } = coarse;
    if (!near.has(hypothesis.position)) return coarse;
    const rough = weighOne(hypothesis, soundLower, finePeak);
    // What is not known about the bank counts as the fault would have it: an open resistor leaves the share to the leakage.
    const lower = covariance(faultyCourse(course, hypothesis, rough.size), question);
    return weighOne(hypothesis, lower, finePeak);
  });
  const sound = {
    weight: Math.log(SOUND_ODDS) + logDensity(soundLower, soundResiduals),
    excess: excess(square(soundLower, soundResiduals), Math.max(1, y.length)),
  };
  return { sound, faults };
}
