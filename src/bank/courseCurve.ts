/*
 * A sum of decaying exponentials: its first zero and its highest point, certified rather than sampled.
 *
 * f(t) = start + sum_k a_k E_k(t), E_k(t) = (1 - exp(-lambda_k t))/lambda_k, which is t where lambda_k = 0; t in s, >= 0, Infinity allowed.
 * Every E_k rises, so on [t1, t2] the parts with a_k > 0 lie between their values at the ends and so do those with a_k < 0: that
 * bounds f, and in the same way f' and f''. Intervals are split until a bound decides, so no narrow peak is stepped over.
 * Source: [methods-derived] interval bounds of a sum of monotone parts
 */

export interface Curve {
  readonly start: number;
  readonly rates: Float64Array;
  readonly parts: Float64Array;
}

export interface Peak {
  readonly voltage: number;
  /** Seconds since the curve began; Infinity when it is only approached. */
  readonly seconds: number;
}

/** E_k at time t. Past half a decay the plain exponential is as exact as expm1, and faster. */
export function riseOf(rate: number, seconds: number): number {
  if (rate === 0) return seconds;
  const decays = rate * seconds;
  return (decays > 0.5 ? 1 - Math.exp(-decays) : -Math.expm1(-decays)) / rate;
}

export function curveAt(curve: Curve, seconds: number): number {
  let value = curve.start;
  for (let k = 0; k < curve.rates.length; k++) {
    const part = curve.parts[k]!;
    if (part !== 0) value += part * riseOf(curve.rates[k]!, seconds);
  }
  return value;
}

/** The derivative of order 1 or 2 at time t; parts that have died away leave nothing. */
function derivativeAt(curve: Curve, seconds: number, order: 1 | 2): number {
  let value = 0;
  for (let k = 0; k < curve.rates.length; k++) value += decayed(curve, k, seconds, order);
  return value;
}

function decayed(curve: Curve, k: number, seconds: number, order: 1 | 2): number {
  const rate = curve.rates[k]!;
  const size = order === 1 ? curve.parts[k]! : -rate * curve.parts[k]!;
  return size === 0 ? 0 : size * (rate === 0 ? 1 : Math.exp(-rate * seconds));
}

interface Span {
  readonly low: number;
  readonly high: number;
}

function boundsOf(curve: Curve, from: number, to: number): Span {
  let low = curve.start;
  let high = curve.start;
  for (let k = 0; k < curve.rates.length; k++) {
    const part = curve.parts[k]!;
    if (part === 0) continue;
    const early = part * riseOf(curve.rates[k]!, from);
    const late = part * riseOf(curve.rates[k]!, to);
    low += Math.min(early, late);
    high += Math.max(early, late);
  }
  return { low, high };
}

function derivativeBounds(curve: Curve, from: number, to: number, order: 1 | 2): Span {
  let low = 0;
  let high = 0;
  for (let k = 0; k < curve.rates.length; k++) {
    const early = decayed(curve, k, from, order);
    const late = decayed(curve, k, to, order);
    low += Math.min(early, late);
    high += Math.max(early, late);
  }
  return { low, high };
}

/** Where to split: in the middle, or twice as far out while the end is open. */
function middle(curve: Curve, from: number, to: number): number {
  if (Number.isFinite(to)) return (from + to) / 2;
  if (from > 0) return 2 * from;
  const fastest = Math.max(...curve.rates);
  return fastest > 0 ? 1 / fastest : 1;
}

const SMALLEST = 4e-16;
const closed = (from: number, to: number): boolean => Number.isFinite(to) && to - from <= SMALLEST * to;

/** First time in (from, to] at which a curve that is not below zero at `from` falls to zero, or null. */
export function firstBelowZero(curve: Curve, from: number, to: number): number | null {
  if (!(to > from)) return null;
  if (boundsOf(curve, from, to).low > 0) return null;
  const tilt = derivativeBounds(curve, from, to, 1);
  if (tilt.low >= 0) return null;
  if (tilt.high <= 0 && Number.isFinite(to)) {
    if (curveAt(curve, to) > 0) return null;
    return bisect((t) => curveAt(curve, t) <= 0, from, to);
  }
  // An end that is only approached is never reached.
  if (tilt.high <= 0 && !(curveAt(curve, to) < 0)) return null;
  if (closed(from, to)) return curveAt(curve, to) <= 0 ? to : null;
  const cut = middle(curve, from, to);
  if (!Number.isFinite(cut)) return null;
  return firstBelowZero(curve, from, cut) ?? firstBelowZero(curve, cut, to);
}

/** The highest point of the curve on [from, to]; the earliest of equals, to 1e-12 of the size of its parts. */
export function highestOf(curve: Curve, from: number, to: number): Peak {
  let best: Peak = { voltage: curveAt(curve, from), seconds: from };
  const size = Math.abs(curve.start) + Math.max(...[...curve.parts].map((_, k) => partSize(curve, k, to)), 0);
  const offer = (seconds: number): void => {
    const voltage = curveAt(curve, seconds);
    if (voltage > best.voltage + 1e-13 * size) best = { voltage, seconds };
  };
  const visit = (t1: number, t2: number): void => {
    if (!(boundsOf(curve, t1, t2).high > best.voltage + 1e-12 * size)) return;
    const slope = derivativeBounds(curve, t1, t2, 1);
    if (slope.low >= 0 || slope.high <= 0 || closed(t1, t2)) return;
    const bend = derivativeBounds(curve, t1, t2, 2);
    if (bend.low >= 0) return;
    if (bend.high <= 0 && Number.isFinite(t2)) {
      if (derivativeAt(curve, t1, 1) > 0 && derivativeAt(curve, t2, 1) < 0)
        offer(bisect((t) => derivativeAt(curve, t, 1) <= 0, t1, t2));
      return;
    }
    const cut = middle(curve, t1, t2);
    if (!Number.isFinite(cut)) return;
    offer(cut);
    visit(t1, cut);
    visit(cut, t2);
  };
  if (to > from) {
    offer(to);
    visit(from, to);
  }
  return best;
}

function partSize(curve: Curve, k: number, to: number): number {
  const part = curve.parts[k]!;
  return part === 0 ? 0 : Math.abs(part * riseOf(curve.rates[k]!, to));
}

/** First time (to rounding) at which `holds` turns true, given that it is false at `from` and true at `to`. */
function bisect(holds: (seconds: number) => boolean, from: number, to: number): number {
  let low = from;
  let high = to;
  for (let step = 0; step < 200; step++) {
    const mid = (low + high) / 2;
    if (!(mid > low && mid < high)) break;
    if (holds(mid)) high = mid;
    else low = mid;
  }
  return high;
}
