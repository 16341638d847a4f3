// Owns javascript-lp-solver: small linear and whole-number programmes, a second opinion that is never taken on trust.
//
// What the package promises (1.0.3) and what is done about it:
// - names are shared by columns, rows, goal and result fields: names are invented here (v0.., r0.., goal) and only those read;
// - its presolve forgets the cost of columns that a row fixes: it is off;
// - its tableau is exact to an absolute 1e-8: rows are divided by their limit, fractional columns by their largest term, and
//   a programme whose terms still span too much is refused as unknown;
// - a term of 0 makes a row infeasible: zeros are dropped, and rows without terms are answered here;
// - `unrestricted`, several goals and `useIncremental` give wrong answers: there is no way to ask for them here;
// - without `opType` its own words and deeds differ: always "min";
// - it stops at a time limit without saying so, late, and with fractions called feasible: an answer as late as the limit is
//   unknown, and one that is not whole, breaks a row or misses its cost is too;
// - it reports no proof: a linear optimum counts only with dual prices that reach the same cost; a whole-number one is a claim.
// It cannot be interrupted: callers that need to stop it run it in a worker. Large programmes are refused.
import engine, { type Model as EngineModel } from "javascript-lp-solver";
import { isProgramPoint, type Program, programCost, relaxed, roundedValues } from "./blend/program.ts";
import { type Scaled, type ScaledRow, scaleProgram } from "./blend/programScale.ts";

export interface SolveLimits {
  /** Engine time, ms; needs `clock`, for the engine does not tell when it gave up. */
  readonly milliseconds?: number;
  /** Milliseconds on any steady clock. */
  readonly clock?: () => number;
  /** Most columns taken on; 250 unless told. Above that whole-number programmes may take minutes. */
  readonly mostColumns?: number;
}

export type Unknown = { readonly status: "unknown"; readonly why: "size" | "scale" | "time" | "check" };

export type WholeAnswer =
  /** Checked to keep every row; that nothing is cheaper is the engine's claim. */
  | { readonly status: "claimed"; readonly values: readonly number[]; readonly cost: number }
  | { readonly status: "claimed infeasible" }
  | Unknown;

export type LinearAnswer =
  | {
      readonly status: "optimal";
      readonly values: readonly number[];
      readonly cost: number;
      /**
       * Change of the cost for one more unit of each row's limit: what the dual prices say. Where the optimum has a corner
       * it holds on one side only. Rows with two limits give the sum of both.
       */
      readonly prices: readonly number[];
      /** Bound that the dual prices prove on their own; within 1e-6 of the cost (1e-7 of the largest cost). */
      readonly bound: number;
    }
  /** Proven: what is missing at best, summed over the scaled rows. */
  | { readonly status: "infeasible"; readonly missing: number }
  | Unknown;

/** The package types its entry as CommonJS, which hides the default export of the module that is really loaded. */
const solver = engine as unknown as { readonly Solve: (model: EngineModel) => unknown };

const DEFAULT_COLUMNS = 250;
interface EngineAnswer {
  readonly feasible: boolean;
  readonly bounded: boolean;
  readonly values: readonly number[];
}

interface EngineTask {
  readonly costs: readonly number[];
  readonly rows: readonly { readonly terms: readonly (readonly [number, number])[]; readonly limit: number }[];
  readonly whole: readonly boolean[];
  readonly milliseconds?: number | undefined;
}

/** The only call of the package: minimise costs under rows `>= limit`, columns >= 0. */
function runEngine({ costs, rows, whole, milliseconds }: EngineTask): EngineAnswer {
  const variables: Record<string, Record<string, number>> = {};
  costs.forEach((cost, at) => {
    variables[`v${at}`] = cost === 0 ? {} : { goal: cost };
  });
  const constraints: Record<string, { min: number }> = {};
  rows.forEach(({ terms, limit }, at) => {
    constraints[`r${at}`] = { min: limit };
    for (const [column, value] of terms) variables[`v${column}`]![`r${at}`] = value;
  });
  const ints = Object.fromEntries(whole.flatMap((is, at) => (is ? [[`v${at}`, 1 as const]] : [])));
  const answer = solver.Solve({
    optimize: "goal",
    opType: "min",
    constraints,
    variables,
    ...(Object.keys(ints).length === 0 ? {} : { ints }),
    options: {
      presolve: false,
      useIncremental: false,
      useMIRCuts: false,
      exitOnCycles: true,
      tolerance: 0,
      ...(milliseconds === undefined ? {} : { timeout: milliseconds }),
    },
  }) as Readonly<Record<string, unknown>>;
  const values = costs.map((_, at) => {
    const value = answer[`v${at}`];
    return typeof value === "number" && Number.isFinite(value) ? value : 0;
  });
  return { feasible: answer.feasible === true, bounded: answer.bounded !== false, values };
}

const tooMany = (program: Program, limits: SolveLimits): boolean =>
  program.columns.length > (limits.mostColumns ?? DEFAULT_COLUMNS);

