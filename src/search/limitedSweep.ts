// The search of one part when the brief limits its shot or its faults, or asks for protection, whose cost then counts: every shape, and from the least parallel count on upward
// until a shape keeps the limits, because more in parallel is what lowers a unit's current.
//
// Apart from the plain sweep, which is written for speed; a test holds the two together where no limit binds.

import { chargingWorst, FIT, leastParallel } from "../bank/index.ts";
import { type Capacitor, cheapest, toBuy } from "../catalog/index.ts";
import { minorDigits, tenTo } from "../quantity/index.ts";
import { bestBalance, chainOf, newBalancing } from "./balancing.ts";
import { type Candidate, prepare } from "./candidate.ts";
import { type Broken, limitJudge } from "./limits.ts";
import { isProtected, protectionCost, protectionOf } from "./protection.ts";
import { type Judge, leastSeries, type Reason, type SweepInput } from "./sweepKinds.ts";
import { type LayoutTable, pushRow } from "./table.ts";

const over = (value: number, limit: number | undefined): boolean => limit !== undefined && value > limit * (1 + FIT);
const finiteOrNull = (value: number): number | null => (Number.isFinite(value) ? value : null);

/** Room, mass and money that one count of units takes, or the ceiling that it breaks. */
interface Bulk {
  readonly cost: number;
  readonly volume: number;
  readonly mass: number;
}

/** A broken ceiling. Every one of them is broken by more units too. */
type Weighed = { readonly ok: true; readonly bulk: Bulk } | { readonly ok: false; readonly reason: Reason };

function weigh({ brief }: SweepInput, candidate: Candidate, units: number): Weighed {
  const { unit } = candidate;
  const full = (reason: string, value: number | null, limit: number | null): Weighed => ({
    ok: false,
    reason: { reason, value, limit },
  });
  if (units > brief.maxUnits) return full("unit-limit", units, brief.maxUnits);
  const bill = { quantity: 0, cost: 0 };
  if (!cheapest(unit, units + brief.spares, bill))
    return full("stock", toBuy(unit, units + brief.spares), unit.available ?? null);
  const volume = candidate.volume === null ? Number.POSITIVE_INFINITY : candidate.volume * units;
  const mass = candidate.mass === null ? Number.POSITIVE_INFINITY : candidate.mass * units;
  if (over(volume, brief.maxVolume)) {
    const reason = candidate.volume === null ? "volume-unknown" : "volume-limit";
    return full(reason, finiteOrNull(volume), brief.maxVolume as number);
  }
  if (over(mass, brief.maxMass)) {
    const reason = candidate.mass === null ? "mass-unknown" : "mass-limit";
    return full(reason, finiteOrNull(mass), brief.maxMass as number);
  }
  return { ok: true, bulk: { cost: bill.cost, volume, mass } };
}

/** Why a part gives nothing: the first reason that is more than a matter of resistors or chances, at its least value. */
function keeper(): { readonly keep: (next: Reason) => void; readonly kept: () => Reason | null } {
  let why: Reason | null = null;
  return {
    keep: (next) => {
      const soft = why === null || why.reason === "balance" || why.reason === "risk";
      if (soft) why = { ...next };
      else if (why?.reason === next.reason && next.value !== null && why.value !== null && next.value < why.value)
        why.value = next.value;
    },
    kept: () => why,
  };
}

