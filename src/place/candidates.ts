// Which measured units are considered at all, and what is said about those that do not belong to the lot.
import type { Finding } from "../quantity/index.ts";
import { outlierFinding, wildFinding } from "./flags.ts";
import type { Outlier } from "./outliers.ts";
import type { PlaceRequest } from "./request.ts";
import { keepOrder } from "./spareOrder.ts";
import type { MeasuredUnit } from "./unit.ts";
import { wildEffect } from "./wild.ts";

export interface Candidates {
  readonly units: readonly MeasuredUnit[];
  readonly rejected: readonly Outlier[];
}

/** Sets outliers aside, the furthest out first, as far as spares and pins allow. */
export function candidatesOf(
  units: readonly MeasuredUnit[],
  request: PlaceRequest,
  outliers: readonly Outlier[],
): Candidates {
  if (request.outliers === "keep") return { units, rejected: [] };
  const pinned = new Set((request.pins ?? []).map((pin) => pin.serial));
  const excess = ({ value, low, high }: Outlier): number => Math.max(value / high, low > 0 ? low / value : 0);
  const room = units.length - request.series * request.parallel;
  const ranked = [...outliers].sort((a, b) => excess(b) - excess(a));
  const serials = [...new Set(ranked.map((o) => o.serial))].filter((s) => !pinned.has(s)).slice(0, room);
  const out = new Set(serials);
  return {
    units: units.filter((unit) => !out.has(unit.serial)),
    rejected: outliers.filter((o) => out.has(o.serial)),
  };
}

/** Wild units are tried with and without; so many of them at most. */
const MOST_WILD = 3;

/** Findings about leakage and ESR that do not belong to the lot. */
export const outlierFindings = (outliers: readonly Outlier[], fitted: ReadonlySet<string>): Finding[] =>
  outliers.filter((o) => o.quantity !== "capacitance").map((o) => outlierFinding(o, fitted.has(o.serial)));

/** Findings about wild capacitances: the gap with the unit and without it. */
export function wildFindings(
  units: readonly MeasuredUnit[],
  request: PlaceRequest,
  { outliers, fitted, gap }: { outliers: readonly Outlier[]; fitted: ReadonlySet<string>; gap: number },
): Finding[] {
  const wild = outliers.filter((o) => o.quantity === "capacitance").slice(0, MOST_WILD);
  if (wild.length === 0) return [];
  const order = keepOrder(units, new Set(outliers.map((o) => o.serial)));
  return wild.flatMap((o) => {
    const effect = wildEffect(units, request, { serial: o.serial, gap, fitted: fitted.has(o.serial), order });
    return effect ? [wildFinding(effect)] : [outlierFinding(o, fitted.has(o.serial))];
  });
}
