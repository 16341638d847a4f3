// Readings of one stretch: its ends, its stages at an instant or at many, its current.
import { type Curve, curveAt, riseOf } from "./courseCurve.ts";
import type { Segment } from "./courseSegment.ts";

/** Sum of the stage voltages as a curve. */
export function endsCurve(segment: Segment): Curve {
  const width = segment.modes.rates.length;
  const parts = new Float64Array(width);
  for (let j = 0; j < segment.modes.slopes.length; j++) parts[j % width]! += segment.modes.slopes[j]!;
  return { start: segment.start.reduce((sum, v) => sum + v, 0), rates: segment.modes.rates, parts };
}

/** Stage voltages (V) `seconds` after the stretch began. Plain loops: this is drawn a thousand times a picture. */
export function segmentAt(segment: Segment, seconds: number): Float64Array {
  const { rates, slopes } = segment.modes;
  const width = rates.length;
  const rises = new Float64Array(width);
  for (let k = 0; k < width; k++) {
    const rise = riseOf(rates[k]!, seconds);
    // An endless drift only stands in modes that nothing is in.
    rises[k] = rise === Number.POSITIVE_INFINITY ? 0 : rise;
  }
  const voltages = new Float64Array(segment.start.length);
  for (let i = 0, j = 0; i < voltages.length; i++) {
    let v = segment.start[i]!;
    for (let k = 0; k < width; k++, j++) v += slopes[j]! * rises[k]!;
    voltages[i] = v;
  }
  return voltages;
}

/** `count` even instants at once, stage voltages row by row into `out` from row `row`: each step is a recurrence, no exponential. */
export function segmentOver(
  segment: Segment,
  grid: { readonly from: number; readonly step: number; readonly count: number },
  out: Float64Array,
  row: number,
): void {
  const { rates, slopes } = segment.modes;
  const width = rates.length;
  const stages = segment.start.length;
  // E(t + h) = E(h) + exp(-lambda h) E(t): positive terms, so rounding grows by one part in 1e16 a step and no more.
  const rises = rates.map((rate) => riseOf(rate, grid.from));
  const gains = rates.map((rate) => riseOf(rate, grid.step));
  const keeps = rates.map((rate) => Math.exp(-rate * grid.step));
  for (let at = 0, to = row * stages; at < grid.count; at++, to += stages) {
    let i = 0;
    // Four rows abreast: one sum alone would wait for each of its own additions.
    for (; i + 3 < stages; i += 4) {
      let v0 = segment.start[i]!;
      let v1 = segment.start[i + 1]!;
      let v2 = segment.start[i + 2]!;
      let v3 = segment.start[i + 3]!;
      for (let k = 0, j = i * width; k < width; k++, j++) {
        const rise = rises[k]!;
        v0 += slopes[j]! * rise;
        v1 += slopes[j + width]! * rise;
        v2 += slopes[j + 2 * width]! * rise;
        v3 += slopes[j + 3 * width]! * rise;
      }
      out[to + i] = v0;
      out[to + i + 1] = v1;
      out[to + i + 2] = v2;
      out[to + i + 3] = v3;
    }
    for (; i < stages; i++) {
      let v = segment.start[i]!;
      for (let k = 0, j = i * width; k < width; k++, j++) v += slopes[j]! * rises[k]!;
      out[to + i] = v;
    }
    for (let k = 0; k < width; k++) rises[k] = gains[k]! + keeps[k]! * rises[k]!;
  }
}

/** Chain current (A) `seconds` after the stretch began. */
export const segmentCurrent = (segment: Segment, seconds: number): number => curveAt(segment.current, seconds);
