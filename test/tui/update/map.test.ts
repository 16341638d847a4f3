// Keys of the map: the axes in turn, never the same on both; life asks the engine; up is up.
import { expect, test } from "vitest";
import { AXIS_NAMES } from "../../../src/tui/axes.ts";
import { pointUnder } from "../../../src/tui/mapPoints.ts";
import type { State } from "../../../src/tui/state.ts";
import { nextAxis, toggleTable, walkMap } from "../../../src/tui/update/map.ts";
import { detailed } from "../../support/detailed.ts";

const state = (changes: Partial<State> = {}): State =>
  detailed({ screen: "map", map: { x: "mass", y: "stress", table: false }, ...changes });

test("nextAxis(state, which): all axes in turn but the other's; only life asks", () => {
  let at = state();
  const seen: string[] = [];
  for (let i = 0; i < AXIS_NAMES.length; i += 1) {
    const change = nextAxis(at, "x");
    expect(change.effects.length).toBe(change.state.map.x === "life" ? 1 : 0);
    at = change.state;
    seen.push(at.map.x);
  }
  expect(new Set(seen)).toEqual(new Set(AXIS_NAMES.filter((name) => name !== "stress")));
  expect(nextAxis(state(), "y").state.map.y).toBe("margin");
});

test("walkMap(state, axis, by): up is more, right is more; on the table down is more in parallel", () => {
  const middle = walkMap(walkMap(state(), "y", "first").state, "y", -3).state;
  const height = (at: State) => pointUnder(at)?.y ?? Number.NaN;
  expect(height(walkMap(middle, "y", -1).state)).toBeGreaterThanOrEqual(height(middle));
  expect(height(walkMap(middle, "y", "first").state)).toBeLessThanOrEqual(height(middle));
  expect(height(walkMap(middle, "y", "pageBack").state)).toBeGreaterThanOrEqual(height(middle));
  const table = toggleTable(walkMap(state(), "x", "first").state).state;
  expect(table.map.table).toBe(true);
  expect(height(walkMap(table, "y", 5).state)).toBeGreaterThanOrEqual(height(table));
});
