/*
 * How far the worst stage or unit stands above an even share.
 *
 *   symbol  unit  range     meaning
 *   S_j     F     > 0       capacitance of stage j (any common scale)
 *   m       F     > 0       least S_j
 *   a_i     1/F   > 0       1/C_i of a unit in a string
 *   gap     1     >= 0      n_s V_max / V - 1
 *
 *   cross-tied   V_max/V = (1/m) / sum_j (1/S_j)      gap = sum_j ((S_j - m)/S_j) / sum_j (m/S_j)
 *   a string     V_max/V = max(a) / sum(a)            gap = sum_i (max(a) - a_i) / sum(a)
 *
 * Holds while the same charge passes every stage (charging), and after a long hold with conductances in place of
 * capacitances. The forms above take no difference of two nearly equal results, so a gap of 1e-12 keeps its digits.
 * Source: [methods-derived] series charge and current division.
 */

/** Gap of the first `count` stage sums; 0 when all are equal. Sums > 0, any common scale. */
export function stageGap(sums: ArrayLike<number>, count: number): number {
  let least = Number.POSITIVE_INFINITY;
  for (let j = 0; j < count; j++) if (sums[j]! < least) least = sums[j]!;
  let above = 0;
  let shares = 0;
  for (let j = 0; j < count; j++) {
    above += (sums[j]! - least) / sums[j]!;
    shares += least / sums[j]!;
  }
  return above / shares;
}

/** Gap of one string from the capacitances (or conductances) of its units, each > 0. */
export function stringGap(values: readonly number[]): number {
  return stageGap(values, values.length);
}

/** The stage or unit of greatest voltage, as a share of V, from the gap. */
export const worstShare = (gap: number, series: number): number => (1 + gap) / series;
