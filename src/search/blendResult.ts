// What a blend answers: its strings, the bank as a whole, the proof by names, and what would change the choice. Plain data, SI, major money.

import type { Finding } from "../quantity/index.ts";
import type { Cost, LayoutResult, RefusedPart, Span } from "./result.ts";

/** One group of equal strings, assessed on its own; the findings of the whole bank are the blend's. */
export interface BlendString extends LayoutResult {
  readonly bought: number;
  readonly fromHand: number;
  readonly supplier: string | null;
  /** Fraction of the pulse's charge that this group gives, under the tolerances; null ends where one is unknown. */
  readonly chargeShare: Span;
}

/** The group that stands nearest its limit; null when not assessed or when there is nothing to share. */
export interface WorstShare {
  readonly part: string;
  readonly value: number;
  readonly limit: number;
}

export interface BlendCost extends Cost {
  /** What ordering each part costs as such. */
  readonly lines: number;
  /** What the shipments cost. */
  readonly shipments: number;
}

/** One supplier who sends something; null is one who is not named. Major money. */
export interface Shipment {
  readonly supplier: string | null;
  readonly cost: number;
}

export interface BlendResult {
  readonly id: string;
  readonly strings: readonly BlendString[];
  readonly units: number;
  readonly capacitance: Span;
  readonly energy: Span;
  readonly share: {
    readonly charging: WorstShare | null;
    readonly holding: WorstShare | null;
    readonly leftAfterDump: WorstShare | null;
  };
  /** Slowest group through its own chains, should it be cut off from the rest; and all together through all chains. */
  readonly bleed: { readonly seconds: number | null; readonly together: number | null; readonly toVoltage: number };
  readonly cost: BlendCost | null;
  readonly volume: number | null;
  readonly mass: number | null;
  readonly stress: number | null;
  readonly suppliers: number;
  /** Shipments that cost something. */
  readonly shipments: readonly Shipment[];
  /** Of the bank as a whole. */
  readonly findings: readonly Finding[];
  /** Parts and ties: two blends of one kind differ only in counts. */
  readonly kind: string;
  /** Null for an alternative, which claims nothing. */
  readonly certificate: NamedCertificate | null;
}

/**
 * The proof as data, by part names. Prices are minor units of money for the whole need or the whole of a ceiling; costs are
 * minor units. Whoever has the catalogue and the brief can check it without the search.
 */
export interface NamedCertificate {
  readonly claim: "cheapest" | "no blend exists";
  readonly cost: number | null;
  readonly currency: string | null;
  readonly maxTypes: number;
  /** Each string type that was compared: part, series count, most strings. */
  readonly compared: number;
  readonly prices: {
    readonly cost: 0 | 1;
    readonly capacity: number;
    readonly volume: number;
    readonly mass: number;
    readonly units: number;
  };
  readonly bound: number;
  readonly survivors: readonly {
    readonly part: string;
    readonly series: number;
    readonly strings: readonly number[];
    /** Who must send something for it, where shipments cost anything. */
    readonly suppliers?: readonly string[];
  }[];
  /** Minor units, each charged once, where shipments cost anything. */
  readonly shipments?: Readonly<Record<string, number>>;
  /** What the separate verifier said of it. */
  readonly verdict: "valid" | "invalid" | "unsettled";
  readonly why: string | null;
}

/** One limit loosened alone; the least change first. */
export interface Loosen {
  /** `all ceilings` is a factor on volume, mass and units together, from 1. */
  readonly field: "maxCost" | "maxVolume" | "maxMass" | "maxUnits" | "all ceilings" | "maxTypes" | "energy";
  readonly from: number;
  readonly to: number | null;
  /** Relative change; null where this limit alone cannot. */
  readonly change: number | null;
  /** Cheapest blend then, major money. */
  readonly cost: number | null;
  readonly proven: boolean;
}

/** Under this unit price a part without one would win. */
export interface WinningPrice {
  readonly part: string;
  /** Major money a unit, what is bought over what it saves; null when no price would do, or it was not worked out. */
  readonly below: number | null;
  readonly computed: boolean;
  readonly proven: boolean;
}

/** How far a unit price may move before another blend is the cheapest. */
export interface PriceMove {
  readonly part: string;
  readonly move: "rise" | "fall";
  /** Major money a unit. */
  readonly perUnit: number;
  readonly next: string;
  readonly proven: boolean;
}

