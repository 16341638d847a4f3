// A blend in full: every group of strings assessed, and the bank that they make together.

import { pulseEnergy } from "../bank/index.ts";
import { hazardFindings } from "../hazard/index.ts";
import { toMajor } from "../quantity/index.ts";
import { assess } from "./assess.ts";
import { bleedOf } from "./blendBleed.ts";
import { type BuiltGroup, costOf, shipmentsOf } from "./blendCost.ts";
import { blendFindings } from "./blendFindings.ts";
import { groupLimits, isLimitFinding } from "./blendLimits.ts";
import type { BlendResult, BlendString, WorstShare } from "./blendResult.ts";
import { type BuyingTerms, resistorsOf, type StringType } from "./blendString.ts";
import type { Brief } from "./brief.ts";
import { pricedIn } from "./currency.ts";
import type { LayoutResult, Span } from "./result.ts";
import { type ShipmentWish, shipmentTerms } from "./shipmentTerms.ts";

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

export interface BlendBuilt {
  readonly groups: readonly BuiltGroup[];
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
  const built = groups.map(({ type, strings }): BuiltGroup => {
    const { unit, series } = type;
    const { ties } = resistorsOf(type, strings);
    return { unit, layout: { part: unit.part, series, parallel: strings, ties }, families: type.terms.families };
  });
  return assessGroups({ groups: built, terms, currency });
}

/** Assesses a blend as it is given: nothing is refused here, everything is found. */
export function assessGroups({ groups, terms, currency }: BlendBuilt): Omit<BlendResult, "certificate"> {
  const { brief } = terms;
  const layouts = groups.map(({ unit, layout, families }) => assess({ unit, layout, brief, families, currency }));
  const capacitance = totalOf(layouts.map((one) => one.capacitance));
  const energyOf = (c: number | null): number | null =>
    c === null ? null : pulseEnergy(c, brief.voltage, brief.ripple);
  const bleed = bleedOf(layouts, brief);
  const limited = groupLimits(
    layouts,
    groups.map(({ unit }) => unit),
    brief,
  );
  const strings = layouts.map((layout, at): BlendString => {
    const { unit } = groups[at]!;
    return {
      ...layout,
      // A group's shot is that of the whole bank, and so are its limits on the shot.
      findings: [
        ...layout.findings.filter((finding) => !OF_THE_WHOLE.has(finding.id) && !isLimitFinding(finding)),
        ...limited[at]!,
      ],
      bought: layout.purchase.capacitors?.bought ?? 0,
      fromHand: layout.purchase.capacitors?.fromHand ?? 0,
      supplier: unit.supplier ?? null,
      chargeShare: chargeShare(layout.capacitance, capacitance),
    };
  });
  const bought = strings.filter((one) => one.bought > 0);
  const shipments = shipmentsOf(groups, layouts, terms);
  const whole = {
    capacitance,
    energy: {
      low: energyOf(capacitance.low),
      nominal: energyOf(capacitance.nominal)!,
      high: energyOf(capacitance.high),
    },
    bleed,
  };
  const polarised = groups.some(({ unit }) => unit.polarised !== false);
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
    cost: costOf(strings, terms.lineCost, shipments, currency),
    shipments:
      currency === null ? [] : shipments.map(({ supplier, cost }) => ({ supplier, cost: toMajor(cost, currency) })),
    volume: sumOf(layouts.map(({ volume }) => volume)),
    mass: sumOf(layouts.map(({ mass }) => mass)),
    stress: layouts.some(({ stress }) => stress === null) ? null : Math.max(...layouts.map(({ stress }) => stress!)),
    suppliers: new Set(bought.map(({ supplier }) => supplier)).size,
    findings: blendFindings({ ...whole, brief, polarised }),
    kind: layouts
      .map(({ part, ties }) => `${part} ${ties}`)
      .sort()
      .join(" + "),
  };
}

export interface BuiltBlend {
  readonly groups: readonly BuiltGroup[];
  readonly brief: Brief;
  /** Major money; default 0. */
  readonly shipments?: ShipmentWish | undefined;
  readonly currency: string | null;
  /** Minor units of the currency in one of the major. */
  readonly minor: number;
}

/** A blend somebody has or means to build, in money as the brief has it. */
export function assessBuiltBlend({ groups, brief, shipments, currency, minor }: BuiltBlend) {
  const terms = { brief, families: [], lineCost: 0, shipments: shipmentTerms(shipments, minor) };
  // The groups' own prices are brought into the plan's currency by `assess`; suppliers are told by those.
  const priced = groups.map((group) => ({
    ...group,
    unit: pricedIn([group.unit], currency, brief)[0] ?? group.unit,
    families: pricedIn(group.families, currency, brief),
  }));
  return assessGroups({ groups: priced, terms, currency });
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
