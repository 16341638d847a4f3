// Questions about the state that more than one screen asks: which layouts are listed, which one is under the cursor, chosen, pinned.

import type { LayoutResult, PlanResult } from "../search/index.ts";
import type { Arrangement } from "./ports.ts";
import type { State } from "./state.ts";

export const planOf = (state: State): PlanResult | null =>
  state.answer?.kind === "planned" ? state.answer.plan : null;

export const arrangementOf = ({ part, series, parallel, ties }: Arrangement): Arrangement => ({
  part,
  series,
  parallel,
  ties,
});

export const isSame = (a: Arrangement, b: Arrangement): boolean =>
  a.part === b.part && a.series === b.series && a.parallel === b.parallel && a.ties === b.ties;

export const isPinned = (state: State, layout: Arrangement): boolean => state.pins.some((pin) => isSame(pin, layout));

export const listed = (state: State): readonly LayoutResult[] => planOf(state)?.layouts ?? [];

/** Place in the list of the layout under the cursor; the first when it is no longer listed. */
export const selectedIndex = (state: State, layouts = listed(state)): number =>
  Math.max(
    0,
    layouts.findIndex((layout) => layout.id === state.selected),
  );

export const selectedLayout = (state: State): LayoutResult | null => {
  const layouts = listed(state);
  return layouts[selectedIndex(state, layouts)] ?? null;
};

/** The pinned layouts that could be assessed, each with its place among the pins. */
export const pinnedLayouts = (state: State): readonly (LayoutResult | null)[] =>
  state.answer?.kind === "planned" ? state.answer.pinned : [];

/** The bank that the bank and order screens show: the chosen one, once it is assessed under this brief. */
export const shownBank = (state: State): LayoutResult | null => {
  const { answer, chosen } = state;
  if (answer?.kind !== "planned" || answer.chosen === null || chosen === null) return null;
  return isSame(answer.chosen, chosen) ? answer.chosen : null;
};
