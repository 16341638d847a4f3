// What-if by price: how far the price of a unit may move before another blend becomes the cheapest.
import { ascendCost } from "./ascent.ts";
import { standing } from "./core.ts";
import { wholeBound } from "./dual.ts";
import { tidyCounts } from "./evaluate.ts";
import { type BlendLimits, findBlend } from "./findBlend.ts";
import { type BlendCount, type BlendModel, FIT_TOLERANCE } from "./model.ts";
import { buildPool, usefulStrings } from "./pool.ts";
import { facts, shipmentCost, withShares } from "./shipments.ts";
import type { FoundBlend } from "./singles.ts";

export interface PriceSwitch {
  readonly option: number;
  readonly move: "rise" | "fall";
  /** Minor units of money a unit, not whole: at this change the other blend costs the same, beyond it less. */
  readonly perUnit: number;
  readonly next: FoundBlend;
  /** False when some search was stopped: a smaller change might do. */
  readonly proven: boolean;
}

/** The same choice with `strings` of one option settled; null when that alone breaks a ceiling. */
export function withSettled(model: BlendModel, { option: at, strings }: BlendCount): BlendModel | null {
  const settled = model.options[at]!;
  const slack = FIT_TOLERANCE;
  const rest = (name: "volume" | "mass" | "units"): number =>
    (model.ceilings[name] * (1 + slack) - settled[name] * strings) / (1 + slack);
  const ceilings = { volume: rest("volume"), mass: rest("mass"), units: rest("units") };
  if (Object.values(ceilings).some((room) => room < 0)) return null;
  const requirement = (model.requirement * (1 - slack) - settled.capacity * strings) / (1 - slack);
  const options = model.options.map((option) =>
    option.partIndex === settled.partIndex ? { ...facts(option), costs: new Float64Array(1), maxStrings: 0 } : option,
  );
  const sent = strings > 0 ? (settled.suppliers ?? []) : [];
  // What the settled strings have sent is paid for, whoever else is in it.
  const shipments = (model.shipments ?? []).map((cost, supplier) => (sent.includes(supplier) ? 0 : cost));
  return { options, requirement, ceilings, shipments, maxTypes: model.maxTypes - (strings > 0 ? 1 : 0) };
}

/** The cheapest blend with exactly so many strings of one option; null when there is none. */
export function bestWith(
  model: BlendModel,
  count: BlendCount,
  limits: BlendLimits = {},
): { readonly blend: FoundBlend | null; readonly proven: boolean } {
  const rest = withSettled(model, count);
  if (rest === null) return { blend: null, proven: true };
  const sent = count.strings > 0 ? shipmentCost(model, [count.option]) : 0;
  const own = model.options[count.option]!.costs[count.strings]! + sent;
  if (rest.requirement <= 0) return { blend: { counts: tidyCounts([count]), cost: own }, proven: true };
  if (rest.maxTypes < 1) return { blend: null, proven: true };
  const answer = findBlend(rest, limits);
  if (answer.best === null) return { blend: null, proven: answer.status === "infeasible" };
  return {
    blend: { counts: tidyCounts([...answer.best.counts, count]), cost: answer.best.cost + own },
    proven: answer.status === "optimal",
  };
}

/**
 * Moves of the price of one part's units at which the cheapest blend changes: a rise that sheds some of them, a fall that takes
 * more. `ways` are all options of the part. `bought` says how many units are paid for so many strings of one of them; unless
 * told, all that are in them.
 */
export function priceSwitches(
  model: BlendModel,
  cheapest: FoundBlend,
  ways: readonly number[],
  limits: BlendLimits = {},
  bought: (count: BlendCount) => number = ({ option, strings }) => model.options[option]!.units * strings,
): readonly PriceSwitch[] {
  const first = ways[0]!;
  const own = cheapest.counts.find(({ option }) => ways.includes(option)) ?? { option: first, strings: 0 };
  const now = bought(own);
  const floors = new Map(ways.map((option) => [option, costFloors(model, option)]));
  const others = [
    { option: first, strings: 0 },
    ...ways.flatMap((option) =>
      range(1, usefulStrings(model, model.options[option]!)).map((strings) => ({ option, strings })),
    ),
  ].filter(({ option, strings }) => option !== own.option || strings !== own.strings);
  const moves: PriceSwitch[] = [];
  for (const move of ["rise", "fall"] as const) {
    let best: PriceSwitch | null = null;
    let proven = true;
    // Nearest counts first: what they cost rules out those further off.
    const counts = others
      .map((count) => ({ count, apart: move === "rise" ? now - bought(count) : bought(count) - now }))
      // Where the same units are paid for, no price of theirs can tell the two apart.
      .filter(({ apart }) => apart > 0)
      .sort((a, b) => a.apart - b.apart);
    for (const { count, apart } of counts) {
      if (best !== null && (floors.get(count.option)!(count.strings) - cheapest.cost) / apart >= best.perUnit) continue;
      const other = bestWith(model, count, limits);
      proven &&= other.proven;
      if (other.blend === null) continue;
      const perUnit = Math.max(0, other.blend.cost - cheapest.cost) / apart;
      if (best === null || perUnit < best.perUnit)
        best = { option: count.option, move, perUnit, next: other.blend, proven: true };
    }
    if (best !== null) moves.push({ ...best, proven });
  }
  return moves;
}

const range = (first: number, last: number): number[] =>
  Array.from({ length: Math.max(0, last - first + 1) }, (_, at) => first + at);

/** Lower bounds on the cost of a blend with so many strings of one option, by the Lagrangian bound. */
function costFloors(given: BlendModel, option: number): (strings: number) => number {
  const model = withShares(given);
  const pool = buildPool(model, null, false);
  const { prices } = ascendCost(pool, model.maxTypes, Number.POSITIVE_INFINITY);
  const at = standing(pool, prices, model.maxTypes);
  const k = pool.option.subarray(0, pool.size).indexOf(option);
  if (k < 0) return () => 0;
  const gain =
    prices.capacity * pool.capacity[k]! -
    prices.volume * pool.volume[k]! -
    prices.mass * pool.mass[k]! -
    prices.units * pool.units[k]!;
  const { costs } = model.options[option]!;
  return (strings) =>
    strings === 0
      ? wholeBound(at.value)
      : wholeBound(at.value - Math.min(at.reduced[k]!, at.bar) + costs[strings]! - gain * strings);
}
