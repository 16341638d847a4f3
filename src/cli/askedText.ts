// What was asked, as it was read: every value with its unit, and which of them are defaults.

import { visible } from "../order/index.ts";
import { type Dimension, formatQuantity } from "../quantity/index.ts";
import { type Brief, LIMIT_KEYS } from "../search/index.ts";
import {
  busWords,
  chargerWords,
  clampWords,
  isolatingWords,
  limitWords,
  loadWords,
  sectionWords,
  switchWords,
} from "./circuitWords.ts";
import { pad, wrap } from "./wrap.ts";

interface Asked {
  readonly label: string;
  /** Key of the brief, or several that one line tells. */
  readonly key: string | readonly string[];
  readonly value: (brief: Brief, lot: number | null) => string | null;
}

const show = (x: number | undefined, dimension: Dimension): string | null =>
  x === undefined ? null : formatQuantity(x, dimension, { digits: 6 });

const ASKED: readonly Asked[] = [
  { label: "energy of one pulse", key: "energy", value: (b) => show(b.energy, "energy") },
  { label: "charge voltage", key: "voltage", value: (b) => show(b.voltage, "voltage") },
  {
    label: "allowed fall",
    key: "ripple",
    value: (b) => `${show(b.ripple, "fraction")}${b.ripple === 1 ? ", a full dump" : ""}`,
  },
  {
    label: "steady draw",
    key: "steady",
    value: (b) =>
      b.steady ? `${show(b.steady.current, "current")}, recharged at ${show(b.steady.frequency, "frequency")}` : null,
  },
  {
    label: "basis",
    key: "basis",
    value: (b, lot) => {
      if (b.basis !== "statistical") return b.basis;
      const spread = lot === null ? `${b.distribution} within the tolerance` : `drawn from the ${lot} measured units`;
      return `statistical, risk ${b.risk}, ${spread}`;
    },
  },
  { label: "derating", key: "derating", value: (b) => show(b.derating, "fraction") },
  { label: "overshoot", key: "overshoot", value: (b) => show(b.overshoot, "fraction") },
  { label: "ageing", key: "ageing", value: (b) => show(b.ageing, "fraction") },
  { label: "hold", key: "hold", value: (b) => (Number.isFinite(b.hold) ? show(b.hold, "time") : "for ever") },
  {
    label: "touch-safe",
    key: "touchSafe",
    value: (b) => `${show(b.touchSafe, "voltage")}${b.touchSafeRule ? ` (${visible(b.touchSafeRule)})` : ""}`,
  },
  { label: "most in series", key: "maxSeries", value: (b) => String(b.maxSeries) },
  { label: "most units", key: "maxUnits", value: (b) => String(b.maxUnits) },
  {
    label: "most cost",
    key: "maxCost",
    value: (b) => (b.maxCost === undefined ? null : `${b.maxCost} ${b.currency ?? ""}`.trim()),
  },
  { label: "most volume", key: "maxVolume", value: (b) => show(b.maxVolume, "volume") },
  { label: "most mass", key: "maxMass", value: (b) => show(b.maxMass, "mass") },
  { label: "spares", key: "spares", value: (b) => (b.spares === 0 ? null : String(b.spares)) },
  { label: "dump resistance", key: "dumpResistance", value: (b) => show(b.dumpResistance, "resistance") },
  { label: "ambient", key: "ambient", value: (b) => show(b.ambient, "temperature") },
  { label: "shots", key: "rate", value: (b) => show(b.rate, "frequency") },
  { label: "load", key: "load", value: loadWords },
  { label: "switch", key: "switch", value: switchWords },
  { label: "bus", key: "bus", value: busWords },
  { label: "clamp diode", key: "clamp", value: clampWords },
  { label: "isolating resistor", key: "isolating", value: isolatingWords },
  { label: "section inductance", key: "section", value: sectionWords },
  {
    label: "fuses",
    key: "fused",
    value: (b) => (b.fused ? "one to each unit or string, the cheapest that does" : null),
  },
  { label: "a short resists with", key: "shortResistance", value: (b) => show(b.shortResistance, "resistance") },
  { label: "charger", key: "charger", value: chargerWords },
  { label: "limits of a unit", key: LIMIT_KEYS, value: limitWords },
];

export interface AskedLine {
  readonly label: string;
  readonly value: string;
  /** False for a default. */
  readonly given: boolean;
}

/** The brief as lines of words; what it does not have is left out. `lot`: measured units that stand in for the tolerance. */
export const askedLines = (brief: Brief, given: ReadonlySet<string>, lot: number | null = null): readonly AskedLine[] =>
  ASKED.flatMap(({ label, key, value }) => {
    const text = value(brief, lot);
    const keys = typeof key === "string" ? [key] : key;
    return text === null ? [] : [{ label, value: text, given: keys.some((one) => given.has(one)) }];
  });

/** The brief in lines; the defaults together in the last. */
export function askedText(brief: Brief, given: ReadonlySet<string>, width: number, lot: number | null = null): string {
  const asked = askedLines(brief, given, lot);
  const lines = asked
    .filter((line) => line.given)
    .map(({ label, value }) => wrap(`${pad(label, 20)} ${value}`, width, "  "));
  const defaults = asked.filter((line) => !line.given).map(({ label, value }) => `${label} ${value}`);
  if (defaults.length > 0) lines.push(wrap(`by default: ${defaults.join(", ")}`, width, "  "));
  return lines.join("\n");
}
