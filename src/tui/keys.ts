// The one table of keys: what each does, its words, and when it is live. The dispatcher and the help both read it.
import type { BlendMessage } from "./blend/state.ts";
import { groundTold } from "./ground.ts";
import * as live from "./live.ts";
import { mouseTold } from "./mouse.ts";
import { type Message, SCREEN_KEYS, SCREENS, type ScreenName, type State } from "./state.ts";
import type { InputEvent } from "./tokens.ts";
import type { UnitsMessage } from "./units/state.ts";

export interface KeyRow {
  readonly keys: readonly string[];
  /** How the keys are called on screen; empty where another row's words cover them. */
  readonly shown: string;
  readonly words: string;
  readonly message: Message;
  readonly live: live.Live;
  /** Place in the help line, the least first; null keeps the key to the help screen. */
  readonly rank: number | null;
}

type Short = readonly [readonly string[], string, string, Message, live.Live, (number | null)?];

const lists = live.all(live.on("layouts"), live.hasLayouts);
const maps = live.all(live.on("map"), live.hasLayouts);
const picks: live.Live = (state) => lists(state) || maps(state);
const compares = live.all(live.on("compare"), live.hasPins);
const shows = live.all(live.on("bank", "sharing", "shot", "order"), live.hasBank);
const looks = live.all(live.on("bank", "sharing", "shot"), live.hasBank);
const saves = live.all(live.on("bank", "order"), live.hasBank);
const tracks = live.all(live.on("trail"), live.hasTrail);
const sets = live.all(live.on("parts"), live.hasParts);
const moves: live.Live = (state) =>
  picks(state) ||
  compares(state) ||
  shows(state) ||
  tracks(state) ||
  live.on("parts", "blend")(state) ||
  live.onUnits(state);

/** What lies on top comes first: the first live row wins. */
const ON_TOP: readonly Short[] = [
  [["escape"], "Esc", "stop the work", { type: "stop" }, live.works, 0],
  [["enter"], "Enter", "save", { type: "confirm" }, live.asksName, 1],
  [["escape"], "Esc", "do not save", { type: "cancel" }, live.asksName, 2],
  [["y"], "y", "replace the file", { type: "confirm" }, live.asksReplace, 1],
  [["n", "escape"], "n", "keep the file", { type: "cancel" }, live.asksReplace, 2],
  [["escape", "enter", "f1", "?", "q"], "Esc", "close help", { type: "help" }, live.inHelp, 1],
  [["up"], "Up/Down", "scroll", { type: "move", by: -1 }, live.inHelp, 2],
  [["down"], "", "scroll", { type: "move", by: 1 }, live.inHelp],
  [["pageup"], "", "scroll", { type: "move", by: "pageBack" }, live.inHelp],
  [["pagedown", "space"], "", "scroll", { type: "move", by: "page" }, live.inHelp],
];

const units = (message: UnitsMessage): Message => ({ type: "units", message });

const UNITS: readonly Short[] = [
  [["enter"], "Enter", "read or save", units({ type: "confirm" }), live.typesUnits, 1],
  [["escape"], "Esc", "leave the name", units({ type: "cancel" }), live.typesUnits, 2],
  [["y"], "y", "replace the file", units({ type: "confirm" }), live.asksUnits, 1],
  [["n", "escape"], "n", "keep the file", units({ type: "cancel" }), live.asksUnits, 2],
  [["escape"], "Esc", "stop with the best so far", units({ type: "cancel" }), live.placesUnits, 1],
  [["m"], "m", "file of units", units({ type: "name" }), live.onUnits, 1],
  [["enter"], "Enter", "place", units({ type: "place" }), live.hasUnits, 2],
  [["e", "s"], "e", "save list", units({ type: "list" }), live.hasPlaced, 3],
];

const blend = (message: BlendMessage): Message => ({ type: "blend", message });

const BLEND: readonly Short[] = [
  [["escape"], "Esc", "stop, keep the best", blend({ type: "cancel" }), live.seeksBlend, 1],
  [["enter"], "Enter", "find the blend", blend({ type: "find" }), live.mayFindBlend, 1],
];

const FORM: readonly Short[] = [
  [["down", "tab", "enter"], "Up/Down", "field", { type: "move", by: 1 }, live.onBrief, 1],
  [["up", "shift+tab"], "", "field", { type: "move", by: -1 }, live.onBrief],
  [["pagedown"], "PgDn", "last field", { type: "move", by: "last" }, live.onBrief, null],
  [["pageup"], "PgUp", "first field", { type: "move", by: "first" }, live.onBrief, null],
  [["right", "space"], "Left/Right", "choice", { type: "choice", by: 1 }, live.onChoice, 2],
  [["left"], "", "choice", { type: "choice", by: -1 }, live.onChoice],
  [["escape"], "Esc", "layouts", { type: "go", screen: "layouts" }, live.onBrief, 5],
];

