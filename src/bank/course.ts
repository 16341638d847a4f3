// The whole time course of a chain: charge, hold, dump, rest, each an exact stretch or several.
import { type Chain, chargingShares, leftAfterDump } from "./chain.ts";
import { type Curve, firstBelowZero, highestOf, type Peak } from "./courseCurve.ts";
import {
  type Drive,
  endsCurve,
  type Segment,
  segmentAt,
  segmentCurrent,
  segmentFrom,
  segmentOver,
  voltageCurve,
} from "./courseSegment.ts";

export type PhaseName = "charge" | "hold" | "dump" | "rest";

export interface Phase {
  readonly name: PhaseName;
  /** Length, s; Infinity for an endless hold, or for a charge that never gets there. */
  readonly seconds: number;
  /** Stage voltages (V) at the phase's ends; for an endless phase, those it settles to. */
  readonly start: readonly number[];
  readonly end: readonly number[];
  /** Stage voltages (V), `seconds` (0 to the phase's length) after the phase began. */
  voltagesAt(seconds: number): Float64Array;
  /**
   * Stage voltages (V) at `count` instants `from`, `from + step` ... (s after the phase began, finite), row by row: instant k, stage i at
   * [k n + i]. For pictures: many times faster than asking one by one, the same to 1e-12 of the bank's voltage.
   */
  voltagesOver(grid: { readonly from: number; readonly step: number; readonly count: number }): Float64Array;
  /** Current through the chain (A), positive while charging; 0 for an instant phase. */
  currentAt(seconds: number): number;
  /** For each stage the highest voltage (V) anywhere in the phase and when (s after it began), certified to 1e-12 of the bank's. */
  peaks(): readonly Peak[];
}

export interface Program {
  /** `instant`: so fast that nothing leaks meanwhile. `seriesResistance` (ohm) of what stays between charger and chain, default 0. */
  readonly charge:
    | { readonly kind: "instant" }
    | { readonly kind: "current"; readonly current: number }
    | { readonly kind: "source"; readonly voltage: number; readonly resistance: number };
  readonly voltage: number;
  readonly seriesResistance?: number;
  /** Seconds at `voltage`, 0 to Infinity. */
  readonly hold: number;
  /** Resistance 0 is an instant dump. Null: none. */
  readonly dump: { readonly resistance: number; readonly seconds: number } | null;
  /** Seconds with the ends open, 0 to Infinity. */
  readonly rest: number;
  /** Stage voltages (V) before the charge; default empty. */
  readonly start?: readonly number[];
}

export interface Course {
  readonly phases: readonly Phase[];
  /** False when the charge never reaches the voltage, because leakage takes all that it brings. Nothing follows it then. */
  readonly reached: boolean;
  /** Stage voltages (V) at a time since the charge began (s); the last phase's end when later. */
  voltagesAt(seconds: number): Float64Array;
}

/** The time course of a chain through a program. Source: [methods-derived] 2.1 made a function of time */
export function courseOf(chain: Chain, program: Program): Course {
  const empty = chain.map(() => 0);
  const phases: Phase[] = [chargePhase(chain, program, program.start ?? empty)];
  const reached = phases[0]!.seconds < Number.POSITIVE_INFINITY;
  const follow = (name: PhaseName, drive: Drive, seconds: number): void => {
    phases.push(phaseFrom({ name, chain, drive, start: phases.at(-1)!.end, seconds }));
  };
  if (reached) {
    const held: Drive = { kind: "source", voltage: program.voltage, resistance: program.seriesResistance ?? 0 };
    if (program.hold > 0) follow("hold", held, program.hold);
    if (program.dump && program.dump.resistance > 0)
      follow("dump", { kind: "source", voltage: 0, resistance: program.dump.resistance }, program.dump.seconds);
    else if (program.dump) {
      phases.push(instantPhase("dump", phases.at(-1)!.end, leftAfterDump(chain, phases.at(-1)!.end)));
      // Ends still joined by a wire: the stages go on leaking while they sum to zero.
      if (program.dump.seconds > 0) follow("dump", { kind: "source", voltage: 0, resistance: 0 }, program.dump.seconds);
    }
    if (program.rest > 0) follow("rest", { kind: "current", current: 0 }, program.rest);
  }
  return { phases, reached, voltagesAt: (seconds) => phasesAt(phases, seconds) };
}

function chargePhase(chain: Chain, program: Program, start: readonly number[]): Phase {
  const { charge, voltage } = program;
  if (charge.kind === "instant") {
    const shares = chargingShares(chain);
    const missing = voltage - start.reduce((sum, v) => sum + v, 0);
    return instantPhase(
      "charge",
      start,
      start.map((v, i) => v + missing * shares[i]!),
    );
  }
  return phaseFrom({ name: "charge", chain, drive: charge, start, seconds: Number.POSITIVE_INFINITY, until: voltage });
}

