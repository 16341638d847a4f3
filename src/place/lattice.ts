// Turns measured values into whole numbers, so that sums of them are exact whatever the order of adding.

import { tenTo } from "../quantity/index.ts";

/** Values as whole multiples of one quantum. */
export interface Lattice {
  /** Whole numbers, in the order of the input. */
  readonly values: Float64Array;
  /** True when the input lay on a decimal grid; false when it was rounded to about 15 digits. */
  readonly onGrid: boolean;
}

const EXACT_SUM = 2 ** 52;
const FINEST_DECADE = 18;

const greatestDivisor = (a: number, b: number): number => {
  let [x, y] = [a, b];
  while (y > 0) [x, y] = [y, x % y];
  return x;
};

/** The coarsest power of ten on which every value is whole, or null. */
function decade(values: readonly number[], room: number): number | null {
  const greatest = Math.max(...values);
  for (let k = -3; k <= FINEST_DECADE; k++) {
    const scale = tenTo(k);
    if (greatest * scale > room) return null;
    // Reading a decimal costs half a unit in the last place; so does the scaling.
    if (values.every((v) => Math.abs(v * scale - Math.round(v * scale)) <= v * scale * 1e-15 && v * scale > 0.5)) {
      return scale;
    }
  }
  return null;
}

/**
 * Scales positive values to whole numbers whose total stays below 2^52, where doubles add without error.
 * On a decimal grid the common divisor is taken out as well, so that one step is the resolution of the data.
 */
export function toLattice(values: readonly number[]): Lattice {
  const room = EXACT_SUM / Math.max(1, values.length);
  const scale = decade(values, Math.min(room, 1e12));
  if (scale === null) {
    const stretch = room / Math.max(...values);
    return { values: Float64Array.from(values, (v) => Math.max(1, Math.round(v * stretch))), onGrid: false };
  }
  const whole = values.map((v) => Math.round(v * scale));
  const step = whole.reduce(greatestDivisor, 0);
  return { values: Float64Array.from(whole, (v) => v / step), onGrid: true };
}
