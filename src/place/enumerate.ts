// Every way to divide a few units into unnumbered groups of one size, each once.
import { choose } from "./subsetSums.ts";

/** Units of an enumeration at most: group tables are indexed by bit mask. */
export const MOST_ENUMERATED = 20;

/** Number of ways to choose and divide: C(N, K) K!/((k!)^g g!), K = g k. */
export function arrangements(units: number, groups: number, size: number): number {
  let ways = 1;
  for (let g = groups; g >= 1; g--) ways *= choose(g * size - 1, size - 1);
  return choose(units, groups * size) * ways;
}

/**
 * Calls `visit` with the bit masks of the groups (one array, reused) for every division of `units` units into `groups` groups of
 * `size`; units left over are spares. Yields now and then; a false from `goOn` ends it early, and the return value says whether it ran to the end.
 */
export function* divisions(
  { units, groups, size }: { readonly units: number; readonly groups: number; readonly size: number },
  visit: (masks: Int32Array) => void,
  goOn: (count: number) => boolean,
): Generator<void, boolean> {
  const masks = new Int32Array(groups);
  let since = 0;
  let stopped = false;

  /** Fills group `g` from unit `from` on, `need` units still missing; the group's first unit is the lowest that is not used or spared. */
  const fill = (g: number, from: number, need: number, used: number, spares: number): void => {
    if (stopped) return;
    if (need === 0) {
      if (g + 1 === groups) {
        visit(masks);
        if (++since >= 4096) {
          stopped = !goOn(since);
          since = 0;
        }
      } else open(g + 1, used, spares);
      return;
    }
    for (let i = from; i <= units - need; i++) {
      const bit = 1 << i;
      if (used & bit) continue;
      masks[g] = masks[g]! | bit;
      fill(g, i + 1, need - 1, used | bit, spares);
      masks[g] = masks[g]! & ~bit;
    }
  };

  /** Opens group `g`: its first unit is the lowest unused one, or that unit is spared. */
  const open = (g: number, used: number, spares: number): void => {
    let first = 0;
    while (used & (1 << first)) first++;
    for (let spared = used, left = spares; first < units; ) {
      masks[g] = 1 << first;
      fill(g, first + 1, size - 1, spared | (1 << first), left);
      if (left === 0) break;
      spared |= 1 << first;
      left--;
      while (spared & (1 << first)) first++;
    }
    masks[g] = 0;
  };

  yield;
  open(0, 0, units - groups * size);
  return !stopped;
}
