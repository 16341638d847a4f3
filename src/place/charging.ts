// One door to the charging search, whatever the ties.
import type { Constraints } from "./constraints.ts";
import type { Effort } from "./effort.ts";
import type { Random } from "./random.ts";
import type { SearchStep, Solution } from "./solution.ts";
import { solveStages } from "./solveStages.ts";
import { solveStrings } from "./solveStrings.ts";
import type { Ties } from "./unit.ts";

export interface ChargingTask {
  readonly ties: Ties;
  readonly values: Float64Array;
  readonly rule: Constraints;
  readonly order: readonly number[];
  readonly start: readonly (readonly number[])[];
  readonly stopAt: number;
  readonly prove: boolean;
}

export const solveCharging = (
  { ties, ...task }: ChargingTask,
  random: Random,
  work: Effort,
): Generator<SearchStep, Solution> =>
  ties === "cross-tied" ? solveStages(task, random, work) : solveStrings(task, random, work);

/** Runs a generator to its end. */
export function finish<T>(steps: Generator<unknown, T>): T {
  let step = steps.next();
  while (!step.done) step = steps.next();
  return step.value;
}
