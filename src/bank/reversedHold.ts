/*
 * How far the worst stage ends below zero when a bank is dumped at once at any moment of a hold, over all corners.
 *
 * Symbols as in cornersHold.ts. A dump takes from every stage what the fast charge gave it, V share, so a stage is left with
 * v(t) - v(0): what the hold has moved it by. The victim has the least C and R and leaks most; the others do not leak and have
 * the greatest R. Of the others some have the greatest C and some the least: every number is tried in a finite hold; after an
 * endless one all have the greatest. A leakage stops at zero volts, so no stage is moved by more than all it was charged to.
 * That the worst corner is one of these is brute-forced, not proven: see the tests. Source: [methods-derived] 1.4, 2.1, 2.2
 */
import { type HoldCase, holdConstants } from "./cornersHold.ts";
import { holdModes } from "./holdModes.ts";

export interface ReversedHold {
  /** Left on the victim after the dump, V, <= 0. */
  readonly voltage: number;
  /** On the victim before the dump, V. */
  readonly before: number;
  /** When in the hold the dump would be worst, s; Infinity when it is only approached. */
  readonly seconds: number;
  /** How many of the n - 1 others have the least capacitance; the rest have the greatest. */
  readonly lowOthers: number;
}

/** The most reversed stage that a dump leaves at any time in [0, hold]. Source: [methods-derived] file head. */
export function reversedByHold(given: HoldCase): ReversedHold {
  const { n, V, hold } = given;
  const mixes = hold === Number.POSITIVE_INFINITY ? 1 : n;
  let best = n === 1 ? { voltage: 0, before: V, seconds: 0, lowOthers: 0 } : reversedMix(given, 0);
  for (let lowOthers = 1; lowOthers < mixes; lowOthers++) {
    const found = reversedMix(given, lowOthers);
    if (found.voltage < best.voltage) best = found;
  }
  return best;
}

/** The same with `lowOthers` of the others at the least capacitance. At least two in series. */
export function reversedMix(given: HoldCase, lowOthers: number): ReversedHold {
  const { n, V, hold } = given;
  const { low, high, keep, slack, drain } = holdConstants(given);
  const modes = holdModes({
    voltage: V,
    low,
    high,
    own: { conductance: slack, leakage: drain },
    others: { conductance: keep, leakage: 0 },
    highOthers: n - 1 - lowOthers,
    lowOthers,
  });
  const { start } = modes;
  const at = (before: number, seconds: number): ReversedHold => ({
    voltage: Math.min(0, before - start),
    before,
    seconds,
    lowOthers,
  });
  if (hold === Number.POSITIVE_INFINITY) {
    const across = slack + keep / (n - 1);
    const settled = across > 0 ? ((keep * V) / (n - 1) - drain) / across : drain > 0 ? 0 : start;
    return settled < start ? at(Math.max(0, settled), hold) : at(start, 0);
  }
  const times = modes.turn !== null && modes.turn < hold ? [modes.turn, hold] : [hold];
  return times
    .map((seconds) => at(Math.max(0, modes.oneAt(seconds)), seconds))
    .reduce((a, b) => (b.voltage < a.voltage ? b : a), at(start, 0));
}
