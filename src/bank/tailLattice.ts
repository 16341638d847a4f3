/*
 * Sums of independent values as masses on an even lattice, by direct convolution.
 *
 * Every term of a direct convolution is positive, so each mass keeps its relative precision however small it is: nothing is
 * subtracted. A transform would leave rounding of 1e-16 of the largest mass everywhere and lose a tail of 1e-9 of a tail.
 * Source: [methods-derived] convolution of distributions
 */

export interface Lattice {
  /** Value at the first node. */
  readonly first: number;
  readonly step: number;
  readonly masses: Float64Array;
}

/** Ends whose mass is below this share of the greatest are dropped: far under any tail that is asked for. */
const NOTHING = 1e-40;

export function convolve(a: Lattice, b: Lattice): Lattice {
  const [long, short] = a.masses.length >= b.masses.length ? [a.masses, b.masses] : [b.masses, a.masses];
  const out = new Float64Array(long.length + short.length - 1);
  for (let i = 0; i < short.length; i++) {
    const mass = short[i]!;
    if (mass === 0) continue;
    for (let j = 0, k = i; j < long.length; j++, k++) out[k]! += mass * long[j]!;
  }
  return trimmed({ first: a.first + b.first, step: a.step, masses: out });
}

/** The sum of `count` (>= 1) independent copies. */
export function power(base: Lattice, count: number): Lattice {
  let result: Lattice | null = null;
  let square = base;
  for (let rest = count; ; square = convolve(square, square)) {
    if (rest % 2 === 1) result = result === null ? square : convolve(result, square);
    rest = Math.floor(rest / 2);
    if (rest === 0) return result!;
  }
}

export function trimmed(lattice: Lattice): Lattice {
  const { masses } = lattice;
  let top = 0;
  for (const mass of masses) if (mass > top) top = mass;
  const least = top * NOTHING;
  let from = 0;
  let to = masses.length;
  while (to - from > 2 && masses[from]! <= least) from++;
  while (to - from > 2 && masses[to - 1]! <= least) to--;
  return { first: lattice.first + from * lattice.step, step: lattice.step, masses: masses.slice(from, to) };
}

/** The distribution of 1/x on a lattice of `cells` cells, for x > 0. */
export function reciprocal(lattice: Lattice, cells: number): Lattice {
  const last = lattice.first + (lattice.masses.length - 1) * lattice.step;
  const first = 1 / last;
  const step = (1 / lattice.first - first) / cells;
  const masses = new Float64Array(cells + 1);
  for (const [k, mass] of lattice.masses.entries()) {
    const place = Math.min(Math.max((1 / (lattice.first + k * lattice.step) - first) / step, 0), cells);
    const node = Math.min(Math.floor(place), cells - 1);
    masses[node]! += mass * (1 - (place - node));
    masses[node + 1]! += mass * (place - node);
  }
  return { first, step, masses };
}

/** The chance of being below a value, each mass taken as spread evenly over the step around its node. */
export function below(lattice: Lattice): (value: number) => number {
  const { first, step, masses } = lattice;
  const sums = new Float64Array(masses.length + 1);
  for (const [k, mass] of masses.entries()) sums[k + 1] = sums[k]! + mass;
  return (value) => {
    const place = (value - first) / step + 0.5;
    if (!(place > 0)) return 0;
    const node = Math.floor(place);
    if (node >= masses.length) return sums[masses.length]!;
    return sums[node]! + (place - node) * masses[node]!;
  };
}

/** Width of a lattice in standard deviations of what is on it. */
export function sigmasAcross(lattice: Lattice): number {
  const { masses } = lattice;
  let mass = 0;
  let mean = 0;
  for (const [k, m] of masses.entries()) {
    mass += m;
    mean += m * k;
  }
  mean /= mass;
  let square = 0;
  for (const [k, m] of masses.entries()) square += m * (k - mean) ** 2;
  return square > 0 ? (masses.length - 1) / Math.sqrt(square / mass) : 1;
}
