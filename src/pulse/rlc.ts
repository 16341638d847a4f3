/*
 * Current and capacitor voltage of a series R-L-C loop at any time after it closes, for every damping and both limits.
 *
 *   symbol  name         unit  range
 *   C       capacitance  F     > 0
 *   L       inductance   H     >= 0   (0: pure RC, the current starts at V/R)
 *   R       resistance   ohm   >= 0   (0: lossless, rings for ever)
 *   V       voltage      V     > 0
 *   t       time         s     >= 0
 *
 * L = R = 0 has no finite current and is refused. Holds for constant R, L, C; no skin effect, no switch law.
 * Source: [Cona] series discharge.
 */
import { accepted, type Read, type Refusal, refused } from "../quantity/index.ts";
import { normalDischarge } from "./damping.ts";

/** A series loop: capacitance [F], inductance [H], resistance [ohm]. */
export interface SeriesLoop {
  readonly capacitance: number;
  readonly inductance: number;
  readonly resistance: number;
}

/** Which of the named cases a loop is. */
export type LoopLimit = "general" | "lossless" | "pure RC" | "no impedance";

export function limitOf({ inductance, resistance }: SeriesLoop): LoopLimit {
  if (inductance === 0) return resistance === 0 ? "no impedance" : "pure RC";
  return resistance === 0 ? "lossless" : "general";
}

/** zeta = R/2 sqrt(C/L) [1]; null for a pure RC loop, whose zeta has no bound. Source: [Cona]. */
export function dampingOf({ capacitance, inductance, resistance }: SeriesLoop): number | null {
  return inductance === 0 ? null : (resistance / 2) * Math.sqrt(capacitance / inductance);
}

/** The loop, or every reason it cannot be one. Codes: pulse.loop.capacitance, .inductance, .resistance, .voltage, .none. */
export function checkLoop(loop: SeriesLoop, voltage: number): Read<SeriesLoop> {
  const faults: Refusal[] = [];
  const need = (field: string, value: number, positive: boolean): void => {
    if (Number.isFinite(value) && (positive ? value > 0 : value >= 0)) return;
    const want = positive ? "a number above zero" : "a number, zero or more";
    faults.push({ code: `pulse.loop.${field}`, place: { field }, read: String(value), want });
  };
  need("capacitance", loop.capacitance, true);
  need("inductance", loop.inductance, false);
  need("resistance", loop.resistance, false);
  need("voltage", voltage, true);
  if (faults.length === 0 && limitOf(loop) === "no impedance") {
    const want = "a resistance or an inductance somewhere in the loop; without either the current has no bound";
    faults.push({ code: "pulse.loop.none", place: { field: "inductance" }, read: "0 H and 0 ohm", want });
  }
  return faults.length > 0 ? refused(...faults) : accepted(loop);
}

/** Loop current [A] and capacitor voltage [V] at time [s] >= 0. The loop must have passed `checkLoop`. Source: [Cona]. */
export function dischargeAt(
  loop: SeriesLoop,
  voltage: number,
  time: number,
): { readonly current: number; readonly voltage: number } {
  const { capacitance, inductance, resistance } = loop;
  const damping = dampingOf(loop);
  if (damping === null) {
    const left = voltage * Math.exp(-time / (resistance * capacitance));
    return { current: left / resistance, voltage: left };
  }
  const normal = normalDischarge(damping, time / Math.sqrt(inductance * capacitance));
  return {
    current: voltage * Math.sqrt(capacitance / inductance) * normal.current,
    voltage: voltage * normal.voltage,
  };
}
