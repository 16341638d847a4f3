/*
 * The highest voltage any stage can see in a hold of given length, over all corners, fast enough for a search.
 *
 * | symbol | in code    | unit | meaning                                                        |
 * | ------ | ---------- | ---- | -------------------------------------------------------------- |
 * | n      | n          | 1    | stages in series, >= 1                                         |
 * | m      | m          | 1    | units that share a resistor: p cross-tied, 1 in strings        |
 * | C      | C          | F    | of one unit, nominal; -tLow/+tHigh as fractions                |
 * | I_L    | leakage    | A    | greatest of one unit, the least is 0; stops at zero volts      |
 * |        | insulation | ohm  | least of one unit, the greatest is Infinity                    |
 * | R, q   | R, q       | ohm  | balancing resistor and its tolerance; null: none               |
 * | V      | V          | V    | held at the ends, after a charge too fast to leak              |
 *
 * | k      | victim.units | 1  | units left of the victim's stage, m unless told; `balanced` false: its resistor is open     |
 *
 * The victim has the least C and no leakage and the greatest R; all others leak most and have the least R. Of the others some
 * have the greatest C (they begin lower) and some the least (they sag faster); how many of each depends on the length of the hold, so
 * every number is tried. Three kinds of stage under one sum leave two modes: closed form.
 * That the worst corner is one of these is brute-forced, not proven: see the corner tests.
 * Source: [methods-derived] 1.2, 2.2, 2.4 made a function of time
 */
import { courseOf } from "./course.ts";

export interface HoldCase {
  readonly n: number;
  readonly m: number;
  readonly C: number;
  readonly tLow: number;
  readonly tHigh: number;
  readonly leakage: number;
  readonly insulation: number;
  readonly R: number | null;
  readonly q: number;
  readonly V: number;
  /** s, 0 to Infinity. */
  readonly hold: number;
  /** A fault of the victim's own stage: units left in it, and whether its resistor is still there; left out: none. */
  readonly victim?: { readonly units: number; readonly balanced: boolean };
}

export interface HoldWorst {
  readonly voltage: number;
  /** When in the hold, s; Infinity when it is only approached. */
  readonly seconds: number;
  /** How many of the n - 1 others have the least capacitance; the rest have the greatest. */
  readonly lowOthers: number;
}

/** Highest voltage (V) of any stage at any time in [0, hold], over all corners of C, leakage and R. */
export function worstAtHold(given: HoldCase): HoldWorst {
  const { n, V, hold } = given;
  if (n === 1) return { voltage: V, seconds: 0, lowOthers: 0 };
  const at = holdConstants(given);
  const others = n - 1;
  let best: HoldWorst = { voltage: (V * at.high) / (at.high + others * at.victim), seconds: 0, lowOthers: 0 };
  if (at.drain === 0 && at.slack === 0 && at.keep === 0) return best;
  const settled = (V * at.slack + others * at.drain) / (others * at.keep + at.slack);
  // Nothing stands higher on the way than at the higher of the two ends: brute-forced, see the corner tests.
  if (at.keep > 0 && settled <= best.voltage) return best;
  if (hold === Number.POSITIVE_INFINITY) {
    const voltage = at.keep === 0 ? V : Math.min(V, settled);
    return voltage > best.voltage ? { voltage, seconds: hold, lowOthers: 0 } : best;
  }
  for (let lowOthers = 0; lowOthers <= others; lowOthers++) {
    const found = ofMix(given, at, lowOthers);
    if (found.voltage > best.voltage) best = found;
    if (best.voltage >= V) return { ...best, voltage: V };
  }
  return best;
}

interface HoldConstants {
  /** Stage capacitances, F. */
  readonly victim: number;
  readonly low: number;
  readonly high: number;
  /** Conductance of the victim and of each other, S; leakage of each other, A. */
  readonly keep: number;
  readonly slack: number;
  readonly drain: number;
}

function holdConstants({ m, C, tLow, tHigh, leakage, insulation, R, q, victim }: HoldCase): HoldConstants {
  return {
    victim: (victim?.units ?? m) * C * (1 - tLow),
    low: m * C * (1 - tLow),
    high: m * C * (1 + tHigh),
    keep: R === null || victim?.balanced === false ? 0 : 1 / (R * (1 + q)),
    slack: m / insulation + (R === null ? 0 : 1 / (R * (1 - q))),
    drain: m * leakage,
  };
}

