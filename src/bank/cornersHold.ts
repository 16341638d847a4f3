/*
 * The highest voltage any stage can see in a hold of given length, over all corners, fast enough for a search.
 *
 * | symbol | in code    | unit | meaning                                                        |
 * | ------ | ---------- | ---- | -------------------------------------------------------------- |
 * | n      | n          | 1    | stages in series, >= 1                                         |
 * | m      | m          | 1    | units that share a resistor: p cross-tied, 1 in strings        |
 * | C      | C          | F    | of one unit, nominal; -tLow/+tHigh as fractions                |
 * | I_L    | leakage    | A    | greatest of one unit, the least is 0; stops at zero volts      |
 * |        | insulation | ohm  | least of one unit, the greatest is Infinity                    |
 * | R, q   | R, q       | ohm  | balancing resistor and its tolerance; null: none               |
 * | V      | V          | V    | held at the ends, after a charge too fast to leak              |
 *
 * | k      | victim.units | 1  | units left of the victim's stage, m unless told; `balanced` false: its resistor is open     |
 *
 * The victim has the least C and no leakage and the greatest R; all others leak most and have the least R. Of the others some
 * have the greatest C (they begin lower) and some the least (they sag faster); how many of each depends on the length of the hold, so
 * every number is tried. Three kinds of stage under one sum leave two modes: closed form.
 * That the worst corner is one of these is brute-forced, not proven: see the corner tests.
 * Source: [methods-derived] 1.2, 2.2, 2.4 made a function of time
 */
import { courseOf } from "./course.ts";
import { holdModes } from "./holdModes.ts";

export interface HoldCase {
  readonly n: number;
  readonly m: number;
  readonly C: number;
  readonly tLow: number;
  readonly tHigh: number;
  readonly leakage: number;
  readonly insulation: number;
  readonly R: number | null;
  readonly q: number;
  readonly V: number;
  /** s, 0 to Infinity. */
  readonly hold: number;
  /** A fault of the victim's own stage: units left in it, and whether its resistor is still there; left out: none. */
  readonly victim?: { readonly units: number; readonly balanced: boolean };
}

export interface HoldWorst {
  readonly voltage: number;
  /** When in the hold, s; Infinity when it is only approached. */
  readonly seconds: number;
  /** How many of the n - 1 others have the least capacitance; the rest have the greatest. */
  readonly lowOthers: number;
}

/** Highest voltage (V) of any stage at any time in [0, hold], over all corners of C, leakage and R. */
export function worstAtHold(given: HoldCase): HoldWorst {
  const { n, V, hold } = given;
  if (n === 1) return { voltage: V, seconds: 0, lowOthers: 0 };
  const at = holdConstants(given);
  const others = n - 1;
  let best: HoldWorst = { voltage: (V * at.high) / (at.high + others * at.victim), seconds: 0, lowOthers: 0 };
  if (at.drain === 0 && at.slack === 0 && at.keep === 0) return best;
  const settled = (V * at.slack + others * at.drain) / (others * at.keep + at.slack);
  // Nothing stands higher on the way than at the higher of the two ends: brute-forced, see the corner tests.
  if (at.keep > 0 && settled <= best.voltage) return best;
  if (hold === Number.POSITIVE_INFINITY) {
    const voltage = at.keep === 0 ? V : Math.min(V, settled);
    return voltage > best.voltage ? { voltage, seconds: hold, lowOthers: 0 } : best;
  }
  for (let lowOthers = 0; lowOthers <= others; lowOthers++) {
    const found = ofMix(given, at, lowOthers);
    if (found.voltage > best.voltage) best = found;
    if (best.voltage >= V) return { ...best, voltage: V };
  }
  return best;
}

export interface HoldConstants {
  /** Stage capacitances, F. */
  readonly victim: number;
  readonly low: number;
  readonly high: number;
  /** Conductance of the victim and of each other, S; leakage of each other, A. */
  readonly keep: number;
  readonly slack: number;
  readonly drain: number;
}

/** The corner sides of a case in SI. */
export function holdConstants({ m, C, tLow, tHigh, leakage, insulation, R, q, victim }: HoldCase): HoldConstants {
  return {
    victim: (victim?.units ?? m) * C * (1 - tLow),
    low: m * C * (1 - tLow),
    high: m * C * (1 + tHigh),
    keep: R === null || victim?.balanced === false ? 0 : 1 / (R * (1 + q)),
    slack: m / insulation + (R === null ? 0 : 1 / (R * (1 - q))),
    drain: m * leakage,
  };
}

/** The victim's highest voltage with `lowOthers` of the others at the least capacitance. */
function ofMix(given: HoldCase, at: HoldConstants, lowOthers: number): HoldWorst {
  const { n, V, hold } = given;
  const highOthers = n - 1 - lowOthers;
  const { start, oneAt, highAt, lowAt, turn } = holdModes({
    voltage: V,
    one: at.victim,
    low: at.low,
    high: at.high,
    own: { conductance: at.keep, leakage: 0 },
    others: { conductance: at.slack, leakage: at.drain },
    highOthers,
    lowOthers,
  });
  const dry = at.drain > 0 && ((highOthers > 0 && highAt(hold) < 0) || (lowOthers > 0 && lowAt(hold) < 0));
  if (dry)
    return lowOthers === 0 || highOthers === 0
      ? { voltage: V, seconds: hold, lowOthers }
      : exactMix(given, at, lowOthers);
  const end = oneAt(hold);
  const found = end > start ? { voltage: end, seconds: hold, lowOthers } : { voltage: start, seconds: 0, lowOthers };
  if (turn === null || turn >= hold) return found;
  const voltage = oneAt(turn);
  return voltage > found.voltage ? { voltage, seconds: turn, lowOthers } : found;
}

/** A mix in which some stage runs dry before the hold ends. */
function exactMix(given: HoldCase, at: HoldConstants, lowOthers: number): HoldWorst {
  const stage = (capacitance: number, leakageCurrent: number, conductance: number) => ({
    capacitance,
    leakageCurrent,
    conductance,
    resistance: Number.POSITIVE_INFINITY,
  });
  const chain = [
    stage(at.victim, 0, at.keep),
    ...Array.from({ length: given.n - 1 }, (_, i) => stage(i < lowOthers ? at.low : at.high, at.drain, at.slack)),
  ];
  const course = courseOf(chain, {
    charge: { kind: "instant" },
    voltage: given.V,
    hold: given.hold,
    dump: null,
    rest: 0,
  });
  const peak = course.phases.at(-1)!.peaks()[0]!;
  return { voltage: peak.voltage, seconds: peak.seconds, lowOthers };
}
