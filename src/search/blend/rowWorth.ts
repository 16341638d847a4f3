// What one more unit of volume, mass or units is worth: shadow prices of the linear relaxation, by an outside engine.
import { type SolveLimits, solveLinear } from "../solve.ts";
import { capacityNeeded, roomUnder } from "./evaluate.ts";
import type { BlendModel } from "./model.ts";
import { lowerHull, usefulStrings } from "./pool.ts";
import type { Program, ProgramColumn } from "./program.ts";
import { withShares } from "./shipments.ts";

export interface RowWorth {
  /** Cost of the relaxation, minor units: no blend of these options costs less. */
  readonly bound: number;
  /** Fall of that cost for one more m3, kg, unit; 0 where the ceiling is slack or absent. */
  readonly volume: number;
  readonly mass: number;
  readonly units: number;
  /** Rise of that cost for one more farad needed, and its fall for one more string type allowed. */
  readonly capacity: number;
  readonly types: number;
}

/**
 * The relaxation in which an option may be taken in parts, along the lower hull of its costs: the tightest linear view of the
 * tables. Its worth is exact for small changes of the relaxation and a guide for whole blends.
 */
export function hullProgram(given: BlendModel, among: readonly number[]): Program {
  // A part of a shipment counts for each string type that could share it, so the relaxation stays below every blend.
  const model = withShares(given);
  const columns: ProgramColumn[] = [];
  const terms = { capacity: [], volume: [], mass: [], units: [], types: [] } as Record<string, [number, number][]>;
  const once: [number, number][][] = [];
  for (const at of among) {
    const option = model.options[at]!;
    const hull = lowerHull(option.costs, usefulStrings(model, option));
    const own: [number, number][] = [];
    hull.x.forEach((x, corner) => {
      const column = columns.push({ cost: hull.cost[corner]!, most: Number.POSITIVE_INFINITY, whole: false }) - 1;
      for (const name of ["capacity", "volume", "mass", "units"] as const)
        terms[name]!.push([column, option[name] * x]);
      terms.types!.push([column, 1]);
      own.push([column, 1]);
    });
    if (own.length > 0) once.push(own);
  }
  const open = Number.POSITIVE_INFINITY;
  return {
    columns,
    rows: [
      { terms: terms.capacity!, least: capacityNeeded(model.requirement), most: open },
      ...(["volume", "mass", "units"] as const).map((name) => ({
        terms: terms[name]!,
        least: -open,
        most: roomUnder(model.ceilings[name]),
      })),
      { terms: terms.types!, least: -open, most: model.maxTypes },
      ...once.map((own) => ({ terms: own, least: -open, most: 1 })),
    ],
  };
}

/** Shadow prices over the named options; null when the engine would not settle it. */
export function rowWorth(model: BlendModel, among: readonly number[], limits: SolveLimits = {}): RowWorth | null {
  const answer = solveLinear(hullProgram(model, among), limits);
  if (answer.status !== "optimal") return null;
  const [capacity, volume, mass, units, types] = answer.prices;
  const positive = (price: number | undefined): number => Math.max(0, price ?? 0);
  return {
    bound: answer.bound,
    capacity: positive(capacity),
    volume: positive(-(volume ?? 0)),
    mass: positive(-(mass ?? 0)),
    units: positive(-(units ?? 0)),
    types: positive(-(types ?? 0)),
  };
}
