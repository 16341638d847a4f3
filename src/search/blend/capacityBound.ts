// A bound that counts capacity in whole steps: cheapest way for the later columns of a core to bring so much more.
import type { Core, CoreColumn } from "./core.ts";
import type { Multipliers } from "./dual.ts";

/**
 * Least penalised cost (purchase plus priced volume, mass and units) at which columns `from` onward, at most `types` of them,
 * bring `steps` of capacity. Every count brings its capacity rounded UP to a step, so the true cost is never below.
 */
export interface CapacityBound {
  /** Prices of volume, mass and units in it; that of capacity plays no part. */
  readonly prices: Multipliers;
  readonly steps: number;
  /** Part of a step by which the types that may join can be counted short. */
  readonly slack: number;
  /** Place of the entry for steps = 0; entries for more steps follow. */
  readonly row: (from: number, types: number) => number;
  readonly table: Float64Array;
}

/**
 * A count may be counted this far short of a whole step, so that an exact fit, a hair above it for the tolerance of the need,
 * stays exact. The need is then counted that much shorter for each type that may join.
 */
const STEP_SLACK = 1e-4;

/** Above this many types the table does not tell how many are left, which only weakens it. */
export const MOST_LAYERS = 8;

/** Whole steps that `need` (a fraction of the requirement) asks for. */
export const stepsFor = (bound: CapacityBound, need: number): number =>
  Math.min(bound.steps, Math.max(0, Math.ceil(need * bound.steps - bound.slack)));

/** What the priced ceilings make of one string. */
export const penalty = (
  prices: Multipliers,
  amounts: { readonly volume: number; readonly mass: number; readonly units: number },
) => prices.volume * amounts.volume + prices.mass * amounts.mass + prices.units * amounts.units;

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
  bound.table[bound.row(0, core.maxTypesHere) + stepsFor(bound, 1)]! -
  bound.prices.volume -
  bound.prices.mass -
  bound.prices.units;

/** Builds the table from the last column to the first. */
export function buildCapacityBound(core: Core, steps: number, prices: Multipliers): CapacityBound {
  const count = core.columns.length;
  const layers = layersOf(core);
  const counted = Math.min(core.maxTypes, count) <= MOST_LAYERS;
  const wide = steps + 1;
  const table = new Float64Array((count + 1) * (layers + 1) * wide).fill(Number.POSITIVE_INFINITY);
  const place = (from: number, layer: number): number => (from * (layers + 1) + layer) * wide;
  for (let from = 0; from <= count; from += 1)
    for (let layer = 0; layer <= layers; layer += 1) table[place(from, layer)] = 0;
  for (let from = count - 1; from >= 0; from -= 1) {
    const column = core.columns[from]!;
    const each = penalty(prices, column);
    for (let layer = 1; layer <= layers; layer += 1) {
      const own = place(from, layer);
      table.copyWithin(own, place(from + 1, layer), place(from + 1, layer) + wide);
      const rest = place(from + 1, counted ? layer - 1 : layer);
      for (const strings of column.strings) {
        addChoice(table, {
          own,
          rest,
          price: column.costs[strings]! + each * strings,
          brings: stepsOf(column, strings, steps),
          steps,
        });
      }
    }
  }
  const row = (from: number, types: number): number =>
    place(from, counted ? Math.min(types, layers) : Math.min(types, 1));
  return { prices, steps, slack: STEP_SLACK * core.maxTypesHere, row, table };
}

/** Steps that so many strings bring, rounded up. */
export const stepsOf = (column: CoreColumn, strings: number, steps: number): number =>
  Math.min(steps, Math.ceil(column.capacity * strings * steps - STEP_SLACK));

export interface Addition {
  readonly own: number;
  readonly rest: number;
  readonly price: number;
  readonly brings: number;
  readonly steps: number;
}

/** Lets the row at `own` take `price` for `brings` steps and the row at `rest` for the others. */
export function addChoice(table: Float64Array, { own, rest, price, brings, steps }: Addition): void {
  for (let step = 1; step <= brings; step += 1) if (price < table[own + step]!) table[own + step] = price;
  for (let step = brings + 1; step <= steps; step += 1) {
    const sum = table[rest + step - brings]! + price;
    if (sum < table[own + step]!) table[own + step] = sum;
  }
}
