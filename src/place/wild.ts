// What one wild unit costs: the gap with it fitted and the gap without it.
import { type ChargingTask, finish, solveCharging } from "./charging.ts";
import { constrainedStart } from "./constrainedStart.ts";
import { constraintsOf } from "./constraints.ts";
import { effort } from "./effort.ts";
import { toLattice } from "./lattice.ts";
import { seeded } from "./random.ts";
import { DEFAULTS, type PlaceRequest } from "./request.ts";
import type { MeasuredUnit } from "./unit.ts";

export interface WildEffect {
  readonly serial: string;
  readonly withUnit: number;
  readonly without: number;
  /** True when there was no spare to fit instead: `without` then supposes a unit of median capacitance in its place. */
  readonly supposed: boolean;
}

const MOVES = 200_000;

/** A quick placing of `units` as asked: its gap, or null when the constraints cannot be met. */
function quickGap(units: readonly MeasuredUnit[], request: PlaceRequest, order: readonly number[]): number | null {
  const rule = constraintsOf(units, request);
  const { values } = toLattice(units.map((unit) => unit.capacitance));
  const start = rule.any ? constrainedStart(rule, order, values) : { ok: true as const, groups: [] };
  if (!start.ok) return null;
  const task: ChargingTask = {
    ties: request.ties,
    values,
    rule,
    order,
    start: start.groups,
    stopAt: 1e-6,
    prove: false,
  };
  return finish(solveCharging(task, seeded(request.seed ?? DEFAULTS.seed), effort(MOVES, request.within))).gap;
}

/**
 * `fitted`: the unit is in the placing of gap `gap` because there was no spare; otherwise it was set aside and `gap` is without it.
 */
export function wildEffect(
  units: readonly MeasuredUnit[],
  request: PlaceRequest,
  { serial, gap, fitted, order }: { serial: string; gap: number; fitted: boolean; order: readonly number[] },
): WildEffect | null {
  if (fitted) {
    const sorted = units.map((unit) => unit.capacitance).sort((a, b) => a - b);
    const median = sorted[Math.floor(sorted.length / 2)]!;
    const tamed = units.map((unit) => (unit.serial === serial ? { ...unit, capacitance: median } : unit));
    const without = quickGap(tamed, request, order);
    return without === null ? null : { serial, withUnit: gap, without, supposed: true };
  }
  if ((request.pins ?? []).length > 0) return null;
  const wild = units.findIndex((unit) => unit.serial === serial);
  const withUnit = quickGap(units, { ...request, pins: [{ serial, group: 0 }] }, [
    wild,
    ...order.filter((i) => i !== wild),
  ]);
  return withUnit === null ? null : { serial, withUnit, without: gap, supposed: false };
}
