// What a plan and a check answer: plain data, SI values, money in the major unit of its currency.

import type { Cause, Ties } from "../bank/index.ts";
import type { Capacitor, Purchase } from "../catalog/index.ts";
import type { Finding } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import type { Risk } from "./risk.ts";
import type { BalanceMends } from "./sharing/mends.ts";
import type { WithoutBalance } from "./sharing/withoutBalance.ts";

/** A value under low, nominal and high capacitance; null where the tolerance is unknown. */
export interface Span {
  readonly low: number | null;
  readonly nominal: number;
  readonly high: number | null;
}

/** Voltages of one unit or stage, V, at the charge voltage with overshoot. null is not assessed. */
export interface Shares {
  readonly even: number;
  readonly charging: number | null;
  readonly holding: number | null;
  /** Size of the reverse voltage that the low stage is left with after a dump from equal sharing. */
  readonly leftAfterDump: number | null;
  readonly limit: number;
}

/** The balancing resistor: one position a stage (cross-tied) or a unit (strings). ohm, fraction, W, V. */
export interface Balance {
  /** Resistance of one position. */
  readonly resistance: number;
  readonly tolerance: number;
  readonly positions: number;
  /** Equal elements in series in one position. */
  readonly elements: number;
  readonly elementResistance: number;
  /** Worst power in one element. */
  readonly powerEach: number;
  /** Most that all the chains together take from the charger at full voltage. */
  readonly powerTotal: number;
  /** Worst voltage across one element. */
  readonly voltageEach: number;
  readonly family: string;
  readonly assumed: boolean;
}

/** One kind of protection between a failed unit and the others; cost null when it has no price. */
export interface Protection {
  readonly kind: "fuse" | "isolating resistor" | "section inductance";
  readonly item: string;
  readonly count: number;
  readonly cost: number | null;
}

export interface Cost {
  readonly capacitors: number | null;
  readonly resistors: number | null;
  /** Fuses, isolating resistors and section inductances that the brief asks for; left out when it asks for none. */
  readonly protection?: number | null;
  /** Sum of the priced lines. */
  readonly total: number;
  readonly currency: string;
  /** Lines without a price, which the total leaves out. */
  readonly unpriced: readonly string[];
}

export interface LayoutResult {
  readonly id: string;
  readonly part: string;
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  readonly units: number;
  readonly capacitance: Span;
  readonly energy: Span;
  readonly share: Shares;
  readonly balance: Balance | null;
  /** The same with no balancing resistors, over the whole hold; null for one in series. */
  readonly withoutBalance: WithoutBalance | null;
  readonly bleed: { readonly seconds: number | null; readonly toVoltage: number };
  readonly cost: Cost | null;
  /** What the brief asks for between a failed unit and the others; left out when nothing. `cost` in the major unit. */
  readonly protection?: readonly Protection[];
  /** m^3 in square packing without gaps; kg; null when sizes are unknown. Capacitors only. */
  readonly volume: number | null;
  readonly mass: number | null;
  /** Worst unit voltage over rated voltage; null when not assessed. */
  readonly stress: number | null;
  /** With the statistical basis: chance that any unit of the bank exceeds its limit while charging; null when not assessed. */
  readonly risk?: Risk | null;
  readonly purchase: { readonly capacitors: Purchase | null; readonly resistors: Purchase | null };
  readonly findings: readonly Finding[];
}

export interface RefusedPart {
  readonly part: string;
  readonly reason: string;
  readonly value: number | null;
  readonly limit: number | null;
  /** Where no balancing resistor does: what would mend it at the least number in series. */
  readonly mends?: BalanceMends | null;
}

/** One change of the brief or the stock that, alone, would make something fit. */
export interface Change {
  readonly field: string;
  readonly from: number | null;
  readonly to: number;
  /** The first layout that then fits. */
  readonly layout: string;
  readonly note: string;
}

/** The best layout of this part and these ties that a search finds; cost in the major unit, null when not priced. */
export interface Found {
  readonly id: string;
  readonly series: number;
  readonly parallel: number;
  readonly units: number;
  readonly cost: number | null;
}

export interface Improvement {
  readonly cause: Cause;
  /** V of margin that the cause eats, and as a share of the whole margin between even share and full rating; null: unknown. */
  readonly volts: number | null;
  readonly share: number | null;
  /** Worst stage voltage were the cause gone, V. */
  readonly without: number | null;
  /** What the search was run again with, fraction, A or ohm; null when there is nothing to tighten. */
  readonly tightened: {
    readonly quantity: string;
    readonly from: number;
    readonly to: number;
    readonly unit: string;
  } | null;
  /** What the search then finds; null when nothing was tightened or nothing fits. */
  readonly found: Found | null;
  /** Units and money less than the baseline, below zero when more; null when either side is unknown. */
  readonly saves: { readonly units: number; readonly cost: number | null } | null;
}

export interface Improve {
  /** Even share, worst stage and full rating, V. */
  readonly even: number;
  readonly worst: number | null;
  readonly rating: number;
  /** V still free of the full rating; null when something is unknown. */
  readonly free: number | null;
  /** Best of the same part and ties as things are: what `saves` is reckoned from. Null when nothing fits. */
  readonly baseline: Found | null;
  readonly causes: readonly Improvement[];
}

export interface PlanResult {
  readonly brief: Brief;
  readonly required: { readonly capacitance: number };
  readonly searched: { readonly parts: number; readonly layouts: number; readonly proof: string };
  readonly currency: string | null;
  readonly layouts: readonly LayoutResult[];
  readonly front: readonly string[];
  readonly refused: readonly RefusedPart[];
  readonly changes: readonly Change[];
  /** With the statistical basis: the best layout of the worst case, to say what it would have cost; null when none fits. */
  readonly worstCase?: LayoutResult | null;
  /** What eats the margin of the best layout and what tightening it saves; null when nothing fits or nothing can be told. */
  readonly improve?: Improve | null;
  readonly notes: readonly string[];
}

/** Everything a search works on. */
export interface Stock {
  readonly parts: readonly Capacitor[];
}
