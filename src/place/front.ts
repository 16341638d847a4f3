// Where charging and holding pull apart: the placings of which neither gap can be lowered without raising the other.
import { accepted, type Read, refused } from "../quantity/index.ts";
import { finish } from "./charging.ts";
import { conductancesOf } from "./conductance.ts";
import { constraintsOf } from "./constraints.ts";
import { effort } from "./effort.ts";
import { arrangements, MOST_ENUMERATED } from "./enumerate.ts";
import { gapFloor } from "./floor.ts";
import { exactFront } from "./frontExact.ts";
import { holdAgain } from "./holding.ts";
import { toLattice } from "./lattice.ts";
import { place } from "./place.ts";
import { serialsOf, settled } from "./placing.ts";
import { seeded } from "./random.ts";
import { DEFAULTS, type PlaceRequest } from "./request.ts";
import { lotUncertainty, type MeasuredUnit } from "./unit.ts";

export interface FrontPoint {
  readonly charging: number;
  readonly holding: number;
  readonly groups: readonly (readonly string[])[];
  readonly spares: readonly string[];
}

export interface Front {
  /** Charging gap rising, holding gap falling. */
  readonly points: readonly FrontPoint[];
  /** The point whose greater gap is least. */
  readonly balanced: number;
  /** True when every placing was looked at; otherwise each point is the best found. */
  readonly exact: boolean;
}

const MOST_ARRANGEMENTS = 4_000_000;
const MOVES_EACH = 200_000;
/** Charging limits tried, as multiples of the floor. */
const LIMITS = [0.1, 0.3, 1, 2, 3, 5, 10, 20, 50] as const;
const HALVINGS = 4;

/** A holding gap lower by less than this part is the same one, summed in another order. */
const SAME = 1e-9;

interface RawPoint {
  readonly charging: number;
  readonly holding: number;
  readonly groups: readonly (readonly number[])[];
}

/** Keeps the points that no other point beats in both gaps; charging rising. */
export function undominated<T extends { readonly charging: number; readonly holding: number }>(
  points: readonly T[],
): T[] {
  const sorted = [...points].sort((a, b) => a.charging - b.charging || a.holding - b.holding);
  let least = Number.POSITIVE_INFINITY;
  return sorted.filter((point) => {
    if (point.holding >= least * (1 - SAME)) return false;
    least = point.holding;
    return true;
  });
}

const greater = (point: { readonly charging: number; readonly holding: number }): number =>
  Math.max(point.charging, point.holding);

/**
 * The front of charging gap against holding gap. Exact for small lots without wishes (up to 4 million placings); otherwise one
 * search for each of a row of charging limits, and a few more to close in on the balanced point.
 * Refuses what `place` refuses, and a lot whose holding cannot be judged.
 */
export function placingFront(units: readonly MeasuredUnit[], request: PlaceRequest): Read<Front> {
  const first = place(units, { ...request, goal: "charging" });
  if (!first.ok) return first;
  const out = new Set(first.value.rejected.map((o) => o.serial));
  const pool = units.filter((unit) => !out.has(unit.serial));
  const conductances = conductancesOf(pool, request);
  if (!conductances.known) {
    return refused({
      code: "place.no-front",
      place: { field: "leakage" },
      read: conductances.why,
      want: "leakage of every unit",
    });
  }
  const rule = constraintsOf(pool, request);
  const { values } = toLattice(pool.map((unit) => unit.capacitance));
  const { ties, series, parallel } = request;
  const finishFront = (raw: readonly RawPoint[], exact: boolean): Read<Front> => {
    const points = undominated(raw).map(({ charging, holding, groups }) => {
      const serials = serialsOf(pool, settled(groups, rule.any));
      const fitted = new Set(serials.flat());
      return { charging, holding, groups: serials, spares: units.map((u) => u.serial).filter((s) => !fitted.has(s)) };
    });
    const balanced = points.reduce((best, point, i) => (greater(point) < greater(points[best]!) ? i : best), 0);
    return accepted({ points, balanced, exact });
  };

  const small = pool.length <= MOST_ENUMERATED && !rule.any;
  if (small && arrangements(pool.length, rule.groups, rule.size) <= MOST_ARRANGEMENTS) {
    const work = effort(Number.POSITIVE_INFINITY, request.within);
    const answer = finish(
      exactFront({ ties, series, values, conductances, groups: rule.groups, size: rule.size }, work),
    );
    if (answer.complete) return finishFront(answer.points, true);
  }

  const floor = gapFloor({
    series,
    parallel,
    ties,
    uncertainty: request.uncertainty || lotUncertainty(units) || DEFAULTS.uncertainty,
  });
  const random = seeded(request.seed ?? DEFAULTS.seed);
  const work = effort(Math.max(request.moves ?? DEFAULTS.moves, 1), request.within);
  const index = new Map(pool.map((unit, i) => [unit.serial, i]));
  const begin = first.value.groups.map((group) => group.map((serial) => index.get(serial)!));
  const spares = pool.length > series * parallel;
  const common = { ties, values, rule, conductances, target: 0, spares, moves: MOVES_EACH };
  const at = (limit: number, from: readonly (readonly number[])[]): RawPoint => {
    const held = finish(holdAgain(from, { ...common, limit }, { tries: 1, random, work }));
    return { ...held.gaps, groups: held.groups };
  };
  const found: RawPoint[] = [at(first.value.charging.gap, begin)];
  for (const multiple of LIMITS) {
    const limit = multiple * floor;
    if (limit > first.value.charging.gap) found.push(at(limit, found[found.length - 1]!.groups));
  }
  // The balanced point lies where the limit meets the holding gap found under it.
  let [low, high] = [first.value.charging.gap, Math.max(...found.map(greater))];
  for (let k = 0; k < HALVINGS && low > 0 && low < high; k++) {
    const limit = Math.sqrt(low * high);
    const point = at(limit, begin);
    found.push(point);
    if (point.holding > limit) low = limit;
    else high = limit;
  }
  return finishFront(found, false);
}
