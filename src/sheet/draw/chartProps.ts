// What the charts are drawn from. Plain SI values; null is not known and is said in words where its mark would stand.

interface Chart {
  /** Starts every id inside the drawing: letters, digits, hyphens. */
  readonly id: string;
  readonly title: string;
}

/** One state of the bank and the voltage that one unit or stage may then see, V. */
export interface VoltageBar {
  readonly words: string;
  readonly nominal: number | null;
  readonly worst: number | null;
}

/** A line across a chart, with its words. */
export interface LimitLine {
  readonly words: string;
  readonly value: number;
}

export interface VoltageChartProps extends Chart {
  readonly bars: readonly VoltageBar[];
  readonly limits: readonly LimitLine[];
}

export interface BleedPoint {
  /** s */
  readonly time: number;
  /** V */
  readonly voltage: number;
}

/** One way down: straight between its points on the log scale, so two points do for one time constant. */
export interface BleedCurve {
  readonly words: string;
  readonly points: readonly BleedPoint[];
}

export interface BleedChartProps extends Chart {
  /** At most six: each has a line style of its own. */
  readonly curves: readonly BleedCurve[];
  readonly thresholds: readonly LimitLine[];
}

export interface ShotSample {
  /** s, A, V */
  readonly time: number;
  readonly current: number;
  readonly voltage: number;
}

export interface ShotChartProps extends Chart {
  readonly samples: readonly ShotSample[];
  /** The greatest current; null: not known. */
  readonly peak: { readonly time: number; readonly current: number } | null;
  /** Where the voltage is lowest, when it goes below zero; null: it does not. */
  readonly reversal: { readonly time: number; readonly voltage: number } | null;
}

/** Needing from `from` to `to` pieces costs `cost` and brings `bought`. */
export interface CostStep {
  readonly from: number;
  readonly to: number;
  readonly bought: number;
  /** Whole minor units of the currency; null: no price. */
  readonly cost: number | null;
}

export interface CostChartProps extends Chart {
  readonly steps: readonly CostStep[];
  /** Pieces that the bank needs. */
  readonly needed: number;
  readonly currency: string;
}
