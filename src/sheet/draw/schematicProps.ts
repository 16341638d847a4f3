// What a schematic is drawn from: the bank, what charges it, what empties it, what it fires into. Plain SI values.
//
// null is "not known": it is drawn as a blank to fill in. A part that is not fitted is left out (null or an empty list where
// the field says so), and the drawing says that it is not there.

import type { Ties } from "../../bank/index.ts";

/** A resistance that may not be known yet, ohm. */
export interface DrawnResistor {
  readonly resistance: number | null;
  /** More about it in a few words ("wire wound, on the lid"); null: nothing to add. */
  readonly words: string | null;
}

/** What stands between charger and bank. */
export interface Isolation extends DrawnResistor {
  readonly kind: "resistor" | "relay" | "diode";
}

/** The balancing resistor of one position: k equal elements in series. */
export interface DrawnBalance {
  /** Of the whole position, ohm. */
  readonly resistance: number | null;
  /** Fraction. */
  readonly tolerance: number | null;
  readonly elements: number;
}

export const LOAD_KINDS = ["resistor", "coil", "lamp", "short", "unknown"] as const;
export const SWITCH_KINDS = ["thyristor", "gap", "contact", "unknown"] as const;

export interface DrawnLoad {
  readonly kind: (typeof LOAD_KINDS)[number];
  /** Value or name in a few words ("lamp, 150 mm arc"); null: a blank. */
  readonly words: string | null;
  /** A coil in series with the load that shapes the pulse. */
  readonly coil: boolean;
}

export interface SchematicProps {
  /** Starts every id inside the drawing, so that several may stand on one page: letters, digits, hyphens. */
  readonly id: string;
  /** Name of the bank, as its owner wrote it. */
  readonly title: string;
  readonly series: number;
  readonly parallel: number;
  readonly ties: Ties;
  readonly unit: {
    readonly part: string;
    readonly capacitance: number | null;
    readonly voltage: number | null;
    /** null: not known; drawn as polarised, which is the safe reading, and said. */
    readonly polarised: boolean | null;
  };
  /** V with overshoot. */
  readonly chargeVoltage: number | null;
  /** Words on the charger ("constant current, 50 mA"); null: a blank. */
  readonly charger: string | null;
  /** From charger to bank, in order; empty: none, which is said. */
  readonly isolation: readonly Isolation[];
  /** One across each stage (cross-tied) or each unit (strings); null: none fitted. */
  readonly balance: DrawnBalance | null;
  /** Permanent ones across the ends of the bank, besides the balancing chain. */
  readonly bleeds: readonly DrawnResistor[];
  /** With the relay that closes when its power fails; null: none fitted. */
  readonly dump: DrawnResistor | null;
  readonly switch: { readonly kind: (typeof SWITCH_KINDS)[number]; readonly words: string | null };
  readonly load: DrawnLoad;
  /** Diodes: across the ends of the bank, and across each stage (cross-tied) or unit (strings). */
  readonly clamps: { readonly bank: boolean; readonly positions: boolean };
  /** In series with each unit or each string; null: none. `words` is the rating, null a blank. */
  readonly fuse: { readonly at: "unit" | "string"; readonly words: string | null } | null;
  /** One in series with each unit; null: none. */
  readonly isolating: DrawnResistor | null;
  /** The end of the bank that is tied to the one earth point. */
  readonly earth: Earth;
}

/** `none`: neither end, the bank floats; `unknown`: to be decided, and a blank says so. */
export type Earth = "negative" | "positive" | "none" | "unknown";
