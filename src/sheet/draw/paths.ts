// Points to path text, by d3-shape: chosen for its path text, rounded and without a sign too many.

import { line } from "d3-shape";
import type { Spot } from "./ink.ts";

const straight = line<Spot>(
  ({ x }) => x,
  ({ y }) => y,
).digits(1);

/** Straight from point to point; no points: no text. */
export const linePath = (points: readonly Spot[]): string => straight([...points]) ?? "";
