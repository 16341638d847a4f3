// The balancing resistor: the largest preferred value that still shares safely, as k equal elements within volts and watts.
//
// | symbol | in code | unit | meaning |
// | ------ | ------- | ---- | ------- |
// | R_max  | most    | ohm  | largest resistance that shares safely |
// | k      | elements | 1   | elements in series, the least that is within volts and watts |
// | V_1    | worst   | V    | worst holding voltage at the chosen R |
//
// Each element is the largest preferred value at most R_max/k; V_1/k <= working voltage, V_1^2/(R(1 - q))/k <= derated power.
// The search for k starts at the least that the volts and watts of any R that can come out allow. Source: [joulewright-design] section 3.

import type { ResistorFamily } from "../catalog/index.ts";
import { lastAtMost } from "../quantity/index.ts";
import { type FiniteHold, holdHighest, holdWorst, largestBalanceForHold } from "./finiteHold.ts";
import { holdingLine, holdingWorst, largestBalance } from "./share.ts";

/** More elements than this in one position is no balancing resistor that anyone builds. */
export const MOST_ELEMENTS = 100_000;

/** A chosen resistor of one position. */
export interface Choice {
  resistance: number;
  element: number;
  elements: number;
  /** Worst holding voltage across the position, V. */
  worst: number;
}

/** Power in one element at the worst holding voltage with the resistor at its low end, W. */
export const elementPower = (worst: number, resistance: number, spread: number, elements: number): number =>
  (worst * worst) / (resistance * (1 - spread)) / elements;

/**
 * Chooses from one family; false when none does (the spread leaves no R, or the family has no value so small).
 * `bank.spread` is the family's tolerance. The result is written into `choice`, because the search calls this for every layout.
 */
export function chooseBalance(bank: FiniteHold, limit: number, family: ResistorFamily, choice: Choice): boolean {
  // After an endless hold with a leakage current the worst voltage is a straight line in R, V_1 = base + slope R: the common case, kept short.
  const straight = bank.hold === Number.POSITIVE_INFINITY && bank.leak.kind === "current";
  const line = straight ? holdingLine(bank) : NO_LINE;
  const bound =
    straight && line.slope > 0
      ? (limit - line.base) / line.slope
      : largestBalanceForHold(bank, limit, largestBalance(bank, limit));
  if (straight || bank.hold === Number.POSITIVE_INFINITY)
    return chooseBelow({ bank, limit, family, line, straight }, bound, choice);
  // In a finite hold the way may stand higher than its ends: then the next value below is tried, and after a few the family is given up.
  let most = bound;
  for (let step = 0; step < MOST_STEPS; step++) {
    if (!chooseBelow({ bank, limit, family, line, straight }, most, choice)) return false;
    choice.worst = holdHighest(bank, choice.resistance);
    if (choice.worst <= limit * (1 + 1e-9)) return true;
    most = choice.resistance * (1 - 1e-6);
  }
  return false;
}

const MOST_STEPS = 6;

interface Task {
  readonly bank: FiniteHold;
  readonly limit: number;
  readonly family: ResistorFamily;
  readonly line: { readonly base: number; readonly slope: number };
  readonly straight: boolean;
}

/** The choice with R at most `most`, by the voltages at the end of the hold. */
function chooseBelow({ bank, limit, family, line, straight }: Task, most: number, choice: Choice): boolean {
  const { base, slope } = line;
  const { values, voltage, lowest, highest, tolerance, step } = family;
  if (!(most >= lowest * (1 - 1e-9))) return false;
  const watts = family.power * family.derating * (1 - tolerance);
  // Whatever k is, R lies between these two: at most one step of the series below the smaller of R_max and one largest element.
  const least = Math.min(most, highest) / step;
  const reach = Math.min(most, highest * MOST_ELEMENTS);
  const even = bank.voltage / bank.series;
  const floor = straight ? Math.min(base + slope * least, bank.voltage) : even;
  const top = straight ? Math.min(base + slope * reach, bank.voltage) : even;
  // V_1^2/R is least at an end of that range, or at R = base/slope, where it is 4 base slope.
  let power = Math.min((floor * floor) / least, (top * top) / reach);
  if (straight && slope * least < base && base < slope * reach) power = Math.min(power, 4 * base * slope);
  const start = Math.max(floor / voltage, power / watts, 1);
  for (let k = Math.ceil(start * (1 - 1e-9)); k <= MOST_ELEMENTS; k++) {
    const index = lastAtMost(values, Math.min(most / k, highest));
    if (index < 0) return false;
    const element = values[index] as number;
    const resistance = element * k;
    const worst = straight ? Math.min(base + slope * resistance, bank.voltage) : holdWorst(bank, resistance);
    // Within a finite hold a smaller R may divide worse than a larger one, when resistors are wider than units.
    if (!straight && worst > limit * (1 + 1e-9)) continue;
    if (worst > voltage * k * (1 + 1e-9)) continue;
    if (worst * worst > watts * resistance * k * (1 + 1e-9)) continue;
    choice.resistance = resistance;
    choice.element = element;
    choice.elements = k;
    choice.worst = worst;
    return true;
  }
  return false;
}

/**
 * True when the family surely has a choice, found without looking for it; false leaves the question open. After an endless hold V_1 <= limit
 * for any R <= R_max, and R is at most one step below R_max: k elements do when k >= limit/voltage and k >= limit^2/(watts R_max/step).
 */
export function surelyChooses(bank: FiniteHold, limit: number, family: ResistorFamily): boolean {
  if (bank.hold !== Number.POSITIVE_INFINITY) return false;
  const most = largestBalance(bank, limit);
  const watts = family.power * family.derating * (1 - family.tolerance);
  const least = Math.min(most, family.highest) / family.step;
  const elements = Math.ceil(Math.max(1, limit / family.voltage, (limit * limit) / (watts * least)));
  return elements <= MOST_ELEMENTS && most >= elements * (family.values[0] as number);
}

/**
 * A worst holding voltage below which no choice comes, whatever the ties, for any series count from that of `bank` (two or more) to
 * `mostSeries`; 0 where nothing is known. V_1(R) starts above zero and bends down, so that at R >= R_max/step it is at least limit/step;
 * and where the largest element caps R, V_1 lies, as a ratio of two straight lines in n, between its ends.
 */
export function leastHolding(bank: FiniteHold, limit: number, family: ResistorFamily, mostSeries: number): number {
  if (bank.hold !== Number.POSITIVE_INFINITY) return 0;
  const capped = family.highest / family.step;
  return (
    Math.min(
      Math.min(limit, bank.voltage) / family.step,
      holdingWorst({ ...bank, sharing: 1 }, capped),
      holdingWorst({ ...bank, sharing: 1, series: mostSeries }, capped),
    ) *
    (1 - 1e-9)
  );
}

const NO_LINE = { base: 0, slope: 0 };
