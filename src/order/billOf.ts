// The bill of materials of one assessed layout: what is bought, and what builders forget.

import { type Capacitor, DEFAULT_FAMILY, type ResistorFamily } from "../catalog/index.ts";
import type { Brief, FuseChoice, LayoutResult } from "../search/index.ts";
import type { Bill } from "./bill.ts";
import { clampLines } from "./clampLines.ts";
import { fuseLines, isolatingLines } from "./fuseLines.ts";
import { otherLines } from "./otherLines.ts";
import { resistorLines, unitLines } from "./partLines.ts";
import { totalsOf } from "./totals.ts";

export interface BillInput {
  readonly layout: LayoutResult;
  /** The capacitor that the layout is made of. */
  readonly unit: Capacitor;
  /** The families that the layout was assessed with. */
  readonly families: readonly ResistorFamily[];
  readonly brief: Brief;
  readonly currency: string | null;
  readonly cautions: readonly string[];
  /** A fuse chosen for each unit; left out: it stays to be chosen, and out of the total. */
  readonly fuse?: FuseChoice | null;
}

/** Counts and lays out; prices are those that the layout was assessed with. */
export function billOf({ layout, unit, families, brief, currency, cautions, fuse = null }: BillInput): Bill {
  const name = layout.balance?.family;
  const family = [...families, DEFAULT_FAMILY].find((f) => f.family === name) ?? null;
  const lines = [
    ...unitLines(layout, unit, brief.spares),
    ...resistorLines(layout, family),
    ...clampLines({ layout, unit, brief }),
    ...fuseLines(layout, fuse),
    ...isolatingLines(layout, brief, currency),
    ...otherLines({ layout, unit, brief }).filter(({ line }) => line !== "fuses" || !fuse?.chosen),
  ];
  return { layout: layout.id, lines, totals: totalsOf({ lines, currency, exchange: brief.exchange }), cautions };
}
