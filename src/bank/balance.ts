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
import { type FiniteHold, holdWorst, largestBalanceForHold } from "./finiteHold.ts";
import { holdingLine, largestBalance } from "./share.ts";

/** More elements than this in one position is no balancing resistor that anyone builds. */
const MOST_ELEMENTS = 100_000;

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
  const { base, slope } = straight ? holdingLine(bank) : NO_LINE;
  const most =
    straight && slope > 0 ? (limit - base) / slope : largestBalanceForHold(bank, limit, largestBalance(bank, limit));
  const { values, voltage, lowest, highest, tolerance, step } = family;
  if (!(most > 0) || most < lowest * (1 - 1e-9)) return false;
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

const NO_LINE = { base: 0, slope: 0 };
