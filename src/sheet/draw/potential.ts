// Potential to earth of the nodes of a bank at full charge with even sharing.
//
//   k  node   0 at the negative end, n at the positive end; node k is above stage k (above place k of a string)
//   V  chargeVoltage [V]; n series
//   k V/n with the negative end earthed, (k - n) V/n with the positive end earthed; not fixed otherwise
// Holds for equal units; the worst shares are on the voltage chart. Source: [textbook] series capacitors.

import type { Earth } from "./schematicProps.ts";

export interface Potentials {
  readonly series: number;
  readonly chargeVoltage: number | null;
  readonly earth: Earth;
}

/** V; null when the voltage is not known, or no end is tied to earth, or it is not yet said which. */
export function potentialOf({ series, chargeVoltage, earth }: Potentials, node: number): number | null {
  if (chargeVoltage === null) return null;
  if (earth === "negative") return (chargeVoltage * node) / series;
  if (earth === "positive") return (chargeVoltage * (node - series)) / series;
  return null;
}
