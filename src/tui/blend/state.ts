// What the screen of blends holds, and the messages and effects of its own.
import type { Read } from "../../quantity/index.ts";
import type { BlendPlan, BlendStage, Brief, LayoutResult } from "../../search/index.ts";

/** What the thread answers. */
export interface BlendAnswer {
  readonly plan: Read<BlendPlan>;
  /** The cheapest layout of one part, to compare with; null when none fits or none has a price. */
  readonly single: LayoutResult | null;
  readonly cautions: readonly string[];
}

/** What is worked out now: a stage of the search, or the layout of one part before it. */
export type Stage = BlendStage | "one part";

export interface Seeking {
  readonly key: string;
  readonly stage: Stage;
  readonly seconds: number;
  /** It was told to stop and has not done so yet. */
  readonly stopping: boolean;
}

export interface FoundBlends {
  /** The brief and catalogues that it holds for. */
  readonly key: string;
  readonly answer: BlendAnswer;
  readonly seconds: number;
  /** The user stopped it: what was known by then. */
  readonly stopped: boolean;
}

/** Why there is nothing: it was ended with nothing in hand, or there was no thread. */
export interface Ended {
  readonly key: string;
  readonly why: "cancelled" | "failed";
}

export interface BlendState {
  readonly running: Seeking | null;
  readonly found: FoundBlends | null;
  readonly ended: Ended | null;
}

export type BlendMessage =
  | { readonly type: "find" }
  | { readonly type: "cancel" }
  | { readonly type: "begun"; readonly key: string }
  | { readonly type: "stage"; readonly stage: Stage }
  | { readonly type: "tick"; readonly seconds: number }
  | { readonly type: "found"; readonly answer: BlendAnswer; readonly seconds: number }
  | { readonly type: "ended"; readonly key: string; readonly why: Ended["why"] };

export type BlendEffect =
  | { readonly what: "find"; readonly brief: Brief; readonly key: string }
  | { readonly what: "stop" };

export const NO_BLEND: BlendState = { running: null, found: null, ended: null };
