// Moves a cursor or a free scroll by a line, a page, or to an end.
import { listed, selectedIndex } from "../pick.ts";
import { type Change, type State, still } from "../state.ts";

export type Step = number | "first" | "last" | "page" | "pageBack";

/** Rows of a page: what a screen shows, less a little overlap. */
export const pageOf = (state: State): number => Math.max(1, state.rows - 10);

export function stepFrom(at: number, by: Step, page: number): number {
  if (typeof by === "number") return at + by;
  if (by === "first") return 0;
  if (by === "last") return Number.MAX_SAFE_INTEGER;
  return at + (by === "page" ? page : -page);
}

/** Moves the cursor of the list; it stops at the ends. */
export function moveSelection(state: State, by: Step): Change {
  const layouts = listed(state);
  const at = stepFrom(selectedIndex(state, layouts), by, pageOf(state));
  const next = layouts[Math.max(0, Math.min(layouts.length - 1, at))];
  return still({ ...state, selected: next?.id ?? state.selected, notice: null });
}

/** Scrolls a screen; the view cuts it to what there is, and `most` brings an overshoot back at the next key. */
export function scrollScreen(state: State, name: string, by: Step, most: number): Change {
  const at = Math.min(state.scroll[name] ?? 0, most);
  const next = Math.max(0, Math.min(most, stepFrom(at, by, pageOf(state))));
  return still({ ...state, scroll: { ...state.scroll, [name]: next }, notice: null });
}
