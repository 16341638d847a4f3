// When no balancing resistor will do: how many more stages, how tight a resistor or how much less voltage would mend it, each found by trying.

import { chargingWorst, FIT } from "../../bank/index.ts";
import type { Capacitor, ResistorFamily } from "../../catalog/index.ts";
import { bestBalance, chainOf, newBalancing, positionsOf, type Shape, sharingOf } from "../balancing.ts";
import type { Brief } from "../brief.ts";
import { prepare } from "../candidate.ts";

/** Each alone would do; null: it would not within what was tried. */
export interface BalanceMends {
  /** Least number in series, same number in parallel. */
  readonly series: number | null;
  /** Widest resistor tolerance, fraction, rounded down to a hundredth of a percent. */
  readonly tolerance: number | null;
  /** Highest charge voltage, V, rounded down to four figures. */
  readonly voltage: number | null;
}

export interface MendInput {
  readonly unit: Capacitor;
  readonly brief: Brief;
  readonly families: readonly ResistorFamily[];
  readonly shape: Shape;
}

/** How far each is tried. */
const MORE_STAGES = 200;
const LEAST_VOLTAGE = 0.05;
const EVEN = { low: 0, high: 0 };

/** Whether some resistor of these families keeps the arrangement within its limit while holding, and its charging share too; null: leakage unknown. */
export function balances({ unit, brief, families, shape }: MendInput): boolean | null {
  const candidate = prepare(unit, brief);
  const chain = chainOf(candidate, brief);
  if (chain === null) return null;
  if (shape.series === 1) return chain.voltage <= candidate.limit * (1 + FIT);
  // Where a risk or the measured units judge the charging, only the even share is asked for here: the rest is a finding of its own.
  const judged = brief.basis === "statistical" || brief.basis === "measured";
  const spread = judged ? EVEN : (unit.tolerance ?? EVEN);
  if (chargingWorst(chain.voltage, shape.series, spread) > candidate.limit * (1 + FIT)) return false;
  chain.series = shape.series;
  chain.sharing = sharingOf(shape);
  return bestBalance(chain, candidate.limit, positionsOf(shape), families, newBalancing());
}

/** The mends; null when a resistor does it already, or the leakage is unknown. */
export function balanceMends(input: MendInput): BalanceMends | null {
  if (balances(input) !== false) return null;
  const { brief, families, shape } = input;
  const fits = (change: Partial<MendInput>): boolean => balances({ ...input, ...change }) === true;
  const counts = Array.from({ length: MORE_STAGES }, (_, i) => shape.series + 1 + i);
  const series = counts.find((n) => fits({ shape: { ...shape, series: n } })) ?? null;
  const tighter = (tolerance: number): readonly ResistorFamily[] =>
    families.map((one) => ({ ...one, tolerance: Math.min(one.tolerance, tolerance) }));
  const widest = Math.max(...families.map((one) => one.tolerance));
  const tolerance = edge(widest, 0, (q) => fits({ families: tighter(q) }));
  const voltage = edge(brief.voltage, brief.voltage * LEAST_VOLTAGE, (v) => fits({ brief: { ...brief, voltage: v } }));
  return {
    series,
    tolerance: tolerance === null ? null : Math.floor(tolerance * 1e4) / 1e4,
    voltage: voltage === null ? null : fourFiguresDown(voltage),
  };
}

/** The largest value between `good` and `bad` that fits; null when not even `good` does. */
function edge(bad: number, good: number, fits: (value: number) => boolean): number | null {
  if (!fits(good)) return null;
  let [no, yes] = [bad, good];
  for (let step = 0; step < 40; step++) {
    const middle = (no + yes) / 2;
    if (fits(middle)) yes = middle;
    else no = middle;
  }
  return yes;
}

function fourFiguresDown(value: number): number {
  const power = Math.floor(Math.log10(value)) - 3;
  return Number(`${Math.floor(Number(`${value}e${-power}`))}e${power}`);
}
