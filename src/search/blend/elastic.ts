// How far the ceilings must give together, at the least, by a linear relaxation: a quick bound for "why is nothing possible".
import { type SolveLimits, solveLinear } from "../solve.ts";
import { roomUnder } from "./evaluate.ts";
import type { BlendModel } from "./model.ts";
import { CEILING_NAMES } from "./pool.ts";
import type { Program } from "./program.ts";
import { hullProgram } from "./rowWorth.ts";

export interface Elastic {
  /** Least sum of relative excesses over the ceilings; above 0 it proves that the options cannot meet the need under them. */
  readonly excess: number;
  /** Excess of each ceiling in that relaxation, as a fraction of the ceiling. */
  readonly volume: number;
  readonly mass: number;
  readonly units: number;
  /** Missing capacity as a fraction of the need, where no ceiling can help. */
  readonly capacity: number;
}

/** What a missing farad weighs against room: dear enough to be the last resort, not so dear as to drown the rest in rounding. */
const LAST_RESORT = 20;

/** The relaxation with ceilings that stretch, at the same price for each percent; null when the engine would not settle it. */
export function elasticCeilings(model: BlendModel, among: readonly number[], limits: SolveLimits = {}): Elastic | null {
  // Counts that the ceilings rule out today are of use once these stretch.
  const open = Number.POSITIVE_INFINITY;
  const { columns, rows } = hullProgram({ ...model, ceilings: { volume: open, mass: open, units: open } }, among);
  const first = columns.length;
  const names = ["capacity", ...CEILING_NAMES] as const;
  const sizes = [model.requirement, ...CEILING_NAMES.map((name) => model.ceilings[name])];
  const program: Program = {
    columns: [
      ...columns.map((column) => ({ ...column, cost: 0 })),
      ...names.map((name) => ({
        cost: name === "capacity" ? LAST_RESORT : 1,
        most: Number.POSITIVE_INFINITY,
        whole: false,
      })),
    ],
    rows: rows.map((row, at) => {
      const size = sizes[at];
      if (size === undefined || !Number.isFinite(size) || size === 0) return row;
      const most = at === 0 ? row.most : roomUnder(size);
      return { ...row, most, terms: [...row.terms, [first + at, at === 0 ? size : -size] as const] };
    }),
  };
  const answer = solveLinear(program, limits);
  if (answer.status !== "optimal") return null;
  const [capacity, volume, mass, units] = names.map((_, at) => answer.values[first + at]!) as [
    number,
    number,
    number,
    number,
  ];
  return { excess: answer.bound, capacity, volume, mass, units };
}
