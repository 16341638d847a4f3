/*
 * A hold of one stage against two kinds of others that differ in capacitance alone: two modes, in closed form.
 *
 * | symbol      | in code              | unit | meaning                                                        |
 * | ----------- | -------------------- | ---- | -------------------------------------------------------------- |
 * | V           | voltage              | V    | held at the ends, after a charge too fast to leak              |
 * | C_lo, C_hi  | low, high            | F    | stage capacitances of the others                               |
 * | C_1         | one                  | F    | of the one stage, C_lo unless told                              |
 * | G_1, I_1    | own                  | S, A | conductance and constant leakage of the one stage              |
 * | G, I        | others               | S, A | the same of each other                                         |
 *
 * dv_i/dt = (I_feed - G_i v_i - I_i)/C_i under sum v_i = V. Leakage is taken as constant: where a stage would fall below zero the
 * caller must say what that means. Source: [methods-derived] 2.1 with three kinds of stage
 */

export interface StageDrain {
  readonly conductance: number;
  readonly leakage: number;
}

export interface MixedHold {
  readonly voltage: number;
  readonly low: number;
  readonly high: number;
  readonly one?: number;
  readonly own: StageDrain;
  readonly others: StageDrain;
  /** How many of the others have C_hi, and how many C_lo. */
  readonly highOthers: number;
  readonly lowOthers: number;
}

/** V at a time (s) into the hold, of the one stage and of each kind of other. */
export interface HoldModes {
  readonly start: number;
  readonly oneAt: (seconds: number) => number;
  readonly highAt: (seconds: number) => number;
  readonly lowAt: (seconds: number) => number;
  /** s at which the one stage's voltage turns, where it does; else null. */
  readonly turn: number | null;
}

/** The modes of one mix. Source: [methods-derived] file head. */
export function holdModes({ voltage, low, high, one = low, own, others, highOthers, lowOthers }: MixedHold): HoldModes {
  const wv = 1 / one;
  const wl = 1 / low;
  const wh = 1 / high;
  const sum = wv + highOthers * wh + lowOthers * wl;
  const v = (voltage * wv) / sum;
  const h = (voltage * wh) / sum;
  const l = (voltage * wl) / sum;
  // Currents out of each kind of stage, then the current that holds the ends.
  const outOne = own.conductance * v + own.leakage;
  const outHigh = others.conductance * h + others.leakage;
  const outLow = others.conductance * l + others.leakage;
  const feed = (wv * outOne + highOthers * wh * outHigh + lowOthers * wl * outLow) / sum;
  const dv = wv * (feed - outOne);
  const dh = wh * (feed - outHigh);
  const dl = wl * (feed - outLow);
  // Modes: wv/(dV - x) + highOthers wh/(dH - x) + lowOthers wl/(dL - x) = 0, a quadratic in x.
  const rateV = own.conductance * wv;
  const rateH = others.conductance * wh;
  const rateL = others.conductance * wl;
  const wH = highOthers * wh;
  const wL = lowOthers * wl;
  const feedSlope = (wv * own.conductance * dv + wH * others.conductance * dh + wL * others.conductance * dl) / sum;
  const bend = wv * (feedSlope - own.conductance * dv);
  const bendHigh = wh * (feedSlope - others.conductance * dh);
  const bendLow = wl * (feedSlope - others.conductance * dl);
  const half = (wv * (rateH + rateL) + wH * (rateV + rateL) + wL * (rateV + rateH)) / (2 * sum);
  const product = (wv * rateH * rateL + wH * rateV * rateL + wL * rateV * rateH) / sum;
  const fast = half + Math.sqrt(Math.max(0, half * half - product));
  const slow = fast === 0 ? 0 : product / fast;
  const course = (from: number, slope: number, curve: number) => (t: number) =>
    from + slope * rise(slow, t) + (curve + slow * slope) * secondRise(slow, fast, t);
  // The slope is dv e^(-slow t) plus (bend + slow dv) times a second part: it can change sign once.
  const late = fast > slow ? (bend + fast * dv) / (fast - slow) : 0;
  const turn = fast > slow ? Math.log(1 - dv / late) / (fast - slow) : 0;
  return {
    start: v,
    oneAt: course(v, dv, bend),
    highAt: course(h, dh, bendHigh),
    lowAt: course(l, dl, bendLow),
    turn: turn > 0 ? turn : null,
  };
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
