// What the screens need from outside: the engine, the files, the clock and the terminal, handed in by main.
import type { Layout } from "../bank/index.ts";
import type { Capacitor, Overrides, ResistorFamily } from "../catalog/index.ts";
import type {
  besideWords,
  clampWords,
  loosenWords,
  proofSentence,
  rateBlocks,
  reasonWords,
  refusalWords,
  Source,
  titleOf,
  withoutBalanceWords,
} from "../cli/index.ts";
import type { Bill } from "../order/index.ts";
import type { Read } from "../quantity/index.ts";
import type {
  BankClamp,
  BankCorners,
  BankCourse,
  Brief,
  Improve,
  InductanceSweep,
  LayoutResult,
  PlanResult,
  Ranking,
  ShareSpread,
  ShotReport,
} from "../search/index.ts";
import type { TerminalInput } from "./input.ts";
import type { SaveAnswer } from "./saveText.ts";
import type { ProcessPort } from "./session.ts";
import type { UnitsPort } from "./units/work.ts";

export type { SaveAnswer };

/** One arrangement by name: what is pinned, chosen and saved. */
export type Arrangement = Layout;

export interface PlanRequest {
  readonly rank: Ranking;
  /** Most layouts worked out in full for the list. */
  readonly most: number;
  /** List only the layouts that no other beats in everything. */
  readonly frontOnly: boolean;
  /** Leave out the search for least changes: asked at every key, with the whole answer asked for when the keys rest. */
  readonly quick: boolean;
  /** Called on the way, parts done of all parts. */
  readonly progress?: ((done: number, total: number) => void) | undefined;
}

/** The states at rest. Ratings and tolerance are those of the unit; null is unknown. */
export interface RestDetail {
  readonly rating: number;
  readonly tolerance: { readonly low: number; readonly high: number } | null;
  readonly corners: BankCorners;
  readonly course: BankCourse | null;
  readonly clamp: BankClamp | null;
  readonly cautions: readonly string[];
}

export interface ShotDetail {
  readonly report: Read<ShotReport>;
  readonly sweep: InductanceSweep | null;
  readonly cautions: readonly string[];
}

/** The pieces; one that is absent is not worked out yet. */
export interface Details {
  /** The brief and the bank that they hold for. */
  readonly key: string;
  readonly rest?: RestDetail | null;
  readonly margin?: Improve | null;
  readonly spread?: ShareSpread | null;
  readonly shot?: ShotDetail | null;
}

export type Piece = Exclude<keyof Details, "key">;

/** Most layouts of a front that are worked out for the map. */
export const MOST_FRONT = 1000;

export interface EnginePort {
  /** Reads a brief from text by key; each refusal's place.field is the key. */
  readonly readBrief: (values: Readonly<Record<string, unknown>>) => Read<Brief>;
  /** Refuses only what cannot be planned at all, such as two currencies without a rate. */
  readonly plan: (brief: Brief, request: PlanRequest) => Read<PlanResult>;
  /** The layouts of a plan's front worked out in full, the cheapest first, at most MOST_FRONT. */
  readonly front: (brief: Brief, plan: PlanResult) => readonly LayoutResult[];
  /** Life of the worst unit over that at its ratings, for the brief's load; null is unknown. */
  readonly life: (brief: Brief, layout: LayoutResult) => number | null;
  /** Assesses one arrangement under a brief; null when the catalogue has no such part. */
  readonly check: (brief: Brief, arrangement: Arrangement) => LayoutResult | null;
  /** What must be bought for a layout; null when the catalogue has no such part. */
  readonly bill: (brief: Brief, layout: LayoutResult) => Bill | null;
  /** The states at rest of one layout; null as for `bill`, here and below. */
  readonly rest: (brief: Brief, layout: LayoutResult) => RestDetail | null;
  /** What eats the margin; null also when there is none to divide. Searches again, so it takes its time. */
  readonly margin: (brief: Brief, layout: LayoutResult) => Improve | null;
  /** How the worst unit's voltage is spread; null also when nothing is spread or known. Draws banks, so it takes its time. */
  readonly spread: (brief: Brief, layout: LayoutResult) => ShareSpread | null;
  /** One shot into the brief's load. */
  readonly shot: (brief: Brief, layout: LayoutResult) => ShotDetail | null;
}

export interface StockFacts {
  /** What the catalogue is called on screen: its file, or how many files. */
  readonly name: string;
  readonly parts: number;
  /** Rows that could not be read. */
  readonly faults: number;
  /** Said on screen about the data, such as that they are invented; empty for none. */
  readonly note: string;
}

