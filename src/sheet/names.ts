// Names of the places of a bank, the same in every list and drawing: units, resistors, bars and the points between units.
//
// A unit is named by its stage (cross-tied) or string and its place in it, from 1: C3.7, 1 at the negative end. TP0 is the bar of
// the negative end and TPn that of the positive end; between them a cross-tied bank has a bar TP3 above its stage 3, and a string
// a point TP2.3 above unit 3 of string 2.

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

/** Something between two points of the bank. */
export interface Between {
  readonly low: string;
  readonly high: string;
}

export const unitName = ({ group, place }: Spot): string => `C${group}.${place}`;

/** Every unit's spot, group by group. */
export const spotsOf = ({ series, parallel, ties }: Shape): readonly Spot[] => {
  const [groups, size] = ties === "cross-tied" ? [series, parallel] : [parallel, series];
  return Array.from({ length: groups * size }, (_, i) => ({ group: Math.floor(i / size) + 1, place: (i % size) + 1 }));
};

/** The points below and above a unit, from the negative end. */
export function pointsOf({ series, ties }: Shape, { group, place }: Spot): Between {
  if (ties === "cross-tied") return { low: `TP${group - 1}`, high: `TP${group}` };
  const point = (above: number): string => (above === 0 || above === series ? `TP${above}` : `TP${group}.${above}`);
  return { low: point(place - 1), high: point(place) };
}

/** The bars, from the negative end; the last is the positive end of the bank. */
export const barsOf = ({ series, ties }: Shape): readonly string[] =>
  ties === "cross-tied" ? Array.from({ length: series + 1 }, (_, i) => `TP${i}`) : ["TP0", `TP${series}`];

/** Where one stands across each stage (cross-tied) or each unit (strings): balancing resistors, clamp diodes. */
export const positionsOf = (shape: Shape, letters: string): readonly (Between & { readonly name: string })[] =>
  shape.ties === "cross-tied"
    ? Array.from({ length: shape.series }, (_, i) => ({
        name: `${letters}${i + 1}`,
        low: `TP${i}`,
        high: `TP${i + 1}`,
      }))
    : spotsOf(shape).map((spot) => ({ name: `${letters}${spot.group}.${spot.place}`, ...pointsOf(shape, spot) }));

/** What a unit is counted in: a stage of the bank, or a string. */
export const groupWord = ({ ties }: Pick<Shape, "ties">): "stage" | "string" =>
  ties === "cross-tied" ? "stage" : "string";

/** What one balancing resistor stands across. */
export const positionWord = ({ ties }: Pick<Shape, "ties">): "stage" | "unit" =>
  ties === "cross-tied" ? "stage" : "unit";
