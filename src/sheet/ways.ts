/*
 * The ways of emptying a bank, each alone: how long they take from one voltage to another, how many there are, and with a fault.
 *
 * All times are at the high capacitance and the high resistance, as Facts has them. A unit shorted with the charger on leaves n - 1
 * stages at V: cross-tied, C grows by n/(n - 1) and the chain loses a resistor, so the time constant is the same; strings, one
 * string of n - 1 beside p - 1 whole ones. Source: [methods-derived] 3.1, 8.
 */

import { bleedPaths } from "../hazard/index.ts";
import { cell } from "./cells.ts";
import type { Facts } from "./facts.ts";
import type { SheetInput } from "./input.ts";

/** Seconds from a voltage to another by each path alone; null where C is not known, or there is no such path. */
export interface Ways {
  readonly chains: number | null;
  readonly oneOpen: number | null;
  readonly dump: number | null;
}

export interface Fall {
  readonly from: number;
  readonly to: number;
}

/** `capacitance` and `chain` may stand in for the bank's own: those of a bank with a fault. */
export function waysDown(facts: Pick<Facts, "capacitance" | "chain" | "chains" | "dump">, { from, to }: Fall): Ways {
  const { capacitance, chain, chains, dump } = facts;
  if (capacitance === null) return { chains: null, oneOpen: null, dump: null };
  const paths = bleedPaths({
    capacitance,
    voltage: from,
    safeVoltage: to,
    chainResistance: chain ?? Number.POSITIVE_INFINITY,
    chains,
    ...(dump === null ? {} : { dump }),
  });
  return { chains: paths.chains, oneOpen: paths.oneOpen, dump: paths.dump };
}

export const NO_WAYS: Ways = { chains: null, oneOpen: null, dump: null };

/** The ways down of the bank with one unit shorted and the charger on, from V. */
export function shortedWays({ layout }: Pick<SheetInput, "layout">, facts: Facts, fall: Fall): Ways {
  const { series: n, parallel: p, ties } = layout;
  const { capacitance, chain, chains } = facts;
  if (capacitance === null) return NO_WAYS;
  const grows = n / (n - 1);
  if (ties === "cross-tied" || p === 1)
    return waysDown({ ...facts, capacitance: capacitance * grows, chain: chain === null ? null : chain / grows }, fall);
  const grown = { ...facts, capacitance: (capacitance * (p - 1 + grows)) / p };
  // The chains side by side as so many equal ones of the same conductance; the worst one to lose is the short string's own.
  const even = chain === null ? null : (chain * chains) / (p - 1 + grows);
  return { ...waysDown({ ...grown, chain: even }, fall), oneOpen: waysDown(grown, fall).oneOpen };
}

/** How many ways empty the bank without a hand, and which. */
export function pathCount({ chains, dump }: Pick<Facts, "chains" | "dump">): {
  readonly count: number;
  readonly words: string;
} {
  const count = (chains > 0 ? 1 : 0) + (dump === null ? 0 : 1);
  const chain =
    chains === 0
      ? "no bleed chain"
      : chains === 1
        ? "one bleed chain (one open resistor ends it)"
        : `${chains} bleed chains side by side, counted as one way`;
  return {
    count,
    words: `${chain}; ${dump === null ? "dump not stated" : "a dump resistor"}; the stick is a hand's, and is not counted`,
  };
}

/** What a wait is for, and what sets it. */
export const clearWords = ({ clear, clearBy }: Pick<Facts, "clear" | "clearBy">): string =>
  `${cell(clear, "voltage")} (${clearBy})`;

/** Each way against the time that the rule gives; nothing where it gives none, or a time is not known. */
export function againstRule({ allowed, chain }: Pick<Facts, "allowed" | "chain">, ways: Ways): readonly string[] {
  if (allowed === null) return [];
  const limit = cell(allowed, "time");
  const judged = (name: string, seconds: number | null): readonly string[] =>
    seconds === null
      ? []
      : [seconds <= allowed ? `${name}: within the ${limit} of the rule.` : `${name}: OVER the ${limit} of the rule.`];
  return [
    ...(chain === null
      ? []
      : [...judged("Bleed chains alone", ways.chains), ...judged("With one bleeder open", ways.oneOpen)]),
    ...judged("Dump resistor alone", ways.dump),
  ];
}
