// A bound that counts capacity in whole steps: cheapest way for the later columns of a core to bring so much more.
import { pricesFrom } from "./ascent.ts";
import type { Core, CoreColumn } from "./core.ts";
import type { Multipliers } from "./dual.ts";
import { climb } from "./ellipsoid.ts";

/**
 * Least penalised cost (purchase plus priced volume, mass and units) at which columns `from` onward, at most `types` of them,
 * bring `steps` of capacity. Every count brings its capacity rounded UP to a step, so the true cost is never below.
 */
export interface CapacityBound {
  /** Prices of volume, mass and units in it; that of capacity plays no part. */
  readonly prices: Multipliers;
  readonly steps: number;
  /** Place of the entry for steps = 0; entries for more steps follow. */
  readonly row: (from: number, types: number) => number;
  readonly table: Float64Array;
}

/** A count's capacity may be counted this far short of a whole step, and so may the need: exact fits stay exact. */
const STEP_SLACK = 1e-9;
const NEED_SLACK = 1e-6;

/** Above this many types the table does not tell how many are left, which only weakens it. */
const MOST_LAYERS = 8;

/** Whole steps that `need` (a fraction of the requirement) asks for. */
export const stepsFor = (bound: CapacityBound, need: number): number =>
  Math.min(bound.steps, Math.max(0, Math.ceil(need * bound.steps - NEED_SLACK)));

const penalty = (prices: Multipliers, amounts: { readonly volume: number; readonly mass: number; readonly units: number }) =>
  prices.volume * amounts.volume + prices.mass * amounts.mass + prices.units * amounts.units;

/** Steps that keep the work near `effort` additions and the table under 64 MB. */
export function stepsWithin(core: Core, effort: number, most = 65536): number {
  const layers = layersOf(core);
  const byWork = effort / (core.pairs * layers + 1);
  const bySize = 8e6 / ((core.columns.length + 1) * (layers + 1));
  return Math.max(64, Math.min(most, Math.floor(Math.min(byWork, bySize))));
}

const layersOf = (core: Core): number => {
  const types = Math.min(core.maxTypes, core.columns.length);
  return types > MOST_LAYERS ? 1 : types;
};

/** Least cost of any blend of the core by this bound, in which the ceilings count only through their prices. */
export const rootBound = (core: Core, bound: CapacityBound): number =>
  bound.table[bound.row(0, core.maxTypesHere) + bound.steps]! - bound.prices.volume - bound.prices.mass - bound.prices.units;

/** Builds the table from the last column to the first. */
export function buildCapacityBound(core: Core, steps: number, prices: Multipliers): CapacityBound {
  const count = core.columns.length;
  const layers = layersOf(core);
  const counted = Math.min(core.maxTypes, count) <= MOST_LAYERS;
  const wide = steps + 1;
  const table = new Float64Array((count + 1) * (layers + 1) * wide).fill(Number.POSITIVE_INFINITY);
  const place = (from: number, layer: number): number => (from * (layers + 1) + layer) * wide;
  for (let from = 0; from <= count; from += 1) for (let layer = 0; layer <= layers; layer += 1) table[place(from, layer)] = 0;
  for (let from = count - 1; from >= 0; from -= 1) {
    const column = core.columns[from]!;
    const each = penalty(prices, column);
    for (let layer = 1; layer <= layers; layer += 1) {
      const own = place(from, layer);
      table.copyWithin(own, place(from + 1, layer), place(from + 1, layer) + wide);
      const rest = place(from + 1, counted ? layer - 1 : layer);
      for (const strings of column.strings) {
        add(table, { own, rest, price: column.costs[strings]! + each * strings, brings: stepsOf(column, strings, steps), steps });
      }
    }
  }
  const row = (from: number, types: number): number => place(from, counted ? Math.min(types, layers) : Math.min(types, 1));
  return { prices, steps, row, table };
}

const stepsOf = (column: CoreColumn, strings: number, steps: number): number =>
  Math.min(steps, Math.ceil(column.capacity * strings * steps - STEP_SLACK));

