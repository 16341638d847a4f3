// The whole state of the screens, and the two closed unions that change it and that it asks for.

import type { Overrides } from "../catalog/index.ts";
import type { Bill } from "../order/index.ts";
import type { Refusal } from "../quantity/index.ts";
import type { Brief, LayoutResult, PlanResult } from "../search/index.ts";
import { FIRST_MAP, type FrontPoint, type MapView } from "./axes.ts";
import { type BlendEffect, type BlendMessage, type BlendState, NO_BLEND } from "./blend/state.ts";
import type { Ground } from "./ground.ts";
import type { Line, LineEdit } from "./line.ts";
import type { CatalogueFacts, Details, SaveAnswer, SharedWords, StockFacts } from "./ports.ts";
import type { Look } from "./terminal.ts";
import { NO_UNITS, type UnitsEffect, type UnitsMessage, type UnitsState } from "./units/state.ts";
import { type History, NO_HISTORY, type Tried, type Work } from "./work.ts";

/** The screens in their order, each with the key that goes there from anywhere. */
export const SCREEN_KEYS = {
  brief: "1",
  layouts: "2",
  compare: "3",
  bank: "4",
  sharing: "5",
  shot: "6",
  order: "7",
  map: "8",
  parts: "9",
  units: "0",
  blend: "b",
  trail: "t",
} as const;
export type ScreenName = keyof typeof SCREEN_KEYS;
export const SCREENS = Object.keys(SCREEN_KEYS) as readonly ScreenName[];

/** Most layouts side by side. */
export const MOST_PINS = 4;

/** What the engine last answered, all of it for one text of the brief. */
export type Answer =
  | { readonly kind: "refused"; readonly refusals: readonly Refusal[] }
  | {
      readonly kind: "planned";
      readonly brief: Brief;
      /** False while nothing fits and the least changes were not looked for yet. */
      readonly changesSought: boolean;
      readonly plan: PlanResult;
      /** Pinned arrangements assessed under this brief; null where the catalogue has no such part. */
      readonly pinned: readonly (LayoutResult | null)[];
      readonly chosen: LayoutResult | null;
      /** The front in full; null where it was not asked for. */
      readonly front: readonly FrontPoint[] | null;
      readonly bill: Bill | null;
    };

export interface Notice {
  readonly tone: "plain" | "good" | "warn" | "bad";
  readonly text: string;
}

/** The question for a file name; `replace` is set when the file named is there already. */
interface FilePrompt {
  readonly what: "order";
  readonly line: Line;
  readonly replace: boolean;
}

/** The question for a value of a part. */
interface ValuePrompt {
  readonly what: "value";
  readonly line: Line;
  readonly replace: false;
  readonly part: string;
  readonly heading: string;
}

export type Prompt = FilePrompt | ValuePrompt;

/** Long work under way. */
export interface LongJob {
  readonly words: string;
  /** Part of it that is done, 0 to 1; null: not known. */
  readonly done: number | null;
  readonly secondsLeft: number | null;
}

export interface State extends Work {
  readonly columns: number;
  readonly rows: number;
  readonly look: Look;
  readonly stock: StockFacts;
  /** Null until the catalogues are read. */
  readonly words: SharedWords | null;
  readonly screen: ScreenName;
  readonly help: boolean;
  /** Clicks and the wheel are taken; the terminal's own selecting then needs its own key, mostly Shift. */
  readonly mouse: boolean;
  readonly history: History;
  /** Every brief that was tried, the oldest first. */
  readonly trail: readonly Tried[];
  /** The field whose typing gave the last of the trail. */
  readonly trailTyping: string | null;
  /** Place on the trail under the cursor, counted from its end; 0 is now. */
  readonly trailBack: number;
  readonly map: MapView;
  /** The catalogues as they were understood; null until they are read. */
  readonly catalogue: CatalogueFacts | null;
  /** How often they were read: what was worked out on other values holds no more. */
  readonly reads: number;
  readonly partIndex: number;
  readonly headingIndex: number;
  /** Faults in place of parts. */
  readonly showFaults: boolean;
  /** The field under the caret, which is also the value in hand on the other screens. */
  readonly field: number;
  readonly caret: number;
  readonly answer: Answer | null;
  /** Number of the last question put to the engine, and of the last one answered. */
  readonly asked: number;
  readonly answered: number;
  readonly work: LongJob | null;
  /** The question whose answer was stopped; -1 for none. */
  readonly stopped: number;
  /** Id of the layout under the cursor; the place in the list is derived from it. */
  readonly selected: string | null;
  /** Column under the cursor on the comparison. */
  readonly column: number;
  /** Rows on which the pinned layouts agree are shown too. */
  readonly unfolded: boolean;
  /** What was worked out of the chosen bank for the screens that look closer; null before. */
  readonly details: Details | null;
  /** The spread of the worst unit is wanted on any basis. */
  readonly spread: boolean;
  /** First row shown of each screen that scrolls freely; cut to what there is when drawn. */
  readonly scroll: Readonly<Record<string, number>>;
  readonly prompt: Prompt | null;
  readonly units: UnitsState;
  readonly blend: BlendState;
  readonly notice: Notice | null;
  /** The catalogue is too large to look for least changes while one types. */
  readonly slow: boolean;
}