/** One value of a part in words, and where it comes from. */
export interface PartValue {
  readonly heading: string;
  readonly text: string;
  readonly state: "datasheet" | "measured" | "assumed" | "unknown";
  readonly rule?: string;
}

/** The catalogues as they were understood. */
export interface CatalogueFacts {
  readonly parts: readonly Capacitor[];
  readonly sources: readonly Source[];
}

/** Words that the screens share with the commands. They come with the engine, so that the first frame does not wait for them. */
export interface SharedWords {
  readonly titleOf: typeof titleOf;
  readonly clampWords: typeof clampWords;
  readonly withoutBalanceWords: typeof withoutBalanceWords;
  readonly rateBlocks: typeof rateBlocks;
  readonly besideWords: typeof besideWords;
  readonly loosenWords: typeof loosenWords;
  readonly proofSentence: typeof proofSentence;
  readonly reasonWords: typeof reasonWords;
  readonly refusalWords: typeof refusalWords;
  /** Headings whose values can be set by hand. */
  readonly headings: readonly string[];
  readonly valuesOf: (unit: Capacitor) => readonly PartValue[];
  /** Money in the major unit of its currency. */
  readonly majorOf: (minor: number, currency: string | undefined) => number;
  /** Why these values cannot be set by hand; null when they can. */
  readonly overrideTrouble: (unit: Capacitor, texts: Readonly<Record<string, string>>) => string | null;
}

/** What is read and loaded once the first frame stands. */
export interface Workshop {
  readonly engine: EnginePort;
  readonly stock: StockFacts;
  readonly words: SharedWords;
  readonly units: UnitsPort;
  readonly catalogue: CatalogueFacts;
  /** What the engine was made of, for another one in a thread. */
  readonly families: readonly ResistorFamily[];
  /** What is set by hand for all parts, as it was read. */
  readonly overrides: Overrides;
  /** Writes what is set by hand beside the catalogues, never into them. */
  readonly saveOverrides: (overrides: Overrides) => SaveAnswer;
  /** Writes the order of a bank to a file whose ending names the format. */
  readonly exportBill: (bill: Bill, path: string, replace: boolean) => SaveAnswer;
}

/** A thread that can be talked to in plain data. */
export interface ThreadPort {
  readonly post: (ask: object) => void;
  readonly onReply: (take: (reply: unknown) => void) => void;
  /** It could not start, or has failed. */
  readonly onFail: (failed: () => void) => void;
  /** Ends it at once, whatever it does. */
  readonly end: () => void;
}

export interface ScreenPorts {
  /** Reads the catalogues and loads the engine; refused, the screens end and the refusals are for the caller to tell. */
  readonly open: () => Promise<Read<Workshop>>;
  /** Calls back when a catalogue has changed on disk, until the function that it gives is called. */
  readonly watch: (changed: () => void) => () => void;
  /** Opens a thread for long work; absent: all is done in this one. */
  readonly thread?: (() => ThreadPort) | undefined;
  /** What is known of the catalogues before they are read. */
  readonly stock: StockFacts;
  /** The brief to start with when none was saved: text by key. */
  readonly brief: Readonly<Record<string, string>>;
  /** The brief was asked for now, so that it holds and not the one saved last time. */
  readonly briefFirst: boolean;
  /** What else the brief says, which the form has no field for; kept and planned with. */
  readonly extra: Readonly<Record<string, unknown>>;
  /** The text last given to `saveSession`, or null. */
  readonly loadSession: () => string | null;
  /** Saves at once; null when done, else why not. */
  readonly saveSession: (text: string) => string | null;
  /** Puts a saved text that could not be read aside, so that it is not overwritten; where it is now, or null. */
  readonly keepSession: () => string | null;
  readonly stdin: TerminalInput;
  readonly stdout: TerminalOutput;
  /** Writes to the terminal at once. */
  readonly writeSync: (text: string) => void;
  /** Says one line on standard error. */
  readonly complain: (line: string) => void;
  readonly process: ProcessPort;
  readonly env: Record<string, string | undefined>;
  readonly ascii?: boolean;
  /** Asked for; absent: found out. */
  readonly ground?: "dark" | "light";
}

/** The part of a terminal's output stream that is used. */
export interface TerminalOutput {
  readonly isTTY?: boolean;
  readonly columns?: number;
  readonly rows?: number;
  write: (text: string) => unknown;
  on: (event: "resize" | "error", listener: (fact?: unknown) => void) => unknown;
  off: (event: "resize" | "error", listener: (fact?: unknown) => void) => unknown;
}
