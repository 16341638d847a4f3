// The orders a list of layouts can have, in the order that a key goes through them.
import type { Ranking } from "../search/index.ts";

/** Every ranking once: the compiler holds this against the search's own list, whose module the first frame does not wait for. */
const PLACE: Readonly<Record<Ranking, number>> = { cost: 0, units: 1, volume: 2, mass: 3, stress: 4 };

export const RANKS = Object.keys(PLACE).sort((a, b) => PLACE[a as Ranking] - PLACE[b as Ranking]) as readonly Ranking[];
