// Finds good prices for the Lagrangian bound: bisection on the price of capacity, then an ellipsoid over all prices.
import { type DualPoint, dualPoint, evaluateDual, type Multipliers } from "./dual.ts";
import { climb as climbEllipsoid, type Hill } from "./ellipsoid.ts";
import type { Pool } from "./pool.ts";

export interface Ascent {
  readonly prices: Multipliers;
  readonly value: number;
}

interface Climb {
  readonly pool: Pool;
  readonly maxTypes: number;
  readonly weight: 0 | 1;
  readonly point: DualPoint;
  /** A value from which nothing more need be proven. */
  readonly enough: number;
}

export const pricesFrom = (weight: 0 | 1, at: ArrayLike<number>): Multipliers => ({
  cost: weight,
  capacity: at[0]!,
  volume: at[1]!,
  mass: at[2]!,
  units: at[3]!,
});

/** Which ceilings any option feels. */
function liveRows(pool: Pool): readonly number[] {
  const rows = [pool.volume, pool.mass, pool.units];
  return rows.flatMap((row, at) => (row.some((amount) => amount > 0) ? [at + 1] : []));
}

/**
 * Best price of capacity alone, and whether the blends on either side of it break a ceiling. The bound is concave and
 * made of straight pieces: where the tangents of both ends cross is the next place to look, and when the bound reaches
 * the crossing that is the top.
 */
function climbCapacity(climb: Climb): { readonly at: number; readonly value: number; readonly broken: boolean } {
  const { pool, maxTypes, point } = climb;
  const probe = (price: number) => {
    evaluateDual(pool, { cost: 1, capacity: price, volume: 0, mass: 0, units: 0 }, maxTypes, point);
    const [slope, volume, mass, units] = point.slope as unknown as readonly [number, number, number, number];
    return { at: price, value: point.value, slope, breaks: volume > 0 || mass > 0 || units > 0 };
  };
  let low = probe(0);
  let high = probe(dearest(pool));
  // A price at which each option is taken in full may still favour small cheap ones where types are few.
  for (let step = 0; step < 10 && high.slope > 0; step += 1) high = probe(4 * high.at);
  let best = low.value >= high.value ? low : high;
  for (let step = 0; step < 60 && low.slope > 0 && high.slope < 0; step += 1) {
    const crossing = (high.value - low.value + low.slope * low.at - high.slope * high.at) / (low.slope - high.slope);
    const at = step % 6 === 5 ? (low.at + high.at) / 2 : crossing;
    if (!(at > low.at && at < high.at)) break;
    const next = probe(at);
    const top = low.value + low.slope * (at - low.at);
    if (next.value > best.value) best = next;
    if (best.value >= climb.enough) return { at: best.at, value: best.value, broken: false };
    if (next.slope > 0) low = next;
    else high = next;
    const ceiling = low.value + low.slope * (high.at - low.at);
    if (ceiling - best.value <= 0.05 || high.at - low.at <= 1e-9 * high.at) break;
    if (at === crossing && next.value >= top - 0.01) break;
  }
  return { at: best.at, value: best.value, broken: low.breaks || high.breaks };
}

/** A price of capacity at which every option is taken in full. */
function dearest(pool: Pool): number {
  const { hullX, hullCost, capacity, start } = pool;
  let high = 1;
  for (let k = 0; k < pool.size; k += 1) {
    const last = start[k + 1]! - 1;
    const single = last === start[k]!;
    const rise = hullCost[last]! - (single ? 0 : hullCost[last - 1]!);
    const run = hullX[last]! - (single ? 0 : hullX[last - 1]!);
    const whole = hullCost[last]! / hullX[last]!;
    high = Math.max(high, (2 * Math.max(rise / run, whole)) / capacity[k]!);
  }
  return high;
}

const hillOf = (climb: Climb, live: readonly number[]): Hill => ({
  look: (at, slope) => {
    evaluateDual(climb.pool, pricesFrom(climb.weight, at), climb.maxTypes, climb.point);
    slope.set(climb.point.slope);
    return climb.point.value;
  },
  live,
  enough: climb.enough,
  fine: climb.weight === 1 ? 0.2 : 1e-9,
});

function climbFrom(
  climb: Climb,
  from: readonly number[],
  radius: number,
  live: readonly number[],
  steps: number,
): Ascent {
  const top = climbEllipsoid(hillOf(climb, live), from, radius, steps);
  return { prices: pricesFrom(climb.weight, top.at), value: top.value };
}

/** Prices whose bound on the cost is as high as was found; never below 0, and it stops early at `enough`. */
export function ascendCost(pool: Pool, maxTypes: number, enough: number): Ascent {
  const climb: Climb = { pool, maxTypes, weight: 1, point: dualPoint(), enough };
  const first = climbCapacity(climb);
  const alone: Ascent = { prices: pricesFrom(1, [first.at, 0, 0, 0]), value: first.value };
  if (!first.broken) return alone;
  const live = [0, ...liveRows(pool)];
  let best = alone;
  let radius = 3 * first.at + 1;
  for (let round = 0; round < 3; round += 1) {
    const p = best.prices;
    const next = climbFrom(climb, [p.capacity, p.volume, p.mass, p.units], radius, live, 45 * live.length);
    if (next.value <= best.value + Math.max(0.5, 1e-6 * best.value)) return next.value > best.value ? next : best;
    best = next;
    if (best.value >= enough) break;
    radius *= 4;
  }
  return best;
}

/** Climbs again from known prices, for a pool that has grown tighter. */
export function ascendFrom(pool: Pool, maxTypes: number, known: Multipliers, enough: number, steps: number): Ascent {
  const climb: Climb = { pool, maxTypes, weight: 1, point: dualPoint(), enough };
  const live = [0, ...liveRows(pool)];
  const from = [known.capacity, known.volume, known.mass, known.units];
  const radius = 0.3 * (known.capacity + known.volume + known.mass + known.units) + 1;
  return climbFrom(climb, from, radius, live, steps * live.length);
}

/**
 * Prices of the ceilings, that of capacity being 1, which show how little capacity they leave. A value above 0 proves that
 * the need cannot be met under the ceilings and the limit on types, whatever it costs.
 */
export function ascendFeasibility(pool: Pool, maxTypes: number): Ascent {
  const climb: Climb = { pool, maxTypes, weight: 0, point: dualPoint(), enough: 1e-9 };
  const start = climbFrom(climb, [1, 0, 0, 0], 0, [], 1);
  const live = liveRows(pool);
  if (live.length === 0 || start.value > 1e-9) return start;
  const next = climbFrom(
    climb,
    [1, 0.2, 0.2, 0.2].map((p, i) => (i === 0 || live.includes(i) ? p : 0)),
    2,
    live,
    40 * live.length,
  );
  return next.value > start.value ? next : start;
}