/** The search of each part by its number; the reason when it gives no layout. */
export function sweepLimited(input: SweepInput, table: LayoutTable, judge: Judge): (part: number) => Reason | null {
  const { brief, families, required, currency } = input;
  const limits = limitJudge(brief);
  const voltage = brief.voltage * (1 + brief.overshoot);
  const minor = tenTo(minorDigits(currency ?? ""));
  const balancing = newBalancing();
  const guarded = isProtected(brief);
  const stock = { fuses: input.fuses ?? null, currency };
  return (part) => {
    const unit = input.parts[part] as Capacitor;
    const candidate = prepare(unit, brief);
    const worstSeries = leastSeries(voltage, candidate.limit, candidate.tolerance);
    const least = judge === null ? worstSeries : leastSeries(voltage, candidate.limit, null);
    const bySeries = { reason: "series-limit", value: least, limit: brief.maxSeries };
    if (least > brief.maxSeries) return bySeries;
    const chain = chainOf(candidate, brief);
    const before = table.count;
    const { keep, kept } = keeper();

    /** Tries one shape: pushed and settled, settled without a chance, or worth more in parallel. */
    const tries = (n: number, p: number, tied: boolean, bulk: Bulk): "settled" | "more" => {
      const ties = tied ? "cross-tied" : "strings";
      let worst = Number.POSITIVE_INFINITY;
      if (n === 1) worst = voltage;
      else if (candidate.tolerance !== null) worst = chargingWorst(voltage, n, candidate.tolerance);
      if (judge !== null && n < worstSeries) {
        const tolerance = candidate.tolerance ?? { low: 0, high: 0 };
        if (!judge({ tolerance, series: n, parallel: p, ties, share: candidate.limit / voltage })) {
          keep({ reason: "risk", value: null, limit: brief.risk });
          return "settled";
        }
      }
      let [resistors, family] = [0, -1];
      if (n > 1 && chain !== null) {
        chain.series = n;
        chain.sharing = tied ? p : 1;
        if (!bestBalance(chain, candidate.limit, tied ? n : n * p, families, balancing)) {
          keep({ reason: "balance", value: null, limit: candidate.limit });
          return "settled";
        }
        family = balancing.family;
        worst = Math.max(worst, balancing.worst);
        resistors = Number.isFinite(balancing.cost) ? balancing.cost : 0;
      }
      const known = n === 1 || chain !== null ? worst : Number.POSITIVE_INFINITY;
      const guards = guarded ? protectionOf(brief, { unit, series: n, parallel: p, ties, worst: known }, stock) : [];
      if (typeof guards === "string") {
        keep({ reason: "no-fuse", value: null, limit: null });
        return guards === "more" ? "more" : "settled";
      }
      const cost = bulk.cost + resistors + protectionCost(guards);
      if (brief.maxCost !== undefined && over(cost / minor, brief.maxCost)) {
        const reason = Number.isFinite(cost) ? "cost-limit" : "price-unknown";
        keep({ reason, value: finiteOrNull(cost / minor), limit: brief.maxCost });
        return "settled";
      }
      const broken: Broken | null =
        limits === null ? null : limits({ unit, series: n, parallel: p, ties, worst: known });
      if (broken !== null) {
        keep({ reason: broken.reason, value: broken.value, limit: broken.limit });
        return broken.stuck ? "settled" : "more";
      }
      const { volume, mass } = bulk;
      const stress = worst / unit.voltage;
      pushRow(table, { part, series: n, parallel: p, tied, family, cost, volume, mass, stress });
      return "settled";
    };

    for (let n = least; n <= brief.maxSeries; n++) {
      const first = leastParallel(required, n, candidate.basis);
      const open = new Set([true, false]);
      let full = false;
      for (let p = first; open.size > 0; p++) {
        const weighed = weigh(input, candidate, n * p);
        if (!weighed.ok) {
          if (p === first) keep(weighed.reason);
          full = p === first;
          break;
        }
        // one in series or in parallel counts once, as strings; more in parallel then opens the other tie again
        const shapes = n > 1 && p > 1 ? [true, false] : [false];
        for (const tied of shapes)
          if (open.has(tied) && tries(n, p, tied, weighed.bulk) === "settled") open.delete(tied);
        if (n === 1) open.delete(true);
        if (p === 1 && !open.has(false)) open.delete(true);
      }
      if (full) break;
    }
    return table.count > before ? null : (kept() ?? bySeries);
  };
}
