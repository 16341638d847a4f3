// The front door: brief and parts to ranked layouts, their front, every refusal, and what would have to give way.

import { leastParallel, requiredCapacitance } from "../bank/index.ts";
import { type Capacitor, DEFAULT_FAMILY, type Fuse, type ResistorFamily } from "../catalog/index.ts";
import { accepted, type Read, refused } from "../quantity/index.ts";
import { assess } from "./assess.ts";
import type { Brief } from "./brief.ts";
import { prepare } from "./candidate.ts";
import { leastChanges } from "./changes.ts";
import { planCurrency, pricedIn } from "./currency.ts";
import { frontRows } from "./front.ts";
import { improve } from "./improve.ts";
import { limitChanges } from "./limitChanges.ts";
import { hasLimits } from "./limits.ts";
import { comparison, firstRows, idOf, type Ranking, tiesOf } from "./rank.ts";
import type { LayoutResult, PlanResult, RefusedPart } from "./result.ts";
import { balanceMends } from "./sharing/mends.ts";
import { leastSeries, type SweepInput, sweep } from "./sweep.ts";
import type { Judge } from "./sweepKinds.ts";
import type { LayoutTable } from "./table.ts";

export interface PlanInput {
  readonly brief: Brief;
  readonly parts: readonly Capacitor[];
  /** Default: the assumed family. */
  readonly families?: readonly ResistorFamily[];
  /** Fuses to choose from where the brief asks for them. */
  readonly fuses?: readonly Fuse[] | null;
  /** How many layouts are worked out in full; 0 for all. Default 20. */
  readonly limit?: number;
  readonly rank?: Ranking;
  /** Leave out the search for least changes when nothing fits (a form that plans at every key). */
  readonly quick?: boolean;
  /** With the measured basis: whether the measured units, placed, share safely in a shape. */
  readonly judge?: Judge;
  /** Called after each part: how many are done, of how many. */
  readonly progress?: ((done: number, total: number) => void) | undefined;
  /** With the statistical basis: measured capacitances of the only part, F, at least LEAST_LOT; units are drawn from them. */
  readonly lot?: readonly number[];
}

/** Up to so many layouts asked for, from so many parts on, the search keeps only what may be among them or on the front: less is done faster whole. */
const MOST_SIEVED = 1000;
const SIEVED_FROM = 500;

/** Plans. Refuses only what cannot be understood (two currencies); nothing fitting is an answer, with its least changes. */
export function plan(input: PlanInput): Read<PlanResult> {
  const { brief, limit = 20, rank = "cost", quick = false } = input;
  const given = input.families ?? [DEFAULT_FAMILY];
  if (brief.fused === true && !input.fuses?.length) {
    const want = "a fuse catalogue to choose from; or leave the fuses out of the brief";
    return refused({ code: "missing-value", place: { field: "fuses" }, read: "nothing", want });
  }
  const money = planCurrency(brief, input.fuses ? [...input.parts, ...input.fuses] : input.parts, given);
  if (!money.ok) return money;
  const currency = money.value;
  const parts = pricedIn(distinct(input.parts), currency, brief);
  const families = pricedIn(given, currency, brief);
  const required = requiredCapacitance(brief);
  const fuses = input.fuses ? pricedIn(input.fuses, currency, brief) : null;
  const work: SweepInput = {
    parts,
    families,
    brief,
    required,
    currency,
    fuses,
    judge: input.judge ?? null,
    progress: input.progress,
    lot: input.lot,
  };
  const wanted = parts.length >= SIEVED_FROM && limit > 0 && limit <= MOST_SIEVED ? { limit, rank } : null;
  const { table, count, refused: refusals } = sweep(work, { wanted });
  const rows = firstRows(table.count, limit, comparison(table, parts, rank));
  const layouts = rows.map((row) => layoutAt(work, table, row));
  return accepted({
    brief,
    required: { capacitance: required },
    searched: { parts: parts.length, layouts: count, proof: "exhaustive" },
    currency,
    layouts,
    front: frontRows(table).map((row) => idOf(table, parts, row)),
    refused: quick ? refusals : withMends(work, refusals),
    changes: count > 0 || quick ? [] : hasLimits(brief) ? limitChanges(work) : leastChanges(work),
    ...(brief.basis === "statistical" && !quick ? { worstCase: bestOfWorstCase(input) } : {}),
    ...(quick ? {} : { improve: improveBest(work, layouts[0]) }),
    notes: notesOf(brief),
  });
}

