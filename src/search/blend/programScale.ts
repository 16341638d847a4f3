// Brings a programme to the scale an engine with an absolute tolerance can bear: limits of 1, terms not far from 1.
import type { Program, ProgramRow } from "./program.ts";

/** Scaled terms outside this range would drown in the engine's absolute 1e-8. */
const SMALLEST_TERM = 1e-6;
const LARGEST_TERM = 1e6;

/** A row as `sum >= limit`, divided so that its limit (or, at 0, its largest term) is 1. */
export interface ScaledRow {
  readonly terms: readonly (readonly [number, number])[];
  readonly limit: number;
  /** The row it came from, and what one unit of its limit is worth here. */
  readonly from: number;
  readonly factor: number;
}

export interface Scaled {
  readonly rows: readonly ScaledRow[];
  /** Column values are multiplied by this for the engine. */
  readonly stretch: readonly number[];
  readonly costs: readonly number[];
  readonly costScale: number;
}

/** Rows of one direction, bounds included, scaled; null when a row without terms cannot hold; "scale" when too wide. */
export function scaleProgram(program: Program): Scaled | null | "scale" {
  const halves: { terms: readonly (readonly [number, number])[]; limit: number; from: number; sign: number }[] = [];
  const half = (row: ProgramRow, from: number, sign: number, limit: number): void => {
    if (Math.abs(limit) !== Number.POSITIVE_INFINITY) halves.push({ terms: row.terms, limit, from, sign });
  };
  program.rows.forEach((row, at) => {
    half(row, at, 1, row.least);
    half(row, at, -1, row.most);
  });
  program.columns.forEach(({ most }, at) => {
    if (most < Number.POSITIVE_INFINITY) halves.push({ terms: [[at, 1]], limit: most, from: -1, sign: -1 });
  });
  const largest = new Array<number>(program.columns.length).fill(0);
  const rows: ScaledRow[] = [];
  for (const { terms, limit, from, sign } of halves) {
    const live = terms.filter(([, value]) => value !== 0);
    if (live.length === 0) {
      if (sign * limit > 0) return null;
      continue;
    }
    const size = limit !== 0 ? Math.abs(limit) : Math.max(...live.map(([, value]) => Math.abs(value)));
    const factor = sign / size;
    rows.push({ terms: live.map(([at, value]) => [at, value * factor]), limit: limit * factor, from, factor });
    if (from >= 0) for (const [at, value] of live) largest[at] = Math.max(largest[at]!, Math.abs(value * factor));
  }
  const stretch = program.columns.map(({ whole }, at) => (whole || largest[at] === 0 ? 1 : largest[at]!));
  const fitted = rows.map((row) => ({
    ...row,
    terms: row.terms.map(([at, value]) => [at, value / stretch[at]!] as const),
  }));
  const costs = program.columns.map(({ cost }, at) => cost / stretch[at]!);
  const costScale = Math.max(1e-300, ...costs.map(Math.abs));
  for (const { terms, from } of fitted) {
    if (from < 0) continue;
    for (const [, value] of terms)
      if (Math.abs(value) < SMALLEST_TERM || Math.abs(value) > LARGEST_TERM) return "scale";
  }
  return { rows: fitted, stretch, costs, costScale };
}
