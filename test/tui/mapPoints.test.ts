// Points of the map: only those with both values; the cursor walks all of them along either axis and stops at the ends.
import { expect, test } from "vitest";
import { frontOf, placedPoints, pointUnder, walked } from "../../src/tui/mapPoints.ts";
import type { State } from "../../src/tui/state.ts";
import { detailed } from "../support/detailed.ts";
import { stateWith } from "../support/stock.ts";

const state = (changes: Partial<State> = {}): State =>
  detailed({ screen: "map", map: { x: "mass", y: "stress", table: false }, ...changes });

test("placedPoints(state): none without a plan; those whose mass is known; all by their counts", () => {
  expect(placedPoints(stateWith({ screen: "map" }))).toEqual([]);
  const all = frontOf(state());
  expect(all.length).toBeGreaterThan(5);
  const placed = placedPoints(state());
  expect(placed.length).toBe(all.filter(({ layout }) => layout.mass !== null && layout.stress !== null).length);
  expect(placed.length).toBeLessThan(all.length);
  const counts = placedPoints(state({ map: { x: "mass", y: "stress", table: true } }));
  expect(counts.map(({ x, y, point }) => [x, y, point.layout.series, point.layout.parallel])).toEqual(
    all.map(({ layout }) => [layout.series, layout.parallel, layout.series, layout.parallel]),
  );
});

test("pointUnder(state): the selected layout, else the first; nothing where there is none", () => {
  const last = placedPoints(state()).at(-1);
  expect(pointUnder(state({ selected: last?.point.layout.id ?? "" }))?.point.layout.id).toBe(last?.point.layout.id);
  expect(pointUnder(state({ selected: "no such" }))).toEqual(placedPoints(state())[0]);
  expect(pointUnder(stateWith({ screen: "map" }))).toBeNull();
});

test.each(["x", "y"] as const)("walked(state, %s, by): every point once from end to end, rising", (axis) => {
  let at = state();
  at = { ...at, selected: walked(at, axis, -1e9) };
  const seen: number[] = [];
  const ids = new Set<string | null>();
  for (let i = 0; i < placedPoints(at).length; i += 1) {
    seen.push(pointUnder(at)?.[axis] ?? Number.NaN);
    ids.add(at.selected);
    at = { ...at, selected: walked(at, axis, 1) };
  }
  expect(ids.size).toBe(placedPoints(at).length);
  expect(seen).toEqual([...seen].sort((a, b) => a - b));
  expect(walked(at, axis, 1)).toBe(at.selected);
  expect(walked(stateWith(), axis, 1)).toBeNull();
});
