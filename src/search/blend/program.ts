// A linear programme as plain data, the one shape that both outside engines are given, and the check of any answer to it.

export interface ProgramColumn {
  /** What one unit costs; the sum is minimised. */
  readonly cost: number;
  /** Largest value; Infinity when only rows hold it. The smallest is always 0. */
  readonly most: number;
  /** Whole numbers only. */
  readonly whole: boolean;
}

export interface ProgramRow {
  readonly terms: readonly (readonly [column: number, value: number])[];
  /** -Infinity and Infinity where the row is open. */
  readonly least: number;
  readonly most: number;
}

export interface Program {
  readonly columns: readonly ProgramColumn[];
  readonly rows: readonly ProgramRow[];
}

/** Rows and bounds are held to this, relative to the largest of the limit and the terms. */
export const PROGRAM_TOLERANCE = 1e-7;

/** Value of the goal, summed afresh. */
export const programCost = (program: Program, values: ArrayLike<number>): number =>
  program.columns.reduce((sum, column, at) => sum + column.cost * values[at]!, 0);

/** Whether the values keep every bound, every row and every whole column, within `tolerance`. */
export function isProgramPoint(program: Program, values: ArrayLike<number>, tolerance = PROGRAM_TOLERANCE): boolean {
  for (const [at, column] of program.columns.entries()) {
    const value = values[at]!;
    if (!Number.isFinite(value) || value < -tolerance || value > column.most * (1 + tolerance)) return false;
    if (column.whole && !Number.isInteger(value)) return false;
  }
  for (const row of program.rows) {
    let sum = 0;
    let size = 0;
    for (const [at, value] of row.terms) {
      sum += value * values[at]!;
      size = Math.max(size, Math.abs(value * values[at]!));
    }
    const slack = (limit: number): number => tolerance * Math.max(size, Math.abs(limit));
    if (row.least > Number.NEGATIVE_INFINITY && sum < row.least - slack(row.least)) return false;
    if (row.most < Number.POSITIVE_INFINITY && sum > row.most + slack(row.most)) return false;
  }
  return true;
}

/** Whole columns rounded, or null when one is not near a whole number. */
export function roundedValues(program: Program, values: ArrayLike<number>): number[] | null {
  const out: number[] = [];
  for (const [at, column] of program.columns.entries()) {
    const value = values[at]!;
    const near = Math.round(value);
    if (column.whole && !(Math.abs(value - near) <= 1e-5)) return null;
    out.push(column.whole ? near + 0 : Math.max(0, value));
  }
  return out;
}

/** The programme with every column free to take fractions. */
export const relaxed = (program: Program): Program => ({
  rows: program.rows,
  columns: program.columns.map((column) => ({ ...column, whole: false })),
});
