/*
 * Lower bound on the gap of independent strings, by prefixes of the units sorted by elastance.
 *
 *   symbol   unit  meaning
 *   a        1/F   elastance 1/C of a unit, sorted falling: a_1 >= a_2 >= ...
 *   t        1     sum(a)/max(a) of a string; V_max = V / min t, gap = n_s/t - 1
 *   s        1     spares, N - n_s n_p
 *
 *   t <= min_k [ sum of the top k n_s ] / [ sum_(i<=k) a_((i-1)n_s + 1) ]
 * because the k-th leader (largest a of its string) is at least a_((k-1)n_s+1), and k strings hold at most the top k n_s.
 * With spares the same from the first leader p <= s + 1 on, and the best p counts.
 * Holds for any division into strings. Source: [methods-derived]; compared with full enumeration in the tests.
 */
import type { Bound } from "./boundMatrix.ts";

/** Upper bound on min t over `strings` strings of `series` units out of `falling` (elastances, sorted falling). */
export function prefixLeast(falling: ArrayLike<number>, series: number, strings: number): number {
  const spares = falling.length - series * strings;
  const head = new Float64Array(falling.length + 1);
  for (let i = 0; i < falling.length; i++) head[i + 1] = head[i]! + falling[i]!;
  let best = 0;
  for (let first = 0; first <= spares; first++) {
    let least = Number.POSITIVE_INFINITY;
    let leaders = 0;
    for (let k = 1; k <= strings; k++) {
      leaders += k === 1 ? falling[first]! : falling[spares + (k - 1) * series]!;
      least = Math.min(least, (head[first + k * series]! - head[first]!) / leaders);
    }
    best = Math.max(best, least);
  }
  return best;
}

/** Lower bound on the gap. `capacitances` > 0 on any common scale. */
export function stringsBound(capacitances: ArrayLike<number>, series: number, strings: number): Bound {
  const falling = Float64Array.from(capacitances, (c) => 1 / c)
    .sort()
    .reverse();
  return { gap: Math.max(0, series / prefixLeast(falling, series, strings) - 1), kind: "prefix" };
}
