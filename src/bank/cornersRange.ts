// A stage whose values may lie anywhere in a range, and a corner of the ranges in words.
import type { Stage } from "./chain.ts";

export interface Range {
  readonly low: number;
  readonly nominal: number;
  readonly high: number;
}

/** A stage whose values may lie anywhere in a range; SI units as in Stage. */
export interface StageRange {
  readonly capacitance: Range;
  readonly leakageCurrent: Range;
  readonly conductance: Range;
  readonly resistance: Range;
}

export type Side = "low" | "high";
export type Sides = Readonly<Record<keyof Stage, Side>>;

/** A stage of `units` equal units (one in a string) that share a balancing resistor (null: none). */
export function stageRange(given: {
  readonly units: number;
  readonly capacitance: number;
  readonly tLow: number;
  readonly tHigh: number;
  /** Greatest leakage current of a unit, A; the least is 0. */
  readonly leakage: number;
  /** Least insulation resistance of a unit, ohm; the greatest is Infinity. */
  readonly insulation: number;
  readonly resistance: number | null;
  readonly q: number;
}): StageRange {
  const { units, capacitance, tLow, tHigh, leakage, insulation, q } = given;
  const nominal = units * capacitance;
  const resistance = given.resistance ?? Number.POSITIVE_INFINITY;
  return {
    capacitance: { low: nominal * (1 - tLow), nominal, high: nominal * (1 + tHigh) },
    leakageCurrent: { low: 0, nominal: units * leakage, high: units * leakage },
    conductance: { low: 0, nominal: units / insulation, high: units / insulation },
    resistance: { low: resistance * (1 - q), nominal: resistance, high: resistance * (1 + q) },
  };
}

/** Only quantities that have a spread at all are named. */
export function cornerWords(
  ranges: readonly StageRange[],
  stage: number,
  named: readonly (keyof Stage)[],
  victim: Sides,
  rest: Sides,
): string {
  const others = ranges.filter((_, i) => i !== stage);
  const own = ranges[stage]!;
  const clauses = named.flatMap((key) => {
    const spread = ranges.some((range) => range[key].high !== range[key].low);
    if (!spread) return [];
    const mine = sideWords(key, own[key], victim[key]);
    const theirs = new Set(others.map((range) => sideWords(key, range[key], rest[key])));
    const company = theirs.size === 1 ? [...theirs][0]! : `each at its ${rest[key] === "low" ? "least" : "greatest"}`;
    return [others.length === 0 ? `stage ${stage + 1} ${mine}` : `stage ${stage + 1} ${mine}, the rest ${company}`];
  });
  return clauses.length === 0 ? "every stage alike" : clauses.join("; ");
}

const NAMES: Readonly<Record<keyof Stage, string>> = {
  capacitance: "",
  leakageCurrent: "leakage ",
  conductance: "insulation leakage ",
  resistance: "resistor ",
};

function sideWords(key: keyof Stage, range: Range, side: Side): string {
  if (key === "capacitance" || key === "resistance") {
    const percent = Math.round((range[side] / range.nominal - 1) * 1e5) / 1e3;
    return `${NAMES[key]}at ${percent > 0 ? "+" : ""}${percent} %`;
  }
  return range[side] === 0 ? `with no ${NAMES[key].trim()}` : `with the greatest ${NAMES[key].trim()}`;
}
