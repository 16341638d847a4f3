// What each stage of a mesh watches for: its peak, its zero, its fading, and the change to another stage.
import type { Watch } from "./integrate.ts";
import * as eq from "./meshSlopes.ts";

/** Stages: bank and load in one loop; the clamp conducting; the same with the bank's branch settled; a lamp's slow tail. */
export type Mode = "series" | "clamped" | "asleep" | "tail";

/** A lamp's law is not followed below this part of the peak current; other loads are followed far lower. */
const LAMP_FADE = 1e-3;
const FADE = 1e-6;
/** Where the slow tail takes over: its own error is of the order of the square of this. */
const TAIL_SHARE = 1e-5;
const TAIL_MATCH = 1e-7;
/** The bank's branch may be let to sleep when its resistance is below this: what sleeping leaves out goes as its square. */
const SLEEPY = 1e-3;

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

/** Volts by which the bank's branch is off what it does asleep, above the integrator's own noise; 1 when it may not sleep. */
export function awake(m: eq.NormalMesh, side: eq.Side, y: Float64Array): number {
  const path = m.bankR + m.clampR;
  if (m.bankL > 0 || path >= SLEEPY || path === 0) return 1;
  const off = path * Math.abs(eq.bankCurrent(m, y) - eq.sleepingCurrent(m, side, y));
  return off - (1e-10 + 3 * path * path * m.clampR);
}

/** Watches of the clamped stage: diode off, faded, bank's branch settled, lowest voltage. */
const clampedWatches = (m: eq.NormalMesh, side: eq.Side, peak: number): Watch[] => [
  { value: (_s, y) => y[eq.ROOT]! * Math.abs(y[eq.ROOT]!) - eq.bankCurrent(m, y), direction: -1, stops: true },
  { value: (_s, y) => side * y[eq.ROOT]! - Math.sqrt(FADE * peak), direction: -1, stops: true },
  { value: (_s, y) => awake(m, side, y), direction: -1, stops: true },
  { value: (_s, y) => side * eq.bankCurrent(m, y), direction: -1, stops: false },
];

const asleepWatches = (_m: eq.NormalMesh, side: eq.Side, peak: number): Watch[] => [
  { value: (_s, y) => side * y[eq.ROOT]! - Math.sqrt(FADE * peak), direction: -1, stops: true },
];

const tailWatches = (_m: eq.NormalMesh, side: eq.Side, peak: number): Watch[] => [
  { value: (_x, y) => side * y[eq.ROOT]! - Math.sqrt(LAMP_FADE * peak), direction: -1, stops: true },
];

/** The watches of a stage, given the direction of the current and the peak so far. */
export const watchesOf = (mode: Mode, m: eq.NormalMesh, side: eq.Side, peak: number): Watch[] =>
  ({ series: seriesWatches, clamped: clampedWatches, asleep: asleepWatches, tail: tailWatches })[mode](m, side, peak);

const FADE_WATCH = { series: 2, clamped: 1, asleep: 0, tail: 0 } as const;

/** Whether the current has faded as the stage's own watch would tell it; never before the first peak. */
export const hasFaded = (mode: Mode, m: eq.NormalMesh, side: eq.Side, peak: number, y: Float64Array): boolean =>
  peak > 0 && watchesOf(mode, m, side, peak)[FADE_WATCH[mode]]!.value(0, y) <= 0;
