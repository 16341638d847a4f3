// The proof of a blend as plain data: prices, what they bound, the blend, and every option that the bound leaves open.
import { type Ascent, ascendFrom } from "./ascent.ts";
import { buildCore } from "./core.ts";
import { BOUND_SLACK, dualPoint, evaluateDual, type Multipliers } from "./dual.ts";
import { type BlendAnswer, NO_PRICES } from "./findBlend.ts";
import type { BlendCount, BlendModel } from "./model.ts";
import { buildPool } from "./pool.ts";
import { allShipments, withShares } from "./shipments.ts";

export interface BlendCertificate {
  /** The claim: this blend is the cheapest; null with no counts claims that no blend exists. */
  readonly cost: number | null;
  readonly counts: readonly BlendCount[];
  readonly prices: Multipliers;
  /** Value of the Lagrangian bound at the prices, over all options, each charged its share of the shipments it needs. */
  readonly bound: number;
  /** Every option and count that a cheaper blend could use by that bound: all else is ruled out by arithmetic alone. */
  readonly survivors: readonly { readonly option: number; readonly strings: readonly number[] }[];
}

/** One more than any blend of so many types could cost, from the last entries of the tables. */
export function costBeyond(model: BlendModel): number {
  const last = model.options.map((option) => option.costs[option.maxStrings]!).sort((a, b) => b - a);
  return last.slice(0, model.maxTypes).reduce((sum, cost) => sum + cost, 0) + allShipments(model) + 1;
}

/** Writes the proof of a settled answer; null when the search was stopped. Builds every cost table. */
export function certify(model: BlendModel, answer: BlendAnswer): BlendCertificate | null {
  if (answer.status === "stopped") return null;
  const cost = answer.best?.cost ?? null;
  const counts = answer.best?.counts ?? [];
  const shared = withShares(model);
  const pool = buildPool(shared, null, true);
  const point = dualPoint();
  if (cost === null && answer.prices.cost === 0) {
    evaluateDual(pool, answer.prices, model.maxTypes, point);
    return { cost, counts, prices: answer.prices, bound: point.value, survivors: [] };
  }
  const threshold = cost ?? costBeyond(model);
  evaluateDual(pool, answer.prices, model.maxTypes, point);
  const known: Ascent = { prices: answer.prices, value: point.value };
  const more = ascendFrom(pool, model.maxTypes, answer.prices, threshold, 20);
  const { prices } = more.value > known.value ? more : known;
  evaluateDual(pool, prices, model.maxTypes, point);
  // Costs are whole: a bound above cost - 1 leaves nothing to try, and the verifier wants no survivors then.
  const settled = point.value >= threshold - 1 + BOUND_SLACK;
  const survivors = settled
    ? []
    : buildCore(shared, pool, prices, threshold).columns.map(({ option, strings }) => ({
        option,
        strings: [...strings].sort((a, b) => a - b),
      }));
  survivors.sort((a, b) => a.option - b.option);
  return { cost, counts, prices: prices ?? NO_PRICES, bound: point.value, survivors };
}

/** The pairs of a certificate, for an outside engine. */
export const certificatePairs = (certificate: BlendCertificate): BlendCount[] =>
  certificate.survivors.flatMap(({ option, strings }) => strings.map((x) => ({ option, strings: x })));
