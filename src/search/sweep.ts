// Tries every part, every series count and both ties, and keeps what does the job: exhaustive, no layout object made.

import { chargingWorst, FIT, leastParallel, type Outlook } from "../bank/index.ts";
import { type Capacitor, cheapest, toBuy } from "../catalog/index.ts";
import { minorDigits } from "../quantity/index.ts";
import { bestBalance, chainOf, newBalancing, outlookOf } from "./balancing.ts";
import { prepare } from "./candidate.ts";
import { frontRows } from "./front.ts";
import { sweepLimited } from "./limitedSweep.ts";
import { hasLimits } from "./limits.ts";
import type { RefusedPart } from "./result.ts";
import { riskJudge } from "./risk.ts";
import { mayMatter, remember, type Sieve, sieveOf, type Wanted } from "./sieve.ts";
import { strongOf } from "./strong.ts";
import { type Judge, leastSeries, type Reason, type SweepInput } from "./sweepKinds.ts";
import { type Figures, type LayoutRow, type LayoutTable, newTable, noFigures, pushRow } from "./table.ts";

export { leastSeries, type SweepInput } from "./sweepKinds.ts";

export interface Sweep {
  /** All layouts that fit, or with a `wanted` those that may matter to it: the first of the order and the whole front. */
  readonly table: LayoutTable;
  /** How many fit, kept or not. */
  readonly count: number;
  readonly refused: readonly RefusedPart[];
}

export interface SweepOptions {
  /** End at the first layout that fits, for asking whether anything does. */
  readonly stopAtFirst?: boolean;
  /** Keep only what may matter; without it everything is kept. */
  readonly wanted?: Wanted | null;
}

const balancing = newBalancing();
const bill = { quantity: 0, cost: 0 };
const outlook: Outlook = { sure: false, floor: 0 };

interface Run {
  readonly input: SweepInput;
  readonly judge: Judge;
  readonly table: LayoutTable;
  sieve: Sieve | null;
  count: number;
}

/** At least so many parts are tried before the sieve is made. */
const FIRST_PARTS = 128;
/** Each pass over the parts takes so many times those of the pass before, and its sieve knows what that found. */
const PASS = 8;

/** Runs the whole search. */
export function sweep(input: SweepInput, { stopAtFirst = false, wanted = null }: SweepOptions = {}): Sweep {
  const { parts, brief } = input;
  const table = newTable(Math.max(256, Math.min(parts.length, wanted === null ? 1 << 17 : FIRST_PARTS) * 32));
  const judge = input.judge ?? (brief.basis === "statistical" ? riskJudge(brief) : null);
  if (hasLimits(brief)) return sweepByLimits(input, table, judge);
  const run: Run = { input, judge, table, sieve: null, count: 0 };
  const reasons: (Reason | null)[] = new Array(parts.length).fill(null);
  let stride = 1;
  if (wanted !== null) while (parts.length / (stride * PASS) >= FIRST_PARTS) stride *= PASS;
  let sample: readonly number[] = [];
  for (let seen = 0; stride >= 1; seen = stride, stride /= PASS) {
    if (wanted !== null && table.count > 0) {
      if (seen > 0 && sample.length === 0) sample = Array.from({ length: table.count }, (_, i) => i);
      run.sieve = sieveOf(table, strongOf(table, frontRows(table), sample), wanted);
    }
    for (let i = 0; i < parts.length; i += stride) {
      if (seen > 0 && i % seen === 0) continue;
      reasons[i] = sweepPart(run, i);
      if (stopAtFirst && run.count > 0) break;
    }
  }
  const refused: RefusedPart[] = [];
  reasons.forEach((reason, i) => {
    if (reason !== null) refused.push({ part: (parts[i] as Capacitor).part, ...reason });
  });
  return { table, count: run.count, refused };
}

/** The search under limits on shot, fault and life: each layout is worked out in full. */
function sweepByLimits(input: SweepInput, table: LayoutTable, judge: Judge): Sweep {
  const limited = sweepLimited(input, table, judge);
  const refused: RefusedPart[] = [];
  for (const [i, unit] of input.parts.entries()) {
    const reason = limited(i);
    if (reason !== null) refused.push({ part: unit.part, ...reason });
  }
  return { table, count: table.count, refused };
}

const row: LayoutRow & Figures = { ...noFigures(), part: 0, series: 1, parallel: 1, tied: false, family: -1 };

function sweepPart(run: Run, index: number): Reason | null {
  const { judge, table, sieve } = run;
  const { brief, families, required, currency, parts } = run.input;
  const unit = parts[index] as Capacitor;
  const candidate = prepare(unit, brief);
  const voltage = brief.voltage * (1 + brief.overshoot);
  const minor = 10 ** minorDigits(currency ?? "");
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
        if (sieve !== null && brief.maxCost === undefined) {
          // What fits and cannot matter is counted and not worked out: resistors only add to the cost, and holding to the stress.
          outlookOf(chain, candidate.limit, families, outlook);
          row.cost = capacitors;
          row.stress = Math.max(charging, outlook.floor) / unit.voltage;
          if (outlook.sure && !mayMatter(sieve, row)) {
            run.count++;
            continue;
          }
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
      if (sieve !== null && !mayMatter(sieve, row)) continue;
      pushRow(table, row);
      if (sieve !== null) remember(sieve, row);
    }
  }
  return run.count > before ? null : (why ?? { reason: "series-limit", value: least, limit: brief.maxSeries });
}

const over = (value: number, limit: number | undefined): boolean => limit !== undefined && value > limit * (1 + FIT);
const finiteOrNull = (value: number): number | null => (Number.isFinite(value) ? value : null);
