// The blend that `check` and `order` are about: inputs read, parts found, every group and the whole assessed.

import type { Capacitor } from "../catalog/index.ts";
import { accepted, minorDigits, type Read, refused, tenTo } from "../quantity/index.ts";
import { assessBuiltBlend, type BlendFault, type BlendResult, blendFaults, planCurrency } from "../search/index.ts";
import { readShipmentFlag } from "./blendFlags.ts";
import { type GroupInput, readBlendGroups } from "./blendInput.ts";
import { type CautionLine, cautionsOf } from "./cautions.ts";
import type { BankFlags } from "./checked.ts";
import type { Ports } from "./ports.ts";
import { type Settings, settle } from "./settings.ts";
import { findPart, readStock, type Stock } from "./stock.ts";

export type BlendBankFlags = BankFlags & { readonly blend?: string; readonly shipmentCost?: string };

export interface CheckedBlend {
  readonly blend: Omit<BlendResult, "certificate">;
  readonly faults: readonly BlendFault[];
  readonly units: readonly Capacitor[];
  readonly settings: Settings;
  readonly stock: Stock;
  readonly currency: string | null;
  readonly cautions: readonly CautionLine[];
  readonly notes: readonly string[];
}

/** Null when the flags speak of one layout and not of a blend. */
export function checkedBlend(
  brief: string | undefined,
  flags: BlendBankFlags,
  ports: Ports,
): Read<CheckedBlend | null> {
  const groups = readBlendGroups(flags, ports.files);
  if (!groups.ok) return groups;
  if (groups.value === null) return accepted(null);
  const settings = settle(brief, flags, ports.files);
  const stock = readStock(flags, ports.files);
  const shipments = readShipmentFlag(flags.shipmentCost);
  if (!settings.ok || !stock.ok || !shipments.ok)
    return refused(...[settings, stock, shipments].flatMap((read) => (read.ok ? [] : read.refusals)));
  if (settings.value.brief.basis === "measured" || flags.measured !== undefined) {
    const want = "one layout with --measured: the units of a blend are not judged one by one";
    return refused({ code: "contradiction", place: { field: "--measured" }, read: "a blend", want });
  }
  return assessed(groups.value, { settings: settings.value, stock: stock.value, shipments: shipments.value });
}

interface Given {
  readonly settings: Settings;
  readonly stock: Stock;
  readonly shipments: Parameters<typeof assessBuiltBlend>[0]["shipments"];
}

function assessed(groups: readonly GroupInput[], { settings, stock, shipments }: Given): Read<CheckedBlend> {
  const found = groups.map(({ layout }) => findPart(layout.part, stock.parts, { field: "--blend" }));
  const missing = found.flatMap((read) => (read.ok ? [] : read.refusals));
  if (missing.length > 0) return refused(...missing);
  const units = found.flatMap((read) => (read.ok ? [read.value] : []));
  const { brief } = settings;
  const currency = planCurrency(brief, units, stock.families);
  if (!currency.ok) return currency;
  const blend = assessBuiltBlend({
    groups: groups.map(({ layout, family }, at) => {
      const own = stock.families.filter((one) => one.family === family);
      return { unit: units[at]!, layout, families: own.length > 0 ? own : stock.families };
    }),
    brief,
    shipments,
    currency: currency.value,
    minor: tenTo(minorDigits(currency.value ?? "")),
  });
  const lines = blend.strings.flatMap((group, at) =>
    // The whole bank's charge decides how much of a blast an arc would be.
    cautionsOf(brief, { layout: { ...group, capacitance: blend.capacitance }, unit: units[at]! }),
  );
  return accepted({
    blend,
    faults: blendFaults(blend, units, brief),
    units,
    settings,
    stock,
    currency: currency.value,
    cautions: lines.filter(({ id }, at) => lines.findIndex((one) => one.id === id) === at),
    notes: ["Resistors are bought for each group on its own."],
  });
}
