// The worked bank for the fault tests: 4s5p of 3300 uF and 450 V at 1600 V, with nothing known that need not be.
import type { HoldCase } from "../../src/bank/index.ts";
import type { FaultBank } from "../../src/pulse/faultBank.ts";

/** Its endless hold without leakage, spread or resistors, in which nothing moves. */
const hold: HoldCase = {
  n: 4,
  m: 5,
  C: 3300e-6,
  tLow: 0,
  tHigh: 0,
  leakage: 0,
  insulation: Number.POSITIVE_INFINITY,
  R: null,
  q: 0,
  V: 1600,
  hold: Number.POSITIVE_INFINITY,
};

export const tied: FaultBank = {
  series: 4,
  parallel: 5,
  ties: "cross-tied",
  unit: { capacitance: 3300e-6, ratedVoltage: 450, toleranceLow: 0, toleranceHigh: 0 },
  voltage: 1600,
  worstCharging: 400,
  worstHolding: null,
  hold,
};
export const strings: FaultBank = { ...tied, ties: "strings", hold: { ...hold, m: 1 } };
