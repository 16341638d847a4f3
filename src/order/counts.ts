// How many of the small things a layout takes: nodes, bars, links, terminals, protected groups.
//
// A bank of n stages has n + 1 potentials when cross-tied; p strings of n units share only the two end bars and have p(n - 1) links of their own.
// Source: [joulewright-design] section 2 (ties); the counts follow from it.

import type { Layout } from "../bank/index.ts";

export interface Counts {
  /** Conductors that join more than two units, or a unit to the outside. */
  readonly bars: number;
  /** Unit-to-unit links inside strings. */
  readonly links: number;
  /** Groups whose voltage stands by itself: stages when cross-tied, else every unit. */
  readonly groups: number;
  /** Points that must be touched in turn to be sure that nothing is charged. */
  readonly stickPoints: number;
  readonly terminals: number;
  /** Fuses so that a failed unit is cut off from the neighbours that would empty into it. */
  readonly fuses: number;
  readonly labels: number;
}

/** Counts of a layout; whole numbers. One in parallel has no neighbours to fuse against. */
export function countsOf({ series, parallel, ties }: Pick<Layout, "series" | "parallel" | "ties">): Counts {
  const units = series * parallel;
  const tied = ties === "cross-tied";
  const links = tied ? 0 : parallel * (series - 1);
  const bars = tied ? series + 1 : 2;
  return {
    bars,
    links,
    groups: tied ? series : units,
    stickPoints: bars + links,
    terminals: 2 * units,
    fuses: parallel < 2 ? 0 : tied || series === 1 ? units : parallel,
    labels: units + (tied ? series : parallel) + 1,
  };
}
