// What stands between a failed unit and its neighbours, counted and priced for one shape: fuses, isolating resistors, section inductances.

import type { Capacitor, Fuse } from "../catalog/index.ts";
import { minorDigits, tenTo } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { chooseFuse, fuseCount, fuseSeesAt } from "./fuses.ts";
import type { Protection } from "./result.ts";
import type { Shape } from "./shotCorner.ts";

/** The shape to protect; `worst` the highest voltage of a unit before a fault, V (not finite: unknown). */
export interface ProtectedCase extends Shape {
  readonly unit: Capacitor;
  readonly worst: number;
}

/** What prices and choices are made with; no fuse catalogue leaves the fuses to be chosen, without a price. */
export interface ProtectionStock {
  readonly fuses: readonly Fuse[] | null;
  readonly currency: string | null;
}

/** Whether the brief asks for any. */
export const isProtected = ({ fused, isolating, section }: Brief): boolean =>
  fused === true || isolating !== undefined || section !== undefined;

/** Section inductances of a shape: one to each unit that shares both ends with others, else one to each string. */
export const sectionCount = ({ series, parallel, ties }: Shape): number =>
  ties === "cross-tied" || series === 1 ? series * parallel : parallel;

/**
 * Lines of what the brief asks for; "more" when none of the fuses is proven to do and more in parallel may mend it, "stuck" when
 * it cannot: the voltage is over every fuse's, or what a fuse sees is unknown.
 */
export function protectionOf(
  brief: Brief,
  given: ProtectedCase,
  stock: ProtectionStock,
): readonly Protection[] | "more" | "stuck" {
  const { unit, worst, ...shape } = given;
  const scale = tenTo(minorDigits(stock.currency ?? ""));
  const priced = (count: number, price: number | undefined): number | null =>
    price === undefined || stock.currency === null ? null : Math.round(price * scale) * count;
  const lines: Protection[] = [];
  if (brief.fused === true && fuseCount(shape) > 0) {
    if (stock.fuses === null) lines.push({ kind: "fuse", item: "to be chosen", count: fuseCount(shape), cost: null });
    else {
      const { chosen, count, sees } = chooseFuse(shape, stock.fuses, fuseSeesAt(brief, unit, shape, worst));
      if (chosen === null) {
        const unknown = sees.normalAction === null || sees.leastFaultAction === null;
        const breaks = stock.fuses.some(({ voltage }) => voltage !== undefined && voltage >= (sees.voltage ?? 0));
        return unknown || !breaks ? "stuck" : "more";
      }
      lines.push({ kind: "fuse", item: chosen.row.fuse, count, cost: chosen.purchase.cost });
    }
  }
  if (brief.isolating !== undefined) {
    const count = shape.series * shape.parallel;
    const cost = priced(count, brief.isolatingPrice);
    lines.push({ kind: "isolating resistor", item: "isolating resistor", count, cost });
  }
  if (brief.section !== undefined) {
    const count = sectionCount(shape);
    lines.push({
      kind: "section inductance",
      item: "section inductance",
      count,
      cost: priced(count, brief.section.price),
    });
  }
  return lines;
}

/** What the priced lines cost together, minor units. */
export const protectionCost = (lines: readonly Protection[]): number =>
  lines.reduce((sum, { cost }) => sum + (cost ?? 0), 0);
