// Preferred values: the E series of IEC 60063 as data, and the next value up, down or nearest.
//
// Symbols: N values a decade; value = digits x 10^k. The tables are given, not computed: eight values of E24 depart from the rounding rule,
// and one of E192 (920). E3, E6, E12 are every 8th, 4th, 2nd of E24; E48 and E96 every 4th and 2nd of E192.
// Source: [IEC60063] tables (E24, E12, E48 read in published copies, E96 partly; E192's 920 from memory, the rest by the rule).

export const SERIES_NAMES = ["E3", "E6", "E12", "E24", "E48", "E96", "E192"] as const;
export type SeriesName = (typeof SERIES_NAMES)[number];

const E24 = [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91] as const;

// biome-ignore format: eight rows of twenty-four read better than a column of 192
const E192 = [
  100, 101, 102, 104, 105, 106, 107, 109, 110, 111, 113, 114, 115, 117, 118, 120, 121, 123, 124, 126, 127, 129, 130, 132,
  133, 135, 137, 138, 140, 142, 143, 145, 147, 149, 150, 152, 154, 156, 158, 160, 162, 164, 165, 167, 169, 172, 174, 176,
  178, 180, 182, 184, 187, 189, 191, 193, 196, 198, 200, 203, 205, 208, 210, 213, 215, 218, 221, 223, 226, 229, 232, 234,
  237, 240, 243, 246, 249, 252, 255, 258, 261, 264, 267, 271, 274, 277, 280, 284, 287, 291, 294, 298, 301, 305, 309, 312,
  316, 320, 324, 328, 332, 336, 340, 344, 348, 352, 357, 361, 365, 370, 374, 379, 383, 388, 392, 397, 402, 407, 412, 417,
  422, 427, 432, 437, 442, 448, 453, 459, 464, 470, 475, 481, 487, 493, 499, 505, 511, 517, 523, 530, 536, 542, 549, 556,
  562, 569, 576, 583, 590, 597, 604, 612, 619, 626, 634, 642, 649, 657, 665, 673, 681, 690, 698, 706, 715, 723, 732, 741,
  750, 759, 768, 777, 787, 796, 806, 816, 825, 835, 845, 856, 866, 876, 887, 898, 909, 920, 931, 942, 953, 965, 976, 988,
] as const;

const every = (table: readonly number[], step: number): readonly number[] => table.filter((_, i) => i % step === 0);

/** Two- or three-digit values of one decade, rising. */
export const SERIES: Readonly<Record<SeriesName, readonly number[]>> = {
  E3: every(E24, 8),
  E6: every(E24, 4),
  E12: every(E24, 2),
  E24,
  E48: every(E192, 4),
  E96: every(E192, 2),
  E192,
};

/** Two numbers closer than this, relatively, are the same preferred value. */
const SAME = 1e-9;

/** All values of a series from `low` to `high` inclusive, rising. Range: 0 < low <= high, at most 30 decades. */
export function seriesBetween(name: SeriesName, low: number, high: number): readonly number[] {
  const table = SERIES[name];
  const width = table[0] === 100 ? 2 : 1;
  const values: number[] = [];
  for (let decade = Math.floor(Math.log10(low)); decade <= Math.floor(Math.log10(high)) + 1; decade++) {
    for (const digits of table) {
      const value = Number(`${digits}e${decade - width}`);
      if (value >= low * (1 - SAME) && value <= high * (1 + SAME)) values.push(value);
    }
  }
  return values;
}

/** Index of the largest of rising `values` that is at most `x` (within 1e-9 relative); -1 when all are larger. */
export function lastAtMost(values: ArrayLike<number>, x: number): number {
  const bound = x * (1 + SAME);
  let low = -1;
  let high = values.length;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if ((values[middle] as number) <= bound) low = middle;
    else high = middle;
  }
  return low;
}

/** The largest value of the series at most x. Range: x > 0, finite. */
export function preferredAtMost(name: SeriesName, x: number): number {
  const near = seriesBetween(name, x / 20, x * 2);
  return near[lastAtMost(near, x)] as number;
}

/** The smallest value of the series at least x. Range: x > 0, finite. */
export function preferredAtLeast(name: SeriesName, x: number): number {
  const near = seriesBetween(name, x / 2, x * 20);
  return near.find((value) => value >= x * (1 - SAME)) as number;
}

/** The value of the series nearest to x by ratio. Range: x > 0, finite. */
export function preferredNearest(name: SeriesName, x: number): number {
  const below = preferredAtMost(name, x);
  const above = preferredAtLeast(name, x);
  return x / below <= above / x ? below : above;
}
