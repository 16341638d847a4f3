/*
 * An ideal crowbar (or a clamp diode without drop) closing across the bank at the instant its own voltage reaches zero.
 *
 *   symbol  name            unit   formula
 *   t_c     time            s      (pi - acos zeta)/w_d
 *   i_c     current         A      (V/Z0) exp(-zeta (pi - acos zeta)/sqrt(1 - zeta^2))
 *   E_L     energyInLoop    J      L i_c^2/2, all that is left
 *   A_c     actionBefore    A^2 s  (E - E_L)/R; lossless limit pi E/(2 Z0)
 *
 * Afterwards the current dies away with L/R of the outer loop and the bank carries nothing. Needs all L outside the bank and
 * no drop; a real diode takes its drop times the charge and fires a little earlier. From critical damping up the voltage
 * never crosses zero, so there is nothing to clamp: null. Source: [methods-derived], checked against numerical integration.
 */
import { dampingOf, type SeriesLoop } from "./rlc.ts";

/** The instant of clamping and where the energy goes. */
export interface Crowbar {
  readonly time: number;
  readonly current: number;
  readonly energyInLoop: number;
  readonly actionBefore: number;
  /** Action of the outer loop after the crowbar [A^2 s]; null when the outer loop has no resistance and never dies away. */
  readonly actionAfter: number | null;
}

/** `bankResistance` [ohm] is the part of the loop's resistance inside the bank. Source: [methods-derived] file head. */
export function crowbarOf(loop: SeriesLoop, voltage: number, bankResistance: number): Crowbar | null {
  const damping = dampingOf(loop);
  if (damping === null || damping >= 1) return null;
  const { capacitance, inductance, resistance } = loop;
  const ring = Math.sqrt((1 - damping) * (1 + damping));
  const angle = Math.PI - Math.acos(damping);
  const fade = (damping * angle) / ring;
  const stored = (capacitance * voltage * voltage) / 2;
  const impedance = Math.sqrt(inductance / capacitance);
  const energyInLoop = stored * Math.exp(-2 * fade);
  const outer = resistance - bankResistance;
  return {
    time: (Math.sqrt(inductance * capacitance) * angle) / ring,
    current: (voltage / impedance) * Math.exp(-fade),
    energyInLoop,
    actionBefore: (stored / impedance) * (damping === 0 ? angle : -Math.expm1(-2 * fade) / (2 * damping)),
    actionAfter: outer > 0 ? energyInLoop / outer : null,
  };
}