function phasesAt(phases: readonly Phase[], seconds: number): Float64Array {
  let begun = 0;
  for (const phase of phases) {
    if (seconds < begun + phase.seconds) return phase.voltagesAt(Math.max(0, seconds - begun));
    begun += phase.seconds;
  }
  return Float64Array.from(phases.at(-1)!.end);
}

function instantPhase(name: PhaseName, start: readonly number[], end: readonly number[]): Phase {
  return {
    name,
    seconds: 0,
    start,
    end,
    voltagesAt: () => Float64Array.from(end),
    voltagesOver: ({ count }) => Float64Array.from({ length: count * end.length }, (_, j) => end[j % end.length]!),
    currentAt: () => 0,
    peaks: () => start.map((v, i) => ({ voltage: Math.max(v, end[i]!), seconds: 0 })),
  };
}

interface Stretch {
  readonly begin: number;
  readonly length: number;
  readonly segment: Segment;
}

/** One phase from given stage voltages (V) under one drive, for `seconds` or until the ends reach `until` (V). */
export function phaseFrom(given: {
  readonly name: PhaseName;
  readonly chain: Chain;
  readonly drive: Drive;
  readonly start: readonly number[];
  readonly seconds: number;
  readonly until?: number;
}): Phase {
  const stretches: Stretch[] = [];
  let start = given.start;
  let begin = 0;
  let arrived = given.until === undefined;
  // Each leakage can stop and start again a few times; far more than this would mean that the stretches do not end.
  for (let turn = 0; turn < 50 * (given.chain.length + 1); turn++) {
    const segment = segmentFrom(given.chain, given.drive, start, given.seconds - begin);
    let length = Math.min(segment.seconds, given.seconds - begin);
    if (given.until !== undefined) {
      const there = firstBelowZero(shortfall(segment, given.until), 0, length);
      arrived = there !== null;
      length = there ?? length;
    }
    stretches.push({ begin, length, segment });
    const ended = segmentAt(segment, length);
    start = Array.from(ended, (v, i) => (length === segment.seconds && crosses(segment, given.chain, i, v) ? 0 : v));
    begin += length;
    if ((given.until !== undefined && arrived) || length < segment.seconds || begin >= given.seconds) break;
  }
  const end = start;
  const find = (seconds: number): Stretch =>
    stretches.findLast((stretch) => stretch.begin <= seconds && stretch.begin < Number.POSITIVE_INFINITY) ??
    stretches[0]!;
  return {
    name: given.name,
    seconds: arrived ? begin : Number.POSITIVE_INFINITY,
    start: given.start,
    end,
    voltagesAt: (seconds) => {
      const stretch = find(seconds);
      return segmentAt(stretch.segment, Math.min(seconds - stretch.begin, stretch.length));
    },
    voltagesOver: (grid) => {
      const stages = given.chain.length;
      const out = new Float64Array(grid.count * stages);
      for (let row = 0; row < grid.count; ) {
        const at = grid.from + row * grid.step;
        const stretch = find(at);
        const last = stretch === stretches.at(-1);
        const span = stretch.begin + stretch.length;
        const fit = last && at >= span ? 0 : Math.floor((span - at) / grid.step) + 1;
        const count = Math.min(grid.count - row, Math.max(1, fit));
        const from = Math.min(at - stretch.begin, stretch.length);
        segmentOver(stretch.segment, { from, step: grid.step, count }, out, row);
        row += count;
      }
      return out;
    },
    currentAt: (seconds) => {
      const stretch = find(seconds);
      return segmentCurrent(stretch.segment, Math.min(seconds - stretch.begin, stretch.length));
    },
    peaks: () => given.chain.map((_, i) => peakOf(stretches, i)),
  };
}

/** What the ends still lack, V, as a curve. */
function shortfall(segment: Segment, until: number): Curve {
  const ends = endsCurve(segment);
  return { start: until - ends.start, rates: ends.rates, parts: ends.parts.map((part) => -part) };
}

/** Whether stage i is the one that reached zero: rounding must not leave it a hair above or below. */
function crosses(segment: Segment, chain: Chain, i: number, v: number): boolean {
  const size = segment.start.reduce((sum, start) => sum + Math.abs(start), 0);
  return chain[i]!.leakageCurrent > 0 && Math.abs(v) <= 1e-12 * size;
}

function peakOf(stretches: readonly Stretch[], i: number): Peak {
  let best: Peak = { voltage: Number.NEGATIVE_INFINITY, seconds: 0 };
  for (const { begin, length, segment } of stretches) {
    const peak = highestOf(voltageCurve(segment, i), 0, length);
    if (peak.voltage > best.voltage) best = { voltage: peak.voltage, seconds: begin + peak.seconds };
  }
  return best;
}
