// The worked bank for the fault tests: 4s5p of 3300 uF and 450 V at 1600 V, with nothing known that need not be.
import type { FaultBank } from "../../src/pulse/faultBank.ts";

export const tied: FaultBank = {
  series: 4,
  parallel: 5,
  ties: "cross-tied",
  unit: { capacitance: 3300e-6, ratedVoltage: 450 },
  voltage: 1600,
  worstCharging: 400,
  worstHolding: null,
};
export const strings: FaultBank = { ...tied, ties: "strings" };
