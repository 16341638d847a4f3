// The shot at the highest voltage the charger reaches: what ratings and an early fire are judged by.

import { type Bound, type Discharge, dischargeOf, type Envelope } from "../pulse/index.ts";
import { accepted, type Read } from "../quantity/index.ts";
import type { Brief } from "./brief.ts";
import { type EnvelopeInput, shotEnvelope } from "./envelope.ts";

/** The brief charged to V(1 + overshoot). */
export const atHighest = (brief: Brief): Brief => ({
  ...brief,
  voltage: brief.voltage * (1 + brief.overshoot),
  overshoot: 0,
});

export interface HighestShot {
  readonly discharge: Discharge;
  readonly envelope: Envelope;
  /** A and J at the worst end of all that spreads; null where no end is known. */
  readonly peakCurrent: number | null;
  readonly unitHeat: number | null;
  /** What `peakCurrent` is. */
  readonly bound: Bound;
}

/** Refused as by `dischargeOf`. */
export function highestShot(input: EnvelopeInput): Read<HighestShot> {
  const brief = atHighest(input.brief);
  const shot = dischargeOf(input.bank, input.circuit, brief.voltage);
  if (!shot.ok) return shot;
  const envelope = shotEnvelope({ ...input, brief });
  if (!envelope.ok) return envelope;
  const { peakCurrent, action } = envelope.value;
  const { bounds, unit } = shot.value;
  const known = input.unit.tolerance !== undefined && envelope.value.proven;
  const whole = bounds.peakCurrent === "value" || bounds.peakCurrent === "upper bound";
  const spread = action.high === null || !action.nominal ? null : action.high / action.nominal;
  const esr = 1 + (brief.spread?.esr ?? 0);
  return accepted({
    discharge: shot.value,
    envelope: envelope.value,
    peakCurrent: peakCurrent.high === null ? null : Math.max(peakCurrent.high, shot.value.peakCurrent),
    unitHeat:
      input.unit.tolerance === undefined || spread === null || unit.heat === null ? null : unit.heat * spread * esr,
    bound: whole ? (known ? "upper bound" : "side unknown") : bounds.peakCurrent,
  });
}
