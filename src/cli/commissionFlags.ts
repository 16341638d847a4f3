// The flags of `commission`, read into numbers, every fault told.

import type { LifeLimits } from "../place/index.ts";
import type { Dimension, Refusal } from "../quantity/index.ts";
import type { SheetWishes } from "./bankSheet.ts";
import { flagQuantity } from "./placeFlags.ts";

export interface CommissionFlags {
  readonly readings?: string;
  readonly meter?: string;
  readonly resolution?: string;
  readonly unitLimit?: string;
  readonly balance?: string;
  readonly charger?: string;
  readonly nextVoltage?: string;
  readonly nextHold?: string;
  readonly history?: string;
  readonly capacitanceLost?: string;
  readonly esrGrown?: string;
  readonly leakageMost?: string;
  readonly json?: boolean;
}

export interface CommissionChoices extends SheetWishes {
  /** Relative, and V. */
  readonly meter: number;
  readonly resolution: number;
  /** Neither was given. */
  readonly meterAssumed: boolean;
  readonly charger: "on" | "off";
  readonly next: { readonly bank: number; readonly seconds: number } | null;
  /** The builder's ends of life of a unit. */
  readonly life: LifeLimits;
}

/** A handheld meter: half a per cent and a tenth of a volt. Common practice, no source. */
const METER = 0.005;
const RESOLUTION = 0.1;
/** ESR may grow to several times its first value before a unit is given up. */
const MOST_GROWTH = 100;

export function readCommissionFlags(flags: CommissionFlags): {
  readonly choices: CommissionChoices;
  readonly faults: readonly Refusal[];
} {
  const faults: Refusal[] = [];
  const of = (text: string | undefined, flag: string, dimension: Dimension, most = 1): number | undefined => {
    if (text === undefined) return undefined;
    const value = flagQuantity(text, flag, dimension, most);
    if (typeof value === "number") return value;
    faults.push(value);
    return undefined;
  };
  const none = flags.balance?.trim().toLowerCase() === "none";
  const resistance = none ? ("none" as const) : of(flags.balance, "--balance", "resistance");
  const limit = of(flags.unitLimit, "--unit-limit", "voltage");
  const meter = of(flags.meter, "--meter", "fraction");
  const resolution = of(flags.resolution, "--resolution", "voltage");
  const bank = of(flags.nextVoltage, "--next-voltage", "voltage");
  const seconds = of(flags.nextHold, "--next-hold", "time");
  const capacitance = of(flags.capacitanceLost, "--capacitance-lost", "fraction");
  const esr = of(flags.esrGrown, "--esr-grown", "fraction", MOST_GROWTH);
  const leakage = of(flags.leakageMost, "--leakage-most", "current");
  const charger = flags.charger ?? "on";
  if (charger !== "on" && charger !== "off")
    faults.push({
      code: "bad-choice",
      place: { field: "--charger" },
      read: JSON.stringify(charger),
      want: "on or off",
    });
  const needless = [
    ["--capacitance-lost", flags.capacitanceLost],
    ["--esr-grown", flags.esrGrown],
    ["--leakage-most", flags.leakageMost],
  ] as const;
  for (const [flag, text] of needless) {
    if (text === undefined || flags.history !== undefined) continue;
    faults.push({ code: "missing-option", place: { field: flag }, read: text, want: "--history FILE beside it" });
  }
  if (flags.nextHold !== undefined && flags.nextVoltage === undefined)
    faults.push({
      code: "missing-option",
      place: { field: "--next-hold" },
      read: flags.nextHold,
      want: "--next-voltage beside it",
    });
  return {
    faults,
    choices: {
      meter: meter ?? METER,
      resolution: resolution ?? RESOLUTION,
      meterAssumed: meter === undefined && resolution === undefined,
      charger: charger === "off" ? "off" : "on",
      next: bank === undefined ? null : { bank, seconds: seconds ?? 0 },
      life: {
        ...(capacitance === undefined ? {} : { capacitance }),
        ...(esr === undefined ? {} : { esr }),
        ...(leakage === undefined ? {} : { leakage }),
      },
      ...(resistance === undefined ? {} : { resistance }),
      ...(limit === undefined ? {} : { limit }),
    },
  };
}
