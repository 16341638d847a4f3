/*
 * The measured basis of a plan: the least series count that the units themselves support, each shape judged by placing them.
 *
 *   part as measured   C the mean of the lot, tolerance its extremes and the meter's doubt u, leakage its greatest, stock its count
 *   a shape shares     V_worst (1 + 2 u/sqrt(n_p)) <= limit, V_worst of the units placed in it
 *
 * Holding and what a dump leaves are the worst case of the lot. Source: [methods-derived] shares of the placed stages.
 */
import { bankCapacitance, FIT, pulseEnergy } from "../bank/index.ts";
import type { Capacitor, ResistorFamily } from "../catalog/index.ts";
import { accepted, type Read } from "../quantity/index.ts";
import { type Brief, type Judge, type LayoutResult, type PlanResult, plan, type Ranking } from "../search/index.ts";
import { place } from "./place.ts";
import type { Placing } from "./placing.ts";
import { DEFAULTS } from "./request.ts";
import { lotUncertainty, type MeasuredUnit, type Ties } from "./unit.ts";

export interface MeasuredPlanInput {
  readonly brief: Brief;
  /** The part that was measured, as its catalogue has it. */
  readonly part: Capacitor;
  /** Two or more units of it. */
  readonly units: readonly MeasuredUnit[];
  readonly families: readonly ResistorFamily[];
  readonly limit: number;
  readonly rank: Ranking;
  /** u, relative. */
  readonly uncertainty?: number;
}

/** What the units do in one layout, placed. */
export interface PlacedShare {
  readonly id: string;
  /** Worst voltage while charging with the meter's doubt, V. */
  readonly charging: number;
  readonly gap: number;
  /** F and J of the units that would be fitted. */
  readonly capacitance: number;
  readonly energy: number;
}

export interface MeasuredPlan {
  readonly result: PlanResult;
  /** One for each layout that is listed. */
  readonly placed: readonly PlacedShare[];
  /** The layout of fewest in series (then units), placed; null when none does it. */
  readonly least: LayoutResult | null;
  /** The same by the datasheet's worst case, from as many units not measured. */
  readonly worstCase: LayoutResult | null;
}

/** A quick placing: certified to a tenth of what the meter can tell, or the best of some milliseconds. */
const MOVES = 300_000;

/** The catalogue's row with what was measured in place of what was promised. */
export function partAsMeasured(part: Capacitor, units: readonly MeasuredUnit[], uncertainty: number): Capacitor {
  const values = units.map((unit) => unit.capacitance);
  const mean = values.reduce((sum, c) => sum + c, 0) / values.length;
  const leakages = units.flatMap((unit) => (unit.leakage === undefined ? [] : [unit.leakage]));
  const measured = { state: "measured" } as const;
  const known = leakages.length === units.length;
  return {
    ...part,
    capacitance: mean,
    tolerance: {
      low: 1 - (Math.min(...values) / mean) * (1 - uncertainty),
      high: (Math.max(...values) / mean) * (1 + uncertainty) - 1,
    },
    ...(known ? { leakage: Math.max(...leakages) } : {}),
    onHand: units.length,
    // A unit that was not measured cannot be placed.
    available: 0,
    states: { ...part.states, capacitance: measured, tolerance: measured, ...(known ? { leakage: measured } : {}) },
  };
}

/** Plans with the measured units; every listed layout comes with what they do in it. */
export function measuredPlan(input: MeasuredPlanInput): Read<MeasuredPlan> {
  const { brief, units, families, limit, rank } = input;
  const uncertainty = input.uncertainty ?? lotUncertainty(units) ?? DEFAULTS.uncertainty;
  const known = new Map<string, Placing | null>();
  const placed = (series: number, parallel: number, ties: Ties): Placing | null => {
    const key = `${series} ${parallel} ${ties}`;
    const before = known.get(key);
    if (before !== undefined) return before;
    const read =
      series * parallel > units.length
        ? null
        : place(units, { series, parallel, ties, uncertainty, goal: "charging", stopAtFloor: true, moves: MOVES });
    const made = read?.ok ? read.value : null;
    known.set(key, made);
    return made;
  };
  const judge: Judge = ({ series, parallel, ties, share }) => {
    const made = placed(series, parallel, ties);
    return made !== null && made.charging.worst * (1 + made.charging.plusMinus) <= share * (1 + FIT);
  };
  const part = partAsMeasured(input.part, units, uncertainty);
  const read = plan({ brief, parts: [part], families, limit, rank, judge });
  if (!read.ok) return read;
  const stock = { ...input.part, onHand: units.length, available: 0 };
  const all = { families, limit: 0, rank, quick: true } as const;
  const every = plan({ ...all, brief, parts: [part], judge });
  const worst = plan({ ...all, brief: { ...brief, basis: "worst case" }, parts: [stock] });
  const capacitance = new Map(units.map((unit) => [unit.serial, unit.capacitance]));
  const shares = read.value.layouts.flatMap((layout): PlacedShare[] => {
    const made = placed(layout.series, layout.parallel, layout.ties);
    if (made === null) return [];
    const total = bankOf(made, (serial) => capacitance.get(serial) ?? 0) * (1 - brief.ageing);
    const { worst: share, plusMinus, gap } = made.charging;
    const voltage = brief.voltage * (1 + brief.overshoot);
    const charging = voltage * share * (1 + plusMinus);
    return [
      { id: layout.id, charging, gap, capacitance: total, energy: pulseEnergy(total, brief.voltage, brief.ripple) },
    ];
  });
  return accepted({
    result: read.value,
    placed: shares,
    least: every.ok ? fewest(every.value.layouts) : null,
    worstCase: worst.ok ? fewest(worst.value.layouts) : null,
  });
}

const fewest = (layouts: readonly LayoutResult[]): LayoutResult | null =>
  [...layouts].sort((a, b) => a.series - b.series || a.units - b.units || a.id.localeCompare(b.id, "en"))[0] ?? null;

/** Capacitance of the placed bank, F. */
function bankOf({ ties, groups }: Placing, of: (serial: string) => number): number {
  const sums = groups.map((group) => group.map(of));
  const seriesOf = (values: readonly number[]): number => 1 / values.reduce((sum, c) => sum + 1 / c, 0);
  if (ties === "strings") return sums.reduce((sum, string) => sum + seriesOf(string), 0);
  return seriesOf(
    sums.map((stage) =>
      bankCapacitance(
        stage.reduce((sum, c) => sum + c, 0),
        1,
        1,
      ),
    ),
  );
}
