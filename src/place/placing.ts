// What a placing says: groups of serials, spares, the two gaps with what is proven, the floor, and findings.
import type { Finding } from "../quantity/index.ts";
import type { BoundKind } from "./boundMatrix.ts";
import type { Outlier } from "./outliers.ts";
import type { MeasuredUnit, Ties } from "./unit.ts";

export interface ChargingShare {
  /** Voltage of the worst stage (cross-tied) or unit (strings) while charging, as a share of V. */
  readonly worst: number;
  /** n_s times `worst`, minus 1. */
  readonly gap: number;
  /** No placing of the units considered has a smaller gap. */
  readonly lowerBound: number;
  readonly boundKind: BoundKind;
  /** gap - lowerBound. */
  readonly certified: number;
  readonly proof: "optimal" | "within";
  /** The gap before any of it was given up for holding. */
  readonly attained: number;
  /** Two standard deviations of a stage (unit) voltage, relative, from the meter. */
  readonly plusMinus: number;
}

export interface HoldingShare {
  readonly worst: number;
  readonly gap: number;
  /** What the uncertainty of the leakage readings alone would leave. */
  readonly floor: number;
}

export interface Placing {
  readonly ties: Ties;
  readonly series: number;
  readonly parallel: number;
  /** Serials by stage (cross-tied) or by string. */
  readonly groups: readonly (readonly string[])[];
  readonly spares: readonly string[];
  /** Units set aside by the outlier rule; they are among the spares. */
  readonly rejected: readonly Outlier[];
  readonly charging: ChargingShare;
  /** Null when it cannot be judged; a finding says why. */
  readonly holding: HoldingShare | null;
  /** The gap below which a better placing is for show: the meter cannot tell. */
  readonly floor: number;
  /** Significant digits of a voltage that the meter supports. */
  readonly digits: number;
  /** Elementary trials spent. */
  readonly moves: number;
  readonly findings: readonly Finding[];
}

/** Groups in a settled order: units by their place in the input, groups by their first unit unless they are numbered by pins. */
export function settled(groups: readonly (readonly number[])[], numbered: boolean): number[][] {
  const sorted = groups.map((group) => [...group].sort((a, b) => a - b));
  return numbered ? sorted : sorted.sort((a, b) => a[0]! - b[0]!);
}

export const serialsOf = (units: readonly MeasuredUnit[], groups: readonly (readonly number[])[]): string[][] =>
  groups.map((group) => group.map((i) => units[i]!.serial));
