/*
 * The highest voltage any sound stage can see when another shorts in a hold whose ends stay held.
 *
 * | symbol | in code | unit | meaning                                                       |
 * | ------ | ------- | ---- | ------------------------------------------------------------- |
 * | n      | n       | 1    | stages before the short, >= 1; none is left of one            |
 * | V_1    | tight   | V    | the tight stage at the end of the hold, the others alike      |
 * | C_1 C_2|         | F    | its capacitance and that of each other                        |
 *
 * A short as the hold begins leaves the hold of n - 1 stages. One as it ends adds to the tight stage its part by charge of what
 * the shorted one had: V_1 + (V - V_1)/(n - 1) (1/C_1)/(1/C_1 + (n - 2)/C_2), with C_2 at either end. The higher of the two counts.
 * Instants between are not tried: without resistors the two agree to the volt, whatever the instant.
 * Source: [methods-derived] 2.1 and 8
 */
import { type HoldCase, worstAtHold } from "./cornersHold.ts";
import { courseOf } from "./course.ts";

/** Volts, over all corners of the `given` hold of the whole bank; 0 with one stage. */
export function shortedHold(given: HoldCase): number {
  const { n, V } = given;
  if (n === 1) return 0;
  if (n === 2) return V;
  const early = worstAtHold({ ...given, n: n - 1 }).voltage;
  return Math.min(V, Math.max(early, lateShort(given, 1 + given.tHigh), lateShort(given, 1 - given.tLow)));
}

/** The others of capacitance C `factor`, as one: alike in series they keep alike. */
function lateShort({ n, m, C, tLow, leakage, insulation, R, q, V, hold }: HoldCase, factor: number): number {
  const others = n - 1;
  const [own, other] = [m * C * (1 - tLow), m * C * factor];
  const chain = [
    {
      capacitance: own,
      leakageCurrent: 0,
      conductance: 0,
      resistance: R === null ? Number.POSITIVE_INFINITY : R * (1 + q),
    },
    {
      capacitance: other / others,
      leakageCurrent: m * leakage,
      conductance: m / insulation / others,
      resistance: R === null ? Number.POSITIVE_INFINITY : R * (1 - q) * others,
    },
  ];
  const course = courseOf(chain, { charge: { kind: "instant" }, voltage: V, hold, dump: null, rest: 0 });
  const tight = course.phases.at(-1)?.end[0] ?? V;
  return tight + ((V - tight) / others) * (other / (other + (n - 2) * own));
}
