// Names of the places of a bank, the same in every list and drawing: units, resistors, bars and the nodes inside strings.
//
// A unit is named by its stage (cross-tied) or string and its place in it, from 1: C3.7. A bar is named by the count of stages
// below it, from the negative end: B0 to Bn; independent strings share B0 and B1 alone, and N2.3 lies in string 2 above unit 3.

import type { Ties } from "../bank/index.ts";

export interface Shape {
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
}

export interface Spot {
  /** Stage (cross-tied) or string, and place in it, from 1. */
  readonly group: number;
  readonly place: number;
}

export const unitName = ({ group, place }: Spot): string => `C${group}.${place}`;

/** Every unit's spot, group by group. */
export const spotsOf = ({ series, parallel, ties }: Shape): readonly Spot[] => {
  const [groups, size] = ties === "cross-tied" ? [series, parallel] : [parallel, series];
  return Array.from({ length: groups * size }, (_, i) => ({ group: Math.floor(i / size) + 1, place: (i % size) + 1 }));
};

/** The nodes below and above a unit, from the negative end. */
export function nodesOf(
  { series, ties }: Shape,
  { group, place }: Spot,
): { readonly low: string; readonly high: string } {
  if (ties === "cross-tied") return { low: `B${group - 1}`, high: `B${group}` };
  const node = (above: number): string => (above === 0 ? "B0" : above === series ? "B1" : `N${group}.${above}`);
  return { low: node(place - 1), high: node(place) };
}

/** The bars, from the negative end; the last is the positive end of the bank. */
export const barsOf = ({ series, ties }: Shape): readonly string[] =>
  Array.from({ length: ties === "cross-tied" ? series + 1 : 2 }, (_, i) => `B${i}`);

/** Balancing positions: across each stage (cross-tied) or each unit (strings). */
export const balanceSpots = (
  shape: Shape,
): readonly { readonly name: string; readonly low: string; readonly high: string }[] =>
  shape.ties === "cross-tied"
    ? Array.from({ length: shape.series }, (_, i) => ({ name: `RB${i + 1}`, low: `B${i}`, high: `B${i + 1}` }))
    : spotsOf(shape).map((spot) => ({ name: `RB${spot.group}.${spot.place}`, ...nodesOf(shape, spot) }));

/** What one stands in: a stage of the bank, or a string. */
export const groupWord = ({ ties }: Pick<Shape, "ties">): "stage" | "string" =>
  ties === "cross-tied" ? "stage" : "string";
