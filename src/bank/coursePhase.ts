// One phase of a course: the stretches between which a leakage stops or starts, joined and read as one.
import type { Chain } from "./chain.ts";
import { type Curve, firstBelowZero, highestOf, type Peak } from "./courseCurve.ts";
import { endsCurve, segmentAt, segmentCurrent, segmentOver } from "./courseRead.ts";
import { type Drive, type Segment, segmentFrom, voltageCurve } from "./courseSegment.ts";

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

/** A phase so short that nothing leaks meanwhile. */
export function instantPhase(name: PhaseName, start: readonly number[], end: readonly number[]): Phase {
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
      const gap = shortfall(segment, given.until);
      const there = gap.start <= 0 ? 0 : firstBelowZero(gap, 0, length);
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