/** What one more unit of a ceiling is worth, major money; a guide from the linear relaxation. */
export interface CeilingWorth {
  readonly volume: number;
  readonly mass: number;
  readonly units: number;
  readonly types: number;
}

/** How far the stock of a part may move before another blend is the cheapest. */
export interface StockMove {
  readonly part: string;
  readonly move: "fewer" | "more";
  /** `fewer`: with less than so many of them, on hand and bought, the blend cannot be built. `more`: so many must be on sale. */
  readonly units: number;
  /** Major money: what the cheapest costs more (or less) then; null when nothing fits. */
  readonly change: number | null;
  readonly next: string | null;
  readonly proven: boolean;
}

export const FRONT_NAMES = ["volume", "mass", "units", "stress"] as const;
export type FrontName = (typeof FRONT_NAMES)[number];

/** SI (m3, kg, number, fraction of the rating), major money. */
export interface BlendFrontPoint {
  readonly amount: number;
  readonly cost: number;
  readonly lowerBound: number;
  readonly id: string;
  readonly proven: boolean;
}

export interface BlendFront {
  readonly against: FrontName;
  readonly points: readonly BlendFrontPoint[];
}

/** One step of the cost ladder: the cheapest blend for every need above `from` up to `to`. */
export interface BlendLadderStep {
  /** F of the basis; and J of a pulse. */
  readonly from: number;
  readonly to: number;
  readonly energy: { readonly from: number; readonly to: number };
  readonly cost: number;
  readonly id: string;
  readonly units: number;
  readonly proven: boolean;
  /** The brief's own need stands on this step. */
  readonly asked: boolean;
}

export interface BlendLadder {
  readonly end: "complete" | "out of reach" | "cut";
  readonly steps: readonly BlendLadderStep[];
}

export interface EngineAnswer {
  readonly engine: string;
  /** Minor units; null where it says that nothing fits, or nothing cheaper. */
  readonly cost: number | null;
  readonly id: string | null;
}

/** The first limit of the brief that a group is not proven to keep. */
export interface BrokenLimit {
  readonly part: string;
  readonly limit: string;
  readonly value: number | null;
  readonly allowed: number | null;
  readonly unit: string;
  /** False: known to be over; true: it cannot be told, or only a bound is known. */
  readonly open: boolean;
}

/** The brief's limits on shot and faults, where the cheapest blend of all does not keep them. */
export interface LimitedBlend {
  /** Blends that cost no more, each judged and each breaking a limit. */
  readonly rejected: number;
  readonly cheapest: { readonly id: string; readonly cost: number | null; readonly broken: BrokenLimit | null };
}

export interface BlendPlan {
  readonly currency: string | null;
  readonly maxTypes: number;
  readonly compared: number;
  readonly status: "optimal" | "stopped" | "infeasible";
  readonly provenBy: string | null;
  /** Major money: no blend costs less; null when none exists or nothing is known. */
  readonly lowerBound: number | null;
  readonly gap: number | null;
  readonly blends: readonly BlendResult[];
  /** The proof where no blend carries it: that none exists or all cost too much, or one that the verifier rejected. */
  readonly certificate: NamedCertificate | null;
  /** Null when the brief sets no limits on shot and faults, or the cheapest of all keeps them. */
  readonly limited: LimitedBlend | null;
  /** What the second engine said on the core, or why it was not asked. */
  readonly secondOpinion: "agrees" | "disagrees" | "no answer" | "not asked";
  /** Answers that contradict each other, all of them; empty as a rule. */
  readonly disagreements: readonly EngineAnswer[];
  /** True when every kind of blend within the asked percentage is listed; null when none were asked for. */
  readonly alternativesComplete: boolean | null;
  readonly leftOut: readonly RefusedPart[];
  readonly loosen: readonly Loosen[];
  readonly winningPrices: readonly WinningPrice[];
  readonly priceMoves: readonly PriceMove[];
  readonly stockMoves: readonly StockMove[];
  /** Those that were asked for. */
  readonly fronts: readonly BlendFront[];
  readonly ladder: BlendLadder | null;
  readonly worth: CeilingWorth | null;
  readonly notes: readonly string[];
}
