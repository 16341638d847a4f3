// The options as columns of numbers for the bound: normalised rows, and for each option the lower hull of its costs.
import { capacityNeeded, roomUnder } from "./evaluate.ts";
import type { BlendModel, BlendOption } from "./model.ts";

/** The rows that a multiplier can stand for; capacity is a need, the others are ceilings. */
export const CEILING_NAMES = ["volume", "mass", "units"] as const;
export type CeilingName = (typeof CEILING_NAMES)[number];

/**
 * Columns of the options that can be used at all. Every amount is divided by its limit (tolerance included), so the need
 * and every ceiling are 1; a row without a ceiling holds zeros. `hullX`, `hullCost` from start[k] to start[k + 1] are
 * points on or below the cost table whose lower envelope lies nowhere above it for x >= 1.
 */
export interface Pool {
  readonly size: number;
  /** Place in the model's options. */
  readonly option: Int32Array;
  readonly capacity: Float64Array;
  readonly volume: Float64Array;
  readonly mass: Float64Array;
  readonly units: Float64Array;
  /** Most strings that are of use: stock, ceilings, and what meets the need alone. */
  readonly most: Int32Array;
  readonly start: Int32Array;
  readonly hullX: Float64Array;
  readonly hullCost: Float64Array;
}

/** Above this no table reaches, and neighbouring counts would soon be one number. */
const MOST_COUNT = 2 ** 31;

/** Least count of `each` that reaches `need`, settled by multiplication, not by the rounded quotient. */
export function stringsToReach(need: number, each: number): number {
  let count = Math.max(0, Math.ceil(need / each));
  if (count > MOST_COUNT) return count;
  while (count > 0 && (count - 1) * each >= need) count -= 1;
  while (count * each < need) count += 1;
  return count;
}

/** Most whole strings under a ceiling, settled by multiplication. */
function stringsUnder(room: number, each: number): number {
  if (each === 0 || room === Number.POSITIVE_INFINITY) return Number.POSITIVE_INFINITY;
  let count = Math.floor(room / each);
  if (count > MOST_COUNT) return count;
  while (count > 0 && count * each > room) count -= 1;
  while ((count + 1) * each <= room) count += 1;
  return count;
}

/** Most strings of the option that could ever be of use. */
export function usefulStrings(model: BlendModel, option: BlendOption): number {
  return Math.min(
    option.maxStrings,
    stringsToReach(capacityNeeded(model.requirement), option.capacity),
    ...CEILING_NAMES.map((name) => stringsUnder(roomUnder(model.ceilings[name]), option[name])),
  );
}

/** Corners of the lower convex hull of costs[1..most]. */
export function lowerHull(costs: Float64Array, most: number): { readonly x: number[]; readonly cost: number[] } {
  const x: number[] = [];
  const cost: number[] = [];
  for (let at = 1; at <= most; at += 1) {
    const c = costs[at]!;
    while (x.length >= 2) {
      const ax = x[x.length - 2]!;
      const bx = x[x.length - 1]!;
      const ac = cost[cost.length - 2]!;
      if ((cost[cost.length - 1]! - ac) * (at - ax) < (c - ac) * (bx - ax)) break;
      x.pop();
      cost.pop();
    }
    x.push(at);
    cost.push(c);
  }
  return { x, cost };
}

const scaled = (amount: number, ceiling: number): number =>
  ceiling === Number.POSITIVE_INFINITY || amount === 0 ? 0 : amount / roomUnder(ceiling);

/** Columns of the named options; their hulls come from the tables when `exact`, else from the floors where given. */
export function buildPool(model: BlendModel, among: readonly number[] | null, exact: boolean): Pool {
  const wanted = among?.length ?? model.options.length;
  const option = new Int32Array(wanted);
  const most = new Int32Array(wanted);
  const start = new Int32Array(wanted + 1);
  const rows = {
    capacity: new Float64Array(wanted),
    volume: new Float64Array(wanted),
    mass: new Float64Array(wanted),
    units: new Float64Array(wanted),
  };
  const hullX: number[] = [];
  const hullCost: number[] = [];
  const need = capacityNeeded(model.requirement);
  let size = 0;
  for (let at = 0; at < wanted; at += 1) {
    const index = among === null ? at : among[at]!;
    const from = model.options[index]!;
    const count = usefulStrings(model, from);
    if (count < 1) continue;
    option[size] = index;
    most[size] = count;
    rows.capacity[size] = from.capacity / need;
    for (const name of CEILING_NAMES) rows[name][size] = scaled(from[name], model.ceilings[name]);
    addHull(from, count, exact, hullX, hullCost);
    size += 1;
    start[size] = hullX.length;
  }
  return { size, option, ...rows, most, start, hullX: Float64Array.from(hullX), hullCost: Float64Array.from(hullCost) };
}

function addHull(from: BlendOption, most: number, exact: boolean, hullX: number[], hullCost: number[]): void {
  const floor = exact ? undefined : from.floor;
  if (floor) {
    hullX.push(1);
    hullCost.push(floor.fixed + floor.perString);
    if (most > 1) {
      hullX.push(most);
      hullCost.push(floor.fixed + floor.perString * most);
    }
    return;
  }
  const hull = lowerHull(from.costs, most);
  hullX.push(...hull.x);
  hullCost.push(...hull.cost);
}
