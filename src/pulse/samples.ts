/*
 * A recorded current, taken as straight lines between its samples, and its exact integrals.
 *
 *   i_k, t_k   current [A] and time [s] of sample k, times strictly rising
 *   charge     sum of h (a + b)/2           action  sum of h (a^2 + a b + b^2)/3
 *
 * Source: [methods-derived] integrals of a straight line and of its square.
 */
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";

/** One sample: time [s], current [A]. */
export interface CurrentSample {
  readonly time: number;
  readonly current: number;
}

/** How much longer than the median spacing a spacing may be before it counts as a gap. Assumed, common practice, no source. */
export const GAP_FACTOR = 10;

/** The samples, or why not. Codes: pulse.samples.few, .number, .order, .gap (each names the sample, counted from 1). */
export function checkSamples(samples: readonly CurrentSample[]): Read<readonly CurrentSample[]> {
  const fault = (code: string, line: number, read: string, want: string): Refusal => ({
    code: `pulse.samples.${code}`,
    place: { field: "samples", line },
    read,
    want,
  });
  if (samples.length < 2) return refused(fault("few", 1, `${samples.length} samples`, "at least two samples"));
  const faults = samples.flatMap(({ time, current }, index) =>
    Number.isFinite(time) && Number.isFinite(current)
      ? []
      : [fault("number", index + 1, `${time}, ${current}`, "a time and a current, both numbers")],
  );
  if (faults.length > 0) return refused(...faults);
  const spacings = samples.slice(1).map((sample, index) => sample.time - samples[index]!.time);
  const median = spacings.toSorted((a, b) => a - b)[Math.floor(spacings.length / 2)]!;
  spacings.forEach((spacing, index) => {
    const line = index + 2;
    if (spacing <= 0) faults.push(fault("order", line, `${spacing} s after the one before`, "rising times"));
    else if (spacing > GAP_FACTOR * median) {
      const want = `no spacing above ${GAP_FACTOR} times the median of ${median} s`;
      faults.push(fault("gap", line, `${spacing} s after the one before`, want));
    }
  });
  return faults.length > 0 ? refused(...faults) : accepted(samples);
}

/** Exact integrals of the straight lines, and the extremes at the samples. */
export interface SampleIntegrals {
  readonly charge: number;
  readonly absoluteCharge: number;
  readonly action: number;
  readonly peakCurrent: number;
  readonly peakTime: number;
  /** Charge delivered up to each sample [C]. */
  readonly chargeAt: readonly number[];
  /** Greatest charge delivered at any time [C], for the lowest voltage of the bank. */
  readonly greatestCharge: number;
}

/** Integrals of samples that have passed `checkSamples`. Source: [methods-derived] file head. */
export function integralsOf(samples: readonly CurrentSample[]): SampleIntegrals {
  const start = samples[0]!.time;
  let [charge, absoluteCharge, action, greatestCharge] = [0, 0, 0, 0];
  let peak = samples[0]!;
  const chargeAt = [0];
  for (let index = 1; index < samples.length; index++) {
    const [from, to] = [samples[index - 1]!, samples[index]!];
    const [a, b, h] = [from.current, to.current, to.time - from.time];
    const turn = a * b < 0 ? a / (a - b) : 1;
    // where the line crosses zero, the charge has its extreme inside the spacing
    if (turn < 1) {
      greatestCharge = Math.max(greatestCharge, charge + (turn * h * a) / 2);
      absoluteCharge += (h * (Math.abs(a) * turn + Math.abs(b) * (1 - turn))) / 2;
    } else absoluteCharge += (h * Math.abs(a + b)) / 2;
    charge += (h * (a + b)) / 2;
    action += (h * (a * a + a * b + b * b)) / 3;
    greatestCharge = Math.max(greatestCharge, charge);
    chargeAt.push(charge);
    if (Math.abs(b) > Math.abs(peak.current)) peak = to;
  }
  return {
    charge,
    absoluteCharge,
    action,
    peakCurrent: Math.abs(peak.current),
    peakTime: peak.time - start,
    chargeAt,
    greatestCharge,
  };
}

/** Current [A] and charge delivered so far [C] at a time after the first sample [s]; zero current outside the record. */
export function sampleAt(
  samples: readonly CurrentSample[],
  { chargeAt }: SampleIntegrals,
  time: number,
): { readonly current: number; readonly charge: number } {
  const moment = samples[0]!.time + time;
  const last = samples.length - 1;
  if (moment >= samples[last]!.time) {
    return { current: moment > samples[last]!.time ? 0 : samples[last]!.current, charge: chargeAt[last]! };
  }
  let [low, high] = [0, last];
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (samples[middle]!.time <= moment) low = middle;
    else high = middle;
  }
  const [from, to] = [samples[low]!, samples[high]!];
  const passed = Math.max(0, moment - from.time);
  const slope = (to.current - from.current) / (to.time - from.time);
  const current = from.current + slope * passed;
  return { current, charge: chargeAt[low]! + (passed * (from.current + current)) / 2 };
}
