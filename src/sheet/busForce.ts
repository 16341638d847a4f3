/*
 * The force per metre that pushes the go and return of a bus apart.
 *
 *   symbol  unit  range  meaning
 *   I       A     >= 0   peak current
 *   w, g    m     > 0    width of flat bars and the gap between them
 *   s       m     > 0    spacing of a wire pair, centre to centre
 *
 *   flat bars  F/l = mu0 I^2/(2 w), the field between wide bars; an upper bound, for narrow ones the field spreads
 *   wire pair  F/l = mu0 I^2/(2 pi s), thin wires
 *   coax       none on the whole: the forces balance round the axis
 * Source: [textbook] B = mu0 I/w between sheets, mu0 I/(2 pi s) of a wire; force on a sheet is half B times I.
 */

import type { Brief } from "../search/index.ts";

/** H/m. Source: [CODATA2022]. */
const MU0 = 1.25663706127e-6;

/** N/m at `current`; null when the shape of the bus, or a length of it, is not known. */
export function busForce(bus: Brief["bus"], current: number): number | null {
  if (bus === undefined) return null;
  if (bus.shape === "coax") return 0;
  if (bus.shape === "flat bars" && bus.width !== undefined) return (MU0 * current ** 2) / (2 * bus.width);
  if (bus.shape === "wire pair" && bus.spacing !== undefined) return (MU0 * current ** 2) / (2 * Math.PI * bus.spacing);
  return null;
}
