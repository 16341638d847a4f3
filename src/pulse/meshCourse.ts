// Follows a mesh through its stages (bank and load in one loop, clamp conducting, slow tail) until the current has died away.
import type { Piece } from "./dormandPrince.ts";
import { type Course, integrate, type Watch } from "./integrate.ts";
import * as eq from "./meshSlopes.ts";

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

type Mode = "series" | "clamped" | "tail";

/** A lamp's law is not followed below this part of the peak current; other loads are followed far lower. */
const LAMP_FADE = 1e-3;
const FADE = 1e-6;
/** Where the slow tail takes over: its own error is of the order of the square of this. */
const TAIL_SHARE = 1e-5;
const TAIL_MATCH = 1e-7;
/** Less energy than this, as a part of that stored, is not worth another half-cycle. */
const SPENT = 1e-10;
const MOST_HALVES = 400;
const MOST_STEPS = 400_000;

/** Watches of the series stage: peak, zero, faded away, then slow tail or clamp. The first peak stops, as the rest need it. */
function seriesWatches(m: eq.NormalMesh, side: eq.Side, peak: number): Watch[] {
  const cut = Math.sqrt((m.lamp > 0 ? LAMP_FADE : FADE) * peak);
  const rise = (y: Float64Array): number => side * eq.seriesRise(m, side, y);
  const toward = (y: Float64Array): number => side * y[eq.VOLTAGE]!;
  const slow = (y: Float64Array): number => {
    const a = Math.abs(y[eq.ROOT]!);
    const off = Math.abs(toward(y) - eq.tailVoltage(m, a).value) - TAIL_MATCH * Math.abs(toward(y));
    return Math.max(eq.coilShare(m, a) - TAIL_SHARE, off, rise(y));
  };
  return [
    { value: (_s, y) => rise(y), direction: -1, stops: peak === 0 },
    { value: (_s, y) => side * y[eq.ROOT]!, direction: -1, stops: true },
    {
      value: (_s, y) => Math.max(side * y[eq.ROOT]! - cut, rise(y), -toward(y)),
      direction: -1,
      stops: peak > 0,
    },
    m.clampDrop === null
      ? { value: (_s, y) => (m.lamp > 0 ? slow(y) : 1), direction: -1, stops: true }
      : {
          value: (_s, y) => (m.outerL > 0 ? eq.terminalVoltage(m, side, y) + m.clampDrop! : 1),
          direction: -1,
          stops: true,
        },
  ];
}

const clampedWatches = (m: eq.NormalMesh, side: eq.Side, peak: number): Watch[] => [
  { value: (_s, y) => y[eq.ROOT]! * Math.abs(y[eq.ROOT]!) - eq.bankCurrent(m, y), direction: -1, stops: true },
  { value: (_s, y) => side * y[eq.ROOT]! - Math.sqrt(FADE * peak), direction: -1, stops: true },
  { value: (_s, y) => side * eq.bankCurrent(m, y), direction: -1, stops: false },
];

const tailWatches = (_m: eq.NormalMesh, side: eq.Side, peak: number): Watch[] => [
  { value: (_x, y) => side * y[eq.ROOT]! - Math.sqrt(LAMP_FADE * peak), direction: -1, stops: true },
];

const SLOPES = { series: eq.seriesSlope, clamped: eq.clampedSlope, tail: eq.tailSlope } as const;

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
    return { stages, end: y, peak, lowest, whole, clamped: mode === "clamped", steps };
  };
  for (;;) {
    const watches = { series: seriesWatches, clamped: clampedWatches, tail: tailWatches }[mode];
    const course: Course = integrate({
      slope: SLOPES[mode](m, side),
      from: 0,
      to: Number.POSITIVE_INFINITY,
      start: y,
      firstStep: mode === "tail" ? 1e-3 : 1e-2 * Math.sqrt(typical),
      tolerance,
      floors,
      watches: watches(m, side, peak.current),
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
    if (mode === "tail") return finish(true);
    if (mode === "clamped") {
      if (watch !== 0) return finish(true);
      mode = "series";
      continue;
    }
    if (watch === 0) continue;
    if (watch === 2) return finish(true);
    if (watch === 3 && m.clampDrop !== null) {
      mode = "clamped";
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
      mode = "clamped";
      y[eq.BANK_CURRENT] = 0;
    }
  }
}
