// Every check of one arrangement at rest, in the order a reader wants them.

import type { Finding } from "../quantity/index.ts";
import { hazards, limits, oneShorted } from "./dangerFindings.ts";
import { balanceLoad, bleed, energy, steadySupply } from "./dutyFindings.ts";
import type { Cornered, FindingsInput } from "./findingsInput.ts";
import { cornersOf } from "./sharing/corners.ts";
import { chargingRisk, chargingShare, holdingShare, reverse } from "./sharingFindings.ts";

export type { FindingsInput };

export function findingsOf(given: FindingsInput): readonly Finding[] {
  const input: Cornered = { ...given, corners: cornersOf(given) };
  return [
    chargingShare(input),
    ...chargingRisk(input),
    holdingShare(input),
    ...balanceLoad(input),
    reverse(input),
    energy(input),
    ...steadySupply(input),
    bleed(input),
    ...hazards(input),
    ...oneShorted(input),
    ...limits(input),
  ];
}