interface Addition {
  readonly own: number;
  readonly rest: number;
  readonly price: number;
  readonly brings: number;
  readonly steps: number;
}

/** Lets the row at `own` take `price` for `brings` steps and the row at `rest` for the others. */
function add(table: Float64Array, { own, rest, price, brings, steps }: Addition): void {
  for (let step = 1; step <= brings; step += 1) if (price < table[own + step]!) table[own + step] = price;
  for (let step = brings + 1; step <= steps; step += 1) {
    const sum = table[rest + step - brings]! + price;
    if (sum < table[own + step]!) table[own + step] = sum;
  }
}

/** Volume, mass and units (fractions of their ceilings) of the blend behind the root of the bound. */
export function rootBlend(core: Core, bound: CapacityBound): { readonly volume: number; readonly mass: number; readonly units: number } {
  const { table, steps, prices } = bound;
  const counted = core.maxTypesHere <= MOST_LAYERS;
  const sum = { volume: 0, mass: 0, units: 0 };
  let types = core.maxTypesHere;
  let step = steps;
  core.columns.forEach((column, from) => {
    const here = table[bound.row(from, types) + step]!;
    if (step === 0 || here === table[bound.row(from + 1, types) + step]!) return;
    const each = penalty(prices, column);
    for (const strings of column.strings) {
      const rest = Math.max(0, step - stepsOf(column, strings, steps));
      const price = column.costs[strings]! + each * strings;
      if (here !== price && here !== table[bound.row(from + 1, counted ? types - 1 : types) + rest]! + price) continue;
      sum.volume += strings * column.volume;
      sum.mass += strings * column.mass;
      sum.units += strings * column.units;
      if (here === price) step = 0;
      else step = rest;
      types -= counted ? 1 : 0;
      return;
    }
  });
  return sum;
}

/** Prices of the ceilings under which the bound, counted in few steps, stands highest. */
export function pricedCeilings(core: Core, steps: number): Multipliers {
  const { capacity, volume, mass, units } = core.prices;
  const live = [1, 2, 3].filter((row) => core.columns.some((c) => [0, c.volume, c.mass, c.units][row]! > 0));
  if (live.length === 0) return core.prices;
  const top = climb(
    {
      look: (at, slope) => {
        const bound = buildCapacityBound(core, steps, pricesFrom(1, at));
        const blend = rootBlend(core, bound);
        slope.set([0, blend.volume - 1, blend.mass - 1, blend.units - 1]);
        return rootBound(core, bound);
      },
      live,
      enough: Number.POSITIVE_INFINITY,
      fine: 1e-4 * capacity,
    },
    [capacity, volume, mass, units],
    0.3 * capacity,
    9 * live.length,
  );
  return pricesFrom(1, top.at);
}

/** The core without the pairs that, at best, still end above `limit` (a cost): each tried with all before and all after it. */
export function tightenCore(core: Core, bound: CapacityBound, limit: number): Core {
  const { steps, table, prices } = bound;
  const types = core.maxTypesHere;
  const counted = types <= MOST_LAYERS;
  const layers = counted ? types : 1;
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
        for (let step = 0; step <= steps - brings; step += 1) {
          low = Math.min(low, before[first + step]! + table[after + steps - brings - step]!);
        }
        add(next, { own: counted ? first + wide : wide, rest: first, price, brings, steps });
      }
      if (low + price <= bar) keep.push(at);
    }
    before = next;
    if (keep.length === 0) return;
    pairs += keep.length;
    const strings = Int32Array.from(keep, (at) => column.strings[at]!);
    columns.push({ ...column, strings, reduced: Float64Array.from(keep, (at) => column.reduced[at]!) });
  });
  columns.sort((a, b) => a.reduced[0]! - b.reduced[0]! || a.option - b.option);
  return { ...core, columns, pairs, maxTypesHere: Math.min(core.maxTypes, columns.length) };
}
