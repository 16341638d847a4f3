// The cheapest blend that a judge accepts, by trying every blend in the order of cost: for limits that no row can say.
import { ascendCost } from "./ascent.ts";
import { BOUND_SLACK, type Multipliers } from "./dual.ts";
import { capacityNeeded, isFittingBlend, roomUnder, tidyCounts } from "./evaluate.ts";
import type { BlendLimits } from "./findBlend.ts";
import type { BlendCount, BlendModel } from "./model.ts";
import { buildPool } from "./pool.ts";
import { shipmentCost, withShares } from "./shipments.ts";
import type { FoundBlend } from "./singles.ts";

export interface AcceptedBlend {
  readonly status: "optimal" | "infeasible" | "stopped";
  readonly best: FoundBlend | null;
  /** No accepted blend costs less. */
  readonly lowerBound: number;
  /** Blends that cost less (or as much, and were tried first) and were turned down. */
  readonly rejected: number;
}

export interface AcceptLimits extends BlendLimits {
  /** Most blends judged; judging is the dear part. */
  readonly most?: number;
}

/** Blends kept of one band of cost before it is cut in two. */
const BAND = 20_000;
const FIRST_RISE = 0.005;

interface Column {
  readonly option: number;
  readonly part: number;
  readonly amounts: readonly number[];
  /** Counts and their reduced costs, best first. */
  readonly counts: readonly { readonly strings: number; readonly cost: number; readonly reduced: number }[];
}

/**
 * Walks up from the least cost in bands; in each, every blend that meets the need, also with strings beyond it, is judged, the
 * cheapest first. `known` is the least cost of any blend, by a search that was settled.
 */
export function findAccepted(
  model: BlendModel,
  known: number,
  accepts: (blend: FoundBlend) => boolean,
  limits: AcceptLimits = {},
): AcceptedBlend {
  const { most = 2000, work = 5e6, stop = () => false } = limits;
  const { columns, offset } = columnsOf(model);
  const beyond = costBeyondAll(model);
  const spent = { work: 0 };
  let rejected = 0;
  let low = known;
  let rise = Math.max(1, Math.ceil(known * FIRST_RISE));
  while (low < beyond) {
    const high = Math.min(beyond, low + rise);
    const band = { low, high, columns, offset };
    const found = blendsWithin(model, band, { spent, work, stop });
    if (found === "stopped") return { status: "stopped", best: null, lowerBound: low, rejected };
    if (found === "full") {
      if (rise === 1) return { status: "stopped", best: null, lowerBound: low, rejected };
      rise = Math.max(1, Math.floor(rise / 4));
      continue;
    }
    for (const blend of found.sort((a, b) => a.cost - b.cost || size(a) - size(b))) {
      if (rejected >= most || stop()) return { status: "stopped", best: null, lowerBound: blend.cost, rejected };
      if (accepts(blend)) return { status: "optimal", best: blend, lowerBound: blend.cost, rejected };
      rejected += 1;
    }
    low = high;
    rise *= 2;
  }
  return { status: "infeasible", best: null, lowerBound: Number.POSITIVE_INFINITY, rejected };
}

const size = ({ counts }: FoundBlend): number => counts.reduce((sum, { strings }) => sum + strings, 0);

const costBeyondAll = (model: BlendModel): number => {
  const last = model.options.map(({ costs, maxStrings }) => costs[maxStrings]!).sort((a, b) => b - a);
  const sent = (model.shipments ?? []).reduce((sum, cost) => sum + cost, 0);
  return last.slice(0, model.maxTypes).reduce((sum, cost) => sum + cost, 0) + sent + 1;
};

/** Every option with every count, at the prices of the bound; counts beyond the need are of use here. */
function columnsOf(model: BlendModel): { readonly columns: readonly Column[]; readonly offset: number } {
  const shared = withShares(model);
  const need = capacityNeeded(model.requirement);
  const pool = buildPool(shared, null, false);
  const prices: Multipliers = ascendCost(pool, model.maxTypes, Number.POSITIVE_INFINITY).prices;
  const { volume, mass, units } = model.ceilings;
  const rooms = [volume, mass, units].map((ceiling) => (ceiling === 0 ? 1 : roomUnder(ceiling)));
  const columns = shared.options.flatMap((option, at): Column[] => {
    const amounts = [
      option.capacity / need,
      ...[option.volume, option.mass, option.units].map((amount, row) => amount / rooms[row]!),
    ];
    const gain =
      prices.capacity * amounts[0]! -
      prices.volume * amounts[1]! -
      prices.mass * amounts[2]! -
      prices.units * amounts[3]!;
    const counts = Array.from({ length: option.maxStrings }, (_, x) => {
      const cost = option.costs[x + 1]!;
      return { strings: x + 1, cost, reduced: cost - gain * (x + 1) };
    });
    counts.sort((a, b) => a.reduced - b.reduced);
    return counts.length === 0 ? [] : [{ option: at, part: option.partIndex, amounts, counts }];
  });
  columns.sort((a, b) => a.counts[0]!.reduced - b.counts[0]!.reduced);
  return { columns, offset: prices.capacity - prices.volume - prices.mass - prices.units };
}

interface Band {
  readonly low: number;
  readonly high: number;
  readonly columns: readonly Column[];
  readonly offset: number;
}

/** All blends of a band of cost [low, high); `full` when there are too many. */
function blendsWithin(
  model: BlendModel,
  { low, high, columns, offset }: Band,
  budget: { readonly spent: { work: number }; readonly work: number; readonly stop: () => boolean },
): FoundBlend[] | "full" | "stopped" {
  const found: FoundBlend[] = [];
  const path: BlendCount[] = [];
  const parts: number[] = [];
  const limit = high - 1 + BOUND_SLACK;
  let end: "full" | "stopped" | null = null;
  const go = (from: number, left: number, reduced: number, sums: readonly number[]): void => {
    for (let at = from; at < columns.length && end === null; at += 1) {
      const column = columns[at]!;
      let rest = 0;
      for (let i = at + 1; i < Math.min(columns.length, at + left); i += 1)
        rest += Math.min(0, columns[i]!.counts[0]!.reduced);
      if (offset + reduced + rest + column.counts[0]!.reduced > limit) return;
      if (parts.includes(column.part)) continue;
      for (const count of column.counts) {
        if (offset + reduced + rest + count.reduced > limit || end !== null) break;
        budget.spent.work += 1;
        if (budget.spent.work >= budget.work || ((budget.spent.work & 1023) === 0 && budget.stop())) end = "stopped";
        const next = sums.map((sum, row) => sum + column.amounts[row]! * count.strings);
        if (next.some((sum, row) => row > 0 && sum > 1 + 1e-12)) continue;
        path.push({ option: column.option, strings: count.strings });
        parts.push(column.part);
        if (next[0]! >= 1 - 1e-12) keep();
        if (left > 1) go(at + 1, left - 1, reduced + count.reduced, next);
        path.pop();
        parts.pop();
      }
    }
  };
  const keep = (): void => {
    const sent = shipmentCost(
      model,
      path.map(({ option }) => option),
    );
    const cost = path.reduce((sum, { option, strings }) => sum + model.options[option]!.costs[strings]!, sent);
    if (cost < low || cost >= high || !isFittingBlend(model, path)) return;
    found.push({ counts: tidyCounts(path), cost });
    if (found.length > BAND) end = "full";
  };
  go(0, model.maxTypes, 0, [0, 0, 0, 0]);
  return end ?? found;
}
