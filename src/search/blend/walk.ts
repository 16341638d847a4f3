// Walks depth first through the blends of a core that cost less than a threshold, pruned by three bounds.
import { type CapacityBound, stepsFor } from "./capacityBound.ts";
import type { Core } from "./core.ts";
import { BOUND_SLACK, type Multipliers } from "./dual.ts";
import type { BlendCount } from "./model.ts";
import { stringsToReach } from "./pool.ts";

/** A count of work done and a say in when to stop, shared by every walk of one search. */
export interface Budget {
  spent: number;
  readonly most: number;
  readonly stop: () => boolean;
}

export interface Walk {
  readonly core: Core;
  /** Only blends that cost less are of interest. */
  readonly threshold: number;
  /** Prices that show how little capacity the ceilings leave; null when no ceiling is felt. */
  readonly feasibility: Multipliers | null;
  /** Told of every blend found; answers the threshold from then on. Costs are as tabulated. */
  readonly found: (counts: readonly BlendCount[], cost: number) => number;
  readonly budget: Budget;
  /** Counts capacity in steps; null before it is worth its making. */
  readonly bound: CapacityBound | null;
  /** Most work for this walk. */
  readonly most: number;
}

/** `capped` when the walk used up its own share, `stopped` when the budget of the whole search ended. */
export type WalkEnd = "complete" | "capped" | "stopped";

const TINY = 1e-12;

/** Walks the core. */
export function walkCore(walk: Walk): WalkEnd {
  const { core, budget, bound } = walk;
  const { columns, prices } = core;
  const count = columns.length;
  const offset = prices.capacity - prices.volume - prices.mass - prices.units;
  const negative = prefixOfNegatives(core);
  const reach = walk.feasibility === null ? null : reachTable(core, walk.feasibility);
  const f = walk.feasibility;
  const path: BlendCount[] = [];
  const parts: number[] = [];
  let limit = walk.threshold - 1 + BOUND_SLACK;
  let own = 0;
  let end: WalkEnd = "complete";

  const best = (from: number, types: number): number =>
    negative[Math.min(count, from + types)]! - negative[Math.min(count, from)]!;

  const report = (option: number, strings: number, cost: number): void => {
    limit = walk.found([...path, { option, strings }], cost) - 1 + BOUND_SLACK;
  };

  const spend = (): void => {
    own += 1;
    budget.spent += 1;
    if (budget.spent >= budget.most || ((budget.spent & 1023) === 0 && budget.stop())) end = "stopped";
    else if (own >= walk.most) end = "capped";
  };

  const explore = (
    from: number,
    left: number,
    cost: number,
    got: number,
    volume: number,
    mass: number,
    units: number,
    reduced: number,
  ): void => {
    const need = 1 - got;
    for (let i = from; i < count; i += 1) {
      const column = columns[i]!;
      const after = offset + reduced + best(i + 1, left - 1);
      if (after + column.reduced[0]! > limit) return;
      spend();
      if (end !== "complete") return;
      if (parts.includes(column.part)) continue;
      const alone = stringsToReach(need, column.capacity);
      if (alone <= column.most) {
        const total = cost + column.costs[alone]!;
        if (
          total <= limit &&
          volume + column.volume * alone <= 1 &&
          mass + column.mass * alone <= 1 &&
          units + column.units * alone <= 1
        ) {
          report(column.option, alone, total);
        }
      }
      if (left === 1) continue;
      for (let at = 0; at < column.strings.length; at += 1) {
        const x = column.strings[at]!;
        if (after + column.reduced[at]! > limit) break;
        if (x >= alone) continue;
        const g = got + column.capacity * x;
        const v = volume + column.volume * x;
        const w = mass + column.mass * x;
        const u = units + column.units * x;
        if (v > 1 || w > 1 || u > 1) continue;
        if (reach !== null && f !== null) {
          const room = f.volume * (1 - v) + f.mass * (1 - w) + f.units * (1 - u);
          if (1 - g - room > reach[(i + 1) * (core.maxTypesHere + 1) + left - 1]! + TINY) continue;
        }
        const c = cost + column.costs[x]!;
        if (bound !== null) {
          const rest = bound.table[bound.row(i + 1, left - 1) + stepsFor(bound, 1 - g)]!;
          if (
            c + rest - bound.prices.volume * (1 - v) - bound.prices.mass * (1 - w) - bound.prices.units * (1 - u) >
            limit
          )
            continue;
        }
        path.push({ option: column.option, strings: x });
        parts.push(column.part);
        explore(i + 1, left - 1, c, g, v, w, u, reduced + column.reduced[at]!);
        path.pop();
        parts.pop();
        if (end !== "complete") return;
      }
    }
  };

  explore(0, core.maxTypesHere, 0, 0, 0, 0, 0, 0);
  return end;
}

/** Sums of the columns' least reduced costs where below 0, in the core's order. */
function prefixOfNegatives(core: Core): Float64Array {
  const sums = new Float64Array(core.columns.length + 1);
  core.columns.forEach((column, at) => {
    sums[at + 1] = sums[at]! + Math.min(0, column.reduced[0]!);
  });
  return sums;
}

/** Most priced capacity that columns i onward can bring with 0, 1, ... types, row by row. */
function reachTable(core: Core, prices: Multipliers): Float64Array {
  const wide = core.maxTypesHere + 1;
  const table = new Float64Array((core.columns.length + 1) * wide);
  const top: number[] = [];
  for (let i = core.columns.length - 1; i >= 0; i -= 1) {
    const c = core.columns[i]!;
    const each = c.capacity - prices.volume * c.volume - prices.mass * c.mass - prices.units * c.units;
    top.push(Math.max(0, each * c.most));
    top.sort((a, b) => b - a);
    if (top.length > core.maxTypesHere) top.pop();
    let sum = 0;
    for (let types = 1; types < wide; types += 1) {
      sum += top[types - 1] ?? 0;
      table[i * wide + types] = sum;
    }
  }
  return table;
}
