// The voltage that comes back after a short, for the whole bank, and how its range is said.

import { type Recovery, recovery } from "../hazard/index.ts";
import { up } from "./cells.ts";
import type { Facts } from "./facts.ts";
import type { SheetInput } from "./input.ts";

/** null when the tolerance is unknown. A unit of unknown polarity is taken as polarised, which lets more come back. */
export const recoveryOf = ({ unit }: Pick<SheetInput, "unit">, { voltage, capacitance }: Facts): Recovery | null =>
  capacitance === null ? null : recovery({ soak: voltage, capacitance, polarised: unit.polarised !== false });

/** "200 V to 300 V", or "up to 200 V" where no least is known. */
export const rangeWords = ({ low, high }: Pick<Recovery, "low" | "high">): string =>
  low === null ? `up to ${up(high, "voltage")}` : `${up(low, "voltage")} to ${up(high, "voltage")}`;
