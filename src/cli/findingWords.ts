// What each finding is about, and its figures as text rounded to the safe side.

import { type Dimension, type Finding, formatQuantity, roundTo, type Verdict } from "../quantity/index.ts";

interface Title {
  readonly title: string;
  /** True when the limit is a least: then the value rounds down and the limit up. */
  readonly least?: boolean;
}

export const FINDINGS: Readonly<Record<string, Title>> = {
  "charging-share": { title: "worst unit while charging" },
  "charging-risk": { title: "chance of one over its limit" },
  "holding-share": { title: "worst unit while holding" },
  "balance-power": { title: "power in a balancing element" },
  "balance-voltage": { title: "voltage on a balancing element" },
  "balance-power-start": { title: "power in a balancing element, as the hold begins" },
  "balance-voltage-start": { title: "voltage on a balancing element, as the hold begins" },
  "reverse-after-dump": { title: "reverse voltage left by a dump" },
  "pulse-energy": { title: "energy of one pulse", least: true },
  "steady-current": { title: "capacitance for the steady current", least: true },
  "unit-short": { title: "sound units with one shorted" },
  "energy-class": { title: "stored energy, class of hazard" },
  "arc-blast": { title: "stored energy, arc blast" },
  "energy-at-safe": { title: "energy left at touch-safe volts" },
  recovery: { title: "voltage that comes back" },
  bleed: { title: "time to touch-safe by bleeding" },
  "pulse.unit.current": { title: "peak current of a unit" },
  "pulse.unit.slew": { title: "slew of a unit" },
  "pulse.unit.action": { title: "action through a unit" },
  "pulse.fault.action": { title: "action through a sound unit, fault" },
  "pulse.unit.reversal": { title: "reversal of a unit" },
  "pulse.unit.rms": { title: "rms current of a unit" },
  "pulse.unit.rise": { title: "temperature rise of a unit, K" },
  "pulse.polarity": { title: "reversal of a polarised unit" },
  "pulse.rate": { title: "shots a second" },
  "pulse.bus.shape": { title: "width over gap of the bars", least: true },
  "pulse.bound.inductance": { title: "no inductance" },
  "pulse.bound.lossless": { title: "no resistance" },
  "pulse.bound.unknown": { title: "parts of the loop unknown" },
  "pulse.fuse.lives": { title: "fuse lives through the shot" },
  "pulse.fuse.clears": { title: "fuse clears the fault", least: true },
  "pulse.fuse.voltage": { title: "fuse breaks the voltage" },
  "pulse.stated.peak": { title: "stated peak against the possible" },
  "pulse.stated.loss": { title: "stated loss against the stored" },
  "pulse.stated.none": { title: "nothing stated to hold it to" },
  "lamp.explosion": { title: "energy over explosion energy" },
  "lamp.width.least": { title: "pulse width, lamp's law", least: true },
  "lamp.width.most": { title: "pulse width, lamp's law" },
  "lamp.density.least": { title: "A/m2 in the lamp, lamp's law", least: true },
  "lamp.density.most": { title: "A/m2 in the lamp, lamp's law" },
  "limit-peak-current": { title: "your limit on peak current" },
  "limit-slew": { title: "your limit on slew" },
  "limit-reversal": { title: "your limit on reversal" },
  "limit-rms": { title: "your limit on rms current" },
  "limit-temperature-rise": { title: "your limit on rise, K" },
  "limit-fault-energy": { title: "your limit into a shorted unit" },
  "limit-life": { title: "your limit on life", least: true },
  "place.charging-gap": { title: "charging gap against the floor" },
  "place.holding-gap": { title: "holding gap against the floor" },
  "place.charging-stress": { title: "worst unit while charging" },
  "place.holding-stress": { title: "worst unit at the end of a hold" },
  "place.peak-stress": { title: "highest between the two" },
  "place.leakage-missing": { title: "leakage not measured" },
  "place.leakage-no-test-voltage": { title: "leakage without its voltage" },
  "place.leakage-zero": { title: "leakage read as nought" },
  "place.wild-unit": { title: "gap with a wild unit, without" },
  "place.outlier-capacitance": { title: "capacitance out of the lot" },
  "place.outlier-leakage": { title: "leakage out of the lot" },
  "place.outlier-esr": { title: "ESR out of the lot" },
  "place.outside-tolerance": { title: "units outside the part's tolerance" },
  "place.mixed-parts": { title: "groups of mixed parts" },
  "history.capacitance-lost": { title: "capacitance lost" },
  "history.esr-grown": { title: "ESR grown" },
  "history.leakage": { title: "leakage as last measured" },
  "history.charging-stress": { title: "worst unit, as last measured" },
  "commission.over-limit": { title: "a reading over its limit" },
  "commission.whole": { title: "the readings as a whole" },
  "commission.sum": { title: "sum of the readings" },
};

const DIMENSION_OF: Readonly<Record<string, Dimension>> = {
  V: "voltage",
  W: "power",
  J: "energy",
  s: "time",
  A: "current",
  ohm: "resistance",
  F: "capacitance",
  C: "charge",
  kg: "mass",
  m: "length",
  A2s: "action",
  "V/s": "slew",
  Hz: "frequency",
  "%": "fraction",
  "1": "fraction",
};

/** The verdict as a word of fixed width, so that it never depends on colour. */
export const VERDICTS: Readonly<Record<Verdict, string>> = {
  pass: "pass",
  warn: "WARN",
  fail: "FAIL",
  "not assessed": "not assessed",
};

export const titleOf = (id: string): string => FINDINGS[id]?.title ?? id.replaceAll("-", " ");

/** Value, limit and margin as text; what is unknown says so. */
export function findingFigures({ id, value, limit, margin, unit }: Finding): {
  readonly value: string;
  readonly limit: string;
  readonly margin: string;
} {
  const least = FINDINGS[id]?.least === true;
  const dimension = DIMENSION_OF[unit] ?? "count";
  const tiny = (x: number | null): x is number => unit === "1" && x !== null && x !== 0 && Math.abs(x) < 1e-3;
  const show = (x: number | null, rounding: "up" | "down"): string =>
    tiny(x) ? roundTo(x, 3, rounding).toExponential() : formatQuantity(x, dimension, { rounding });
  return {
    // A chance of nought is what was reckoned from, not that it cannot be.
    value: id === "charging-risk" && value === 0 ? "none found" : show(value, least ? "down" : "up"),
    limit: limit === null ? "unknown" : `${least ? ">=" : "<="} ${show(limit, least ? "up" : "down")}`,
    margin: marginText(margin),
  };
}

/** Free part of the limit in percent; where the limit is passed more than twice, how many times it is taken. */
function marginText(margin: number | null): string {
  if (margin === null) return "";
  if (margin < -1) return `x ${formatQuantity(1 - margin, "count", { digits: 3, rounding: "up" })}`;
  return formatQuantity(margin, "fraction", { digits: 3, rounding: "down" });
}
