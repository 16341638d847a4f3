// What the other groups of a blend pour into a shorted unit.
//
// | symbol | in code  | unit | meaning |
// | ------ | -------- | ---- | ------- |
// | C_o    | others   | F    | nominal capacitance of the other groups |
// | C_s    | standing | F    | what is left of the group or string when one of its n units in series is shorted |
// | V      | voltage  | V    | charge voltage, overshoot included |
//
// A short makes the group's ends fall to V(n - 1)/n; the loss as the others fill it up again is (V/n)^2 C_s C_o/(2(C_s + C_o)),
// at most all of it in the shorted unit; with n = 1 they empty into it: V^2 C_o/2. That loss is concave in C_o, so adding it to
// what the group's own neighbours bring never says too little.
// Source: [methods-derived] charge and energy of two capacitors joined, as for the group's own neighbours.

import type { Ties } from "../bank/index.ts";

export interface PouredCase {
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  /** Of one unit, F. */
  readonly capacitance: number;
  readonly others: number;
  readonly voltage: number;
}

/** Joules, at most. */
export function pouredIntoShort({ series: n, parallel, ties, capacitance, others, voltage }: PouredCase): number {
  if (others === 0) return 0;
  if (n === 1) return (voltage * voltage * others) / 2;
  const standing = ((ties === "cross-tied" ? parallel : 1) * capacitance) / (n - 1);
  return ((voltage / n) ** 2 * standing * others) / (2 * (standing + others));
}
