// Points to path text, by d3-shape: chosen for its steps and its rounding of coordinates.

import { curveStepAfter, line } from "d3-shape";
import type { Spot } from "./ink.ts";

const DIGITS = 1;
const base = line<Spot>(
  ({ x }) => x,
  ({ y }) => y,
).digits(DIGITS);

/** Straight from point to point; no points: no text. */
export const linePath = (points: readonly Spot[]): string => base([...points]) ?? "";

const steps = line<Spot>(
  ({ x }) => x,
  ({ y }) => y,
)
  .curve(curveStepAfter)
  .digits(DIGITS);

/** Level from each point to the next, then up or down to it. */
export const stepPath = (points: readonly Spot[]): string => steps([...points]) ?? "";
