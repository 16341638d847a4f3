// Tries one part at every series count and both ties, and pushes what may matter to a table; no layout object is made.

import { chargingWorst, FIT, leastParallel } from "../bank/index.ts";
import { type Capacitor, cheapest, leastBuyable, toBuy } from "../catalog/index.ts";
import { minorDigits, tenTo } from "../quantity/index.ts";
import { bestBalance, chainOf, holdingFloor, newBalancing, type SearchChain, surelyBalances } from "./balancing.ts";
import { type Candidate, prepare } from "./candidate.ts";
import { mayMatter, remember, type Sieve } from "./sieve.ts";
import { type Judge, leastSeries, type Reason, type SweepInput } from "./sweepKinds.ts";
import { type Figures, type LayoutRow, type LayoutTable, noFigures, pushRow } from "./table.ts";

const balancing = newBalancing();
const bill = { quantity: 0, cost: 0 };

export interface Run {
  readonly input: SweepInput;
  readonly judge: Judge;
  readonly table: LayoutTable;
  sieve: Sieve | null;
  count: number;
}

const row: LayoutRow & Figures = { ...noFigures(), part: 0, series: 1, parallel: 1, tied: false, family: -1 };

/** Why the part gives no layout, or null when it gives some: counted in `run`, and kept in its table as its sieve allows. */
export function sweepPart(run: Run, index: number): Reason | null {
  const { judge, table, sieve } = run;
  const { brief, families, required, currency, parts } = run.input;
  const unit = parts[index] as Capacitor;
  const candidate = prepare(unit, brief);
  const voltage = brief.voltage * (1 + brief.overshoot);
  const minor = tenTo(minorDigits(currency ?? ""));
  const worstSeries = leastSeries(voltage, candidate.limit, candidate.tolerance);
  const least = judge === null ? worstSeries : leastSeries(voltage, candidate.limit, null);
  if (least > brief.maxSeries) return { reason: "series-limit", value: least, limit: brief.maxSeries };
  const chain = chainOf(candidate, brief);
  const before = run.count;
  let why: Reason | null = null;
  const ceiling = (reason: string, value: number | null, limit: number | null): void => {
    if (why === null || why.reason === "balance" || why.reason === "risk") why = { reason, value, limit };
    else if (why.reason === reason && value !== null && why.value !== null && value < why.value) why.value = value;
  };
  row.part = index;
  // From the first n whose units, cost and size, with the least stress that any later n has, cannot matter, no later n can: all of them only
  // rise with n. Those are counted and not worked out further.
  const floor = sieve === null ? 0 : stressFloor(run.input, candidate, chain, Math.max(2, least));
  let settled = false;
  for (let n = least; n <= brief.maxSeries; n++) {
    const p = leastParallel(required, n, candidate.basis);
    const units = n * p;
    if (units > brief.maxUnits) {
      ceiling("unit-limit", units, brief.maxUnits);
      break;
    }
    const needed = units + brief.spares;
    if (settled ? leastBuyable(unit, needed) === null : !cheapest(unit, needed, bill)) {
      ceiling("stock", toBuy(unit, needed), unit.available ?? null);
      break;
    }
    const capacitors = bill.cost;
    row.series = n;
    row.parallel = p;
    row.units = units;
    row.volume = candidate.volume === null ? Number.POSITIVE_INFINITY : candidate.volume * units;
    row.mass = candidate.mass === null ? Number.POSITIVE_INFINITY : candidate.mass * units;
    if (over(row.volume, brief.maxVolume)) {
      const reason = candidate.volume === null ? "volume-unknown" : "volume-limit";
      ceiling(reason, finiteOrNull(row.volume), brief.maxVolume as number);
      break;
    }
    if (over(row.mass, brief.maxMass)) {
      const reason = candidate.mass === null ? "mass-unknown" : "mass-limit";
      ceiling(reason, finiteOrNull(row.mass), brief.maxMass as number);
      break;
    }
    let charging = Number.POSITIVE_INFINITY;
    if (n === 1) charging = voltage;
    else if (candidate.tolerance !== null) charging = chargingWorst(voltage, n, candidate.tolerance);
    if (sieve !== null && !settled && n > 1 && brief.maxCost === undefined) {
      row.cost = capacitors;
      row.stress = floor / unit.voltage;
      settled = !mayMatter(sieve, row);
    }
    for (let tied = n > 1 && p > 1 ? 1 : 0; tied >= 0; tied--) {
      if (judge !== null && n < worstSeries) {
        const ties = tied === 1 ? "cross-tied" : "strings";
        const tolerance = candidate.tolerance ?? { low: 0, high: 0 };
        if (!judge({ tolerance, series: n, parallel: p, ties, share: candidate.limit / voltage })) {
          ceiling("risk", null, brief.risk);
          continue;
        }
      }
      let worst = charging;
      let resistors = 0;
      row.family = -1;
      if (n > 1 && chain !== null) {
        chain.series = n;
        chain.sharing = tied === 1 ? p : 1;
        if (settled && surelyBalances(chain, candidate.limit, families)) {
          run.count++;
          continue;
        }
        if (!bestBalance(chain, candidate.limit, tied === 1 ? n : units, families, balancing)) {
          ceiling("balance", null, candidate.limit);
          continue;
        }
        row.family = balancing.family;
        worst = Math.max(worst, balancing.worst);
        resistors = Number.isFinite(balancing.cost) ? balancing.cost : 0;
      }
      row.cost = capacitors + resistors;
      if (brief.maxCost !== undefined && over(row.cost / minor, brief.maxCost)) {
        const reason = Number.isFinite(row.cost) ? "cost-limit" : "price-unknown";
        ceiling(reason, finiteOrNull(row.cost / minor), brief.maxCost);
        continue;
      }
      run.count++;
      row.stress = worst / unit.voltage;
      row.tied = tied === 1;
      if (settled || (sieve !== null && !mayMatter(sieve, row))) continue;
      pushRow(table, row);
      if (sieve !== null) remember(sieve, row);
    }
  }
  return run.count > before ? null : (why ?? { reason: "series-limit", value: least, limit: brief.maxSeries });
}

/** The least worst voltage of any layout of this part from `series` (two or more) to the brief's limit, both ties. */
function stressFloor(
  { brief, families }: SweepInput,
  candidate: Candidate,
  chain: SearchChain | null,
  series: number,
): number {
  if (candidate.tolerance === null) return Number.POSITIVE_INFINITY;
  const charging = chargingWorst(brief.voltage * (1 + brief.overshoot), brief.maxSeries, candidate.tolerance);
  if (chain === null) return charging;
  chain.series = series;
  return Math.max(charging, holdingFloor(chain, candidate.limit, families, brief.maxSeries));
}

const over = (value: number, limit: number | undefined): boolean => limit !== undefined && value > limit * (1 + FIT);
const finiteOrNull = (value: number): number | null => (Number.isFinite(value) ? value : null);
