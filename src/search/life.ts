// Life of the worst unit over its life at its ratings, by the builder's own exponents and never by an assumed one.

import type { Capacitor } from "../catalog/index.ts";
import { type LifeCase, type LifeRatio, lifeRatio } from "../pulse/index.ts";
import type { Brief } from "./brief.ts";

/** Where the worst unit works: highest volts while charged (null: unknown), reversal, K over ambient (null: unknown). */
export interface LifeStress {
  readonly voltage: number | null;
  readonly reversal: number;
  readonly rise: number | null;
}

/** Life over that at the reference: the unit's rated voltage and reversal, and the temperature the builder named. */
export interface LifeReport extends LifeRatio {
  readonly reference: {
    readonly voltage: number;
    readonly reversal: number | null;
    readonly temperature: number | null;
    readonly shots: number | null;
  };
  readonly notes: readonly string[];
}

/** Exponents of the brief beat those of the catalogue. Less reversal than the rated one is never a gain. */
export function lifeOf(brief: Brief, unit: Capacitor, at: LifeStress): LifeReport {
  const own = brief.life ?? {};
  const notes = ["A ratio by exponents that the builder gave; published ones disagree widely, and none is a promise."];
  const missing: (keyof LifeCase)[] = [];
  const stresses: { -readonly [key in keyof LifeCase]: LifeCase[key] } = {};
  if (at.voltage === null) missing.push("voltage");
  else {
    const exponent = own.voltageExponent ?? unit.lifeExponent ?? null;
    stresses.voltage = { value: at.voltage, reference: unit.voltage, exponent };
  }
  const reference = unit.reversal ?? null;
  const exponent = own.reversalExponent ?? unit.reversalExponent ?? null;
  // the power law runs to infinity as reversal goes to nothing, so no gain is taken from it
  const within = reference !== null && at.reversal <= reference;
  if (within && at.reversal < reference)
    notes.push("Less reversal than rated is counted as the rated one: no gain is claimed.");
  else if (!within && at.reversal > 0) {
    if (reference === null || reference === 0) missing.push("reversal");
    else stresses.reversal = { value: at.reversal, reference, exponent };
  }
  if (own.halving !== undefined && own.reference !== undefined) {
    if (brief.ambient === undefined || at.rise === null) missing.push("temperature");
    else stresses.temperature = { value: brief.ambient + at.rise, reference: own.reference, exponent: own.halving };
  } else notes.push("Temperature is left out: no halving and reference were given.");
  const ratio = lifeRatio(stresses);
  const lacking = [...missing, ...ratio.missing];
  return {
    ...ratio,
    ratio: lacking.length > 0 ? null : ratio.ratio,
    missing: lacking,
    reference: {
      voltage: unit.voltage,
      reversal: reference,
      temperature: own.reference ?? null,
      shots: unit.ratedShots ?? null,
    },
    notes,
  };
}
