// Sets layouts side by side: each row a respect, with the best and worst found, and whether all agree.
import type { LayoutResult } from "../search/index.ts";
import {
  NOT_ASSESSED,
  shareOfLimit,
  shown,
  shownCost,
  shownLimit,
  shownMoney,
  shownVerdict,
  shownWorst,
  UNKNOWN,
} from "./values.ts";

export interface ComparedCell {
  readonly text: string;
  readonly standing: "best" | "worst" | null;
  /** Difference to the best of the row, as a fraction of it; null where there is none to say. */
  readonly beyondBest: number | null;
}

export interface ComparedRow {
  readonly label: string;
  readonly cells: readonly ComparedCell[];
  /** Every layout shows the same here. */
  readonly agrees: boolean;
}

interface Respect {
  readonly label: string;
  readonly text: (layout: LayoutResult) => string;
  /** What is ranked, and which end is better; absent where neither is. */
  readonly value?: (layout: LayoutResult) => number | null;
  readonly better?: "low" | "high";
}

const RESPECTS: readonly Respect[] = [
  { label: "part", text: (l) => l.part },
  { label: "in series", text: (l) => String(l.series) },
  { label: "in parallel", text: (l) => String(l.parallel) },
  { label: "ties", text: (l) => l.ties },
  { label: "checks", text: shownVerdict },
  {
    label: "total cost",
    text: shownCost,
    value: (l) => (l.cost === null || l.cost.unpriced.length > 0 ? null : l.cost.total),
    better: "low",
  },
  {
    label: "  capacitors",
    text: (l) => shownMoney(l.cost?.capacitors ?? null, l.cost?.currency ?? ""),
    value: (l) => l.cost?.capacitors ?? null,
    better: "low",
  },
  {
    label: "  resistors",
    text: (l) => shownMoney(l.cost?.resistors ?? null, l.cost?.currency ?? ""),
    value: (l) => l.cost?.resistors ?? null,
    better: "low",
  },
  { label: "units", text: (l) => String(l.units), value: (l) => l.units, better: "low" },
  {
    label: "energy, least",
    text: (l) => shownLimit(l.energy.low, "energy"),
    value: (l) => l.energy.low,
    better: "high",
  },
  {
    label: "energy, nominal",
    text: (l) => shown(l.energy.nominal, "energy"),
    value: (l) => l.energy.nominal,
    better: "high",
  },
  { label: "C, least", text: (l) => shownLimit(l.capacitance.low, "capacitance") },
  { label: "even share", text: (l) => shown(l.share.even, "voltage") },
  { label: "worst, charging", text: (l) => shownWorst(l.share.charging, "voltage") },
  { label: "worst, holding", text: (l) => shownWorst(l.share.holding, "voltage") },
  { label: "unit limit", text: (l) => shownLimit(l.share.limit, "voltage") },
  { label: "worst of limit", text: (l) => shownPart(shareOfLimit(l)), value: shareOfLimit, better: "low" },
  { label: "worst of rating", text: (l) => shownPart(l.stress), value: (l) => l.stress, better: "low" },
  {
    label: "left after dump",
    text: (l) => shownWorst(l.share.leftAfterDump, "voltage"),
    value: (l) => l.share.leftAfterDump,
    better: "low",
  },
  { label: "balancing", text: (l) => (l.balance === null ? "none" : shown(l.balance.resistance, "resistance")) },
  {
    label: "  elements",
    text: (l) => (l.balance === null ? "none" : String(l.balance.positions * l.balance.elements)),
    value: (l) => (l.balance === null ? 0 : l.balance.positions * l.balance.elements),
    better: "low",
  },
  {
    label: "  power, all",
    text: (l) => (l.balance === null ? "none" : shownWorst(l.balance.powerTotal, "power")),
    value: (l) => l.balance?.powerTotal ?? 0,
    better: "low",
  },
  {
    label: "bleeds down in",
    text: (l) => shownWorst(l.bleed.seconds, "time"),
    value: (l) => l.bleed.seconds,
    better: "low",
  },
  { label: "volume", text: (l) => shown(l.volume, "volume"), value: (l) => l.volume, better: "low" },
  { label: "mass", text: (l) => shown(l.mass, "mass"), value: (l) => l.mass, better: "low" },
];

const shownPart = (fraction: number | null): string => shownWorst(fraction, "fraction");

/** An absent layout is one that the catalogue no longer has. */
export function compareLayouts(layouts: readonly (LayoutResult | null)[]): readonly ComparedRow[] {
  return RESPECTS.map(({ label, text, value, better }) => {
    const texts = layouts.map((layout) => (layout === null ? "not in catalogue" : text(layout)));
    const agrees = texts.every((one) => one === texts[0]) && texts.length > 0;
    const numbers = layouts.map((layout) => (layout === null || value === undefined ? null : value(layout)));
    const known = numbers.filter((number) => number !== null);
    const [low, high] = [Math.min(...known), Math.max(...known)];
    const ranked = better !== undefined && known.length > 1 && low < high && !agrees;
    const best = better === "low" ? low : high;
    const cells = texts.map((shownText, index): ComparedCell => {
      const number = numbers[index] ?? null;
      if (!ranked || number === null) return { text: shownText, standing: null, beyondBest: null };
      const standing = number === best ? "best" : number === (better === "low" ? high : low) ? "worst" : null;
      return { text: shownText, standing, beyondBest: number === best || best === 0 ? null : number / best - 1 };
    });
    return { label, cells, agrees };
  });
}

export const isOpenText = (text: string): boolean => text === NOT_ASSESSED || text === UNKNOWN || text === "no price";
