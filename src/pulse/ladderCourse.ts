// A whole shot of a ladder: each branch's peak current and action, by steps that keep to an error.

import { power } from "../quantity/index.ts";
import type { BusPath } from "./busPath.ts";
import { type Ladder, type LadderEnd, type LadderState, ladderStep } from "./ladder.ts";

/** What drives the ladder: its own load, or the bank's current as already known [A] at a time [s]. */
export type LadderDrive =
  | { readonly kind: "load"; readonly load: BusPath }
  | { readonly kind: "given"; readonly current: (time: number) => number };

export interface LadderCase {
  readonly ladder: Ladder;
  /** Charge voltage of every branch [V]. */
  readonly voltage: number;
  readonly drive: LadderDrive;
  /** s followed. */
  readonly seconds: number;
  /** Ends where the sum of the currents first comes back to zero. */
  readonly toZero?: boolean;
}

/**
 * Per branch, arm by arm from the feed outward: A, A^2 s, and the lowest V; the same currents of their sum. `seconds` is how far
 * they were followed; where that was to the zero of the sum, the lowest voltages are followed as long again, the load being off.
 */
export interface LadderFigures {
  readonly peaks: readonly number[];
  readonly actions: readonly number[];
  readonly lowest: readonly number[];
  readonly totalPeak: number;
  readonly totalAction: number;
  readonly seconds: number;
}

/** Error of a step, in parts of the charge voltage and of the largest branch current. */
const ERROR = 1e-9;
/** Branches times steps: more is not followed, and `seconds` says so. */
const WORK = 4e5;
const MANY = 64;
const FEWEST = 400;
const MOST = 6000;

/** Powers 0 to 3 of the cubic through four even samples of a given current. */
function cubic(current: (time: number) => number, from: number): (step: number) => readonly number[] {
  return (h) => {
    const [a, b, c, d] = [0, 1, 2, 3].map((k) => current(from + (h * k) / 3)) as [number, number, number, number];
    const x = h / 3;
    const [one, two, three] = [b - a, c - 2 * b + a, d - 3 * c + 3 * b - a];
    return [a, (one - two / 2 + three / 3) / x, (two - three) / (2 * x * x), three / (6 * x * x * x)];
  };
}

const endOf = (drive: LadderDrive, from: number): LadderEnd =>
  drive.kind === "load" ? drive : { kind: "given", powers: cubic(drive.current, from) };

/** Where in a step, as a part of it, a parabola through three even samples turns; null when it does not within. */
function turn(a: number, b: number, c: number): number | null {
  const [slope, bend] = [(c - a) / 2, a - 2 * b + c];
  return bend !== 0 && Math.abs(slope) < Math.abs(bend) ? (1 - slope / bend) / 2 : null;
}

/** The lowest of a parabola through three even samples. */
function lowestOf([a, b, c]: readonly [number, number, number]): number {
  const bend = a - 2 * b + c;
  const turned = turn(a, b, c);
  const least = Math.min(a, b, c);
  return turned === null || bend <= 0 ? least : Math.min(least, b - ((c - a) / 2) ** 2 / (2 * bend));
}

/** The load is off: the branches go on among themselves. */
const OPEN: LadderDrive = { kind: "given", current: () => 0 };

/** Follows the ladder; every step is one whole against two halves, whose difference sets the next. */
export function ladderCourse({ ladder, voltage, drive, seconds, toZero = false }: LadderCase): LadderFigures {
  const count = ladder.reduce((sum, arm) => sum + arm.length, 0);
  let state: LadderState = {
    voltages: new Float64Array(count).fill(voltage),
    currents: new Float64Array(count),
    total: 0,
  };
  const peaks = new Float64Array(count);
  const actions = new Float64Array(count);
  const lowest = new Float64Array(count).fill(voltage);
  let [totalPeak, totalAction, time, largest] = [0, 0, 0, 0];
  let until = seconds;
  let opened: number | null = null;
  let step = seconds * 1e-7;
  const most = Math.min(MOST, Math.max(FEWEST, Math.floor(WORK / count)));
  for (let tried = 0; tried < most && time < until; tried++) {
    step = Math.min(step, until - time);
    const driven = opened === null ? drive : OPEN;
    const whole = ladderStep(ladder, state, step, endOf(driven, time));
    const half = ladderStep(ladder, state, step / 2, endOf(driven, time));
    const end = ladderStep(ladder, half, step / 2, endOf(driven, time + step / 2));
    let error = 0;
    for (let k = 0; k < count; k++) largest = Math.max(largest, Math.abs(end.currents[k] as number));
    for (let k = 0; k < count; k++) {
      const volts = Math.abs((whole.voltages[k] as number) - (end.voltages[k] as number)) / voltage;
      const amperes = Math.abs((whole.currents[k] as number) - (end.currents[k] as number));
      error = Math.max(error, volts, largest > 0 ? amperes / largest : 0);
    }
    if (error > 4 * ERROR && step > seconds * 1e-12) {
      step *= Math.max(0.1, 0.9 * power(ERROR / error, 1 / 6));
      continue;
    }
    const begun = time === 0;
    const [from, length, at] = [state, step, time];
    // a parabola finds when a current turns; the step itself, cut short there, how high
    const greatest = (before: number, three: readonly [number, number, number], of: (at: LadderState) => number) => {
      const [a, b, c] = three;
      const seen = Math.max(before, Math.abs(a), Math.abs(b), Math.abs(c));
      const turned = begun ? null : turn(a, b, c);
      if (turned === null || turned <= 0 || Math.max(Math.abs(a), Math.abs(b), Math.abs(c)) < before * 0.99)
        return seen;
      // with very many branches the parabola's own height must do: each look costs as much as a step
      if (count > MANY) return Math.max(seen, Math.abs(b - ((c - a) / 2) ** 2 / (2 * (a - 2 * b + c))));
      return Math.max(seen, Math.abs(of(ladderStep(ladder, from, length * turned, endOf(drive, at)))));
    };
    for (let k = 0; k < count; k++) {
      const three = [state, half, end].map(({ voltages }) => voltages[k] as number) as [number, number, number];
      lowest[k] = Math.min(lowest[k] as number, lowestOf(three));
    }
    if (opened !== null) {
      time += step;
      state = end;
      step *= Math.min(3, 0.9 * power(ERROR / Math.max(error, 1e-14), 1 / 6));
      continue;
    }
    const add = (a: number, b: number, c: number): number => (step / 6) * (a * a + 4 * b * b + c * c);
    for (let k = 0; k < count; k++) {
      // without inductance the current starts at its peak, not at the zero that the state begins with
      const middle = half.currents[k] as number;
      const last = end.currents[k] as number;
      const first = begun ? middle : (state.currents[k] as number);
      peaks[k] = greatest(peaks[k] as number, [first, middle, last], (at) => at.currents[k] as number);
      actions[k] = (actions[k] as number) + add(first, middle, last);
    }
    const first = begun ? half.total : state.total;
    totalPeak = greatest(totalPeak, [first, half.total, end.total], (at) => at.total);
    totalAction += add(first, half.total, end.total);
    time += step;
    state = end;
    if (toZero && !begun && end.total <= 0 && totalPeak > 0) {
      opened = time;
      until = 2 * time;
      step *= 1e-3;
      continue;
    }
    step *= Math.min(3, 0.9 * power(ERROR / Math.max(error, 1e-14), 1 / 6));
  }
  return {
    peaks: [...peaks],
    actions: [...actions],
    lowest: [...lowest],
    totalPeak,
    totalAction,
    seconds: opened ?? time,
  };
}
