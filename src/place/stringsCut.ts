/*
 * Strings cut from the sorted lot: the quick first placing of independent strings.
 *
 *   a = 1/C elastance, sorted falling;  t = sum(a)/max(a) of a string, the worst unit stands at V/t.
 * Consecutive windows of the sorted lot, chosen for the greatest least t. Optimal for two units in series (with spares too) and
 * for one string; not in general: one small unit among large ones can be the worst string, and spreading misfits helps.
 * Source: [methods-derived]; the counterexample and the optimal cases are in the tests.
 */

/** t of a string of elastances: the bank voltage over the voltage of its worst unit. */
export function evenness(elastances: readonly number[]): number {
  const greatest = Math.max(...elastances);
  let sum = 0;
  for (const a of elastances) sum += a / greatest;
  return sum;
}

/** Starts of non-overlapping windows with t >= `wanted`, scanning from the largest elastance; at most `strings` of them. */
function windowsAbove(t: Float64Array, wanted: number, series: number, strings: number): number[] {
  const starts: number[] = [];
  for (let at = 0; at < t.length && starts.length < strings; ) {
    if (t[at]! >= wanted) {
      starts.push(at);
      at += series;
    } else at++;
  }
  return starts;
}

/** The best consecutive windows. Gives unit indices by string; units in no window are spares. */
export function cutStrings(capacitances: ArrayLike<number>, series: number, strings: number): number[][] {
  const order = Array.from({ length: capacitances.length }, (_, i) => i).sort(
    (a, b) => capacitances[a]! - capacitances[b]! || a - b,
  );
  const falling = order.map((i) => 1 / capacitances[i]!);
  const t = Float64Array.from({ length: order.length - series + 1 }, (_, at) =>
    evenness(falling.slice(at, at + series)),
  );
  const levels = Float64Array.from(t).sort();
  // The least level is always reachable: the windows 0, n_s, 2 n_s ... all have it.
  let low = 0;
  let high = levels.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (windowsAbove(t, levels[middle]!, series, strings).length === strings) low = middle;
    else high = middle - 1;
  }
  return windowsAbove(t, levels[low]!, series, strings).map((start) => order.slice(start, start + series));
}
