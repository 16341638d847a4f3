// One arrangement in full: capacitance, energy, shares, balancing, bleed, cost and every finding.

import {
  bankCapacitance,
  chargingWorst,
  elementPower,
  holdHighest,
  type Layout,
  layoutId,
  leftAfterDump,
  plainTies,
  pulseEnergy,
  unitCount,
} from "../bank/index.ts";
import { type Capacitor, type Fuse, type Purchase, purchase, type ResistorFamily } from "../catalog/index.ts";
import { toMajor } from "../quantity/index.ts";
import { bestBalance, chainOf, newBalancing, positionsOf, shapedChain, sharingOf } from "./balancing.ts";
import type { Brief } from "./brief.ts";
import { type Candidate, prepare } from "./candidate.ts";
import { pricedIn } from "./currency.ts";
import { findingsOf } from "./findings.ts";
import { isProtected, protectionCost, protectionOf } from "./protection.ts";
import type { Balance, Cost, LayoutResult, Protection, Shares, Span } from "./result.ts";
import { type Risk, riskOf } from "./risk.ts";
import { balanceMends } from "./sharing/mends.ts";
import { withoutBalance } from "./sharing/withoutBalance.ts";

/** How the balancing resistor comes about: chosen by the rule, fixed by the builder, or left out. */
export type BalanceWish =
  | { readonly kind: "choose" }
  | { readonly kind: "none" }
  | { readonly kind: "fixed"; readonly resistance: number; readonly tolerance: number };

export interface AssessInput {
  readonly unit: Capacitor;
  readonly layout: Layout;
  readonly brief: Brief;
  readonly families: readonly ResistorFamily[];
  readonly currency: string | null;
  readonly balance?: BalanceWish;
  /** Fuses to choose from where the brief asks for them; null or left out: no fuse catalogue. */
  readonly fuses?: readonly Fuse[] | null;
  /** Measured capacitances, F, that the statistical basis draws from instead of the tolerance; at least LEAST_LOT. */
  readonly lot?: readonly number[];
}

/** Assesses one arrangement, safe or not: nothing is refused here, everything is found. */
export function assess(input: AssessInput): LayoutResult {
  const { brief, currency, balance: wish = { kind: "choose" } } = input;
  const [unit = input.unit] = pricedIn([input.unit], currency, brief);
  const families = pricedIn(input.families, currency, brief);
  const layout = plainTies({ ...input.layout, part: unit.part });
  const { series, parallel, ties } = layout;
  const candidate = prepare(unit, brief);
  const voltage = brief.voltage * (1 + brief.overshoot);
  const units = unitCount(layout);
  const { tolerance } = candidate;
  const chosen = series > 1 ? balanceOf(candidate, brief, layout, families, wish) : null;
  const share: Shares = {
    even: voltage / series,
    charging:
      tolerance === null && series > 1 ? null : chargingWorst(voltage, series, tolerance ?? { low: 0, high: 0 }),
    holding: holdingOf(candidate, brief, layout, chosen),
    leftAfterDump:
      tolerance === null ? (series === 1 ? 0 : null) : Math.abs(leftAfterDump(voltage, series, tolerance).low),
    limit: candidate.limit,
  };
  const capacitance: Span = {
    low:
      tolerance === null
        ? null
        : bankCapacitance(unit.capacitance * (1 - tolerance.low) * (1 - brief.ageing), series, parallel),
    nominal: bankCapacitance(unit.capacitance, series, parallel),
    high: tolerance === null ? null : bankCapacitance(unit.capacitance * (1 + tolerance.high), series, parallel),
  };
  const energyOf = (c: number | null): number | null =>
    c === null ? null : pulseEnergy(c, brief.voltage, brief.ripple);
  const capacitors = purchase(unit, units + brief.spares);
  const family = chosen === null ? null : families.find((f) => f.family === chosen.family);
  const resistors = chosen === null || !family ? null : purchase(family, chosen.positions * chosen.elements);
  const worst = series === 1 ? voltage : worstOf(share.charging, candidate.leak === null ? 0 : share.holding);
  const guards = guardsFor(input, unit, layout, worst);
  const result: Omit<LayoutResult, "findings"> = {
    id: layoutId(layout),
    part: unit.part,
    series,
    parallel,
    ties,
    units,
    capacitance,
    energy: {
      low: energyOf(capacitance.low),
      nominal: energyOf(capacitance.nominal) as number,
      high: energyOf(capacitance.high),
    },
    share,
    balance: chosen,
    withoutBalance: withoutBalance({ result: { series, parallel, ties, balance: null }, unit, brief }, candidate.limit),
    bleed: {
      seconds:
        chosen === null || capacitance.high === null ? null : bleedSeconds(chosen, layout, capacitance.high, brief),
      toVoltage: brief.touchSafe,
    },
    cost: costOf({
      capacitors,
      resistors,
      needsResistors: chosen !== null || (series > 1 && candidate.leak === null),
      guards,
      currency,
    }),
    ...(guards === null ? {} : { protection: guards.map((one) => ({ ...one, cost: major(one.cost, currency) })) }),
    volume: candidate.volume === null ? null : candidate.volume * units,
    mass: candidate.mass === null ? null : candidate.mass * units,
    stress: worst === null ? null : worst / unit.voltage,
    ...(brief.basis === "statistical" ? { risk: riskFor(candidate, input, layout) } : {}),
    purchase: { capacitors, resistors },
  };
  const lacking = series > 1 && chosen === null && wish.kind === "choose" && candidate.leak !== null;
  const mends = lacking ? balanceMends({ unit, brief, families, shape: layout }) : null;
  return { ...result, findings: findingsOf({ result, unit, brief, candidate, family: family ?? null, mends }) };
}

