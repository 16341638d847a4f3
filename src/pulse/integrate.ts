// Integrates a small system of differential equations to a tolerance, stopping at or noting the events it is given.
import { power } from "../quantity/index.ts";
import { type Piece, pieceOf, type Scratch, type Slope, scratchOf, step, within } from "./dormandPrince.ts";

/** Something to watch for: `value` passing zero in `direction` (+1 rising, -1 falling). */
export interface Watch {
  readonly value: (x: number, y: Float64Array) => number;
  readonly direction: 1 | -1;
  /** Whether the integration ends there; otherwise the place is only noted. */
  readonly stops: boolean;
}

/** What to integrate. `floors` are the sizes of each state below which its error is judged as if it had that size. */
export interface Problem {
  readonly slope: Slope;
  readonly from: number;
  readonly to: number;
  readonly start: Float64Array;
  readonly firstStep: number;
  /** Allowed error per step, relative. */
  readonly tolerance: number;
  readonly floors: Float64Array;
  readonly watches: readonly Watch[];
  readonly maxSteps: number;
}

/** A watched place: which watch, where, and the state there. */
export interface Hit {
  readonly watch: number;
  readonly x: number;
  readonly y: Float64Array;
}

/** `ended`: "watch" (the last hit stopped it), "end" (reached `to`), "steps" (ran out of steps: the result is not whole). */
export interface Course {
  readonly x: number;
  readonly y: Float64Array;
  readonly pieces: readonly Piece[];
  readonly hits: readonly Hit[];
  readonly ended: "watch" | "end" | "steps";
  readonly steps: number;
}

const errorNorm = (y: Float64Array, s: Scratch, problem: Problem): number => {
  let worst = 0;
  for (let i = 0; i < y.length; i++) {
    const size = Math.max(problem.floors[i]!, Math.abs(y[i]!), Math.abs(s.next[i]!));
    const part = Math.abs(s.error[i]!) / size;
    if (!(part <= worst)) worst = part;
  }
  return worst / problem.tolerance;
};

/** Part of the piece at which the watch passes zero, by bisection kept inside the sign change. */
function crossing(watch: Watch, piece: Piece, before: number, out: Float64Array): number {
  let [low, high] = [0, 1];
  const rising = before < 0;
  for (let turn = 0; turn < 60 && high - low > 1e-15; turn++) {
    const middle = (low + high) / 2;
    const value = watch.value(piece.x + middle * piece.h, within(piece, middle, out));
    if (value < 0 === rising) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

const passes = ({ direction }: Watch, before: number, after: number): boolean =>
  direction > 0 ? before < 0 && after >= 0 : before > 0 && after <= 0;

/**
 * Integrates with the step chosen so that each step's estimated error stays within `tolerance`.
 * At a stopping watch the last step is taken again to the crossing, so the end state has the step's accuracy, not the
 * interpolation's. Source: [HNW] section II.4 step control.
 */
export function integrate(problem: Problem): Course {
  const { slope, watches, to } = problem;
  const size = problem.start.length;
  const y = problem.start.slice();
  let x = problem.from;
  let h = problem.firstStep;
  let steps = 0;
  const s = scratchOf(size);
  const held = new Float64Array(size);
  const pieces: Piece[] = [];
  const hits: Hit[] = [];
  let before = watches.map((watch) => watch.value(x, y));
  let after = before.slice();
  slope(x, y, s.k[0]!);
  while (x < to) {
    if (steps++ >= problem.maxSteps) return { x, y, pieces, hits, ended: "steps", steps };
    h = Math.min(h, to - x);
    step(slope, { x, h }, y, s);
    const error = errorNorm(y, s, problem);
    if (!(error <= 1)) {
      h *= Number.isFinite(error) ? Math.max(0.2, 0.9 * power(error, -0.2)) : 0.1;
      continue;
    }
    let piece = pieceOf({ x, h }, y, s);
    let found: { watch: number; part: number }[] | null = null;
    for (let index = 0; index < watches.length; index++) {
      const watch = watches[index]!;
      const value = before[index]!;
      after[index] = watch.value(x + h, s.next);
      if (!passes(watch, value, after[index]!)) continue;
      found ??= [];
      found.push({ watch: index, part: crossing(watch, piece, value, held) });
    }
    for (const { watch, part } of found?.sort((a, b) => a.part - b.part) ?? []) {
      const reach = part * h;
      if (watches[watch]!.stops) {
        step(slope, { x, h: reach }, y, s);
        piece = pieceOf({ x, h: reach }, y, s);
        pieces.push(piece);
        const end = s.next.slice();
        hits.push({ watch, x: x + reach, y: end });
        return { x: x + reach, y: end, pieces, hits, ended: "watch", steps };
      }
      hits.push({ watch, x: x + reach, y: within(piece, part, new Float64Array(size)) });
    }
    pieces.push(piece);
    x = to - x <= h ? to : x + h;
    y.set(s.next);
    [before, after] = [after, before];
    s.k[0]!.set(s.k[6]!);
    h *= Math.min(5, 0.9 * power(Math.max(error, 1e-10), -0.2));
  }
  return { x, y, pieces, hits, ended: "end", steps };
}
