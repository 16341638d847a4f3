// The options as columns of numbers for the bound: normalised rows, and for each option the lower hull of its costs.
import { capacityNeeded, roomUnder } from "./evaluate.ts";
import type { BlendModel, BlendOption, CostFloor } from "./model.ts";

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
  const { volume, mass, units } = model.ceilings;
  let most = option.maxStrings;
  if (most * option.capacity > model.requirement) {
    most = Math.min(most, stringsToReach(capacityNeeded(model.requirement), option.capacity));
  }
  if (most * option.volume > volume) most = Math.min(most, stringsUnder(roomUnder(volume), option.volume));
  if (most * option.mass > mass) most = Math.min(most, stringsUnder(roomUnder(mass), option.mass));
  if (most * option.units > units) most = Math.min(most, stringsUnder(roomUnder(units), option.units));
  return most;
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

/** What divides an amount to make its ceiling 1; Infinity, and so amounts of 0, where there is none. */
const unitOf = (ceiling: number): number => (ceiling === 0 ? 1 : roomUnder(ceiling));

/** Columns of the named options; their hulls come from the tables when `exact`, else from the floors where given. */
export function buildPool(model: BlendModel, among: readonly number[] | null, exact: boolean): Pool {
  const wanted = among?.length ?? model.options.length;
  const option = new Int32Array(wanted);
  const most = new Int32Array(wanted);
  const start = new Int32Array(wanted + 1);
  const capacity = new Float64Array(wanted);
  const volume = new Float64Array(wanted);
  const mass = new Float64Array(wanted);
  const units = new Float64Array(wanted);
  const hull: Hull = { x: new Float64Array(3 * wanted + 16), cost: new Float64Array(3 * wanted + 16), length: 0 };
  const need = capacityNeeded(model.requirement);
  const unit = {
    volume: unitOf(model.ceilings.volume),
    mass: unitOf(model.ceilings.mass),
    units: unitOf(model.ceilings.units),
  };
  let size = 0;
  for (let at = 0; at < wanted; at += 1) {
    const index = among === null ? at : among[at]!;
    const from = model.options[index]!;
    const count = usefulStrings(model, from);
    if (count < 1) continue;
    option[size] = index;
    most[size] = count;
    capacity[size] = from.capacity / need;
    volume[size] = from.volume / unit.volume;
    mass[size] = from.mass / unit.mass;
    units[size] = from.units / unit.units;
    addHull(hull, from, count, exact);
    size += 1;
    start[size] = hull.length;
  }
  return { size, option, capacity, volume, mass, units, most, start, hullX: hull.x, hullCost: hull.cost };
}

/** Corners of all columns on end; `length` of the arrays is in use. */
interface Hull {
  x: Float64Array;
  cost: Float64Array;
  length: number;
}

function addCorner(hull: Hull, x: number, cost: number): void {
  if (hull.length === hull.x.length) {
    const wider = (old: Float64Array): Float64Array => {
      const next = new Float64Array(2 * old.length);
      next.set(old);
      return next;
    };
    hull.x = wider(hull.x);
    hull.cost = wider(hull.cost);
  }
  hull.x[hull.length] = x;
  hull.cost[hull.length] = cost;
  hull.length += 1;
}

function addHull(hull: Hull, from: BlendOption, most: number, exact: boolean): void {
  const floor = exact ? undefined : from.floor;
  if (floor) {
    addFloor(hull, floor, most);
    return;
  }
  const { x, cost } = lowerHull(from.costs, most);
  for (let at = 0; at < x.length; at += 1) addCorner(hull, x[at]!, cost[at]!);
}

/** The greater of a level and a slope: its corners, the middle one where they cross, which need not be at a whole count. */
function addFloor(hull: Hull, { fixed, perString, least = 0 }: CostFloor, most: number): void {
  const first = Math.max(least, fixed + perString);
  const last = fixed + perString * most;
  addCorner(hull, 1, first);
  if (most === 1) return;
  const crossing = perString > 0 ? (first - fixed) / perString : 1;
  if (crossing > 1 && crossing < most) addCorner(hull, crossing, first);
  addCorner(hull, most, Math.max(first, last));
}
