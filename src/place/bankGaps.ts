// The gaps of a bank as it stands, from its units: for what is built, edited or mended by hand.
import { type Conductances, conductancesOf } from "./conductance.ts";
import { stageGap, stringGap } from "./gap.ts";
import type { PlaceRequest } from "./request.ts";
import type { MeasuredUnit } from "./unit.ts";

export interface BankGaps {
  readonly charging: number;
  /** Null when it cannot be judged. */
  readonly holding: number | null;
}

type Shape = Pick<PlaceRequest, "series" | "parallel" | "ties" | "balanceConductance" | "leakageVoltage">;

const total = (values: readonly number[]): number => values.reduce((sum, v) => sum + v, 0);

/** Gap of weights (capacitance or conductance) that stand in groups; `perStage` is added to each stage. */
export function gapOfGroups(ties: PlaceRequest["ties"], groups: readonly (readonly number[])[], perStage = 0): number {
  if (ties === "strings") return Math.max(...groups.map(stringGap));
  const sums = groups.map((group) => total(group) + perStage);
  return stageGap(sums, sums.length);
}

/** Both gaps of the groups of units as they stand; groups may be of unequal count (a unit taken out). */
export function bankGaps(groups: readonly (readonly MeasuredUnit[])[], shape: Shape): BankGaps {
  const capacitances = groups.map((group) => group.map((unit) => unit.capacitance));
  const conductances: Conductances = conductancesOf(groups.flat(), shape);
  const charging = gapOfGroups(shape.ties, capacitances);
  if (!conductances.known) return { charging, holding: null };
  let at = 0;
  const held = groups.map((group) => group.map(() => conductances.perUnit[at++]!));
  return { charging, holding: gapOfGroups(shape.ties, held, conductances.perStage) };
}

/** Share of V across each stage (cross-tied) or each unit, string by string, from weights of the same kind. */
export function shares(ties: PlaceRequest["ties"], groups: readonly (readonly number[])[], perStage = 0): number[][] {
  const divide = (weights: readonly number[]): number[] => {
    const inverse = weights.map((w) => 1 / w);
    const sum = total(inverse);
    return inverse.map((w) => w / sum);
  };
  return ties === "strings" ? groups.map(divide) : [divide(groups.map((group) => total(group) + perStage))];
}
