// What a screen gives to be drawn: its rows, where the caret stands, and how far it can be scrolled.
import type { Row } from "../row.ts";
import type { State } from "../state.ts";

export interface Page {
  readonly rows: readonly Row[];
  readonly caret: { readonly row: number; readonly column: number } | null;
  readonly mostScroll: number;
}

/** Room for the body of a screen. */
export interface Room {
  readonly columns: number;
  readonly rows: number;
}

export const pageOf = (rows: readonly Row[]): Page => ({ rows, caret: null, mostScroll: 0 });

/** A screen of rows that scrolls when it is longer than its room; the last line then says what is below and above. */
export function scrolled(state: State, name: string, head: readonly Row[], rows: readonly Row[], room: Room): Page {
  const space = Math.max(0, room.rows - head.length);
  if (rows.length <= space) return pageOf([...head, ...rows]);
  const window = Math.max(1, space - 1);
  const mostScroll = rows.length - window;
  const from = Math.max(0, Math.min(mostScroll, state.scroll[name] ?? 0));
  const below = rows.length - from - window;
  const words = `${from > 0 ? `${from} above` : ""}${from > 0 && below > 0 ? ", " : ""}${below > 0 ? `${below} more below` : ""}`;
  const hint: Row = { left: [{ text: `  (${words})`, style: "quiet" }] };
  return { rows: [...head, ...rows.slice(from, from + window), hint], caret: null, mostScroll };
}
