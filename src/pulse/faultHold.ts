// What a hold makes of a fault that stands: sound units after leakage and the resistors' tolerance have had their time.
import { shortedHold, worstAtHold } from "../bank/index.ts";
import { type FaultBank, worstBefore } from "./faultBank.ts";

/** Another stage short, V; null where leakage or tolerance is unknown and has a say. Source: [methods-derived] as `shortedHold`. */
export function heldWithShort(bank: FaultBank): number | null {
  const { hold = null, series, voltage } = bank;
  if (series <= 2) return series === 1 ? 0 : voltage;
  return hold === null ? null : Math.max(worstBefore(bank), shortedHold(hold));
}

/** A stage of parallel units short of one, V; null as above. Source: [methods-derived] as `worstAtHold`. */
export function heldWithOpen(bank: FaultBank): number | null {
  const { hold = null, series, parallel, voltage } = bank;
  if (series === 1 || parallel === 1) return voltage;
  if (hold === null) return null;
  return Math.max(worstBefore(bank), worstAtHold({ ...hold, victim: { units: parallel - 1, balanced: true } }).voltage);
}

/** A stage whose resistor is open, V; null as above. Source: [methods-derived] as `worstAtHold`. */
export function heldWithoutResistor(bank: FaultBank): number | null {
  const { hold = null, balance, voltage } = bank;
  if (balance?.hold === null) return voltage;
  if (hold === null) return null;
  return Math.max(worstBefore(bank), worstAtHold({ ...hold, victim: { units: hold.m, balanced: false } }).voltage);
}
