// What the screen of measured units holds, and the messages and effects of its own.
import type { Layout } from "../../bank/index.ts";
import type { MeasuredUnit, Placing, SearchStep } from "../../place/index.ts";
import type { Read, Refusal } from "../../quantity/index.ts";
import { type Line, type LineEdit, lineOf } from "../line.ts";
import type { SaveAnswer } from "../saveText.ts";

/** A lot as read from its file. */
export interface UnitsLot {
  readonly path: string;
  readonly units: readonly MeasuredUnit[];
  /** Rows that were lost. */
  readonly faults: readonly Refusal[];
}

/** The places filled in the order of the file: what the bank would be without placing. */
export interface Listed {
  readonly bank: Layout;
  readonly groups: readonly (readonly string[])[];
  readonly gap: number;
}

/** Where the search stands. */
export interface Running {
  readonly phase: SearchStep["phase"];
  readonly gap: number;
  /** Part of the effort spent, 0 to 1. */
  readonly part: number;
  readonly groups: readonly (readonly string[])[];
}

export interface Placed {
  readonly bank: Layout;
  readonly placing: Placing;
  /** The user stopped it: the best by then. */
  readonly stopped: boolean;
}

export interface UnitsState {
  /** What is typed: the name of the file of units, or of the list to save; null when keys are keys. */
  readonly typing: "path" | "save" | null;
  readonly path: Line;
  readonly save: Line;
  /** The list's file is there already. */
  readonly replace: boolean;
  readonly lot: UnitsLot | null;
  readonly refusals: readonly Refusal[];
  readonly before: Listed | null;
  readonly running: Running | null;
  readonly placed: Placed | null;
}

export type UnitsMessage =
  | { readonly type: "name" }
  | { readonly type: "edit"; readonly edit: LineEdit }
  | { readonly type: "confirm" }
  | { readonly type: "cancel" }
  | { readonly type: "place" }
  | { readonly type: "list" }
  | { readonly type: "read"; readonly path: string; readonly read: Read<UnitsLot> }
  | { readonly type: "begun"; readonly before: Listed; readonly running: Running }
  | { readonly type: "progress"; readonly running: Running }
  | { readonly type: "placed"; readonly bank: Layout; readonly read: Read<Placing>; readonly stopped: boolean }
  | { readonly type: "listed"; readonly answer: SaveAnswer };

export type UnitsEffect =
  | { readonly what: "read"; readonly path: string }
  | { readonly what: "place"; readonly lot: UnitsLot }
  | { readonly what: "stop" }
  | {
      readonly what: "save";
      readonly lot: UnitsLot;
      readonly placed: Placed;
      readonly path: string;
      readonly replace: boolean;
    };

export const NO_UNITS: UnitsState = {
  typing: null,
  path: lineOf(""),
  save: lineOf("positions.csv"),
  replace: false,
  lot: null,
  refusals: [],
  before: null,
  running: null,
  placed: null,
};