export type Message =
  | { readonly type: "resized"; readonly columns: number; readonly rows: number }
  | { readonly type: "go"; readonly screen: ScreenName }
  | { readonly type: "help" }
  | { readonly type: "quit" }
  | { readonly type: "suspend" }
  | { readonly type: "redraw" }
  | { readonly type: "edit"; readonly edit: LineEdit }
  | { readonly type: "choice"; readonly by: number }
  | { readonly type: "move"; readonly by: number | "first" | "last" | "page" | "pageBack" }
  | { readonly type: "column"; readonly by: number }
  | { readonly type: "nudge"; readonly up: boolean; readonly coarse: boolean }
  | { readonly type: "hand"; readonly by: 1 | -1 }
  | { readonly type: "undo" }
  | { readonly type: "redo" }
  | { readonly type: "retry" }
  | { readonly type: "axis"; readonly which: "x" | "y" }
  | { readonly type: "table" }
  | { readonly type: "pin" }
  | { readonly type: "choose" }
  | { readonly type: "rank" }
  | { readonly type: "front" }
  | { readonly type: "fold" }
  | { readonly type: "orderPins" }
  | { readonly type: "spread" }
  | { readonly type: "load" }
  | { readonly type: "detailed"; readonly details: Details }
  | { readonly type: "export" }
  | { readonly type: "confirm" }
  | { readonly type: "cancel" }
  | { readonly type: "answered"; readonly asked: number; readonly answer: Answer; readonly slow: boolean }
  | {
      readonly type: "opened";
      readonly stock: StockFacts;
      readonly words: SharedWords;
      readonly catalogue: CatalogueFacts;
      readonly overrides: Overrides;
    }
  | { readonly type: "work"; readonly work: LongJob | null }
  | { readonly type: "stop" }
  | { readonly type: "ground"; readonly ground: Ground }
  | { readonly type: "again" }
  | { readonly type: "mouse" }
  | { readonly type: "click"; readonly column: number; readonly row: number }
  | { readonly type: "value" }
  | { readonly type: "faults" }
  | { readonly type: "saved"; readonly answer: SaveAnswer }
  | { readonly type: "units"; readonly message: UnitsMessage }
  | { readonly type: "blend"; readonly message: BlendMessage }
  | { readonly type: "say"; readonly notice: Notice };

export type Effect =
  | { readonly type: "ask"; readonly asked: number }
  | { readonly type: "export"; readonly bill: Bill; readonly path: string; readonly replace: boolean }
  | { readonly type: "units"; readonly effect: UnitsEffect }
  | { readonly type: "blend"; readonly effect: BlendEffect }
  | { readonly type: "overrides"; readonly overrides: Overrides }
  | { readonly type: "stop" }
  | { readonly type: "mouse"; readonly on: boolean }
  | { readonly type: "quit" }
  | { readonly type: "suspend" }
  | { readonly type: "redraw" };

export interface Change {
  readonly state: State;
  readonly effects: readonly Effect[];
}

export const still = (state: State): Change => ({ state, effects: [] });

/** Asks the engine again: for a changed brief, order, pin or chosen bank. */
export const ask = (state: State): Change => {
  const asked = state.asked + 1;
  return { state: { ...state, asked }, effects: [{ type: "ask", asked }] };
};

export interface Start {
  readonly columns: number;
  readonly rows: number;
  readonly look: Look;
  readonly stock: StockFacts;
  readonly values: Readonly<Record<string, string>>;
  readonly extra: Readonly<Record<string, unknown>>;
}

export const initialState = (start: Start): State => ({
  ...start,
  words: null,
  history: NO_HISTORY,
  trail: [],
  trailTyping: null,
  trailBack: 0,
  map: FIRST_MAP,
  catalogue: null,
  overrides: {},
  reads: 0,
  partIndex: 0,
  headingIndex: 0,
  showFaults: false,
  screen: "brief",
  help: false,
  mouse: false,
  field: 0,
  caret: (start.values.energy ?? "").length,
  rank: "cost",
  frontOnly: false,
  answer: null,
  asked: 0,
  answered: 0,
  work: null,
  stopped: -1,
  selected: null,
  pins: [],
  column: 0,
  unfolded: false,
  chosen: null,
  details: null,
  spread: false,
  scroll: {},
  prompt: null,
  units: NO_UNITS,
  blend: NO_BLEND,
  notice: null,
  slow: false,
});
