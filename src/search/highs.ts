// Owns the highs package (HiGHS in wasm): a second opinion, and the fallback when the own search takes too long.
//
// What the package promises and what is done about it:
// - it solves a sparse model given as arrays and may stop at a time limit with a point and a bound;
// - its default relative gap is 1e-4, which is no proof: both gaps are set here;
// - it throws on a model without columns: answered here;
// - native memory lives until dispose(): done whatever happens;
// - it holds rows to 1e-6 by default, and has called blends optimal that fell short: tolerances are tightened, whole values
//   are rounded and every row is checked again, and an answer that fails the check is unknown.
import { isProgramPoint, type Program, programCost, roundedValues } from "./blend/program.ts";

export interface HighsLimits {
  /** Time that one run may take, s. The engine looks at its own clock; it may overrun. */
  readonly seconds?: number;
  /** Absolute gap at which a point counts as optimal; costs in whole cents need no less than 0.5. */
  readonly gap?: number;
}

export type HighsAnswer =
  | { readonly status: "optimal"; readonly values: readonly number[]; readonly cost: number; readonly bound: number }
  | { readonly status: "infeasible" }
  | {
      readonly status: "unknown";
      readonly why: "time" | "engine" | "check";
      /** A point that passed the check, where there is one. */
      readonly values: readonly number[] | null;
      /** Least cost by the engine's word; null when it gave none. */
      readonly bound: number | null;
    };

type Engine = import("highs").Highs;
// The package types its entry as CommonJS, which hides the default export of the module that is really loaded.
type Loader = () => Promise<Engine>;
let engine: Promise<Engine> | undefined;

/** Loads the wasm once a process; the first call takes a second or two. */
const load = (): Promise<Engine> => {
  engine ??= import("highs").then((module) => (module.default as unknown as Loader)());
  return engine;
};

/** Bytes the engine holds, for the test that models are given back. */
export const highsMemory = async (): Promise<number> => (await load()).memoryBytes;

/** Minimises the programme. Never throws for what the programme holds. */
export async function solveWithHighs(program: Program, limits: HighsLimits = {}): Promise<HighsAnswer> {
  if (program.columns.length === 0) {
    return isProgramPoint(program, [])
      ? { status: "optimal", values: [], cost: 0, bound: 0 }
      : { status: "infeasible" };
  }
  // Where the package or its wasm is not installed, there is no second opinion to be had.
  const highs = await load().catch(() => null);
  if (highs === null) return { status: "unknown", why: "engine", values: null, bound: null };
  const model = highs.createModel();
  try {
    model.options.set({
      output_flag: false,
      mip_rel_gap: 0,
      mip_abs_gap: limits.gap ?? 0.5,
      mip_feasibility_tolerance: 1e-9,
      primal_feasibility_tolerance: 1e-9,
      ...(limits.seconds === undefined ? {} : { time_limit: limits.seconds }),
    });
    model.raw.passModel(modelData(program, highs.constants.objectiveSense.minimize));
    const status = model.run().modelStatus;
    if (status === 8) return { status: "infeasible" };
    const whole = program.columns.some((column) => column.whole);
    const bound = Number(model.info.get(whole ? "mip_dual_bound" : "objective_function_value"));
    const values = status === 7 || status === 13 ? checked(program, model.getSolution().colValue) : null;
    if (status === 7 && values !== null)
      return { status: "optimal", values, cost: programCost(program, values), bound };
    const why = status === 7 ? "check" : status === 13 ? "time" : "engine";
    return { status: "unknown", why, values, bound: why === "time" && Number.isFinite(bound) ? bound : null };
  } finally {
    model.dispose();
  }
}

function checked(program: Program, values: ArrayLike<number>): readonly number[] | null {
  const rounded = values.length === program.columns.length ? roundedValues(program, values) : null;
  return rounded !== null && isProgramPoint(program, rounded) ? rounded : null;
}

function modelData(program: Program, sense: Engine["constants"]["objectiveSense"]["minimize"]) {
  const starts: number[] = [0];
  const indices: number[] = [];
  const values: number[] = [];
  for (const row of program.rows) {
    for (const [column, value] of row.terms) {
      if (value === 0) continue;
      indices.push(column);
      values.push(value);
    }
    starts.push(indices.length);
  }
  return {
    numCols: program.columns.length,
    numRows: program.rows.length,
    sense,
    colCost: program.columns.map((column) => column.cost),
    colLower: program.columns.map(() => 0),
    colUpper: program.columns.map((column) => column.most),
    rowLower: program.rows.map((row) => row.least),
    rowUpper: program.rows.map((row) => row.most),
    matrix: {
      format: "csr" as const,
      numRows: program.rows.length,
      numCols: program.columns.length,
      starts,
      indices,
      values,
    },
    integrality: program.columns.map((column) => (column.whole ? (1 as const) : (0 as const))),
  };
}
