/*
 * Skin depth, and the frequency at which a pulse should be taken for it.
 *
 *   delta  skinDepth   m      sqrt(rho/(pi f mu0))
 *   rho    resistivity ohm m  > 0
 *   f      frequency   Hz     > 0: the ring frequency; for a pulse that does not ring 1/(4 t_peak), a rule of thumb of this file
 *
 * Holds for a good, non-magnetic conductor. Source: [CODATA-2022] mu0; [textbook-skin] the depth.
 */
import type { Peaks } from "./peaks.ts";

/** Magnetic constant [N/A^2]. Source: [CODATA-2022]. */
export const MU0 = 1.25663706127e-6;

/** Resistivity at 20 degC [ohm m]: annealed copper standard; aluminium from memory. Source: [IACS]. */
export const RESISTIVITY = { copper: 1.7241e-8, aluminium: 2.82e-8 } as const;

export const skinDepth = ({ resistivity, frequency }: { resistivity: number; frequency: number }): number =>
  Math.sqrt(resistivity / (Math.PI * frequency * MU0));

/** Frequency [Hz] at which to take a pulse's skin depth; null for a current that starts at its peak. Rule of thumb, see head. */
export function pulseFrequency({ ringFrequency, peakTime }: Pick<Peaks, "ringFrequency" | "peakTime">): number | null {
  if (ringFrequency !== null) return ringFrequency;
  return peakTime > 0 ? 1 / (4 * peakTime) : null;
}
