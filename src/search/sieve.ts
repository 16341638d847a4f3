// What the search may forget at once: a layout that is neither among the first `limit` nor on the front, whatever else is found.

import type { Ranking } from "./rank.ts";
import { isBeaten, type Strong } from "./strong.ts";
import { type Figures, figuresAt, type LayoutTable, noFigures } from "./table.ts";

export interface Wanted {
  /** How many of the first in order are wanted. Range: >= 1. */
  readonly limit: number;
  readonly rank: Ranking;
}

export interface Sieve {
  readonly strong: Strong;
  readonly rank: Ranking;
  /** Places of the best `limit` kept rows, as a heap with the worst on top; Infinity while there are fewer. */
  readonly places: Float64Array;
}

function figureOf(figures: Readonly<Figures>, rank: Ranking): number {
  switch (rank) {
    case "cost":
      return figures.cost;
    case "units":
      return figures.units;
    case "volume":
      return figures.volume;
    case "mass":
      return figures.mass;
    case "stress":
      return figures.stress;
  }
}

/**
 * A number that never falls along the order of layouts: from 0 to 1 by the figure that ranks, and one more when the stress is not assessed.
 * Near figures may share a number; such a row is then kept without need.
 */
function placeOf(figures: Readonly<Figures>, rank: Ranking): number {
  const within = 1 - 1 / (1 + figureOf(figures, rank));
  return figures.stress === Number.POSITIVE_INFINITY ? 1 + within : within;
}

/** Puts a place into the heap instead of its worst. */
function enter(places: Float64Array, place: number): void {
  let at = 0;
  for (let child = 1; child < places.length; child = 2 * at + 1) {
    if (child + 1 < places.length && (places[child + 1] as number) > (places[child] as number)) child++;
    if ((places[child] as number) <= place) break;
    places[at] = places[child] as number;
    at = child;
  }
  places[at] = place;
}

/** A sieve that knows the rows of the table so far, and strong ones among them; rows pushed later are told to it by `remember`. */
export function sieveOf(table: LayoutTable, strong: Strong, { limit, rank }: Wanted): Sieve {
  const places = new Float64Array(limit).fill(Number.POSITIVE_INFINITY);
  const figures = noFigures();
  for (let row = 0; row < table.count; row++) {
    const place = placeOf(figuresAt(table, row, figures), rank);
    if (place < (places[0] as number)) enter(places, place);
  }
  return { strong, rank, places };
}

/** False only when a layout with these figures, or any worse ones, is surely not wanted. */
export const mayMatter = (sieve: Sieve, figures: Readonly<Figures>): boolean =>
  placeOf(figures, sieve.rank) <= (sieve.places[0] as number) || !isBeaten(sieve.strong, figures);

/** Tells the sieve of a row that was kept. */
export function remember({ rank, places }: Sieve, figures: Readonly<Figures>): void {
  const place = placeOf(figures, rank);
  if (place < (places[0] as number)) enter(places, place);
}
