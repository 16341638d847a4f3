// The corner behind each worst case of one arrangement, in words and volts: charging, holding, and what a dump leaves.

import {
  chargingWorst,
  cornerWords,
  holdCornerWords,
  reversedByHold,
  type Sides,
  type Stage,
  stageRange,
  worstAtHold,
} from "../../bank/index.ts";
import { formatQuantity } from "../../quantity/index.ts";
import { leakOf } from "../candidate.ts";
import { fullVoltage, holdCaseOf, type RestingBank } from "./holdCase.ts";

export interface CornerFact {
  /** V on the stage named. */
  readonly voltage: number;
  /** "stage 1 at -20 %, the rest at +20 %"; every stage may be the first. */
  readonly words: string;
}

/** null: not assessed, because the tolerance or the leakage is unknown, or one in series. */
export interface BankCorners {
  readonly charging: CornerFact | null;
  /** Highest voltage at any moment from the end of the charge to the end of the hold; `hold` is s into it, Infinity for its endless end. */
  readonly holding: (CornerFact & { readonly hold: number }) | null;
  /** Most reverse (below zero) after a dump from equal sharing. */
  readonly dumped: CornerFact | null;
  /** The same after the hold's own unequal sharing, at the worst moment of the hold to dump: `hold` is s into it, Infinity for its endless end. */
  readonly dumpedFromHold: (CornerFact & { readonly hold: number }) | null;
}

export const NO_CORNERS: BankCorners = { charging: null, holding: null, dumped: null, dumpedFromHold: null };

/** The stage named and its company, for the highest while charging and holding, and for the most reverse after a hold. */
const TIGHT: Sides = { capacitance: "low", leakageCurrent: "low", conductance: "low", resistance: "high" };
const LOOSE: Sides = { capacitance: "high", leakageCurrent: "high", conductance: "high", resistance: "low" };
const REVERSED: Sides = { capacitance: "low", leakageCurrent: "high", conductance: "high", resistance: "low" };
const FORWARD: Sides = { capacitance: "high", leakageCurrent: "low", conductance: "low", resistance: "high" };
const CONDUCTING: readonly (keyof Stage)[] = ["leakageCurrent", "conductance", "resistance"];

/** The words alone; two stages stand for all, because all have the same ranges. */
function wordsOf({ result, unit }: RestingBank, named: readonly (keyof Stage)[], victim: Sides, rest: Sides): string {
  const leak = leakOf(unit);
  const { low, high } = unit.tolerance ?? { low: 0, high: 0 };
  const range = stageRange({
    units: 1,
    capacitance: unit.capacitance,
    tLow: low,
    tHigh: high,
    leakage: leak?.kind === "current" ? leak.amperes : 0,
    insulation: leak?.kind === "insulation" ? leak.ohms : Number.POSITIVE_INFINITY,
    resistance: result.balance?.resistance ?? null,
    q: result.balance?.tolerance ?? 0,
  });
  return cornerWords([range, range], 0, named, victim, rest);
}

/** The corners of one arrangement. */
export function cornersOf(bank: RestingBank): BankCorners {
  if (bank.result.series === 1) return NO_CORNERS;
  return {
    ...fromCharge(bank),
    holding: holdingCorner(bank),
    ...fromHold(bank),
  };
}

function fromCharge(bank: RestingBank): Pick<BankCorners, "charging" | "dumped"> {
  const { result, unit, brief } = bank;
  if (unit.tolerance === undefined) return { charging: null, dumped: null };
  const volts = fullVoltage(brief);
  const worst = chargingWorst(volts, result.series, unit.tolerance);
  // From equal sharing the same corner that stands highest while charging is reversed most by a dump.
  const words = wordsOf(bank, ["capacitance"], TIGHT, LOOSE);
  return {
    charging: { voltage: worst, words },
    dumped: { voltage: volts / result.series - worst, words },
  };
}

function holdingCorner(bank: RestingBank): BankCorners["holding"] {
  const given = holdCaseOf(bank);
  const endless = bank.brief.hold === Number.POSITIVE_INFINITY;
  if (given === null) return null;
  const worst = worstAtHold(given);
  // At the endless end capacitance has no part in the division: it is not named.
  const words = endless && worst.seconds > 0 ? wordsOf(bank, CONDUCTING, TIGHT, LOOSE) : holdCornerWords(given, worst);
  return { voltage: worst.voltage, hold: worst.seconds, words };
}

function fromHold(bank: RestingBank): Pick<BankCorners, "dumpedFromHold"> {
  const given = holdCaseOf(bank);
  if (given === null) return { dumpedFromHold: null };
  const { voltage, seconds, lowOthers } = reversedByHold(given);
  return { dumpedFromHold: { voltage, hold: seconds, words: reversedWords(bank, lowOthers) } };
}

function reversedWords(bank: RestingBank, lowOthers: number): string {
  const others = bank.result.series - 1;
  const named = (rest: Sides): string => wordsOf(bank, ["capacitance", ...CONDUCTING], REVERSED, rest);
  if (lowOthers === 0) return named(FORWARD);
  const low = { ...FORWARD, capacitance: "low" } as const;
  return lowOthers === others ? named(low) : `${named(FORWARD)}; but ${lowOthers} of the rest as low as stage 1`;
}

/** The corner of the voltage at the end of a hold, as against its start: an endless end does not depend on capacitance. */
export function heldEndWords(bank: RestingBank): string {
  const words = wordsOf(bank, CONDUCTING, TIGHT, LOOSE);
  return bank.brief.hold === Number.POSITIVE_INFINITY || words === "every stage alike"
    ? words
    : `${words}; capacitance at whichever end is worse by then`;
}

/** The hold after which a dump is worst: `seconds` into it, Infinity for its endless end. */
export const heldWords = (seconds: number): string =>
  seconds === Number.POSITIVE_INFINITY
    ? "an endless hold"
    : `${formatQuantity(seconds, "time", { digits: 3 })} of hold`;
