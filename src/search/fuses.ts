// A fuse for each unit (each string, for strings): the cheapest of a catalogue that lives through the shot and clears the fault.

import { type Capacitor, type Fuse as FuseRow, type Purchase, purchase } from "../catalog/index.ts";
import {
  atHigh,
  type FaultBank,
  type Fuse,
  faultAction,
  fuseFindings,
  leastFaultAction,
  unitShortLoop,
} from "../pulse/index.ts";
import type { Finding } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { faultBankOf, faultUnitOf, guardsOf } from "./faults.ts";
import { atHighest } from "./highestShot.ts";
import type { LayoutResult } from "./result.ts";
import { type Shape, shotCorner } from "./shotCorner.ts";

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
  /** The most that the neighbours drive through a shorted unit, and the least: the fuse must clear on the least. */
  readonly faultAction: number | null;
  readonly leastFaultAction: number | null;
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

/**
 * What a fuse sees in one shape whose worst unit stands at `worst` V before a fault (not finite: unknown). The shot with every
 * unit high and the worst share; without a load, or with sharing that no tolerance bounds, the normal action is unknown.
 */
export function fuseSeesAt(brief: Brief, unit: Capacitor, shape: Shape, worst: number): FuseSees {
  const voltage = brief.voltage * (1 + brief.overshoot);
  const before = Number.isFinite(worst) ? worst : voltage;
  const shared = unit.tolerance !== undefined || shape.parallel === 1;
  const shot = brief.load === undefined || !shared ? null : shotCorner(atHighest(brief), unit, shape, "high");
  const { series, parallel, ties } = shape;
  const bank: FaultBank = {
    series,
    parallel,
    ties,
    unit: faultUnitOf(unit),
    voltage,
    leastVoltage: brief.voltage,
    ...guardsOf(brief),
    worstCharging: before,
    worstHolding: null,
  };
  return {
    normalAction: shot?.ok ? shot.value.unit.action : null,
    faultAction: faultAction(unitShortLoop(atHigh(bank))),
    leastFaultAction: leastFaultAction(bank),
    voltage: before,
  };
}

/** The fuse for an assessed layout. Without a load in the brief the normal shot is unknown, and so no fuse can be chosen. */
export function fittedFuse(
  { layout, unit, brief }: { readonly layout: LayoutResult; readonly unit: Capacitor; readonly brief: Brief },
  rows: readonly FuseRow[],
): FuseChoice {
  const { worstCharging, worstHolding } = faultBankOf({ result: layout, unit, brief });
  return chooseFuse(layout, rows, fuseSeesAt(brief, unit, layout, Math.max(worstCharging, worstHolding ?? 0)));
}
