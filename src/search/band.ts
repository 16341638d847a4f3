// The band that sampled courses of a shot's current and voltage run in over time, when capacitance, ESR, resistance and inductance spread.
//
// At one time the extreme need not lie at a corner (a ring that is late or early passes its peak in between), so the spreads are
// gone through in steps, corners and nominal among them. More steps where few parts spread. It is a sample, not a bound:
// in the reverse half courses up to 1.1 % of the peak outside it have been seen.

import type { Corner, Discharge } from "../pulse/index.ts";
import { accepted, type Read } from "../quantity/index.ts";
import { dischargeWith, type EnvelopeInput, isLinear, spreadOf } from "./envelope.ts";

export interface Ends {
  readonly low: number;
  readonly nominal: number;
  readonly high: number;
}

/** A and V at one time [s]. */
export interface BandRow {
  readonly time: number;
  readonly current: Ends;
  readonly voltage: Ends;
}

/** `courses` shots were sampled; `at` gives the lowest, nominal and highest of them at a time [s]. */
export interface Band {
  /** What the ends are: of the sampled courses, never a bound on every course that may be. */
  readonly kind: "sample";
  readonly courses: number;
  readonly at: (time: number) => BandRow;
}

const PARTS = ["capacitance", "esr", "inductance", "resistance"] as const;
/** Steps of each part by how many spread; a lamp, a clamp or a drop takes the integrator for each shot, so fewer. */
const LINEAR_STEPS = [1, 17, 7, 5, 3] as const;
const OTHER_STEPS = [1, 5, 3, 2, 2] as const;

/** The band; null when nothing spreads. Refused as by `dischargeOf`. */
export function shotBand(input: EnvelopeInput): Read<Band | null> {
  const spread = spreadOf(input);
  const spreading = PARTS.filter((part) => spread[part].low < spread[part].high).length;
  if (spreading === 0) return accepted(null);
  const steps = (isLinear(input.circuit) ? LINEAR_STEPS : OTHER_STEPS)[spreading] ?? 2;
  const { capacitance, esr, inductance, resistance } = spread;
  const nominal: Corner = {
    capacitance: capacitance.nominal,
    esr: esr.nominal,
    inductance: inductance.nominal,
    resistance: resistance.nominal,
  };
  let corners: readonly Corner[] = [nominal];
  for (const part of PARTS) {
    const { low, high } = spread[part];
    if (!(low < high)) continue;
    const values = Array.from({ length: steps }, (_, k) => low + ((high - low) * k) / (steps - 1));
    corners = corners.flatMap((corner) => values.map((value) => ({ ...corner, [part]: value })));
  }
  const courses: Discharge[] = [];
  for (const corner of [nominal, ...corners]) {
    const shot = dischargeWith(input, corner);
    if (!shot.ok) return shot;
    courses.push(shot.value);
  }
  const [middle] = courses as [Discharge, ...Discharge[]];
  const at = (time: number): BandRow => {
    const { current, voltage } = middle.at(time);
    const amperes = { low: current, nominal: current, high: current };
    const volts = { low: voltage, nominal: voltage, high: voltage };
    for (const course of courses) {
      const here = course.at(time);
      amperes.low = Math.min(amperes.low, here.current);
      amperes.high = Math.max(amperes.high, here.current);
      volts.low = Math.min(volts.low, here.voltage);
      volts.high = Math.max(volts.high, here.voltage);
    }
    return { time, current: amperes, voltage: volts };
  };
  return accepted({ kind: "sample", courses: courses.length, at });
}
