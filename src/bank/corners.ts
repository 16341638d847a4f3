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
import { cornerWords, type Sides, type StageRange } from "./cornersRange.ts";

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

/** A stage that ends up highest, and the company that puts it there. */
const TIGHT: Sides = { capacitance: "low", leakageCurrent: "low", conductance: "low", resistance: "high" };
const LOOSE: Sides = { capacitance: "high", leakageCurrent: "high", conductance: "high", resistance: "low" };

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
