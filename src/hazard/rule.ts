// The shape of a published limit: who sets it, where, how far it was read, and its numbers.

/** `read`: the text itself; `second hand`: a public page that quotes it; `memory`: neither, confirm before you rely on it. */
export type HowRead = "read" | "second hand" | "memory";

export interface Limit {
  readonly quantity: "voltage" | "charge" | "energy" | "time" | "capacitance" | "current" | "share of voltage";
  /** SI. */
  readonly value: number;
  readonly unit: "V" | "C" | "J" | "s" | "F" | "A" | "1";
  /** Absent: at any voltage. */
  readonly at?: VoltageRange;
}

export interface Rule {
  readonly id: string;
  readonly body: string;
  readonly clause: string;
  /** Year or number of the edition; "" where what was read does not say. */
  readonly edition: string;
  readonly tag: HowRead;
  /** What it asks, in words of our own. */
  readonly words: string;
  /** Voltages that the rule as a whole speaks of; absent: those of its limits. */
  readonly scope?: VoltageRange;
  readonly limits: readonly Limit[];
}

/** Where a limit applies, V: `from` and `upTo` inclusive, `below` exclusive. */
export interface VoltageRange {
  readonly from?: number;
  readonly below?: number;
  readonly upTo?: number;
}

/** Makers of limits, so that a row of a table stays a row. SI values. */
export const volts = (value: number): Limit => ({ quantity: "voltage", value, unit: "V" });
export const seconds = (value: number): Limit => ({ quantity: "time", value, unit: "s" });
export const charge = (value: number, at: VoltageRange = {}): Limit => ({ quantity: "charge", value, unit: "C", at });
export const energy = (value: number, at: VoltageRange = {}): Limit => ({ quantity: "energy", value, unit: "J", at });
export const farads = (value: number, at: VoltageRange): Limit => ({ quantity: "capacitance", value, unit: "F", at });
export const share = (value: number): Limit => ({ quantity: "share of voltage", value, unit: "1" });

/** Whether a limit speaks of a voltage. Range: voltage >= 0. */
export const applies = ({ at }: Pick<Limit, "at">, voltage: number): boolean =>
  voltage >= (at?.from ?? 0) &&
  voltage < (at?.below ?? Number.POSITIVE_INFINITY) &&
  voltage <= (at?.upTo ?? Number.POSITIVE_INFINITY);
