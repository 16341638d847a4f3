// A blend in full: every group of strings assessed, and the bank that they make together.

import { pulseEnergy } from "../bank/index.ts";
import { hazardFindings } from "../hazard/index.ts";
import { minorDigits, tenTo } from "../quantity/index.ts";
import { assess } from "./assess.ts";
import { bleedOf } from "./blendBleed.ts";
import { blendFindings } from "./blendFindings.ts";
import type { BlendCost, BlendResult, BlendString, WorstShare } from "./blendResult.ts";
import { type BuyingTerms, resistorsOf, type StringType } from "./blendString.ts";
import type { LayoutResult, Span } from "./result.ts";

/** So many strings of one type. */
export interface Group {
  readonly type: StringType;
  readonly strings: number;
}

export interface BlendMade {
  readonly groups: readonly Group[];
  readonly terms: BuyingTerms;
  readonly currency: string | null;
}

/** Parts and ties of the groups, by name. */
export const kindOf = (groups: readonly Group[]): string =>
  groups
    .map(({ type, strings }) => `${type.unit.part} ${resistorsOf(type, strings).ties}`)
    .sort()
    .join(" + ");

export function assessBlend({ groups, terms, currency }: BlendMade): Omit<BlendResult, "certificate"> {
  const { brief, families } = terms;
  const layouts = groups.map(({ type, strings }) => {
    const { ties } = resistorsOf(type, strings);
    const layout = { part: type.unit.part, series: type.series, parallel: strings, ties };
    return assess({ unit: type.unit, layout, brief, families, currency });
  });
  const capacitance = totalOf(layouts.map((one) => one.capacitance));
  const energyOf = (c: number | null): number | null =>
    c === null ? null : pulseEnergy(c, brief.voltage, brief.ripple);
  const bleed = bleedOf(layouts, brief);
  const strings = layouts.map((layout, at): BlendString => {
    const { unit } = groups[at]!.type;
    return {
      ...layout,
      findings: layout.findings.filter(({ id }) => !OF_THE_WHOLE.has(id)),
      bought: layout.purchase.capacitors?.bought ?? 0,
      fromHand: layout.purchase.capacitors?.fromHand ?? 0,
      supplier: unit.supplier ?? null,
      chargeShare: chargeShare(layout.capacitance, capacitance),
    };
  });
  const bought = strings.filter((one) => one.bought > 0);
  const whole = {
    capacitance,
    energy: {
      low: energyOf(capacitance.low),
      nominal: energyOf(capacitance.nominal)!,
      high: energyOf(capacitance.high),
    },
    bleed,
  };
  const polarised = groups.some(({ type }) => type.unit.polarised !== false);
  return {
    id: layouts.map(({ id }) => id).join(" + "),
    strings,
    units: layouts.reduce((sum, { units }) => sum + units, 0),
    ...whole,
    share: {
      charging: worstOf(layouts, (one) => one.share.charging),
      holding: worstOf(layouts, (one) => one.share.holding),
      leftAfterDump: worstOf(layouts, (one) => one.share.leftAfterDump),
    },
    cost: costOf(strings, terms.lineCost, currency),
    volume: sumOf(layouts.map(({ volume }) => volume)),
    mass: sumOf(layouts.map(({ mass }) => mass)),
    stress: layouts.some(({ stress }) => stress === null) ? null : Math.max(...layouts.map(({ stress }) => stress!)),
    suppliers: new Set(bought.map(({ supplier }) => supplier)).size,
    findings: blendFindings({ ...whole, brief, polarised }),
    kind: kindOf(groups),
  };
}

/** Ids that speak of the bank as a whole: a single group cannot be judged by them. */
const OF_THE_WHOLE: ReadonlySet<string> = new Set([
  "pulse-energy",
  "steady-current",
  "bleed",
  ...hazardFindings({ capacitance: 1, voltage: 1000, safeVoltage: 60, polarised: true, bleedSeconds: 1 }).map(
    ({ id }) => id,
  ),
]);

const sumOf = (values: readonly (number | null)[]): number | null =>
  values.reduce((sum, value) => (sum === null || value === null ? null : sum + value), 0 as number | null);

const totalOf = (spans: readonly Span[]): Span => ({
  low: sumOf(spans.map(({ low }) => low)),
  nominal: spans.reduce((sum, { nominal }) => sum + nominal, 0),
  high: sumOf(spans.map(({ high }) => high)),
});

/** Charge divides as capacitance does: least with this group low and the others high. */
function chargeShare(own: Span, all: Span): Span {
  const nominal = own.nominal / all.nominal;
  if (own.low === null || own.high === null || all.low === null || all.high === null)
    return { low: null, nominal, high: null };
  return {
    low: own.low / (own.low + all.high - own.high),
    nominal,
    high: own.high / (own.high + all.low - own.low),
  };
}

function worstOf(layouts: readonly LayoutResult[], value: (layout: LayoutResult) => number | null): WorstShare | null {
  let worst: WorstShare | null = null;
  for (const layout of layouts) {
    const here = value(layout);
    if (here === null) return null;
    const { limit } = layout.share;
    if (worst === null || here / limit > worst.value / worst.limit) worst = { part: layout.part, value: here, limit };
  }
  return worst;
}

function costOf(strings: readonly BlendString[], lineCost: number, currency: string | null): BlendCost | null {
  if (currency === null) return null;
  const scale = tenTo(minorDigits(currency));
  const minor = (amount: number | null | undefined): number => Math.round((amount ?? 0) * scale);
  const capacitors = strings.reduce((sum, { cost }) => sum + minor(cost?.capacitors), 0);
  const resistors = strings.reduce((sum, { cost }) => sum + minor(cost?.resistors), 0);
  const lines = lineCost * strings.filter((one) => one.bought > 0).length;
  const unpriced = new Set(strings.flatMap(({ cost }) => cost?.unpriced ?? []));
  const known = !unpriced.has("balancing resistors");
  return {
    capacitors: capacitors / scale,
    resistors: known || resistors > 0 ? resistors / scale : null,
    lines: lines / scale,
    total: (capacitors + resistors + lines) / scale,
    currency,
    unpriced: [...unpriced],
  };
}
