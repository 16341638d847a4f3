// Numbers as cells of the sheet: text with its unit, or a blank to fill in where the value is not known.

import { type Dimension, formatQuantity, type Rounding } from "../quantity/index.ts";
import type { Cell } from "./model.ts";

/** null and undefined are blanks. */
export function cell(value: number | null | undefined, dimension: Dimension, rounding: Rounding = "nearest"): Cell {
  return value === null || value === undefined ? null : formatQuantity(value, dimension, { digits: 4, rounding });
}

/** The same rounded up, and down: for figures that must not be understated, and limits that must not be overstated. */
export const up = (value: number | null | undefined, dimension: Dimension): Cell => cell(value, dimension, "up");
export const down = (value: number | null | undefined, dimension: Dimension): Cell => cell(value, dimension, "down");

/** s until something has happened; Infinity is never. */
export const wait = (seconds: number | null): Cell =>
  seconds === Number.POSITIVE_INFINITY ? "never" : up(seconds, "time");

/** A cell with words where there is no value, for sentences. */
export const said = (value: Cell, missing = "not known"): string => value ?? missing;

/** Used part of a rating; null when either is unknown. */
export const partOf = (value: number | null | undefined, rating: number | null | undefined): number | null =>
  value === null || value === undefined || !rating ? null : value / rating;
