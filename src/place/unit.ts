// One measured unit capacitor, and the two ways in which units are tied into a bank.

/** A unit as measured, before it is fitted. What was not measured is absent, never zero. */
export interface MeasuredUnit {
  /** The mark on the unit; unique among the units measured. */
  readonly serial: string;
  /** C, F, > 0. */
  readonly capacitance: number;
  /** I_leak, A, >= 0, read at the voltage that the request names. */
  readonly leakage?: number;
  /** Equivalent series resistance, ohm, >= 0. */
  readonly esr?: number;
  /** Production lot. */
  readonly lot?: string;
  /** What was sold: units of two parts in one stage are flagged. */
  readonly part?: string;
  /** Polarity or size group: units of two groups never share a stage (cross-tied) or string. */
  readonly group?: string;
  readonly note?: string;
}

/** `cross-tied`: stages of parallel units, stages in series. `strings`: units in series, strings in parallel. */
export type Ties = "cross-tied" | "strings";
