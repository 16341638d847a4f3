// How the capacitance of one unit is spread: uniform, cut normal, or as a measured lot; each as a range and as masses on a lattice.

export type UnitLaw =
  /** F; every value between the tolerance limits equally likely. */
  | { readonly kind: "uniform"; readonly low: number; readonly high: number }
  /**
   * Normal about the nominal (F), tolerance as 3 sigma and nothing beyond it. When the tolerance is lopsided each side has its own
   * sigma = t/3 and the halves meet at the nominal at the same height, so the wider side holds more of the units.
   */
  | { readonly kind: "normal"; readonly nominal: number; readonly tLow: number; readonly tHigh: number }
  /** F; each measured value equally likely. Needs `LEAST_LOT` values to be called a distribution. */
  | { readonly kind: "lot"; readonly values: readonly number[] };

export interface TailCase {
  readonly law: UnitLaw;
  readonly ties: "cross-tied" | "strings";
  readonly n: number;
  readonly p: number;
  /** Unit limit over bank voltage, both in V. */
  readonly share: number;
}

/** Fewer measured units than this say nothing about a tail. Common practice, no source. */
export const LEAST_LOT = 5;

export function lawRange(law: UnitLaw): { readonly low: number; readonly high: number } {
  if (law.kind === "uniform") return { low: law.low, high: law.high };
  if (law.kind === "normal") return { low: law.nominal * (1 - law.tLow), high: law.nominal * (1 + law.tHigh) };
  return { low: Math.min(...law.values), high: Math.max(...law.values) };
}

/** End weights of Gregory's rule: with them a sum over even nodes is an integral to the fourth power of the step. Source: [Hildebrand1974] 5.9 (from memory; a test integrates a cubic) */
const ENDS = [3 / 8, 7 / 6, 23 / 24] as const;

/**
 * Masses at `cells` + 1 (at least 6) even nodes over [from, to]. What lies outside the window is left out: the masses sum to the
 * chance of being inside. A lot's values are shared between their two neighbours, so that mass and mean are kept.
 */
export function lawMasses(law: UnitLaw, from: number, to: number, cells: number): Float64Array {
  const masses = new Float64Array(cells + 1);
  const step = (to - from) / cells;
  if (law.kind === "lot") {
    const slack = 1e-12 * to;
    for (const value of law.values) {
      if (value < from - slack || value > to + slack) continue;
      const place = Math.min(Math.max((value - from) / step, 0), cells);
      const node = Math.min(Math.floor(place), cells - 1);
      masses[node]! += (1 - (place - node)) / law.values.length;
      masses[node + 1]! += (place - node) / law.values.length;
    }
    return masses;
  }
  const density = law.kind === "uniform" ? () => 1 / (law.high - law.low) : normalDensity(law);
  for (let node = 0; node <= cells; node++) {
    const weight = ENDS[Math.min(node, cells - node)] ?? 1;
    masses[node] = density(from + node * step) * weight * step;
  }
  // p units multiply p masses: an error of the whole would grow with p, while one of the mean divides out of the shares.
  const whole = law.kind === "normal" ? massBetween(law, from, to) / masses.reduce((sum, mass) => sum + mass, 0) : 1;
  return masses.map((mass) => mass * whole);
}

/** erf(3/sqrt(2)): what three sigma hold. Source: [AbramowitzStegun] table 26.1 */
const THREE_SIGMA = 0.9973002039367398;

function normalDensity(law: Extract<UnitLaw, { readonly kind: "normal" }>): (value: number) => number {
  const below = (law.nominal * law.tLow) / 3;
  const above = (law.nominal * law.tHigh) / 3;
  const peak = Math.SQRT2 / (Math.sqrt(Math.PI) * (below + above) * THREE_SIGMA);
  return (value) => {
    const z = (value - law.nominal) / (value < law.nominal ? below : above);
    return peak * Math.exp(-0.5 * z * z);
  };
}

/** Chance of a value in [from, to], summed apart on each side of the nominal, where the density bends. */
function massBetween(law: Extract<UnitLaw, { readonly kind: "normal" }>, from: number, to: number): number {
  const density = normalDensity(law);
  const side = (a: number, b: number): number => {
    if (!(b > a)) return 0;
    const cells = 400;
    const step = (b - a) / cells;
    let sum = 0;
    for (let node = 0; node <= cells; node++)
      sum += density(a + node * step) * (ENDS[Math.min(node, cells - node)] ?? 1) * step;
    return sum;
  };
  // A node at the nominal belongs to both sides, and the density is the same on both.
  return side(from, Math.min(to, law.nominal)) + side(Math.max(from, law.nominal), to);
}

/** Cells of the inverse of the cut normal's distribution. */
const STEPS = 8192;

/** The law for drawing, rising: with u in [0, 1), cell i = floor(u k), the value is bases[i] + slopes[i] (u k - i). */
export function lawSteps(law: UnitLaw): { readonly bases: Float64Array; readonly slopes: Float64Array } {
  if (law.kind === "uniform") return { bases: Float64Array.of(law.low), slopes: Float64Array.of(law.high - law.low) };
  if (law.kind === "lot")
    return { bases: Float64Array.from(law.values).sort(), slopes: new Float64Array(law.values.length) };
  const { low, high } = lawRange(law);
  const density = normalDensity(law);
  const edges = new Float64Array(STEPS + 1).fill(high);
  const grid = 40 * STEPS;
  const width = (high - low) / grid;
  let sum = 0;
  let next = 0;
  for (let k = 0; k < grid; k++) {
    const part = density(low + (k + 0.5) * width) * width;
    // The sum ends within rounding of 1; the last edge stays at the limit itself.
    while (next < STEPS && sum + part >= next / STEPS) {
      edges[next] = low + (k + (next / STEPS - sum) / part) * width;
      next++;
    }
    sum += part;
  }
  return { bases: edges.slice(0, STEPS), slopes: edges.slice(1).map((edge, i) => edge - edges[i]!) };
}
