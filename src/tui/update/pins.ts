// Pinning layouts to set them side by side, and choosing the bank to look at.
import { foldedRows } from "../comparison.ts";
import { pointUnder } from "../mapPoints.ts";
import { arrangementOf, isSame, pinnedLayouts, selectedLayout, shownBank } from "../pick.ts";
import type { Arrangement } from "../ports.ts";
import { ask, type Change, MOST_PINS, type State, still } from "../state.ts";

/** The arrangement that the cursor is on, by screen. */
function underCursor(state: State): Arrangement | null {
  if (state.screen === "compare") return state.pins[state.column] ?? null;
  if (state.screen === "map") return pointUnder(state)?.point.layout ?? null;
  return state.screen === "layouts" ? selectedLayout(state) : shownBank(state);
}

export function togglePin(state: State): Change {
  const found = underCursor(state);
  if (found === null) return still(state);
  const arrangement = arrangementOf(found);
  const name = `${arrangement.part} ${arrangement.series}s${arrangement.parallel}p`;
  const without = state.pins.filter((pin) => !isSame(pin, arrangement));
  if (without.length < state.pins.length) {
    const column = Math.max(0, Math.min(state.column, without.length - 1));
    return ask({ ...state, pins: without, column, notice: { tone: "plain", text: `${name} is no longer pinned.` } });
  }
  if (state.pins.length >= MOST_PINS) {
    const text = `${MOST_PINS} layouts are pinned already, which is the most; unpin one first.`;
    return still({ ...state, notice: { tone: "warn", text } });
  }
  const pins = [...state.pins, arrangement];
  const more = pins.length === 1 ? "Pin another to compare them" : "3 compares them";
  const text = `${name} is pinned, ${pins.length} of ${MOST_PINS}. ${more}.`;
  return ask({ ...state, pins, notice: { tone: "good", text } });
}

/** Puts the pinned layouts in the order of the row under the cursor, the best first. */
export function orderPins(state: State): Change {
  const layouts = pinnedLayouts(state);
  const { shown } = foldedRows(layouts, state.unfolded);
  const row = shown[Math.min(state.scroll.compare ?? 0, Math.max(0, shown.length - 1))];
  if (row === undefined || layouts.length < 2) return still(state);
  const pins = row.order.map((place) => state.pins[place]).filter((pin) => pin !== undefined);
  const text = `In the order of ${row.label.trim()}.`;
  const notice = { tone: "plain", text } as const;
  if (pins.every((pin, place) => pin === state.pins[place])) return still({ ...state, notice });
  return ask({ ...state, pins, column: 0, notice });
}

export function chooseBank(state: State): Change {
  const found = underCursor(state);
  if (found === null) return still(state);
  return ask({
    ...state,
    chosen: arrangementOf(found),
    screen: "bank",
    scroll: { ...state.scroll, bank: 0, sharing: 0, shot: 0, order: 0 },
  });
}
