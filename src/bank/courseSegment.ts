// One stretch of a chain's time course over which no leakage current starts or stops: linear, so solved by its modes.
import { type Chain, stageConductance } from "./chain.ts";
import { type Curve, firstBelowZero } from "./courseCurve.ts";
import { type Modes, sourceModes } from "./courseModes.ts";

/** What the ends of the chain are joined to: a source (0 V and a resistor is a dump), or a steady current (0 A is rest). */
export type Drive =
  | { readonly kind: "source"; readonly voltage: number; readonly resistance: number }
  | { readonly kind: "current"; readonly current: number };

/** Above zero a leakage current flows; a stage that it has emptied takes no more than the chain brings; below zero it is off. */
type LeakState = "leaks" | "empty" | "off";

export interface Segment {
  readonly start: readonly number[];
  readonly modes: Modes;
  readonly current: Curve;
  /** Seconds until a leakage starts or stops, Infinity when none does. */
  readonly seconds: number;
}

/** Solves the stretch that begins at `start` (V); with a held source their sum must be its voltage. Looks no further than `horizon` (s). */
export function segmentFrom(
  chain: Chain,
  drive: Drive,
  start: readonly number[],
  horizon = Number.POSITIVE_INFINITY,
): Segment {
  const states = chain.map((stage, i): LeakState => {
    const v = start[i]!;
    return stage.leakageCurrent === 0 || v > 0 ? "leaks" : v < 0 ? "off" : "empty";
  });
  // Taking one empty stage into play lowers the chain's current, so they are settled one at a time, the most eager first.
  let solved = solve(chain, drive, start, states);
  for (let turn = 0; turn < chain.length; turn++) {
    const i = mostEager(chain, states, solved.current.start);
    if (i === null) break;
    states[i] = solved.current.start < 0 ? "off" : "leaks";
    solved = solve(chain, drive, start, states);
  }
  let seconds = horizon;
  let ended = false;
  for (const [i, stage] of chain.entries()) {
    if (stage.leakageCurrent === 0) continue;
    for (const watched of watchedCurves(stage.leakageCurrent, states[i]!, voltageCurve(solved, i), solved.current)) {
      const at = firstBelowZero(watched, 0, seconds);
      if (at === null) continue;
      seconds = at;
      ended = true;
    }
  }
  return { ...solved, seconds: ended ? seconds : Number.POSITIVE_INFINITY };
}

function mostEager(chain: Chain, states: readonly LeakState[], current: number): number | null {
  let found: number | null = null;
  for (const [i, stage] of chain.entries()) {
    if (states[i] !== "empty" || (current >= 0 && current <= stage.leakageCurrent)) continue;
    if (found === null || stage.leakageCurrent < chain[found]!.leakageCurrent) found = i;
  }
  return found;
}

/** Curves whose fall to zero ends the stretch. */
function watchedCurves(leakage: number, state: LeakState, voltage: Curve, current: Curve): readonly Curve[] {
  if (state === "leaks") return [voltage];
  if (state === "off") return [negated(voltage, 0)];
  return [current, negated(current, leakage)];
}

const negated = (curve: Curve, from: number): Curve => ({
  start: from - curve.start,
  rates: curve.rates,
  parts: curve.parts.map((part) => -part),
});

function solve(
  chain: Chain,
  drive: Drive,
  start: readonly number[],
  states: readonly LeakState[],
): Omit<Segment, "seconds"> {
  const active = chain.flatMap((_, i) => (states[i] === "empty" ? [] : [i]));
  const weights = active.map((i) => 1 / chain[i]!.capacitance);
  const drains = active.map(
    (i) => stageConductance(chain[i]!) * start[i]! + (states[i] === "leaks" ? chain[i]!.leakageCurrent : 0),
  );
  const rates = active.map((i, a) => stageConductance(chain[i]!) * weights[a]!);
  const current = startCurrent(drive, start, weights, drains);
  const slopes = active.map((_, a) => (current - drains[a]!) * weights[a]!);
  const modes: Modes =
    drive.kind === "source" && active.length > 0
      ? sourceModes({ rates, weights, slopes, resistance: drive.resistance })
      : diagonalModes(rates, slopes);
  const width = modes.rates.length;
  const all = new Float64Array(chain.length * width);
  for (const [a, i] of active.entries()) all.set(modes.slopes.subarray(a * width, (a + 1) * width), i * width);
  const spread: Modes = { rates: modes.rates, slopes: all };
  return { start, modes: spread, current: currentCurve(drive, current, spread, chain, active[0]) };
}

function startCurrent(
  drive: Drive,
  start: readonly number[],
  weights: readonly number[],
  drains: readonly number[],
): number {
  if (drive.kind === "current") return drive.current;
  if (drive.resistance > 0) return (drive.voltage - start.reduce((sum, v) => sum + v, 0)) / drive.resistance;
  let drained = 0;
  let weight = 0;
  for (const [a, w] of weights.entries()) {
    drained += drains[a]! * w;
    weight += w;
  }
  return weight === 0 ? 0 : drained / weight;
}

function diagonalModes(rates: readonly number[], slopes: readonly number[]): Modes {
  const width = rates.length;
  const spread = new Float64Array(width * width);
  for (const [i, slope] of slopes.entries()) spread[i * width + i] = slope;
  return { rates: Float64Array.from(rates), slopes: spread };
}

/** The chain's current over time: dI/dt = -sum(dv_i/dt)/R, or what one stage in play takes when the ends are held. */
function currentCurve(drive: Drive, start: number, modes: Modes, chain: Chain, first: number | undefined): Curve {
  const width = modes.rates.length;
  const parts = new Float64Array(width);
  if (drive.kind === "source" && first !== undefined) {
    for (let k = 0; k < width; k++) {
      if (drive.resistance > 0) {
        for (let i = 0; i < chain.length; i++) parts[k]! -= modes.slopes[i * width + k]! / drive.resistance;
      } else {
        const stage = chain[first]!;
        parts[k] = modes.slopes[first * width + k]! * (stageConductance(stage) - stage.capacitance * modes.rates[k]!);
      }
    }
  }
  return { start, rates: modes.rates, parts };
}

/** Voltage of stage i as a curve. */
export function voltageCurve(segment: Pick<Segment, "start" | "modes">, i: number): Curve {
  const width = segment.modes.rates.length;
  return {
    start: segment.start[i]!,
    rates: segment.modes.rates,
    parts: segment.modes.slopes.subarray(i * width, (i + 1) * width),
  };
}