const edit = (
  what: "back" | "delete" | "left" | "right" | "home" | "end" | "clear" | "clearBefore" | "backWord",
): Message => ({
  type: "edit",
  edit: { edit: what },
});

const TYPING: readonly Short[] = [
  [["left", "ctrl+b"], "Left/Right", "caret", edit("left"), live.types, null],
  [["right", "ctrl+f"], "", "caret", edit("right"), live.types],
  [["home", "ctrl+a"], "Home/End", "caret to the ends", edit("home"), live.types, null],
  [["end", "ctrl+e"], "", "caret to the ends", edit("end"), live.types],
  [["backspace"], "Backspace", "delete before", edit("back"), live.types, null],
  [["delete", "ctrl+d"], "Delete", "delete after", edit("delete"), live.types, null],
  [["ctrl+w", "alt+backspace"], "Ctrl-W", "delete a word", edit("backWord"), live.types, null],
  [["ctrl+u"], "Ctrl-U", "empty the field", edit("clear"), live.types, 3],
];

const LISTS: readonly Short[] = [
  [["enter"], "Enter", "show bank", { type: "choose" }, picks, 2],
  [["space", "p"], "Space", "pin", { type: "pin" }, picks, 1],
  [["r"], "r", "order by", { type: "rank" }, lists, 3],
  [["f"], "f", "only unbeaten", { type: "front" }, lists, 4],
  [["enter"], "Enter", "this brief again", { type: "retry" }, tracks, 1],
  [["x"], "x y", "other axes", { type: "axis", which: "x" }, maps, 3],
  [["y"], "", "other axes", { type: "axis", which: "y" }, maps],
  [["v"], "v", "counts or scatter", { type: "table" }, maps, 4],
  [["left", "h"], "Left/Right", "walk across", { type: "column", by: -1 }, maps, 5],
  [["right", "l"], "", "walk across", { type: "column", by: 1 }, maps],
  [["left"], "Left/Right", "column", { type: "column", by: -1 }, compares, 1],
  [["right"], "", "column", { type: "column", by: 1 }, compares],
  [["enter"], "Enter", "show bank", { type: "choose" }, compares, 2],
  [["space", "p", "x"], "Space", "unpin", { type: "pin" }, compares, 3],
  [["o"], "o", "order by row", { type: "orderPins" }, compares, 4],
  [["a"], "a", "fold or unfold", { type: "fold" }, compares, 4],
  [["space", "p"], "Space", "pin", { type: "pin" }, looks, 4],
  [["e", "s"], "e", "save order", { type: "export" }, saves, 1],
  [["c"], "c", "chance", { type: "spread" }, live.mayAskSpread, 2],
  [["l"], "l", "load", { type: "load" }, live.on("shot"), 2],
  [["enter", "e"], "Enter", "set by hand", { type: "value" }, sets, 1],
  [["d"], "d", "faults or parts", { type: "faults" }, live.on("parts"), 2],
  [["left"], "Left/Right", "value", { type: "column", by: -1 }, sets, 3],
  [["right"], "", "value", { type: "column", by: 1 }, sets],
  [["up", "k"], "Up/Down", "move", { type: "move", by: -1 }, moves, 6],
  [["down", "j"], "", "move", { type: "move", by: 1 }, moves],
  [["pageup"], "PgUp/PgDn", "page", { type: "move", by: "pageBack" }, moves, null],
  [["pagedown"], "", "page", { type: "move", by: "page" }, moves],
  [["home", "g"], "Home/End", "first and last", { type: "move", by: "first" }, moves, null],
  [["end", "G"], "", "first and last", { type: "move", by: "last" }, moves],
  [
    ["escape"],
    "Esc",
    "layouts",
    { type: "go", screen: "layouts" },
    live.on("compare", "bank", "sharing", "shot", "order", "trail", "map", "parts", "units", "blend"),
    7,
  ],
  [["escape"], "Esc", "brief", { type: "go", screen: "brief" }, live.on("layouts"), 7],
];

/** This function key turns the mouse on and off; screens beyond the one before have none. */
const MOUSE_KEY = 12;

const go = (screen: ScreenName, index: number): readonly Short[] => [
  [
    [`alt+${SCREEN_KEYS[screen]}`, ...(index + 2 < MOUSE_KEY ? [`f${index + 2}`] : [])],
    "",
    screen,
    { type: "go", screen },
    live.noQuestion,
  ],
  [[SCREEN_KEYS[screen]], "", screen, { type: "go", screen }, live.isFree],
];

const nudge = (up: boolean, coarse: boolean): Message => ({ type: "nudge", up, coarse });

