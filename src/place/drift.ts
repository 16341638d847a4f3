// What one unit has lost or grown since it was first measured, whether that is more than the meter's doubt, and when it is due.
import type { Verdict } from "../quantity/index.ts";
import { COVERAGE, dueAfter, type Wear } from "./driftDue.ts";
import { type DriftReading, driftLine } from "./driftFit.ts";

export type DriftKind = "capacitance" | "esr" | "leakage";

/** The builder's own ends of life: part of C lost, part of ESR grown, A of leakage. Absent: not assessed. */
export interface LifeLimits {
  readonly capacitance?: number;
  readonly esr?: number;
  readonly leakage?: number;
}

export interface Remeasured {
  readonly value: number;
  /** Relative standard uncertainty. */
  readonly uncertainty: number;
  /** Shots fired by then, and whole days since 1970; absent when unknown. */
  readonly shots?: number;
  readonly day?: number;
}

export interface Due {
  readonly axis: "shots" | "day";
  /** Shots in all, or days since 1970, as for the readings. Null: the drift does not reach the limit as far as the readings tell. */
  readonly best: number | null;
  /** 95 % of it. */
  readonly soonest: number | null;
  readonly latest: number | null;
  /** How many times the span that was watched lies before `best` (before `soonest` when there is no best). */
  readonly stretch: number | null;
}

export interface Drift {
  readonly kind: DriftKind;
  readonly readings: number;
  readonly first: number;
  readonly last: number;
  /** last/first - 1. */
  readonly change: number;
  /** Of `change`, 95 %: both readings' uncertainty. */
  readonly plusMinus: number;
  /** The change is more than the doubt. */
  readonly real: boolean;
  /** Part of the allowed drift that is used up, 1 at the end of life; null without a limit or with one reading. */
  readonly used: number | null;
  readonly verdict: Verdict;
  /** False when the readings stray from a straight line by more than the meter: the look ahead is then a guess. */
  readonly straight: boolean;
  readonly due: readonly Due[];
}

/** Readings that scatter more than this many times their uncertainty do not lie on a line. Common practice, no source. */
const STRAY = 2;

/** What is used up of the allowed drift; the first reading counts as the line has it, or by itself where the line lacks it. */
function wearOf(kind: DriftKind, limit: number, off: Remeasured | null): Wear {
  if (kind === "leakage") return { ofStart: 1, ofSlope: 1, limit };
  const sign = kind === "esr" ? 1 : -1;
  if (off === null) return { ofStart: -limit, ofSlope: sign, limit: 0 };
  const end = off.value * (1 + sign * limit);
  return { ofStart: sign, ofSlope: sign, limit: sign * end, limitVariance: (end * off.uncertainty) ** 2 };
}

/** Drift of one value of one unit. Readings in order of time; at least one. */
export function drift(kind: DriftKind, readings: readonly Remeasured[], limit: number | undefined): Drift {
  const first = readings[0]!;
  const last = readings.at(-1)!;
  const change = last.value / first.value - 1;
  const ratio = Math.hypot(first.uncertainty, last.uncertainty);
  const plusMinus = COVERAGE * (1 + change) * ratio;
  const once = readings.length < 2;
  const lines = (["shots", "day"] as const).flatMap((axis) => {
    const seen = readings.flatMap((reading): DriftReading[] => {
      const at = reading[axis];
      // A reading of nought has no relative doubt: that of the last digit would have to be known.
      return at === undefined
        ? []
        : [{ at, value: reading.value, sigma: reading.uncertainty * (reading.value || first.value || 1e-12) }];
    });
    const line = driftLine(seen);
    return line === null ? [] : [{ axis, line, span: Math.max(...seen.map(({ at }) => at)) - line.from }];
  });
  const base = {
    kind,
    readings: readings.length,
    first: first.value,
    last: last.value,
    change,
    plusMinus,
    real: !once && Math.abs(change) > plusMinus,
    straight: lines.every(({ line }) => line.scatter <= STRAY),
  };
  if (limit === undefined || once) return { ...base, used: null, verdict: "not assessed", due: [] };
  const goneAt = ({ value }: Remeasured): number => {
    if (kind === "leakage") return value;
    return kind === "esr" ? value / first.value - 1 : 1 - value / first.value;
  };
  const gone = goneAt(last);
  const doubt = kind === "leakage" ? COVERAGE * last.uncertainty * last.value : plusMinus;
  const due = lines.map(({ axis, line, span }): Due => {
    const { best, soonest, latest } = dueAfter(line, wearOf(kind, limit, first[axis] === undefined ? first : null));
    // A value that was read within its limit had not reached it by then, whatever the line through the readings says.
    const seen = readings.flatMap((one) => (one[axis] !== undefined && goneAt(one) < limit ? [one[axis]] : []));
    const held = seen.length === 0 ? 0 : Math.max(...seen) - line.from;
    const ahead = best === null && soonest === null ? null : Math.max(held, (best ?? soonest)!);
    const at = (after: number | null): number | null => (after === null ? null : line.from + Math.max(held, after));
    return {
      axis,
      best: at(best),
      soonest: at(soonest),
      latest: at(latest),
      stretch: ahead === null ? null : ahead / span,
    };
  });
  const verdict = gone >= limit ? "fail" : gone + doubt >= limit ? "warn" : "pass";
  return { ...base, used: gone / limit, verdict, due };
}