const major = (minor: number | null, currency: string | null): number | null =>
  minor === null || currency === null ? null : toMajor(minor, currency);

/** The protection that the brief asks for; null when none. Where no fuse of the catalogue does, they stay to be chosen. */
function guardsFor(
  { brief, currency, fuses = null }: AssessInput,
  unit: Capacitor,
  { series, parallel, ties }: Layout,
  worst: number | null,
): readonly Protection[] | null {
  if (!isProtected(brief)) return null;
  const given = { unit, series, parallel, ties, worst: worst ?? Number.POSITIVE_INFINITY };
  const rows = fuses === null ? null : pricedIn(fuses, currency, brief);
  const lines = protectionOf(brief, given, { fuses: rows, currency });
  if (typeof lines !== "string") return lines;
  const open = protectionOf(brief, given, { fuses: null, currency });
  return typeof open === "string" ? [] : open;
}

/** Chance of an excess while charging, or null when the tolerance is unknown. */
function riskFor(
  { tolerance, limit }: Candidate,
  { brief, lot }: AssessInput,
  { series, parallel, ties }: Layout,
): Risk | null {
  const voltage = brief.voltage * (1 + brief.overshoot);
  if (series === 1) return { exceed: voltage <= limit * (1 + 1e-9) ? 0 : 1, error: 0 };
  const shape = { series, parallel, ties, share: limit / voltage };
  if (lot !== undefined) return riskOf({ tolerance: tolerance ?? { low: 0, high: 0 }, ...shape, lot }, brief);
  return tolerance === null ? null : riskOf({ tolerance, ...shape }, brief);
}

const worstOf = (charging: number | null, holding: number | null): number | null =>
  charging === null || holding === null ? null : Math.max(charging, holding);

/** Worst holding voltage with the resistor as it is; null when the leakage is unknown. */
function holdingOf(candidate: Candidate, brief: Brief, layout: Layout, chosen: Balance | null): number | null {
  const chain = shapedChain(candidate, brief, layout, chosen?.tolerance ?? 0);
  if (layout.series === 1) return brief.voltage * (1 + brief.overshoot);
  if (chain === null) return null;
  return holdHighest(chain, chosen?.resistance ?? Number.POSITIVE_INFINITY);
}

