// Tries every part, every series count and both ties, and keeps what does the job: exhaustive, one pass, no layout object made.

import { chargingWorst, FIT, leastParallel } from "../bank/index.ts";
import { type Capacitor, cheapest, toBuy } from "../catalog/index.ts";
import { minorDigits } from "../quantity/index.ts";
import { bestBalance, chainOf, newBalancing } from "./balancing.ts";
import { prepare } from "./candidate.ts";
import { sweepLimited } from "./limitedSweep.ts";
import { hasLimits } from "./limits.ts";
import type { RefusedPart } from "./result.ts";
import { riskJudge } from "./risk.ts";
import { type Judge, leastSeries, type Reason, type SweepInput } from "./sweepKinds.ts";
import { type LayoutTable, newTable, pushRow } from "./table.ts";

export { leastSeries, type SweepInput } from "./sweepKinds.ts";

export interface Sweep {
  readonly table: LayoutTable;
  readonly refused: readonly RefusedPart[];
}

const balancing = newBalancing();
const bill = { quantity: 0, cost: 0 };

/** Runs the whole search. `stopAtFirst` ends it at the first layout that fits, for asking whether anything does. */
export function sweep(input: SweepInput, stopAtFirst = false): Sweep {
  const table = newTable(Math.max(256, Math.min(input.parts.length * 32, 1 << 22)));
  const refused: RefusedPart[] = [];
  const judge = input.judge ?? (input.brief.basis === "statistical" ? riskJudge(input.brief) : null);
  const limited = hasLimits(input.brief) ? sweepLimited(input, table, judge) : null;
  for (let i = 0; i < input.parts.length; i++) {
    const reason = limited === null ? sweepPart(input, i, table, judge) : limited(i);
    if (reason !== null) refused.push({ part: (input.parts[i] as Capacitor).part, ...reason });
    if (stopAtFirst && table.count > 0) break;
  }
  return { table, refused };
}

function sweepPart(input: SweepInput, index: number, table: LayoutTable, judge: Judge): Reason | null {
  const { brief, families, required, currency } = input;
  const unit = input.parts[index] as Capacitor;
  const candidate = prepare(unit, brief);
  const voltage = brief.voltage * (1 + brief.overshoot);
  const minor = 10 ** minorDigits(currency ?? "");
  const worstSeries = leastSeries(voltage, candidate.limit, candidate.tolerance);
  const least = judge === null ? worstSeries : leastSeries(voltage, candidate.limit, null);
  if (least > brief.maxSeries) return { reason: "series-limit", value: least, limit: brief.maxSeries };
  const chain = chainOf(candidate, brief);
  const before = table.count;
  let why: Reason | null = null;
  const ceiling = (reason: string, value: number | null, limit: number | null): void => {
    if (why === null || why.reason === "balance" || why.reason === "risk") why = { reason, value, limit };
    else if (why.reason === reason && value !== null && why.value !== null && value < why.value) why.value = value;
  };
  for (let n = least; n <= brief.maxSeries; n++) {
    const p = leastParallel(required, n, candidate.basis);
    const units = n * p;
    if (units > brief.maxUnits) {
      ceiling("unit-limit", units, brief.maxUnits);
      break;
    }
    if (!cheapest(unit, units + brief.spares, bill)) {
      ceiling("stock", toBuy(unit, units + brief.spares), unit.available ?? null);
      break;
    }
    const capacitors = bill.cost;
    const volume = candidate.volume === null ? Number.POSITIVE_INFINITY : candidate.volume * units;
    const mass = candidate.mass === null ? Number.POSITIVE_INFINITY : candidate.mass * units;
    if (over(volume, brief.maxVolume)) {
      ceiling(
        candidate.volume === null ? "volume-unknown" : "volume-limit",
        finiteOrNull(volume),
        brief.maxVolume as number,
      );
      break;
    }
    if (over(mass, brief.maxMass)) {
      ceiling(candidate.mass === null ? "mass-unknown" : "mass-limit", finiteOrNull(mass), brief.maxMass as number);
      break;
    }
    let charging = Number.POSITIVE_INFINITY;
    if (n === 1) charging = voltage;
    else if (candidate.tolerance !== null) charging = chargingWorst(voltage, n, candidate.tolerance);
    for (let tied = n > 1 && p > 1 ? 1 : 0; tied >= 0; tied--) {
      let worst = charging;
      let resistors = 0;
      let family = -1;
      if (judge !== null && n < worstSeries) {
        const ties = tied === 1 ? "cross-tied" : "strings";
        const tolerance = candidate.tolerance ?? { low: 0, high: 0 };
        if (!judge({ tolerance, series: n, parallel: p, ties, share: candidate.limit / voltage })) {
          ceiling("risk", null, brief.risk);
          continue;
        }
      }
      if (n > 1 && chain !== null) {
        chain.series = n;
        chain.sharing = tied === 1 ? p : 1;
        if (!bestBalance(chain, candidate.limit, tied === 1 ? n : units, families, balancing)) {
          ceiling("balance", null, candidate.limit);
          continue;
        }
        family = balancing.family;
        worst = Math.max(worst, balancing.worst);
        resistors = Number.isFinite(balancing.cost) ? balancing.cost : 0;
      }
      const cost = capacitors + resistors;
      if (brief.maxCost !== undefined && over(cost / minor, brief.maxCost)) {
        ceiling(Number.isFinite(cost) ? "cost-limit" : "price-unknown", finiteOrNull(cost / minor), brief.maxCost);
        continue;
      }
      const stress = worst / unit.voltage;
      pushRow(table, { part: index, series: n, parallel: p, tied: tied === 1, family, cost, volume, mass, stress });
    }
  }
  return table.count > before ? null : (why ?? { reason: "series-limit", value: least, limit: brief.maxSeries });
}

const over = (value: number, limit: number | undefined): boolean => limit !== undefined && value > limit * (1 + FIT);
const finiteOrNull = (value: number): number | null => (Number.isFinite(value) ? value : null);