/** What if, from any screen. On the form letters are text, so there Alt goes with it. */
const WHAT_IF: readonly Short[] = [
  [["-"], "- +", "step the value in hand", nudge(false, false), live.isFree, null],
  [["+", "="], "", "step", nudge(true, false), live.isFree],
  [["<", ","], "< >", "leap it", nudge(false, true), live.isFree, null],
  [[">", "."], "", "leap", nudge(true, true), live.isFree],
  [["["], "[ ]", "take another value in hand", { type: "hand", by: -1 }, live.isFree, null],
  [["]"], "", "take another", { type: "hand", by: 1 }, live.isFree],
  [["alt+down"], "Alt-Up/Down", "step the value", nudge(false, false), live.isOpen, null],
  [["alt+up"], "", "step", nudge(true, false), live.isOpen],
  [["alt+pagedown"], "Alt-PgUp/PgDn", "leap it", nudge(false, true), live.isOpen, null],
  [["alt+pageup"], "", "leap", nudge(true, true), live.isOpen],
  [["u"], "u U", "take back, bring back", { type: "undo" }, live.isFree, 6],
  [["U"], "", "bring back", { type: "redo" }, live.isFree],
  [["alt+u"], "Alt-u Alt-U", "take back, bring back", { type: "undo" }, live.isOpen, null],
  [["alt+U"], "", "bring back", { type: "redo" }, live.isOpen],
];

/** "1 to 7", or the keys one by one. */
const screenKeys = (names: readonly ScreenName[]): string => names.map((name) => SCREEN_KEYS[name]).join(" ");

const EVERYWHERE: readonly Short[] = [
  ...SCREENS.flatMap(go),
  [
    [],
    screenKeys(SCREENS),
    `${SCREENS.join(", ")}; with Alt from the form too, or F2 and on`,
    { type: "redraw" },
    live.isFree,
    null,
  ],
  [[], "Alt-1 2 ...", "screens", { type: "redraw" }, live.onBrief, 4],
  [["f1"], "F1", "help", { type: "help" }, live.isOpen, 8],
  [["?"], "", "help", { type: "help" }, live.isFree],
  [["ctrl+q", "ctrl+c"], "Ctrl-Q", "save and quit", { type: "quit" }, live.always, 9],
  [["q"], "", "quit", { type: "quit" }, live.isFree],
  [["ctrl+r"], "Ctrl-R", "plan again", { type: "again" }, live.isOpen, null],
  [[`f${MOUSE_KEY}`], `F${MOUSE_KEY}`, "mouse on or off", { type: "mouse" }, live.isOpen, null],
  [["ctrl+z"], "Ctrl-Z", "suspend", { type: "suspend" }, live.always, null],
  [["ctrl+l"], "Ctrl-L", "draw again", { type: "redraw" }, live.always, null],
];

export const KEYS: readonly KeyRow[] = [
  ...ON_TOP,
  ...UNITS,
  ...BLEND,
  ...FORM,
  ...TYPING,
  ...LISTS,
  ...WHAT_IF,
  ...EVERYWHERE,
].map(([keys, shown, words, message, isLive, rank = null]) => ({ keys, shown, words, message, live: isLive, rank }));

/** What the terminal said by itself: its ground, or the mouse. The wheel moves like the keys. */
function messageOfReport(state: State, text: string): Message | null {
  const ground = groundTold(text);
  if (ground !== null) return { type: "ground", ground };
  const mouse = state.mouse ? mouseTold(text) : null;
  if (mouse === null) return null;
  if (mouse.kind === "wheel") return live.isOpen(state) || state.help ? { type: "move", by: mouse.by } : null;
  return live.isOpen(state) ? { type: "click", column: mouse.column, row: mouse.row } : null;
}

/** What an event means now: a key of the table, text typed into a field, a paste; null for nothing. */
export function messageFor(state: State, event: InputEvent): Message | null {
  if (event.kind === "report") return messageOfReport(state, event.text);
  if (event.kind === "paste") {
    return live.types(state) ? { type: "edit", edit: { edit: "insert", text: event.text } } : null;
  }
  const row = KEYS.find(({ keys, live: isLive }) => keys.includes(event.key) && isLive(state));
  if (row) return row.message;
  return event.text !== "" && live.types(state) ? { type: "edit", edit: { edit: "insert", text: event.text } } : null;
}

/** The rows of the table that are live and have a name on screen. */
export const liveKeys = (state: State): readonly KeyRow[] => KEYS.filter((row) => row.shown !== "" && row.live(state));

/** The keys for the help line, the most wanted first. */
export const helpLineKeys = (state: State): readonly KeyRow[] =>
  liveKeys(state)
    .filter((row) => row.rank !== null)
    .sort((a, b) => (a.rank ?? 0) - (b.rank ?? 0));
