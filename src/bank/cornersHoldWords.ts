// The worst corner of a finite hold in words.
import type { HoldCase, HoldWorst } from "./cornersHold.ts";

/** The corner in words; nothing is said of a quantity without spread. */
export function holdCornerWords(given: HoldCase, worst: HoldWorst): string {
  const percent = (fraction: number): string => {
    const value = Math.round(fraction * 1e5) / 1e3;
    return `${value > 0 ? "+" : ""}${value} %`;
  };
  const leaks = given.leakage > 0 || given.insulation < Number.POSITIVE_INFINITY;
  const resists = given.R !== null && given.q > 0;
  const victim = [`one stage at ${percent(-given.tLow)}`];
  const high = given.n - 1 - worst.lowOthers;
  const others =
    worst.lowOthers === 0
      ? `the rest at ${percent(given.tHigh)}`
      : high === 0
        ? `the rest at ${percent(-given.tLow)} too`
        : `${high} of the rest at ${percent(given.tHigh)} and ${worst.lowOthers} at ${percent(-given.tLow)}`;
  const company = [others];
  if (worst.seconds > 0 && leaks) {
    victim.push("with no leakage");
    company.push("with the greatest leakage");
  }
  if (worst.seconds > 0 && resists) {
    victim.push(`resistor at ${percent(given.q)}`);
    company.push(`resistors at ${percent(-given.q)}`);
  }
  return given.n === 1 ? "the only stage" : `${victim.join(", ")}; ${company.join(", ")}`;
}
