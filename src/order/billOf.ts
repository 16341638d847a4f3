// The bill of materials of one assessed layout: what is bought, and what builders forget.

import { type Capacitor, DEFAULT_FAMILY, type ResistorFamily } from "../catalog/index.ts";
import type { Brief, FuseChoice, LayoutResult } from "../search/index.ts";
import type { Alternates } from "./alternates.ts";
import { type Bill, type BillLine, LINE_KINDS } from "./bill.ts";
import { busLines } from "./busLines.ts";
import { clampLines } from "./clampLines.ts";
import { fuseLines, isolatingLines } from "./fuseLines.ts";
import { marked } from "./marks.ts";
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
  /** Other parts that would do, by kind of line. */
  readonly alternates?: Alternates;
}

const alternatesOf = ({ line }: BillLine, found: Alternates): string => (found[line] ?? []).join("; ");

/** Counts and lays out; prices are those that the layout was assessed with. */
export function billOf({
  layout,
  unit,
  families,
  brief,
  currency,
  cautions,
  fuse = null,
  alternates = {},
}: BillInput): Bill {
  const name = layout.balance?.family;
  const family = [...families, DEFAULT_FAMILY].find((f) => f.family === name) ?? null;
  const lines = [
    ...unitLines(layout, unit, brief.spares),
    ...resistorLines(layout, family),
    ...clampLines({ layout, unit, brief }),
    ...fuseLines(layout, fuse),
    ...isolatingLines(layout, brief, currency),
    ...otherLines({ layout, unit, brief }).filter(({ line }) => line !== "fuses" || !fuse?.chosen),
    ...busLines({ layout, unit, brief }),
  ]
    .sort((a, b) => LINE_KINDS.indexOf(a.line) - LINE_KINDS.indexOf(b.line))
    .map((line) => marked({ ...line, alternates: alternatesOf(line, alternates) }));
  return { layout: layout.id, lines, totals: totalsOf({ lines, currency, exchange: brief.exchange }), cautions };
}
