// The bill of materials of a blend: the lines of every group, what the bank needs once, and the shipments.

import { type Capacitor, DEFAULT_FAMILY, type ResistorFamily } from "../catalog/index.ts";
import type { BlendResult, Brief, LayoutResult } from "../search/index.ts";
import { type Bill, type BillLine, LINE_KINDS, type LineKind } from "./bill.ts";
import { busLines } from "./busLines.ts";
import { clampLines } from "./clampLines.ts";
import { isolatingLines } from "./fuseLines.ts";
import { otherLines } from "./otherLines.ts";
import { resistorLines, unitLines } from "./partLines.ts";
import { totalsOf } from "./totals.ts";

export interface BlendBillInput {
  readonly blend: Pick<BlendResult, "id" | "strings" | "capacitance" | "shipments">;
  /** The capacitor of each group, in their order. */
  readonly units: readonly Capacitor[];
  readonly families: readonly ResistorFamily[];
  readonly brief: Brief;
  readonly currency: string | null;
  readonly cautions: readonly string[];
}

/** What a bank has once, whatever it is made of. */
const ONCE: ReadonlySet<LineKind> = new Set([
  "dump resistor",
  "dump relay",
  "load bus",
  "earthing stick",
  "insulator",
  "meter with divider",
  "screen",
  "test resistor",
]);

export function blendBillOf({ blend, units, families, brief, currency, cautions }: BlendBillInput): Bill {
  const lines: BillLine[] = [];
  blend.strings.forEach((group, at) => {
    const unit = units[at]!;
    const family = [...families, DEFAULT_FAMILY].find((one) => one.family === group.balance?.family) ?? null;
    lines.push(...unitLines(group, unit, brief.spares), ...resistorLines(group, family));
    lines.push(...clampLines({ layout: group, unit, brief }).map((line) => forGroup(line, group)));
    lines.push(...isolatingLines(group, brief, currency).map((line) => forGroup(line, group)));
  });
  const once: BillLine[] = [];
  // A group's bars are sized by the shot of the whole bank, which one group's shot does not tell.
  const { load: _load, ...still } = brief;
  blend.strings.forEach((group, at) => {
    // What the bank has once must stand the whole of it.
    const whole = { layout: { ...group, capacitance: blend.capacitance }, unit: units[at]!, brief };
    for (const line of [...otherLines(whole), ...busLines({ ...whole, brief: still })]) {
      if (!ONCE.has(line.line)) lines.push(forGroup(line, group));
      else if (at === 0) once.push(line.line === "earthing stick" ? { ...line, note: STICK } : line);
    }
  });
  lines.push(...once, ...blend.shipments.map((one) => shipmentLine(one, currency)));
  lines.sort((a, b) => LINE_KINDS.indexOf(a.line) - LINE_KINDS.indexOf(b.line));
  return { layout: blend.id, lines, totals: totalsOf({ lines, currency, exchange: brief.exchange }), cautions };
}

const STICK = "Every group has its own points to touch in turn: all of them, group by group.";

const forGroup = (line: BillLine, { id }: LayoutResult): BillLine => ({
  ...line,
  note: `For ${id}. ${line.note}`.trim(),
});

function shipmentLine({ supplier, cost }: BlendResult["shipments"][number], currency: string | null): BillLine {
  return {
    item: `shipment, ${supplier ?? "supplier not named"}`,
    line: "shipment",
    value: "not applicable",
    rating: "not applicable",
    needed: 1,
    onHand: 0,
    toBuy: 1,
    pack: null,
    packs: null,
    surplus: 0,
    unitPrice: cost,
    consumed: cost,
    purchase: cost,
    currency,
    supplier: supplier ?? "",
    orderCode: "",
    alternates: "",
    status: "",
    mark: "",
    note: "Charged once for everything that comes from this supplier.",
    state: "priced",
  };
}
