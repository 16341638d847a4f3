/*
 * What eats the margin between an even share and the full rating: volts for each cause, adding up exactly.
 *
 * w(S) is the highest stage voltage of charge and hold with only the causes of S switched on, w(none) = V/n. A cause's volts are its Shapley
 * value: what switching it on adds, averaged over every order of switching on, so that they add up to w(all) - V/n and no
 * order is favoured. Derating stands apart: it takes (1 - d) of the rating whatever the others do.
 * `without` is w(all but this): what would be left if this cause alone were mended, which is not the same as its volts.
 * Source: [Shapley1953] (from memory); the states are those of worstAtHold
 */
import { type HoldCase, worstAtHold } from "./cornersHold.ts";

export type Cause = "capacitance tolerance" | "leakage" | "resistor tolerance" | "overshoot" | "derating";

export interface MarginCase extends Omit<HoldCase, "leakage" | "insulation"> {
  /** Greatest leakage of a unit, A, and least insulation, ohm (Infinity: none); null: unknown, and then not assessed. */
  readonly leakage: number | null;
  readonly insulation: number | null;
  /** Fractions: the charger's overshoot of V, and the share d of the rating that may be used. */
  readonly overshoot: number;
  readonly derating: number;
  /** Unit rating, V. */
  readonly rating: number;
}

export interface CauseShare {
  readonly cause: Cause;
  /** V of margin that it eats; null when unknown. */
  readonly volts: number | null;
  /** Worst stage voltage (V) were this cause alone gone, for derating the same worst voltage; null when unknown. */
  readonly without: number | null;
}

export interface Margins {
  /** V/n, V. */
  readonly even: number;
  /** Highest stage voltage over all corners, V; null when leakage is unknown and could raise it. */
  readonly worst: number | null;
  /** Largest first, unknown last. With all known they add up to worst - even + (1 - d) rating. */
  readonly causes: readonly CauseShare[];
  /** Rating less even share and all causes, V: what is still free, below zero when over; null when something is unknown. */
  readonly free: number | null;
}

const SWITCHED = ["capacitance tolerance", "leakage", "resistor tolerance", "overshoot"] as const;

/** Shapley's weights: s! (m - 1 - s)! / m! for a cause joining s others, of m. */
function weight(joined: number, causes: number): number {
  let ways = 1;
  for (let k = 1; k <= joined; k++) ways = (ways * (causes - k)) / k;
  return 1 / (ways * causes);
}

/** The margin's causes. Unknown leakage is left off in the sums of the others and told as unknown. */
export function marginCauses(given: MarginCase): Margins {
  const unknown = given.leakage === null || given.insulation === null;
  const causes = SWITCHED.filter((cause) => !(unknown && cause === "leakage"));
  const on = (set: number, cause: Cause): boolean =>
    causes.some((one, bit) => one === cause && (set & (1 << bit)) !== 0);
  const worstOf = (set: number): number =>
    worstAtHold({
      ...given,
      tLow: on(set, "capacitance tolerance") ? given.tLow : 0,
      tHigh: on(set, "capacitance tolerance") ? given.tHigh : 0,
      leakage: on(set, "leakage") ? given.leakage! : 0,
      insulation: on(set, "leakage") ? given.insulation! : Number.POSITIVE_INFINITY,
      q: on(set, "resistor tolerance") ? given.q : 0,
      V: given.V * (1 + (on(set, "overshoot") ? given.overshoot : 0)),
    }).voltage;
  const all = (1 << causes.length) - 1;
  const values = Array.from({ length: all + 1 }, (_, set) => worstOf(set));
  const shares = causes.map((cause, bit): CauseShare => {
    let volts = 0;
    for (let set = 0; set <= all; set++) {
      if (set & (1 << bit)) continue;
      volts += weight(bitCount(set), causes.length) * (values[set | (1 << bit)]! - values[set]!);
    }
    return { cause, volts, without: values[all & ~(1 << bit)]! };
  });
  const derated = given.rating * (1 - given.derating);
  const known = [...shares, { cause: "derating" as const, volts: derated, without: values[all]! }].sort(
    (x, y) => y.volts! - x.volts!,
  );
  return {
    even: values[0]!,
    worst: unknown ? null : values[all]!,
    causes: unknown ? [...known, { cause: "leakage", volts: null, without: values[all]! }] : known,
    free: unknown ? null : given.rating - derated - values[all]!,
  };
}

function bitCount(set: number): number {
  let count = 0;
  for (let rest = set; rest > 0; rest >>= 1) count += rest & 1;
  return count;
}
