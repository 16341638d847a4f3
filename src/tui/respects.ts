// What layouts are compared in: each respect's words, its number, which end is better, and how a difference is told.
import type { Dimension } from "../quantity/index.ts";
import type { LayoutResult } from "../search/index.ts";
import { shareOfLimit, shown, shownCost, shownLimit, shownMoney, shownVerdict, shownWorst } from "./values.ts";

export interface Respect {
  readonly label: string;
  readonly text: (layout: LayoutResult) => string;
  /** What is ranked, and which end is better; absent where neither is. */
  readonly value?: (layout: LayoutResult) => number | null;
  readonly better?: "low" | "high";
  /** An amount of difference with its unit, such as "12.30 EUR". */
  readonly amount?: (difference: number, layout: LayoutResult) => string;
  /** What the better side of two does, the amount put in: "costs {} less". Absent: not told in sentences. */
  readonly gain?: string;
  /** A difference is told as it stands, not in percent: the value is a part of a whole already. */
  readonly isPart?: boolean;
}

const of =
  (dimension: Dimension) =>
  (difference: number): string =>
    shown(difference, dimension);
const money = (difference: number, { cost }: LayoutResult): string => shownMoney(difference, cost?.currency ?? "");
const counted = (difference: number): string => String(Math.round(difference));
const points = (difference: number): string => `${Number((difference * 100).toPrecision(3))} points`;
const shownPart = (fraction: number | null): string => shownWorst(fraction, "fraction");

export const RESPECTS: readonly Respect[] = [
  { label: "part", text: (l) => l.part },
  { label: "in series", text: (l) => String(l.series), value: (l) => l.series },
  { label: "in parallel", text: (l) => String(l.parallel), value: (l) => l.parallel },
  { label: "ties", text: (l) => l.ties },
  { label: "checks", text: shownVerdict },
  {
    label: "total cost",
    text: shownCost,
    value: (l) => (l.cost === null || l.cost.unpriced.length > 0 ? null : l.cost.total),
    better: "low",
    amount: money,
    gain: "costs {} less",
  },
  {
    label: "  capacitors",
    text: (l) => shownMoney(l.cost?.capacitors ?? null, l.cost?.currency ?? ""),
    value: (l) => l.cost?.capacitors ?? null,
    better: "low",
    amount: money,
  },
  {
    label: "  resistors",
    text: (l) => shownMoney(l.cost?.resistors ?? null, l.cost?.currency ?? ""),
    value: (l) => l.cost?.resistors ?? null,
    better: "low",
    amount: money,
  },
  {
    label: "units",
    text: (l) => String(l.units),
    value: (l) => l.units,
    better: "low",
    amount: counted,
    gain: "takes {} fewer units",
  },
  {
    label: "energy, least",
    text: (l) => shownLimit(l.energy.low, "energy"),
    value: (l) => l.energy.low,
    better: "high",
    amount: of("energy"),
    gain: "gives at least {} more",
  },
  {
    label: "energy, nominal",
    text: (l) => shown(l.energy.nominal, "energy"),
    value: (l) => l.energy.nominal,
    better: "high",
    amount: of("energy"),
  },
  { label: "C, least", text: (l) => shownLimit(l.capacitance.low, "capacitance"), value: (l) => l.capacitance.low },
  { label: "even share", text: (l) => shown(l.share.even, "voltage"), value: (l) => l.share.even },
  { label: "worst, charging", text: (l) => shownWorst(l.share.charging, "voltage"), value: (l) => l.share.charging },
  { label: "worst, holding", text: (l) => shownWorst(l.share.holding, "voltage"), value: (l) => l.share.holding },
  { label: "unit limit", text: (l) => shownLimit(l.share.limit, "voltage"), value: (l) => l.share.limit },
  {
    label: "worst of limit",
    text: (l) => shownPart(shareOfLimit(l)),
    value: shareOfLimit,
    better: "low",
    amount: points,
    gain: "keeps its worst unit {} further below its limit",
    isPart: true,
  },
  {
    label: "worst of rating",
    text: (l) => shownPart(l.stress),
    value: (l) => l.stress,
    better: "low",
    amount: points,
    isPart: true,
  },
  {
    label: "left after dump",
    text: (l) => shownWorst(l.share.leftAfterDump, "voltage"),
    value: (l) => l.share.leftAfterDump,
    better: "low",
    amount: of("voltage"),
    gain: "leaves {} less on a unit after a dump",
  },
  {
    label: "balancing",
    text: (l) => (l.balance === null ? "none" : shown(l.balance.resistance, "resistance")),
    value: (l) => l.balance?.resistance ?? null,
  },
  {
    label: "  elements",
    text: (l) => (l.balance === null ? "none" : String(l.balance.positions * l.balance.elements)),
    value: (l) => (l.balance === null ? 0 : l.balance.positions * l.balance.elements),
    better: "low",
    amount: counted,
    gain: "needs {} fewer resistors",
  },
  {
    label: "  power, all",
    text: (l) => (l.balance === null ? "none" : shownWorst(l.balance.powerTotal, "power")),
    value: (l) => l.balance?.powerTotal ?? 0,
    better: "low",
    amount: of("power"),
  },
  {
    label: "bleeds down in",
    text: (l) => shownWorst(l.bleed.seconds, "time"),
    value: (l) => l.bleed.seconds,
    better: "low",
    amount: of("time"),
    gain: "bleeds down {} sooner",
  },
  {
    label: "volume",
    text: (l) => shown(l.volume, "volume"),
    value: (l) => l.volume,
    better: "low",
    amount: of("volume"),
    gain: "takes {} less room",
  },
  {
    label: "mass",
    text: (l) => shown(l.mass, "mass"),
    value: (l) => l.mass,
    better: "low",
    amount: of("mass"),
    gain: "weighs {} less",
  },
];
