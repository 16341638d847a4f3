// Drops pairs of a core that enough others can always stand in for; some cheapest blend is left, not every cheap one.
import type { Core, CoreColumn } from "./core.ts";

/** Rivals looked at for each pair, best first; more would find a little more at a high price. */
const MOST_RIVALS = 1500;

interface Pair {
  readonly column: number;
  readonly at: number;
  readonly reduced: number;
}

/**
 * A pair goes when pairs of `maxTypes` other parts (or one of its own part) each cost no more, bring no less, and take no more
 * volume, mass and units, and need no shipment that it does not need itself. A blend with it uses at most maxTypes - 1 other parts, so one such pair can take its place, and the
 * blend stays under any threshold it was under. Replacements always stand earlier in one fixed order, so no circle forms; and
 * only kept pairs need be asked, for whatever replaces a dropped one replaces what that would have.
 */
export function thinCore(core: Core): Core {
  const pairs: Pair[] = [];
  core.columns.forEach(({ reduced }, column) => {
    for (let at = 0; at < reduced.length; at += 1) pairs.push({ column, at, reduced: reduced[at]! });
  });
  // No pair can stand in for one of smaller reduced cost: prices are nowhere below 0.
  pairs.sort((a, b) => a.reduced - b.reduced || a.column - b.column || a.at - b.at);
  const rivals = Math.min(MOST_RIVALS, pairs.length);
  const amounts = {
    cost: new Float64Array(rivals),
    capacity: new Float64Array(rivals),
    volume: new Float64Array(rivals),
  };
  const others = { mass: new Float64Array(rivals), units: new Float64Array(rivals), part: new Int32Array(rivals) };
  const keep: number[][] = core.columns.map(() => []);
  const senders: (readonly number[])[] = [];
  const parts: number[] = [];
  let known = 0;
  for (const { column: k, at } of pairs) {
    const column = core.columns[k]!;
    const x = column.strings[at]!;
    const cost = column.costs[x]! - column.share;
    // Beyond the whole need more capacity is worth nothing.
    const capacity = Math.min(1, column.capacity * x);
    const [volume, mass, units] = [column.volume * x, column.mass * x, column.units * x];
    parts.length = 0;
    let dropped = false;
    for (let r = 0; r < known && !dropped; r += 1) {
      if (amounts.cost[r]! > cost || amounts.capacity[r]! < capacity || amounts.volume[r]! > volume) continue;
      if (others.mass[r]! > mass || others.units[r]! > units) continue;
      if (!senders[r]!.every((supplier) => column.suppliers.includes(supplier))) continue;
      const part = others.part[r]!;
      if (part === column.part) dropped = true;
      else if (!parts.includes(part)) {
        parts.push(part);
        dropped = parts.length >= core.maxTypes;
      }
    }
    if (dropped) continue;
    keep[k]!.push(at);
    if (known === rivals) continue;
    amounts.cost[known] = cost;
    amounts.capacity[known] = capacity;
    amounts.volume[known] = volume;
    others.mass[known] = mass;
    others.units[known] = units;
    others.part[known] = column.part;
    senders.push(column.suppliers);
    known += 1;
  }
  const columns = core.columns.flatMap((column, k) => (keep[k]!.length === 0 ? [] : [withOnly(column, keep[k]!)]));
  columns.sort((a, b) => a.reduced[0]! - b.reduced[0]! || a.option - b.option);
  const left = columns.reduce((sum, { strings }) => sum + strings.length, 0);
  return { ...core, columns, pairs: left, maxTypesHere: Math.min(core.maxTypes, columns.length) };
}

/** The column with only the named places of its counts, in their order. */
export const withOnly = (column: CoreColumn, places: readonly number[]): CoreColumn => ({
  ...column,
  strings: Int32Array.from(places, (at) => column.strings[at]!),
  reduced: Float64Array.from(places, (at) => column.reduced[at]!),
});
