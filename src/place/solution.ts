// What the searches hand back: groups of unit indices, the charging gap, and what is proven about it.
import type { BoundKind } from "./boundMatrix.ts";

export interface Solution {
  /** Unit indices by stage (cross-tied) or string. */
  readonly groups: readonly (readonly number[])[];
  /** n_s V_max / V - 1. */
  readonly gap: number;
  /** No placing has a smaller gap than this. */
  readonly lowerBound: number;
  readonly boundKind: BoundKind;
}

/** Where a search stands, for a screen. `Unit`: an index within the searches, a serial outside. */
export interface SearchStep<Unit = number> {
  readonly phase: "first" | "exchange" | "proof" | "holding";
  readonly gap: number;
  readonly moves: number;
  /** The groups as they stand, made when asked for and only before the next step. */
  readonly standing: () => readonly (readonly Unit[])[];
}

/** Two gaps count as equal within this. */
const SAME = 1e-12;

export const isOptimal = ({ gap, lowerBound }: Pick<Solution, "gap" | "lowerBound">): boolean =>
  gap - lowerBound <= SAME;
