/*
 * A chain of few kinds of stage as one lump a kind: exact, and as quick for a thousand in series as for three.
 *
 * | symbol | in code     | unit | meaning                                                     |
 * | ------ | ----------- | ---- | ----------------------------------------------------------- |
 * | k      | count       | 1    | equal stages in series, >= 1                                |
 * | C/k    | capacitance | F    | of the lump; conductance G/k, resistor k R, leakage unchanged |
 * | v k    |             | V    | voltage of the lump: k times that of each of its stages     |
 *
 * Equal stages that start equal stay equal, so nothing is approximated. Source: [methods-derived] 2.1
 */

import type { HoldCase, Stage } from "../../bank/index.ts";

export interface Lump {
  /** Equal stages in this lump. */
  readonly count: number;
  readonly stage: Stage;
}

export interface StageSides {
  readonly capacitance: "low" | "high";
  readonly leaks: boolean;
  readonly resistor: "low" | "high";
}

/** One stage at a corner of its values; SI. */
export function stageAtCorner(given: HoldCase, at: StageSides): Stage {
  const { m, C, tLow, tHigh, leakage, insulation, R, q } = given;
  return {
    capacitance: m * C * (at.capacitance === "low" ? 1 - tLow : 1 + tHigh),
    leakageCurrent: at.leaks ? m * leakage : 0,
    conductance: at.leaks ? m / insulation : 0,
    resistance: R === null ? Number.POSITIVE_INFINITY : R * (at.resistor === "low" ? 1 - q : 1 + q),
  };
}

/** `count` equal stages in series as one. */
export const lumped = (count: number, stage: Stage): Lump => ({
  count,
  stage: {
    capacitance: stage.capacitance / count,
    leakageCurrent: stage.leakageCurrent,
    conductance: stage.conductance / count,
    resistance: stage.resistance * count,
  },
});

const TIGHT: StageSides = { capacitance: "low", leaks: false, resistor: "high" };

/** The corner that stands highest: one tight stage, `lowOthers` leaky ones at the least capacitance, the rest leaky at the greatest. */
export function tightLumps(given: HoldCase, lowOthers: number): readonly Lump[] {
  const high = given.n - 1 - lowOthers;
  const leaky = (capacitance: "low" | "high") => stageAtCorner(given, { capacitance, leaks: true, resistor: "low" });
  return [
    lumped(1, stageAtCorner(given, TIGHT)),
    ...(high > 0 ? [lumped(high, leaky("high"))] : []),
    ...(lowOthers > 0 ? [lumped(lowOthers, leaky("low"))] : []),
  ];
}