function balanceOf(
  candidate: Candidate,
  brief: Brief,
  layout: Layout,
  families: readonly ResistorFamily[],
  wish: BalanceWish,
): Balance | null {
  if (wish.kind === "none") return null;
  if (wish.kind === "fixed") return fixedBalance(candidate, brief, layout, families[0] as ResistorFamily, wish);
  const best = newBalancing();
  const chain = chainOf(candidate, brief);
  if (chain === null) return null;
  chain.series = layout.series;
  chain.sharing = sharingOf(layout);
  if (!bestBalance(chain, candidate.limit, positionsOf(layout), families, best)) return null;
  const family = families[best.family] as ResistorFamily;
  return describe(layout, brief, family, {
    resistance: best.resistance,
    tolerance: family.tolerance,
    elements: best.elements,
    worst: best.worst,
  });
}

/** The builder's own resistor, split into as few equal elements as the first family's volts and watts allow. */
function fixedBalance(
  candidate: Candidate,
  brief: Brief,
  layout: Layout,
  family: ResistorFamily,
  { resistance, tolerance }: { readonly resistance: number; readonly tolerance: number },
): Balance {
  const chain = shapedChain(candidate, brief, layout, tolerance);
  const even = (brief.voltage * (1 + brief.overshoot)) / layout.series;
  const worst = chain === null ? even : holdHighest(chain, resistance);
  const byVolts = worst / family.voltage;
  const byWatts = elementPower(worst, resistance, tolerance, 1) / (family.power * family.derating);
  const elements = Math.max(1, Math.ceil(Math.max(byVolts, byWatts) * (1 - 1e-9)));
  return describe(layout, brief, family, { resistance, tolerance, elements, worst });
}

function describe(
  layout: Layout,
  brief: Brief,
  family: ResistorFamily,
  chosen: {
    readonly resistance: number;
    readonly tolerance: number;
    readonly elements: number;
    readonly worst: number;
  },
): Balance {
  const { resistance, tolerance, elements, worst } = chosen;
  const voltage = brief.voltage * (1 + brief.overshoot);
  const positions = positionsOf(layout);
  const chains = positions / layout.series;
  return {
    resistance,
    tolerance,
    positions,
    elements,
    elementResistance: resistance / elements,
    powerEach: elementPower(worst, resistance, tolerance, elements),
    powerTotal: (chains * voltage * voltage) / (layout.series * resistance * (1 - tolerance)),
    voltageEach: worst / elements,
    family: family.family,
    assumed: family.assumed,
  };
}

/** From the highest voltage down to the touch-safe one through the balancing chains alone, with high C and high R, s. */
function bleedSeconds(balance: Balance, layout: Layout, capacitance: number, brief: Brief): number {
  const voltage = brief.voltage * (1 + brief.overshoot);
  if (voltage <= brief.touchSafe) return 0;
  const chains = balance.positions / layout.series;
  const resistance = (balance.resistance * (1 + balance.tolerance) * layout.series) / chains;
  return resistance * capacitance * Math.log(voltage / brief.touchSafe);
}

const PLURAL: Readonly<Record<Protection["kind"], string>> = {
  fuse: "fuses",
  "isolating resistor": "isolating resistors",
  "section inductance": "section inductances",
};

/** What the priced lines come to; null when none has a price. Resistors that cannot be sized have none. */
function costOf(of: {
  readonly capacitors: Purchase | null;
  readonly resistors: Purchase | null;
  readonly needsResistors: boolean;
  readonly guards: readonly Protection[] | null;
  readonly currency: string | null;
}): Cost | null {
  const { currency, needsResistors, guards } = of;
  if (currency === null) return null;
  const capacitors = of.capacitors?.cost ?? null;
  const resistors = needsResistors ? (of.resistors?.cost ?? null) : 0;
  if (capacitors === null && (resistors === null || resistors === 0)) return null;
  return {
    capacitors: capacitors === null ? null : toMajor(capacitors, currency),
    resistors: resistors === null ? null : toMajor(resistors, currency),
    ...(guards === null ? {} : { protection: toMajor(protectionCost(guards), currency) }),
    total: toMajor((capacitors ?? 0) + (resistors ?? 0) + protectionCost(guards ?? []), currency),
    currency,
    unpriced: [
      ...(capacitors === null ? ["capacitors"] : []),
      ...(resistors === null ? ["balancing resistors"] : []),
      ...(guards ?? []).filter(({ cost }) => cost === null).map(({ kind }) => PLURAL[kind]),
    ],
  };
}
