// Follows a mesh through its stages (bank and load in one loop, clamp conducting, slow tail) until the current has died away.
import type { Piece } from "./dormandPrince.ts";
import { type Course, integrate } from "./integrate.ts";
import * as eq from "./meshSlopes.ts";
import { awake, hasFaded, type Mode, watchesOf } from "./meshWatches.ts";

/** One stage's dense pieces. */
export interface Stage {
  readonly pieces: readonly Piece[];
}

/** The whole course in numbers of one. `whole` is false when the step limit cut it short. */
export interface MeshCourse {
  readonly stages: readonly Stage[];
  readonly end: Float64Array;
  readonly peak: { readonly current: number; readonly time: number };
  readonly lowest: number;
  readonly whole: boolean;
  /** Whether the clamp conducted when the course ended. */
  readonly clamped: boolean;
  readonly steps: number;
}

/** Less energy than this, as a part of that stored, is not worth another half-cycle. */
const SPENT = 1e-10;
const MOST_HALVES = 400;
const MOST_STEPS = 200_000;

const SLOPES = {
  series: eq.seriesSlope,
  clamped: eq.clampedSlope,
  asleep: eq.asleepSlope,
  tail: eq.tailSlope,
} as const;

/** |u| on the slow curve at the voltage where the tail begins, so that no charge is lost in the change. */
function tailRoot(m: eq.NormalMesh, from: number, voltage: number): number {
  let a = from;
  for (let turn = 0; turn < 4; turn++) {
    const { value, slope } = eq.tailVoltage(m, a);
    a -= (value - voltage) / slope;
  }
  return a;
}

/** The course from full charge at rest. `oneWay`: the switch opens at the first current zero. `tolerance`: per step. */
export function courseOf(m: eq.NormalMesh, oneWay: boolean, tolerance: number): MeshCourse {
  const r = m.bankR + m.outerR;
  const typical = Math.min(1, 1 / Math.max(r, 1e-9), 1 / Math.max(m.lamp * m.lamp, 1e-9));
  const floors = new Float64Array(eq.STATES).fill(typical);
  floors[eq.ROOT] = Math.sqrt(typical);
  floors[eq.VOLTAGE] = 1;
  floors[eq.TIME] = 1;
  const stages: Stage[] = [];
  let y: Float64Array = new Float64Array(eq.STATES);
  y[eq.VOLTAGE] = 1;
  let [mode, side, lowest, steps, halves]: [Mode, eq.Side, number, number, number] = ["series", 1, 1, 0, 0];
  let peak = { current: 0, time: 0 };
  const seen = (state: Float64Array): void => {
    lowest = Math.min(lowest, state[eq.VOLTAGE]!);
  };
  const finish = (whole: boolean): MeshCourse => {
    return { stages, end: y, peak, lowest, whole, clamped: mode === "clamped" || mode === "asleep", steps };
  };
  for (;;) {
    // a stage can begin with the current already faded, which its watches, waiting for a change, would never tell
    if (y[eq.ROOT] !== 0 && hasFaded(mode, m, side, peak.current, y)) return finish(true);
    const course: Course = integrate({
      slope: SLOPES[mode](m, side),
      from: 0,
      to: Number.POSITIVE_INFINITY,
      start: y,
      firstStep: mode === "tail" ? 1e-3 : 1e-2 * Math.sqrt(typical),
      tolerance,
      floors,
      watches: watchesOf(mode, m, side, peak.current),
      maxSteps: MOST_STEPS - steps,
    });
    steps += course.steps;
    stages.push({ pieces: course.pieces });
    for (const hit of course.hits) {
      seen(hit.y);
      const current = hit.y[eq.ROOT]! ** 2;
      if (mode === "series" && current > peak.current) peak = { current, time: hit.y[eq.TIME]! };
    }
    y = course.y.slice();
    seen(y);
    if (course.ended !== "watch") return finish(false);
    const watch = course.hits.at(-1)!.watch;
    if (mode === "tail" || mode === "asleep") return finish(true);
    if (mode === "clamped") {
      if (watch === 2) {
        mode = "asleep";
        continue;
      }
      if (watch !== 0) return finish(true);
      mode = "series";
      continue;
    }
    if (watch === 0) continue;
    if (watch === 2) return finish(true);
    if (watch === 3 && m.clampDrop !== null) {
      mode = awake(m, side, y) <= 0 ? "asleep" : "clamped";
      y[eq.BANK_CURRENT] = y[eq.ROOT]! * Math.abs(y[eq.ROOT]!);
      continue;
    }
    if (watch === 3) {
      mode = "tail";
      y[eq.ROOT] = side * tailRoot(m, Math.abs(y[eq.ROOT]!), side * y[eq.VOLTAGE]!);
      continue;
    }
    y[eq.ROOT] = 0;
    const voltage = y[eq.VOLTAGE]!;
    if (oneWay || Math.abs(voltage) <= m.drop || voltage * voltage < SPENT || ++halves >= MOST_HALVES)
      return finish(true);
    side = voltage > 0 ? 1 : -1;
    // the drop turns about with the current, which can by itself push the terminals below the clamp
    if (m.clampDrop !== null && m.outerL > 0 && eq.terminalVoltage(m, side, y) + m.clampDrop <= 0) {
      // a clamp lower than the switch's drop leaves the load nothing to conduct on; the bank empties through the diode alone
      if (m.clampDrop <= m.drop) return finish(true);
      mode = "clamped";
      y[eq.BANK_CURRENT] = 0;
    }
  }
}
