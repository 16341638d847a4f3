// The resistor of one layout among all families: the cheapest that works, then the fewest elements; unpriced families last.

import { balanceOutlook, type Choice, chooseBalance, type FiniteHold, type Outlook, type Ties } from "../bank/index.ts";
import { cheapest, isPriced, type ResistorFamily } from "../catalog/index.ts";
import type { Brief } from "./brief.ts";
import type { Candidate } from "./candidate.ts";

export interface Shape {
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
}

/** Resistors come one a stage when cross-tied, one a unit in strings. */
export const positionsOf = ({ series, parallel, ties }: Shape): number =>
  ties === "cross-tied" ? series : series * parallel;

/** Units that share one balancing resistor. */
export const sharingOf = ({ parallel, ties }: Shape): number => (ties === "cross-tied" ? parallel : 1);

/** A chain whose shape and resistor spread change while the search runs over one part. */
export type SearchChain = { -readonly [K in keyof FiniteHold]: FiniteHold[K] };

/** The chain of one part under one brief, worst case, its shape still to be set. Needs a known leakage. */
export function chainOf(candidate: Candidate, brief: Brief): SearchChain | null {
  // Without the tolerance a finite hold has no start to reckon from; an endless one does not need it.
  if (candidate.leak === null || (candidate.tolerance === null && brief.hold !== Number.POSITIVE_INFINITY)) return null;
  return {
    voltage: brief.voltage * (1 + brief.overshoot),
    series: 1,
    sharing: 1,
    spread: 0,
    leak: candidate.leak,
    capacitance: candidate.unit.capacitance,
    tolerance: candidate.tolerance ?? NO_SPREAD,
    hold: brief.hold,
  };
}

const NO_SPREAD = { low: 0, high: 0 };

/** The same for one shape and spread. */
export function shapedChain(candidate: Candidate, brief: Brief, shape: Shape, spread: number): FiniteHold | null {
  const chain = chainOf(candidate, brief);
  return chain === null ? null : { ...chain, series: shape.series, sharing: sharingOf(shape), spread };
}

export interface Balancing extends Choice {
  /** Index of the family. */
  family: number;
  /** Minor units of the family's currency; Infinity when unpriced. */
  cost: number;
}

export const newBalancing = (): Balancing => ({
  family: -1,
  cost: 0,
  resistance: 0,
  element: 0,
  elements: 0,
  worst: 0,
});

const trial: Choice = { resistance: 0, element: 0, elements: 0, worst: 0 };
const bill = { quantity: 0, cost: 0 };

/** Chooses for a chain of at least two in series at `positions` places; false when no family works. Written into `best`. */
export function bestBalance(
  chain: SearchChain,
  limit: number,
  positions: number,
  families: readonly ResistorFamily[],
  best: Balancing,
): boolean {
  best.family = -1;
  best.cost = Number.POSITIVE_INFINITY;
  for (let f = 0; f < families.length; f++) {
    const family = families[f] as ResistorFamily;
    chain.spread = family.tolerance;
    if (!chooseBalance(chain, limit, family, trial)) continue;
    let cost = Number.POSITIVE_INFINITY;
    if (isPriced(family) && cheapest(family, positions * trial.elements, bill)) cost = bill.cost;
    if (best.family >= 0 && (cost > best.cost || (cost === best.cost && trial.elements >= best.elements))) continue;
    best.family = f;
    best.cost = cost;
    best.resistance = trial.resistance;
    best.element = trial.element;
    best.elements = trial.elements;
    best.worst = trial.worst;
  }
  return best.family >= 0;
}

const ahead: Outlook = { sure: false, floor: 0 };

/** What bestBalance will find at the least, without choosing; written into `outlook`. */
export function outlookOf(
  chain: SearchChain,
  limit: number,
  families: readonly ResistorFamily[],
  outlook: Outlook,
): void {
  outlook.sure = false;
  outlook.floor = Number.POSITIVE_INFINITY;
  for (const family of families) {
    chain.spread = family.tolerance;
    balanceOutlook(chain, limit, family, ahead);
    outlook.sure ||= ahead.sure;
    outlook.floor = Math.min(outlook.floor, ahead.floor);
  }
}
