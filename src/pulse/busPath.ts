// What a bus adds to a loop, how units hang on it, and how a shot's current divides along it: the shapes that others compute.

/** Series resistance [ohm] and inductance [H], go and return together. */
export interface BusPath {
  readonly resistance: number;
  readonly inductance: number;
}

/** A path of nothing. */
export const NO_PATH: BusPath = { resistance: 0, inductance: 0 };

/** A path so many times as long. */
export const pathTimes = ({ resistance, inductance }: BusPath, factor: number): BusPath => ({
  resistance: resistance * factor,
  inductance: inductance * factor,
});

export type Feed = "end" | "centre";

/** The piece of bus from one branch to the next, go and return together, and where the load's leads join. */
export interface BusPlace {
  readonly feed: Feed;
  readonly segment: BusPath;
}

/** How the current divides. Positions count from 1 along the bus, for an end feed from the feed on. */
export interface PlaceShares extends BusPlace {
  /** Part of the peak at each position, all units alike. */
  readonly alike: readonly number[];
  /** The position that carries most, and its part of the peak and of the action (not its root) with the tolerance at its worst. */
  readonly position: number;
  readonly share: number;
  readonly action: number;
  /** Times an even part: by its place alone, by its capacitance alone. */
  readonly byPlace: number;
  readonly byCapacitance: number;
  /** Most that any position carries when all are alike and the feed is the other one. */
  readonly otherFeed: number;
  /** Lowest voltage of any branch over the charge voltage, below zero; with the tolerance at its worst where the drive is a load. */
  readonly lowest: number;
  /** Position that stands at it. */
  readonly lowestPosition: number;
  /** s followed. */
  readonly seconds: number;
}
