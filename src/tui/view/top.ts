// The top of every screen: the names of the screens with their keys, and the rule under the brief, which tells the value in hand.

import { drawBar } from "../bar.ts";
import { fieldAt } from "../fields.ts";
import { type Row, type Span, span } from "../row.ts";
import { type LongJob, SCREEN_KEYS, SCREENS, type ScreenName, type State } from "../state.ts";
import { drawnText } from "../text.ts";
import { textWidth } from "../width.ts";

/** From here on the program's name stands at the right. */
const ROOM_FOR_NAME = 100;
const NAME = "joulewright";

function tabName(state: State, screen: ScreenName): string {
  const pins = screen === "compare" && state.pins.length > 0 ? ` (${state.pins.length})` : "";
  const name = `${SCREEN_KEYS[screen]} ${screen}${pins}`;
  return screen === state.screen ? `[${name}]` : name;
}

/** Every screen by its key; the one in sight by its name too, and then as many others as fit, from the first. */
export function tabsRow(state: State): Row {
  const named = state.columns >= ROOM_FOR_NAME;
  let room = state.columns - (named ? NAME.length + 1 : 0);
  for (const screen of SCREENS) room -= (screen === state.screen ? tabName(state, screen).length : 1) + 1;
  const tabs = SCREENS.flatMap((screen): readonly Span[] => {
    const here = screen === state.screen;
    const name = tabName(state, screen);
    const full = here || name.length - 1 <= room;
    if (full && !here) room -= name.length - 1;
    return [span(full ? name : SCREEN_KEYS[screen], here ? "focus" : "plain"), span(" ")];
  });
  return { left: tabs, right: named ? [span(NAME, "title")] : [] };
}

/** What can be said of the keys that step, the fullest first. */
const STEPS: readonly string[] = ["   - + step   < > leap   [ ] other", "   - + step  [ ] other", ""];

/** Seconds as one would say them: no more exact than they are. */
function leftWords(seconds: number | null): string {
  if (seconds === null) return "";
  if (seconds < 1.5) return ", about a second left";
  return seconds < 90 ? `, about ${Math.ceil(seconds)} s left` : `, about ${Math.ceil(seconds / 60)} min left`;
}

/** Long work on the rule: a bar, how much is done, how long it still takes, and how to stop it. */
function workRow({ columns, look }: State, { words, done, secondsLeft }: LongJob): Row {
  const cells = 12;
  const percent = done === null ? "" : ` ${Math.floor(done * 100)} %`;
  const bar = done === null ? "" : ` ${drawBar(done, { columns: cells, full: 1, limit: null, ascii: look.ascii })}`;
  const text = ` ${words}${bar}${percent}${leftWords(secondsLeft)}; Esc stops it `;
  return {
    left: [
      span("──", "quiet"),
      span(text, "strong"),
      span("─".repeat(Math.max(0, columns - text.length - 2)), "quiet"),
    ],
  };
}

/** The rule between the top and the body. On the form the value in hand is the one under the caret. */
export function ruleRow(state: State): Row {
  const rule = (cells: number): Span => span("─".repeat(Math.max(0, cells)), "quiet");
  if (state.work !== null) return workRow(state, state.work);
  if (state.screen === "brief" || state.help) return { left: [rule(state.columns)] };
  const field = fieldAt(state.field);
  const text = drawnText(state.values[field.key] ?? "", state.look.ascii);
  const value = text.trim() === "" ? field.blank : text;
  const told = `in hand: ${field.label} ${value}`;
  const keys = STEPS.find((words) => textWidth(told) + words.length + 6 <= state.columns) ?? "";
  const used = textWidth(told) + keys.length + 4;
  return {
    left: [rule(2), span(" "), span(told, "accent"), span(`${keys} `, "quiet"), rule(state.columns - used)],
  };
}
