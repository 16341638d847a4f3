/*
 * The figures of a whole series discharge in closed form: peak, time of peak, reversal, action, charge, energy split.
 *
 *   symbol  name              unit    formula
 *   I_pk    peakCurrent       A       (V/Z0) exp(-zeta A), Z0 = sqrt(L/C); pure RC: V/R
 *   t_pk    peakTime          s       sqrt(LC) A(zeta); pure RC: 0
 *   VR      reversal          1       exp(-pi zeta/sqrt(1 - zeta^2)); 0 from critical up
 *   t_z     firstZero         s       pi sqrt(LC)/sqrt(1 - zeta^2); null from critical up
 *   A_inf   action            A^2 s   E/R; null when lossless, where it has no bound
 *   A_z     actionToZero      A^2 s   E (1 - VR^2)/R, whose lossless limit is pi E/Z0
 *   Q_z     chargeToZero      C       C V (1 + VR)
 *   E       stored            J       C V^2/2
 *
 * Energies split as the resistances do: E_x = E R_x/R. Holds for linear constant R, L, C. Source: [Cona]; A_z, Q_z [methods-derived].
 */
import { accepted, type Read } from "../quantity/index.ts";
import { angleRatio, peakFactor, reversalFactor } from "./damping.ts";
import { checkLoop, dampingOf, type LoopLimit, limitOf, type SeriesLoop } from "./rlc.ts";

/** Closed-form figures of one discharge, SI. `null` is "has no bound" or "never happens", as each line says. */
export interface Peaks {
  readonly limit: LoopLimit;
  /** zeta; null for pure RC. */
  readonly damping: number | null;
  readonly peakCurrent: number;
  readonly peakTime: number;
  /** First opposite capacitor voltage as a fraction of V. */
  readonly reversal: number;
  /** First current zero [s]; null when the current never crosses. */
  readonly firstZero: number | null;
  /** Ring frequency [Hz]; null when it does not ring. */
  readonly ringFrequency: number | null;
  /** Over the whole discharge [A^2 s]; null when lossless. */
  readonly action: number | null;
  /** Up to the first current zero, for a switch that opens there [A^2 s]. */
  readonly actionToZero: number;
  readonly chargeToZero: number;
  readonly stored: number;
  /** V/L [A/s]; null for pure RC. */
  readonly initialRise: number | null;
  /** Fastest fall of the capacitor voltage, I_pk/C [V/s]. */
  readonly slew: number;
}

/** Peak current [A] of a loop that has passed `checkLoop`. Source: [Cona]. */
export function peakCurrentOf(loop: SeriesLoop, voltage: number): number {
  const damping = dampingOf(loop);
  if (damping === null) return voltage / loop.resistance;
  return voltage * Math.sqrt(loop.capacitance / loop.inductance) * peakFactor(damping);
}

/** Action up to the first current zero [A^2 s], for a loop that has passed `checkLoop`. Source: [methods-derived] file head. */
export function actionToZeroOf(loop: SeriesLoop, voltage: number): number {
  const stored = (loop.capacitance * voltage * voltage) / 2;
  const damping = dampingOf(loop);
  if (damping === null || damping >= 1) return stored / loop.resistance;
  const impedance = Math.sqrt(loop.inductance / loop.capacitance);
  const turn = (2 * Math.PI) / Math.sqrt((1 - damping) * (1 + damping));
  // (1 - VR^2)/(2 zeta), with expm1 because VR nears 1 when the loss is small
  const part = damping === 0 ? Math.PI : -Math.expm1(-damping * turn) / (2 * damping);
  return (stored / impedance) * part;
}

/** All closed-form figures, or the refusals of `checkLoop`. Source: [Cona]. */
export function peaksOf(loop: SeriesLoop, voltage: number): Read<Peaks> {
  const checked = checkLoop(loop, voltage);
  if (!checked.ok) return checked;
  const { capacitance, inductance, resistance } = loop;
  const damping = dampingOf(loop);
  const reversal = damping === null ? 0 : reversalFactor(damping);
  const scale = Math.sqrt(inductance * capacitance);
  const rings = damping !== null && damping < 1;
  const firstZero = rings ? (Math.PI * scale) / Math.sqrt((1 - damping) * (1 + damping)) : null;
  const stored = (capacitance * voltage * voltage) / 2;
  const peakCurrent = peakCurrentOf(loop, voltage);
  return accepted({
    limit: limitOf(loop),
    damping,
    peakCurrent,
    peakTime: damping === null ? 0 : scale * angleRatio(damping),
    reversal,
    firstZero,
    ringFrequency: firstZero === null ? null : 1 / (2 * firstZero),
    action: resistance === 0 ? null : stored / resistance,
    actionToZero: actionToZeroOf(loop, voltage),
    chargeToZero: capacitance * voltage * (1 + reversal),
    stored,
    initialRise: inductance === 0 ? null : voltage / inductance,
    slew: peakCurrent / capacitance,
  });
}
