// Drops the pairs of a core that the capacity bound rules out, each tried between all that comes before and after it.
import { addChoice, type CapacityBound, MOST_LAYERS, penalty, stepsFor, stepsOf } from "./capacityBound.ts";
import type { Core, CoreColumn } from "./core.ts";
import { withOnly } from "./thinCore.ts";

/** The core without the pairs that, at best, still end above `limit` (a cost): each tried with all before and all after it. */
export function tightenCore(core: Core, bound: CapacityBound, limit: number): Core {
  const { steps, table, prices } = bound;
  const types = core.maxTypesHere;
  const counted = types <= MOST_LAYERS;
  const layers = counted ? types : 1;
  const goal = stepsFor(bound, 1);
  const wide = steps + 1;
  let before = new Float64Array((layers + 1) * wide).fill(Number.POSITIVE_INFINITY);
  for (let layer = 0; layer <= layers; layer += 1) before[layer * wide] = 0;
  const bar = limit + prices.volume + prices.mass + prices.units;
  const columns: CoreColumn[] = [];
  let pairs = 0;
  core.columns.forEach((column, from) => {
    const each = penalty(prices, column);
    const keep: number[] = [];
    const next = before.slice();
    for (let at = 0; at < column.strings.length; at += 1) {
      const strings = column.strings[at]!;
      const price = column.costs[strings]! + each * strings;
      const brings = stepsOf(column, strings, steps);
      let low = Number.POSITIVE_INFINITY;
      for (let layer = 0; layer < (counted ? layers : 1); layer += 1) {
        const first = counted ? layer * wide : wide;
        const after = bound.row(from + 1, counted ? types - 1 - layer : types);
        for (let step = 0; step <= Math.max(0, goal - brings); step += 1) {
          low = Math.min(low, before[first + step]! + table[after + Math.max(0, goal - brings - step)]!);
        }
        addChoice(next, { own: counted ? first + wide : wide, rest: first, price, brings, steps });
      }
      if (low + price <= bar) keep.push(at);
    }
    before = next;
    if (keep.length === 0) return;
    pairs += keep.length;
    columns.push(withOnly(column, keep));
  });
  columns.sort((a, b) => a.reduced[0]! - b.reduced[0]! || a.option - b.option);
  return { ...core, columns, pairs, maxTypesHere: Math.min(core.maxTypes, columns.length) };
}
