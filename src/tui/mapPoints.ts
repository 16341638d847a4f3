// The points of the map: which can be placed on its axes, in which order the cursor walks them, and which is under it.
import type { Brief } from "../search/index.ts";
import { AXES, type FrontPoint } from "./axes.ts";
import type { State } from "./state.ts";

export interface Placed {
  readonly point: FrontPoint;
  readonly x: number;
  readonly y: number;
}

export const frontOf = (state: State): readonly FrontPoint[] =>
  state.answer?.kind === "planned" ? (state.answer.front ?? []) : [];

/** Points with a value on both axes; on the table these are the counts in series and in parallel. */
export function placedPoints(state: State): readonly Placed[] {
  if (state.answer?.kind !== "planned") return [];
  const { brief } = state.answer;
  const { x, y, table } = state.map;
  const at = (point: FrontPoint, axis: "x" | "y", given: Brief): number | null =>
    table
      ? axis === "x"
        ? point.layout.series
        : point.layout.parallel
      : AXES[axis === "x" ? x : y].value(point, given);
  return frontOf(state).flatMap((point) => {
    const [across, up] = [at(point, "x", brief), at(point, "y", brief)];
    return across === null || up === null ? [] : [{ point, x: across, y: up }];
  });
}

/** The point under the cursor: the selected layout, else the first that can be placed. */
export const pointUnder = (state: State, points = placedPoints(state)): Placed | null =>
  points.find(({ point }) => point.layout.id === state.selected) ?? points[0] ?? null;

/** The id of the point `by` steps along an axis, stopping at the ends; points at one place are walked one by one. */
export function walked(state: State, axis: "x" | "y", by: number): string | null {
  const points = placedPoints(state);
  const here = pointUnder(state, points);
  if (here === null) return null;
  const other = axis === "x" ? "y" : "x";
  const sorted = [...points].sort((a, b) => a[axis] - b[axis] || a[other] - b[other]);
  const to = Math.max(0, Math.min(sorted.length - 1, sorted.indexOf(here) + by));
  return sorted[to]?.point.layout.id ?? null;
}
