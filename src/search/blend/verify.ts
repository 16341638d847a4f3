// Checks a certificate from the model alone. It shares no code with the search but the model's shape and the tolerance.
import type { BlendCertificate } from "./certificate.ts";
import { type BlendModel, type BlendOption, FIT_TOLERANCE } from "./model.ts";
import { trySurvivors, type VerifyColumn, WHOLE_SLACK } from "./verifySurvivors.ts";

export type Verdict =
  | { readonly verdict: "valid" }
  | { readonly verdict: "invalid"; readonly why: string }
  /** The survivors could not all be tried within the work allowed. */
  | { readonly verdict: "unsettled" };

const invalid = (why: string): Verdict => ({ verdict: "invalid", why });
const ROWS = ["volume", "mass", "units"] as const;

/** Whether the certificate proves what it claims. `work` bounds the trying of survivors. */
export function verifyCertificate(model: BlendModel, certificate: BlendCertificate, work = 5e6): Verdict {
  const { prices, cost, counts } = certificate;
  const weights = [prices.capacity, prices.volume, prices.mass, prices.units];
  if (!weights.every((price) => Number.isFinite(price) && price >= 0))
    return invalid("a price is not a number from 0 up");
  if (prices.cost !== 1 && !(prices.cost === 0 && cost === null))
    return invalid("the weight of the cost is neither 1 nor a plain 0");
  const fault = cost === null ? (counts.length > 0 ? "counts without a cost" : null) : claimFault(model, certificate);
  if (fault !== null) return invalid(fault);

  const shares = sharesOf(model);
  const columns = model.options.map((option) => columnOf(model, option, weights, shares));
  const least = columns.map((column) => leastReduced(column, prices.cost));
  const negative = least.filter((value) => value < 0).sort((a, b) => a - b);
  const best = negative.slice(0, model.maxTypes);
  const bound = best.reduce((sum, value) => sum + value, weights[0]! - weights[1]! - weights[2]! - weights[3]!);
  const size = weights.reduce((sum, price) => sum + price, 1);
  if (!(Math.abs(bound - certificate.bound) <= 1e-9 * size))
    return invalid("the bound does not follow from the prices");
  if (prices.cost === 0) {
    if (certificate.survivors.length > 0) return invalid("survivors beside a proof that needs none");
    return bound > 1e-10 ? { verdict: "valid" } : invalid("the bound does not show that no blend exists");
  }

  const threshold = cost ?? beyond(model);
  const slack = threshold - 1 + WHOLE_SLACK - bound;
  const bar = best.length < model.maxTypes ? 0 : best[best.length - 1]!;
  const listed = new Map<number, Set<number>>();
  for (const { option, strings } of certificate.survivors) {
    if (listed.has(option) || new Set(strings).size !== strings.length) return invalid("a survivor is listed twice");
    listed.set(option, new Set(strings));
  }
  const blur = 1e-9 * size;
  for (const [at, column] of columns.entries()) {
    const limit = slack + Math.min(least[at]!, bar);
    const mine = listed.get(at) ?? new Set<number>();
    for (let x = 1; x <= column.last; x += 1) {
      const reduced = column.option.costs[x]! + column.share - column.gain * x;
      if (mine.has(x) ? slack < -blur || reduced > limit + blur : slack > blur && reduced < limit - blur) {
        return invalid(
          mine.has(x) ? "a survivor is ruled out by the bound" : "a pair that the bound leaves open is missing",
        );
      }
    }
    for (const x of mine)
      if (!Number.isInteger(x) || x < 1 || x > column.last) return invalid("a survivor is no count of its option");
    listed.delete(at);
  }
  if (listed.size > 0) return invalid("a survivor is no option of the model");
  const offset = bound - best.reduce((sum, value) => sum + value, 0);
  const tried = trySurvivors(model, certificate, columns, threshold, offset, work);
  if (tried === "cheaper") return invalid("a cheaper blend exists among the survivors");
  return { verdict: tried === "none" ? "valid" : "unsettled" };
}

function claimFault(model: BlendModel, { cost, counts }: BlendCertificate): string | null {
  const sum = { cost: 0, capacity: 0, volume: 0, mass: 0, units: 0 };
  const parts = new Set<number>();
  const senders = new Set<number>();
  for (const { option: at, strings } of counts) {
    const option = model.options[at];
    if (!option || !Number.isInteger(strings) || strings < 1 || strings > option.maxStrings)
      return "a count cannot be had";
    if (parts.has(option.partIndex)) return "a part is used in two ways";
    parts.add(option.partIndex);
    sum.cost += option.costs[strings]!;
    for (const supplier of option.suppliers ?? []) senders.add(supplier);
    sum.capacity += option.capacity * strings;
    for (const row of ROWS) sum[row] += option[row] * strings;
  }
  if (counts.length > model.maxTypes) return "too many types";
  if (sum.capacity < model.requirement * (1 - FIT_TOLERANCE)) return "short of the requirement";
  for (const row of ROWS) if (sum[row] > model.ceilings[row] * (1 + FIT_TOLERANCE)) return `over the ceiling on ${row}`;
  for (const supplier of senders) sum.cost += model.shipments?.[supplier] ?? 0;
  return sum.cost === cost ? null : "the cost is not that of the counts";
}

/** As many string types as could come in one shipment each bear an equal part of it, in whole minor units: together never more. */
function sharesOf({ options, maxTypes, shipments = [] }: BlendModel): readonly number[] {
  return shipments.map((cost, supplier) => {
    const able = options.filter(({ maxStrings, suppliers }) => maxStrings > 0 && suppliers?.includes(supplier));
    const parts = new Set(able.map(({ partIndex }) => partIndex)).size;
    return Math.floor(cost / Math.max(1, Math.min(parts, maxTypes)));
  });
}

function columnOf(
  model: BlendModel,
  option: BlendOption,
  weights: readonly number[],
  shares: readonly number[],
): VerifyColumn {
  const need = model.requirement * (1 - FIT_TOLERANCE);
  const amounts = [option.capacity / need, ...ROWS.map((row) => part(option[row], model.ceilings[row]))];
  let last = 0;
  const fits = (x: number): boolean => amounts.every((amount, row) => row === 0 || amount * x <= 1 + 1e-12);
  // Beyond the count that meets the need alone, or over a ceiling alone, no blend gains anything.
  while (last < option.maxStrings && option.capacity * last < need && fits(last + 1)) last += 1;
  const gain = amounts.reduce((sum, amount, row) => sum + (row === 0 ? amount : -amount) * weights[row]!, 0);
  const share = (option.suppliers ?? []).reduce((sum, supplier) => sum + shares[supplier]!, 0);
  return { option, amounts, last, gain, share };
}

const part = (amount: number, ceiling: number): number =>
  amount === 0 || ceiling === Number.POSITIVE_INFINITY ? 0 : amount / (ceiling * (1 + FIT_TOLERANCE));

function leastReduced(column: VerifyColumn, weight: number): number {
  let low = Number.POSITIVE_INFINITY;
  const { costs } = column.option;
  for (let x = 1; x <= column.last; x += 1) low = Math.min(low, weight * (costs[x]! + column.share) - column.gain * x);
  return low;
}

function beyond(model: BlendModel): number {
  const last = model.options.map((option) => option.costs[option.maxStrings]!).sort((a, b) => b - a);
  const sent = (model.shipments ?? []).reduce((sum, cost) => sum + cost, 0);
  return 1 + sent + last.slice(0, model.maxTypes).reduce((sum, cost) => sum + cost, 0);
}
