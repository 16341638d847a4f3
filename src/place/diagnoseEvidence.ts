/*
 * What readings say about one supposed state of the bank: predicted readings, their covariance, and the likelihood.
 *
 *   symbol  unit  meaning
 *   y, f    V, A  readings and their prediction
 *   S       V^2   covariance of y - f: the meter's noise on each reading, and what is not known exactly about the bank
 *                 (each C, leakage and resistor; the bank voltage of each row; a gain error common to all readings),
 *                 carried through by differences:  S = D + sum_q (df/dq)(df/dq)' sigma_q^2
 *
 * Holds where the readings are near linear in what is not known (a few per cent). Source: [JCGM100] propagation of uncertainty.
 */
import type { Course, StageModel } from "./diagnoseModel.ts";
import { cholesky } from "./gaussian.ts";

/** One row of readings taken at one time after the quick charge. */
export interface ReadingRow {
  /** s after the charge ended, >= 0. */
  readonly seconds: number;
  /** V that the bank was charged to. */
  readonly bank: number;
  /** Read across each stage, V; null where not read. The sign is the meter's. */
  readonly volts: readonly (number | null)[];
  /** Read across the whole bank, V. */
  readonly total?: number;
  /** Read from the charger, A. */
  readonly current?: number;
}

export interface MeterModel {
  /** Relative, of each reading by itself. */
  readonly relative: number;
  /** V, resolution and zero error of each reading. */
  readonly absolute: number;
  /** Relative, common to all readings of the meter. */
  readonly common: number;
  /** Relative, of a current reading. */
  readonly current: number;
}

/** Relative uncertainties of what the prediction was made from. */
export interface PriorDoubt {
  readonly capacitance: number;
  /** Of ln(leakage). */
  readonly leakage: number;
  readonly resistance: number;
  readonly bank: number;
}

export interface Question {
  readonly stages: readonly StageModel[];
  readonly rows: readonly ReadingRow[];
  readonly meter: MeterModel;
  readonly doubt: PriorDoubt;
}

/** Every reading in one list. */
export const observed = (rows: readonly ReadingRow[]): number[] =>
  rows.flatMap((row) => [
    ...row.volts.filter((v) => v !== null),
    ...(row.total === undefined ? [] : [row.total]),
    ...(row.current === undefined ? [] : [row.current]),
  ]);

/** What the same readings would be under a course; rows of one bank voltage share one run of it. */
export function predicted(course: Course, stages: readonly StageModel[], rows: readonly ReadingRow[]): number[] {
  const answers = new Map<ReadingRow, number[]>();
  for (const bank of new Set(rows.map((row) => row.bank))) {
    const mine = rows.filter((row) => row.bank === bank).sort((a, b) => a.seconds - b.seconds);
    const course1 = course(
      stages,
      bank,
      mine.map((row) => row.seconds),
    );
    for (const [k, row] of mine.entries()) {
      const { volts, current } = course1[k]!;
      const sum = volts.reduce((total, v) => total + Math.abs(v), 0);
      answers.set(row, [
        ...volts.filter((_, i) => row.volts[i] !== null && row.volts[i] !== undefined),
        ...(row.total === undefined ? [] : [sum]),
        ...(row.current === undefined ? [] : [current]),
      ]);
    }
  }
  return rows.flatMap((row) => answers.get(row)!);
}

const NUDGE = 1e-3;

/** Lower triangle of the covariance of readings about the prediction of `course`. */
export function covariance(course: Course, { stages, rows, meter, doubt }: Question): number[][] {
  const base = predicted(course, stages, rows);
  const isCurrent = rows.flatMap((row) => [
    ...row.volts.filter((v) => v !== null).map(() => false),
    ...(row.total === undefined ? [] : [false]),
    ...(row.current === undefined ? [] : [true]),
  ]);
  const effects: number[][] = [];
  const carry = (changed: readonly StageModel[], sigma: number): void => {
    const moved = predicted(course, changed, rows);
    effects.push(moved.map((f, k) => ((f - base[k]!) / NUDGE) * sigma));
  };
  for (const [i, stage] of stages.entries()) {
    carry(stages.with(i, { ...stage, capacitance: stage.capacitance * (1 + NUDGE) }), doubt.capacitance);
    if (stage.conductance > 0) {
      carry(stages.with(i, { ...stage, conductance: stage.conductance * (1 + NUDGE) }), doubt.leakage);
    }
    if (Number.isFinite(stage.resistance)) {
      carry(stages.with(i, { ...stage, resistance: stage.resistance * (1 + NUDGE) }), doubt.resistance);
    }
  }
  effects.push(base.map((f, k) => (isCurrent[k] ? 0 : f * meter.common)));
  let at = 0;
  for (const row of rows) {
    const count = observed([row]).length;
    const start = at;
    effects.push(base.map((f, k) => (k >= start && k < start + count ? f * doubt.bank : 0)));
    at += count;
  }
  const matrix = base.map((f, k) => {
    const line = new Array<number>(base.length).fill(0);
    const noise = isCurrent[k] ? Math.abs(f) * meter.current + 1e-9 : Math.hypot(f * meter.relative, meter.absolute);
    line[k] = noise * noise;
    return line;
  });
  for (const effect of effects) {
    for (let k = 0; k < base.length; k++) {
      for (let l = 0; l <= k; l++) matrix[k]![l] = matrix[k]![l]! + effect[k]! * effect[l]!;
    }
  }
  for (let k = 0; k < base.length; k++) for (let l = 0; l < k; l++) matrix[l]![k] = matrix[k]![l]!;
  return cholesky(matrix);
}
