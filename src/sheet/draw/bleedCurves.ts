/*
 * A fall of voltage told by points that are joined by straight lines on a log scale: when it passes a voltage, and what is drawn of it.
 *
 *   t  time [s], rising; V voltage [V] > 0
 *   between two points  ln V is linear in t: exact for one time constant, t = t1 + (t2 - t1) ln(V1/V)/ln(V1/V2)
 * Holds while nothing switches between two points. Source: [textbook] exponential decay.
 */
import { power } from "../../quantity/index.ts";

export interface BleedPoint {
  readonly time: number;
  readonly voltage: number;
}

/** One way down: straight between its points on the log scale, so two points do for one time constant. */
export interface BleedCurve {
  readonly words: string;
  readonly points: readonly BleedPoint[];
}

/** Points that a log scale can show, up to the first that is not above zero. */
export function drawable(points: readonly BleedPoint[]): readonly BleedPoint[] {
  const end = points.findIndex(
    ({ time, voltage }) => !(voltage > 0 && Number.isFinite(voltage) && Number.isFinite(time)),
  );
  return end < 0 ? points : points.slice(0, end);
}

/** When the voltage first falls to `level`, s; 0 when it begins there, null when it does not within its points. */
export function timeAt(points: readonly BleedPoint[], level: number): number | null {
  const shown = drawable(points);
  const first = shown[0];
  if (first === undefined) return null;
  if (first.voltage <= level) return first.time;
  for (let index = 1; index < shown.length; index += 1) {
    const [from, to] = [shown[index - 1]!, shown[index]!];
    if (to.voltage > level) continue;
    return from.time + ((to.time - from.time) * Math.log(from.voltage / level)) / Math.log(from.voltage / to.voltage);
  }
  return null;
}

/** The curve down to a voltage, the last point on it; a curve that does not get there keeps its last point. */
export function cutAt(points: readonly BleedPoint[], level: number): readonly BleedPoint[] {
  const end = timeAt(points, level);
  if (end === null) return drawable(points);
  return [
    ...drawable(points).filter(({ time, voltage }) => time < end && voltage > level),
    { time: end, voltage: level },
  ];
}

/** The curve up to a time, the last point on it. */
export function until(points: readonly BleedPoint[], time: number): readonly BleedPoint[] {
  const after = points.findIndex((point) => point.time > time);
  if (after <= 0) return after < 0 ? points : [];
  const [from, to] = [points[after - 1]!, points[after]!];
  const share = (time - from.time) / (to.time - from.time);
  return [...points.slice(0, after), { time, voltage: from.voltage * power(to.voltage / from.voltage, share) }];
}
