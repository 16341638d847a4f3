// Climbs a concave function of a few prices, none below 0, by an ellipsoid that is cut through its centre or deeper.

/** A function of the prices and its slope there; fills both. */
export interface Hill {
  /** Value at `at`; writes the slope along each row into `slope`. */
  readonly look: (at: Float64Array, slope: Float64Array) => number;
  /** Rows that may move; the others stay where they start. */
  readonly live: readonly number[];
  /** A value from which nothing more is wanted. */
  readonly enough: number;
  /** Stop when no more than this can be gained. */
  readonly fine: number;
}

export interface Summit {
  readonly at: Float64Array;
  readonly value: number;
}

interface Shape {
  readonly at: Float64Array;
  readonly matrix: Float64Array;
}

/**
 * Best point met in `steps` looks, from a ball of `radius` about `from`. Any point met is as good as its value says; how near
 * the top it lies is not promised.
 * Source: [Bland-Goldfarb-Todd] The ellipsoid method: a survey, Operations Research 29 (1981), deep cuts (from memory)
 */
export function climb(hill: Hill, from: ArrayLike<number>, radius: number, steps: number): Summit {
  const { live } = hill;
  const n = live.length;
  const at = Float64Array.from(from);
  const matrix = new Float64Array(n * n);
  for (let i = 0; i < n; i += 1) matrix[i * n + i] = radius * radius;
  const slope = new Float64Array(at.length);
  const cut = new Float64Array(n);
  let best: Summit = { at: at.slice(), value: Number.NEGATIVE_INFINITY };
  for (let step = 0; step < steps; step += 1) {
    const lowest = live.reduce((low, row, i) => (at[row]! < Math.min(0, low < 0 ? 0 : at[live[low]!]!) ? i : low), -1);
    let shortfall: number;
    if (lowest >= 0) {
      cut.fill(0);
      cut[lowest] = 1;
      shortfall = -at[live[lowest]!]!;
    } else {
      const value = hill.look(at, slope);
      if (value > best.value) best = { at: at.slice(), value };
      if (best.value >= hill.enough) return best;
      live.forEach((row, i) => {
        cut[i] = slope[row]!;
      });
      shortfall = best.value - value;
    }
    const left = cutThrough({ at, matrix }, live, cut, shortfall);
    if (left === null || (lowest < 0 && left <= hill.fine)) break;
  }
  return best;
}

/** Shrinks the ellipsoid to what lies beyond the cut; answers its half-width along the cut before, null when nothing lies there. */
function cutThrough(
  { at, matrix }: Shape,
  live: readonly number[],
  cut: Float64Array,
  shortfall: number,
): number | null {
  const n = live.length;
  const pull = new Float64Array(n);
  let square = 0;
  for (let i = 0; i < n; i += 1) {
    for (let j = 0; j < n; j += 1) pull[i] = pull[i]! + matrix[i * n + j]! * cut[j]!;
    square += pull[i]! * cut[i]!;
  }
  const length = Math.sqrt(Math.max(0, square));
  const depth = length === 0 ? 1 : shortfall / length;
  if (depth >= 1) return null;
  if (n === 1) {
    const half = Math.sqrt(matrix[0]!) * Math.sign(cut[0]!);
    at[live[0]!] = at[live[0]!]! + (half * (1 + depth)) / 2;
    matrix[0] = ((half * (1 - depth)) / 2) ** 2;
    return length;
  }
  const move = (1 + n * depth) / (n + 1) / length;
  const grow = ((n * n) / (n * n - 1)) * (1 - depth * depth);
  const shrink = (2 * (1 + n * depth)) / ((n + 1) * (1 + depth)) / (length * length);
  for (let i = 0; i < n; i += 1) at[live[i]!] = at[live[i]!]! + move * pull[i]!;
  for (let i = 0; i < n; i += 1) {
    for (let j = 0; j < n; j += 1) matrix[i * n + j] = grow * (matrix[i * n + j]! - shrink * pull[i]! * pull[j]!);
  }
  return length;
}
