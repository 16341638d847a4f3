// A click: the name of a screen goes there; a row moves the cursor to it, as far as the screen in sight has one.
import { SCREENS, type State } from "../state.ts";
import { drawScreen } from "../view/screen.ts";
import { tabsRow } from "../view/top.ts";
import { textWidth } from "../width.ts";

/** The screen whose name stands at a column of the first row. */
function tabAt(state: State, column: number) {
  let at = 0;
  let tab = 0;
  for (const { text } of tabsRow(state).left) {
    const width = textWidth(text);
    const isName = text !== " ";
    if (isName && column >= at && column < at + width) return SCREENS[tab] ?? null;
    if (isName) tab += 1;
    at += width;
  }
  return null;
}

/** The rows as plain text. */
const textRows = (state: State): readonly string[] =>
  drawScreen({ ...state, look: { colour: false, ascii: true } }).rows.map((row) => row.replace(/\x1b\[[\d;]*m/g, ""));

/** Row of the screen that has the cursor's mark; null where none has. */
function cursorRow(rows: readonly string[]): number | null {
  const at = rows.findIndex((row, index) => index >= 3 && row.startsWith("> "));
  return at < 0 ? null : at;
}

/** What a click means as another message: a screen, or steps of the cursor; null for nothing. */
export function clickMeans(
  state: State,
  { column, row }: { readonly column: number; readonly row: number },
): { readonly type: "go"; readonly screen: State["screen"] } | { readonly type: "move"; readonly by: number } | null {
  if (row === 0) {
    const screen = tabAt(state, column);
    return screen === null ? null : { type: "go", screen };
  }
  const rows = textRows(state);
  const at = cursorRow(rows);
  if (at === null || row < 4 || row >= state.rows - 3 || row === at) return null;
  // Beneath or beside the form stand results, which are no fields.
  if (state.screen === "brief" && !/^ {2}.{21}\[/.test(rows[row] ?? "")) return null;
  return { type: "move", by: row - at };
}