/** Parts by their first row: a name that stands twice would give two layouts one name. */
export function distinct(parts: readonly Capacitor[]): readonly Capacitor[] {
  // The rows of one catalogue in order: its reader has refused every name that stands twice. A set of 100,000 names costs a quarter of the search.
  if (parts.every(({ file, line }, i) => i === 0 || (file === parts[0]?.file && line > (parts[i - 1]?.line ?? 0))))
    return parts;
  const seen = new Set<string>();
  for (const unit of parts) seen.add(unit.part);
  if (seen.size === parts.length) return parts;
  seen.clear();
  return parts.filter((unit) => !seen.has(unit.part) && seen.add(unit.part));
}

/** Refused parts for which mends are worked out; each takes some hundred tries. */
const MENDED = 40;

/** For the first parts that no balancing resistor keeps safe: what would. */
function withMends(work: SweepInput, refusals: readonly RefusedPart[]): readonly RefusedPart[] {
  const { brief, families, required } = work;
  const voltage = brief.voltage * (1 + brief.overshoot);
  let left = MENDED;
  return refusals.map((one) => {
    const unit = one.reason === "balance" && left-- > 0 ? work.parts.find(({ part }) => part === one.part) : undefined;
    if (unit === undefined) return one;
    const { limit, tolerance, basis } = prepare(unit, brief);
    const series = Math.max(2, leastSeries(voltage, limit, tolerance));
    const shape = { series, parallel: leastParallel(required, series, basis), ties: "strings" } as const;
    return { ...one, mends: balanceMends({ unit, brief, families, shape }) };
  });
}

function improveBest({ parts, brief, families, currency, fuses = null }: SweepInput, best: LayoutResult | undefined) {
  const unit = best && parts.find(({ part }) => part === best.part);
  return best && unit ? improve({ result: best, unit, brief, families, currency, fuses }) : null;
}

/** What the same brief takes when every unit may be at its worst: the price of certainty. */
function bestOfWorstCase(input: PlanInput): LayoutResult | null {
  const worst = plan({ ...input, brief: { ...input.brief, basis: "worst case" }, limit: 1, quick: true });
  return worst.ok ? (worst.value.layouts[0] ?? null) : null;
}

/** One row of the table in full. */
function layoutAt(work: SweepInput, table: LayoutTable, row: number): LayoutResult {
  const unit = work.parts[table.part[row] as number] as Capacitor;
  const layout = {
    part: unit.part,
    series: table.series[row] as number,
    parallel: table.parallel[row] as number,
    ties: tiesOf(table, row),
  };
  const { brief, families, currency, fuses = null, lot } = work;
  return assess({ unit, layout, brief, families, currency, fuses, ...(lot === undefined ? {} : { lot }) });
}

function notesOf(brief: Brief): readonly string[] {
  const notes: string[] = [];
  if (brief.ageing > 0) notes.push("Ageing is counted in energy and not in sharing: units of one bank age alike.");
  if (brief.basis === "nominal")
    notes.push("The nominal basis counts nominal capacitance for energy; sharing is still the worst case.");
  if (brief.basis === "statistical") {
    notes.push(
      "The statistical basis bears a stated risk while charging; energy still counts every unit at its lowest, because a lot may lie low as a whole, and holding is still the worst case.",
    );
  }
  return notes;
}
