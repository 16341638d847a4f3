// A fuse for each unit (each string, for strings): the cheapest of a catalogue that lives through the shot and clears the fault.

import { type Fuse as FuseRow, type Purchase, purchase } from "../catalog/index.ts";
import { type Fault, type Fuse, faultTable, fuseFindings } from "../pulse/index.ts";
import type { Finding } from "../quantity/index.ts";
import { faultBankOf } from "./faults.ts";
import type { LayoutResult } from "./result.ts";
import { type ShotInput, shotOf } from "./shot.ts";

/** A fuse row in the pulse layer's words; blank is unknown. */
export const fuseOf = ({ melting, clearing, voltage }: FuseRow): Fuse => ({
  meltingAction: melting ?? null,
  clearingAction: clearing ?? null,
  dcVoltage: voltage ?? null,
});

/** How many fuses a layout takes: one to a unit where units share both ends, one to a string otherwise, none without neighbours. */
export function fuseCount({ series, parallel, ties }: Pick<LayoutResult, "series" | "parallel" | "ties">): number {
  if (parallel < 2) return 0;
  return ties === "cross-tied" || series === 1 ? series * parallel : parallel;
}

/** What a fuse sees; null where unknown. A^2 s, A^2 s, V. */
export interface FuseSees {
  readonly normalAction: number | null;
  readonly faultAction: number | null;
  readonly voltage: number | null;
}

export interface FuseTried {
  readonly fuse: string;
  readonly findings: readonly Finding[];
}

/** The fuse chosen, or none; `tried` says of each why not. */
export interface FuseChoice {
  readonly count: number;
  readonly sees: FuseSees;
  readonly chosen: { readonly row: FuseRow; readonly purchase: Purchase; readonly findings: readonly Finding[] } | null;
  readonly tried: readonly FuseTried[];
}

/** The cheapest fuse of which every finding passes; unpriced ones last, equals by name. */
export function chooseFuse(
  layout: Pick<LayoutResult, "series" | "parallel" | "ties">,
  rows: readonly FuseRow[],
  sees: FuseSees,
): FuseChoice {
  const count = fuseCount(layout);
  const tried = rows.map((row) => ({ row, findings: fuseFindings(fuseOf(row), sees) }));
  const fit = tried.flatMap(({ row, findings }) => {
    const bought = purchase(row, count);
    const good = findings.every(({ verdict }) => verdict === "pass") && bought !== null;
    return good ? [{ row, purchase: bought, findings }] : [];
  });
  const price = (one: (typeof fit)[number]): number => one.purchase.cost ?? Number.POSITIVE_INFINITY;
  const [chosen = null] = fit.sort((a, b) => price(a) - price(b) || (a.row.fuse < b.row.fuse ? -1 : 1));
  return {
    count,
    sees,
    chosen: count === 0 ? null : chosen,
    tried: tried.map(({ row, findings }) => ({ fuse: row.fuse, findings })),
  };
}

/** What each fuse sees, from the fault table's findings of a fuse without ratings. */
export function fuseSees(faults: readonly Fault[]): FuseSees {
  const findings = faults.flatMap((fault) => fault.findings);
  const of = (id: string): number | null => findings.find((one) => one.id === id)?.value ?? null;
  return {
    normalAction: of("pulse.fuse.lives"),
    faultAction: of("pulse.fuse.clears"),
    voltage: of("pulse.fuse.voltage"),
  };
}

/** A fuse of which nothing is known, to ask the fault table what one would see. */
const UNRATED: Fuse = { meltingAction: null, clearingAction: null, dcVoltage: null };

/** The fuse for an assessed layout. Without a load in the brief the normal shot is unknown, and so no fuse can be chosen. */
export function fittedFuse(input: ShotInput, rows: readonly FuseRow[]): FuseChoice {
  const { layout, unit, brief } = input;
  const asked = { ...input, fuse: UNRATED };
  const shot = brief.load === undefined ? null : shotOf(asked);
  const faults = shot?.ok
    ? shot.value.faults
    : faultTable({ ...faultBankOf({ result: layout, unit, brief }), fuse: UNRATED });
  return chooseFuse(layout, rows, fuseSees(faults));
}