/** A whole-number programme. The answer is a claim: compare it with another engine's. */
export function solveWhole(program: Program, limits: SolveLimits = {}): WholeAnswer {
  if (tooMany(program, limits)) return { status: "unknown", why: "size" };
  const scaled = scaleProgram(program);
  if (scaled === "scale") return { status: "unknown", why: "scale" };
  if (scaled === null) return { status: "claimed infeasible" };
  const { milliseconds, clock } = limits;
  // Without a clock a time-out could not be told from an answer, so none is set.
  const timed = milliseconds !== undefined && clock !== undefined && milliseconds > 0;
  const start = clock?.() ?? 0;
  const answer = runEngine({
    costs: scaled.costs,
    rows: scaled.rows,
    whole: program.columns.map((c) => c.whole),
    milliseconds: timed ? milliseconds : undefined,
  });
  if (timed && (clock?.() ?? 0) - start >= 0.95 * milliseconds) return { status: "unknown", why: "time" };
  if (!answer.feasible) return { status: "claimed infeasible" };
  const values = roundedValues(
    program,
    answer.values.map((value, at) => value / scaled.stretch[at]!),
  );
  if (!answer.bounded || values === null || !isProgramPoint(program, values))
    return { status: "unknown", why: "check" };
  return { status: "claimed", values, cost: programCost(program, values) };
}

/** The programme with fractions allowed, with the worth of each row; every answer is proven by its dual. */
export function solveLinear(whole: Program, limits: SolveLimits = {}): LinearAnswer {
  const program = relaxed(whole);
  if (tooMany(program, limits)) return { status: "unknown", why: "size" };
  const scaled = scaleProgram(program);
  if (scaled === "scale") return { status: "unknown", why: "scale" };
  if (scaled === null) return { status: "infeasible", missing: 1 };
  const costs = scaled.costs.map((cost) => cost / scaled.costScale);
  const none = program.columns.map(() => false);
  const primal = runEngine({ costs, rows: scaled.rows, whole: none });
  if (!primal.feasible) return provenInfeasible(scaled, none.length);
  const duals = runDual(scaled.rows, costs);
  const values = primal.values.map((value, at) => Math.max(0, value / scaled.stretch[at]!));
  if (!primal.bounded || duals === null || !isProgramPoint(program, values)) return { status: "unknown", why: "check" };
  const cost = programCost(program, values);
  const bound = scaled.costScale * scaled.rows.reduce((sum, row, at) => sum + row.limit * duals[at]!, 0);
  // The engine hands out values rounded to 1e-8, so the scaled costs cannot agree more closely than some of those.
  if (Math.abs(cost - bound) > 1e-6 * Math.abs(cost) + 1e-7 * scaled.costScale)
    return { status: "unknown", why: "check" };
  const prices = new Array<number>(program.rows.length).fill(0);
  scaled.rows.forEach(({ from, factor }, at) => {
    if (from >= 0) prices[from] = prices[from]! + duals[at]! * factor * scaled.costScale;
  });
  return { status: "optimal", values, cost, prices, bound };
}

/** Prices y >= 0 of the rows with A'y <= c that make the most of the limits; null when the engine's do not hold. */
function runDual(rows: readonly ScaledRow[], costs: readonly number[]): readonly number[] | null {
  const columns: [number, number][][] = costs.map(() => []);
  rows.forEach(({ terms }, at) => {
    for (const [column, value] of terms) columns[column]!.push([at, -value]);
  });
  const kept = columns.flatMap((terms, at) => (terms.length > 0 ? [{ terms, limit: -costs[at]! }] : []));
  const answer = runEngine({ costs: rows.map(({ limit }) => -limit), rows: kept, whole: rows.map(() => false) });
  if (!answer.feasible || !answer.bounded) return null;
  const holds = kept.every(({ terms, limit }) => {
    const sum = terms.reduce((total, [at, value]) => total + value * answer.values[at]!, 0);
    return sum >= limit - 1e-7 * Math.max(1, ...terms.map(([at, value]) => Math.abs(value * answer.values[at]!)));
  });
  return holds && answer.values.every((value) => value >= -1e-9) ? answer.values : null;
}

/** Lets every scaled row fall short and asks how little will do; a proven amount above 0 proves that the rows clash. */
function provenInfeasible(scaled: Scaled, columns: number): LinearAnswer {
  const costs = [...new Array<number>(columns).fill(0), ...scaled.rows.map(() => 1)];
  const rows = scaled.rows.map((row, at) => ({ ...row, terms: [...row.terms, [columns + at, 1] as const] }));
  const duals = runDual(rows, costs);
  const missing = duals === null ? 0 : rows.reduce((sum, row, at) => sum + row.limit * duals[at]!, 0);
  return missing > 1e-7 ? { status: "infeasible", missing } : { status: "unknown", why: "check" };
}
