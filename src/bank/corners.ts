/*
 * Worst cases of a chain over every corner of its tolerances, for charging, an endless hold, and after a dump; the corner is named.
 *
 * Charging: share_i falls with C_i and rises with every other C, so stage i at its least and the rest at their greatest is worst.
 * Endless hold: v_i = R_i (I - I_i), I = (V + sum R_k I_k)/sum(R_k). While no stage is below zero v_i falls with its own leakage and
 * rises with its own R, and rises with another's leakage and falls with its R: the box's worst is one corner, found without search.
 * After an instant dump: what the hold left less V share_i; capacitance is in the second part only, leakage and R in the first only.
 * Source: [methods-derived] 1.2, 1.4, 2.2
 */
import { type Chain, chargingShares, endOfHold, type Stage } from "./chain.ts";

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

export interface Corner {
  /** V, of the stage named. */
  readonly voltage: number;
  /** Index of that stage, from 0; the first of equals. */
  readonly stage: number;
  /** Every stage's values at the corner. */
  readonly chain: Chain;
  /** The corner in words: "stage 3 at -20 %, the rest at +20 %". */
  readonly words: string;
}

type Side = "low" | "high";
type Sides = Readonly<Record<keyof Stage, Side>>;

/** A stage that ends up highest, and the company that puts it there. */
const TIGHT: Sides = { capacitance: "low", leakageCurrent: "low", conductance: "low", resistance: "high" };
const LOOSE: Sides = { capacitance: "high", leakageCurrent: "high", conductance: "high", resistance: "low" };

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

/** Highest and lowest stage voltage (V) while charging to `voltage` (V). */
export function chargingCorners(ranges: readonly StageRange[], voltage: number): { highest: Corner; lowest: Corner } {
  const value = (chain: Chain, i: number): number => voltage * chargingShares(chain)[i]!;
  return bothCorners(ranges, value, ["capacitance"]);
}

/** Highest and lowest stage voltage (V) after an endless hold at `voltage` (V). */
export function holdingCorners(ranges: readonly StageRange[], voltage: number): { highest: Corner; lowest: Corner } {
  const value = (chain: Chain, i: number): number => heldVoltages(chain, voltage)[i]!;
  return bothCorners(ranges, value, ["capacitance", "leakageCurrent", "conductance", "resistance"]);
}

/**
 * Lowest and highest voltage (V) that a stage keeps after an instant dump: below zero is reverse.
 * `equalised`: the hold left every stage at V/n; `held`: an endless hold left them where leakage and resistors put them.
 */
export function dumpedCorners(
  ranges: readonly StageRange[],
  voltage: number,
  from: "equalised" | "held",
): { highest: Corner; lowest: Corner } {
  const value = (chain: Chain, i: number): number => {
    const before = from === "held" ? heldVoltages(chain, voltage)[i]! : voltage / chain.length;
    return before - voltage * chargingShares(chain)[i]!;
  };
  const named: readonly (keyof Stage)[] =
    from === "held" ? ["capacitance", "leakageCurrent", "conductance", "resistance"] : ["capacitance"];
  const lowVictim: Sides = { capacitance: "low", leakageCurrent: "high", conductance: "high", resistance: "low" };
  const highVictim: Sides = { capacitance: "high", leakageCurrent: "low", conductance: "low", resistance: "high" };
  return {
    highest: best(ranges, value, named, highVictim, lowVictim, 1),
    lowest: best(ranges, value, named, lowVictim, highVictim, -1),
  };
}

/** Where nothing conducts, or nothing decides between equals, a hold leaves what charging gave. */
const heldVoltages = (chain: Chain, voltage: number): readonly number[] =>
  endOfHold(chain, voltage) ?? chargingShares(chain).map((share) => share * voltage);

function bothCorners(
  ranges: readonly StageRange[],
  value: (chain: Chain, i: number) => number,
  named: readonly (keyof Stage)[],
): { highest: Corner; lowest: Corner } {
  return {
    highest: best(ranges, value, named, TIGHT, LOOSE, 1),
    lowest: best(ranges, value, named, LOOSE, TIGHT, -1),
  };
}

function best(
  ranges: readonly StageRange[],
  value: (chain: Chain, i: number) => number,
  named: readonly (keyof Stage)[],
  victim: Sides,
  rest: Sides,
  sign: 1 | -1,
): Corner {
  const found = ranges.map((_, stage): Omit<Corner, "words"> => {
    const chain = ranges.map((range, i) => stageAt(range, i === stage ? victim : rest));
    return { voltage: value(chain, stage), stage, chain };
  });
  const worst = found.reduce((a, b) =>
    sign * b.voltage > sign * a.voltage * (1 + 1e-12 * sign * Math.sign(a.voltage)) ? b : a,
  );
  return { ...worst, words: cornerWords(ranges, worst.stage, named, victim, rest) };
}

const stageAt = (range: StageRange, sides: Sides): Stage => ({
  capacitance: range.capacitance[sides.capacitance],
  leakageCurrent: range.leakageCurrent[sides.leakageCurrent],
  conductance: range.conductance[sides.conductance],
  resistance: range.resistance[sides.resistance],
});

/** Only quantities that have a spread at all are named. */
function cornerWords(
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
