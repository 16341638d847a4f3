// The map: walks the front along either axis, and goes through the axes.
import { AXIS_NAMES, type AxisName } from "../axes.ts";
import { walked } from "../mapPoints.ts";
import { ask, type Change, type State, still } from "../state.ts";
import { pageOf, type Step } from "./scroll.ts";

const FAR = Number.MAX_SAFE_INTEGER;

/** Up is more of the upright axis, and on the table less, which stands on top there. */
export function walkMap(state: State, axis: "x" | "y", by: Step): Change {
  const up = axis === "y" && !state.map.table ? -1 : 1;
  const steps =
    typeof by === "number"
      ? by * up
      : by === "first"
        ? -FAR
        : by === "last"
          ? FAR
          : (by === "page" ? 1 : -1) * up * pageOf(state);
  const selected = walked(state, axis, steps);
  return still({ ...state, selected: selected ?? state.selected, notice: null });
}

const after = (name: AxisName): AxisName => AXIS_NAMES[(AXIS_NAMES.indexOf(name) + 1) % AXIS_NAMES.length] ?? "cost";

/** The next axis; the one that the other axis has is passed over. Life is worked out only when it is asked for. */
export function nextAxis(state: State, which: "x" | "y"): Change {
  const other = state.map[which === "x" ? "y" : "x"];
  const next = after(state.map[which]);
  const map = { ...state.map, [which]: next === other ? after(next) : next };
  const there = { ...state, map, notice: null };
  return map[which] === "life" ? ask(there) : still(there);
}

export const toggleTable = (state: State): Change =>
  still({ ...state, map: { ...state.map, table: !state.map.table }, notice: null });