/** The victim's highest voltage with `lowOthers` of the others at the least capacitance. */
function ofMix(given: HoldCase, at: HoldConstants, lowOthers: number): HoldWorst {
  const { n, V, hold } = given;
  const { keep, slack, drain } = at;
  const wv = 1 / at.victim;
  const wl = 1 / at.low;
  const wh = 1 / at.high;
  const highOthers = n - 1 - lowOthers;
  const sum = wv + highOthers * wh + lowOthers * wl;
  const v = (V * wv) / sum;
  const h = (V * wh) / sum;
  const l = (V * wl) / sum;
  // Currents out of each kind of stage, then the current that holds the ends.
  const outVictim = keep * v;
  const outHigh = slack * h + drain;
  const outLow = slack * l + drain;
  const feed = (wv * outVictim + highOthers * wh * outHigh + lowOthers * wl * outLow) / sum;
  const dv = wv * (feed - outVictim);
  const dh = wh * (feed - outHigh);
  const dl = wl * (feed - outLow);
  const feedSlope = (wv * keep * dv + highOthers * wh * slack * dh + lowOthers * wl * slack * dl) / sum;
  const bend = wv * (feedSlope - keep * dv);
  // Modes: wv/(dV - x) + highOthers wh/(dH - x) + lowOthers wl/(dL - x) = 0, a quadratic in x.
  const rateV = keep * wv;
  const rateH = slack * wh;
  const rateL = slack * wl;
  const wH = highOthers * wh;
  const wL = lowOthers * wl;
  const half = (wv * (rateH + rateL) + wH * (rateV + rateL) + wL * (rateV + rateH)) / (2 * sum);
  const product = (wv * rateH * rateL + wH * rateV * rateL + wL * rateV * rateH) / sum;
  const fast = half + Math.sqrt(Math.max(0, half * half - product));
  const slow = fast === 0 ? 0 : product / fast;
  const victimAt = (t: number): number => v + dv * rise(slow, t) + (bend + slow * dv) * secondRise(slow, fast, t);
  const bendHigh = wh * (feedSlope - slack * dh);
  const bendLow = wl * (feedSlope - slack * dl);
  const end = victimAt(hold);
  const dry =
    drain > 0 &&
    ((highOthers > 0 && h + dh * rise(slow, hold) + (bendHigh + slow * dh) * secondRise(slow, fast, hold) < 0) ||
      (lowOthers > 0 && l + dl * rise(slow, hold) + (bendLow + slow * dl) * secondRise(slow, fast, hold) < 0));
  if (dry)
    return lowOthers === 0 || highOthers === 0
      ? { voltage: V, seconds: hold, lowOthers }
      : exactMix(given, at, lowOthers);
  let found = end > v ? { voltage: end, seconds: hold, lowOthers } : { voltage: v, seconds: 0, lowOthers };
  // The slope is dv e^(-slow t) plus (bend + slow dv) times a second part: it can change sign once.
  if (fast > slow) {
    const late = (bend + fast * dv) / (fast - slow);
    const turn = Math.log(1 - dv / late) / (fast - slow);
    if (turn > 0 && turn < hold) {
      const voltage = victimAt(turn);
      if (voltage > found.voltage) found = { voltage, seconds: turn, lowOthers };
    }
  }
  return found;
}

/** (1 - exp(-x t))/x, t at x = 0. */
const rise = (x: number, t: number): number => (x === 0 ? t : -Math.expm1(-x * t) / x);

/** (rise(a) - rise(b))/(b - a) for a <= b, kept exact when they meet. */
function secondRise(a: number, b: number, t: number): number {
  const gap = (b - a) * t;
  if (gap > 1e-5) return (rise(a, t) - rise(b, t)) / (b - a);
  const x = ((a + b) / 2) * t;
  return x < 1e-5 ? t * t * (0.5 - x / 3) : (t * t * (-Math.expm1(-x) - x * Math.exp(-x))) / (x * x);
}

/** A mix in which some stage runs dry before the hold ends. */
function exactMix(given: HoldCase, at: HoldConstants, lowOthers: number): HoldWorst {
  const stage = (capacitance: number, leakageCurrent: number, conductance: number) => ({
    capacitance,
    leakageCurrent,
    conductance,
    resistance: Number.POSITIVE_INFINITY,
  });
  const chain = [
    stage(at.victim, 0, at.keep),
    ...Array.from({ length: given.n - 1 }, (_, i) => stage(i < lowOthers ? at.low : at.high, at.drain, at.slack)),
  ];
  const course = courseOf(chain, {
    charge: { kind: "instant" },
    voltage: given.V,
    hold: given.hold,
    dump: null,
    rest: 0,
  });
  const peak = course.phases.at(-1)!.peaks()[0]!;
  return { voltage: peak.voltage, seconds: peak.seconds, lowOthers };
}
