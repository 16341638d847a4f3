/*
 * Whether the numbers stated for a discharge can belong to one capacitor, one coil and one resistance.
 *
 *   symbol  name           unit  law used
 *   I       peakCurrent    A     I <= omega C V, the lossless bound, omega = 2 pi f of the ring
 *   W       loss           J     W <= E = C V^2/2
 *   g       frequencyGain  1     I/(C V omega_d) = k(zeta)/sqrt(1 - zeta^2), above 1 only beyond zeta = 0.91
 *
 * A ring so damped that g passes 1 loses nearly all its energy in a half-cycle, so a stated loss rules it out: the bound is
 * then omega C V max(1, g) at the damping whose half-cycle loses W. Without a stated loss the bound is omega C V. Without f
 * the bound only names the largest inductance. Source: [textbook-rlc] the bound; [methods-derived] g.
 */
import type { Finding } from "../quantity/index.ts";
import { peakFactor } from "./damping.ts";
import { atMost, remark } from "./verdict.ts";

/** What someone states of a discharge: F, V, A, Hz, J; null where not stated. */
export interface StatedDischarge {
  readonly capacitance: number;
  readonly voltage: number;
  readonly peakCurrent: number | null;
  readonly ringFrequency: number | null;
  /** Energy lost in one pulse. */
  readonly loss: number | null;
}

/** Verdict with its reasons, and what the numbers imply: J, A, H, fraction. */
export interface Consistency {
  readonly verdict: "plausible" | "inconsistent" | "not assessed";
  readonly stored: number;
  readonly losslessPeak: number | null;
  /** Largest inductance that the stated peak allows, C (V/I)^2. */
  readonly largestInductance: number | null;
  /** Least ring frequency that the stated peak needs, I/(2 pi C V). */
  readonly leastFrequency: number | null;
  readonly lossFraction: number | null;
  readonly findings: readonly Finding[];
}

/** Rounded publication figures may miss a bound by this much before they count as inconsistent. Assumed, no source. */
export const ROUNDING = 0.02;

/** Most that the peak can exceed omega C V when a half-cycle loses this part of the stored energy [1]. Source: [methods-derived]. */
export function frequencyGain(lossFraction: number | null): number {
  if (lossFraction === null || lossFraction <= 0 || lossFraction >= 1) return 1;
  const decrement = -Math.log1p(-lossFraction) / (2 * Math.PI);
  // VR^2 = 1 - loss gives zeta/sqrt(1 - zeta^2) = decrement
  const damping = decrement / Math.hypot(1, decrement);
  return Math.max(1, peakFactor(damping) / Math.sqrt((1 - damping) * (1 + damping)));
}

/** Checks a stated discharge against the bounds of a series loop. */
export function checkStated(stated: StatedDischarge): Consistency {
  const { capacitance: C, voltage: V, peakCurrent, ringFrequency, loss } = stated;
  const stored = (C * V * V) / 2;
  const losslessPeak = ringFrequency === null ? null : 2 * Math.PI * ringFrequency * C * V;
  const claims: Finding[] = [
    atMost({
      id: "pulse.stated.peak",
      value: peakCurrent,
      limit:
        losslessPeak === null
          ? null
          : losslessPeak * frequencyGain(loss === null ? null : loss / stored) * (1 + ROUNDING),
      unit: "A",
      source: "textbook-rlc",
      note: "Stated peak against omega C V, which no loss can exceed; the capacitance, the frequency or the peak is off.",
    }),
    atMost({
      id: "pulse.stated.loss",
      value: loss,
      limit: stored * (1 + ROUNDING),
      unit: "J",
      source: "textbook-rlc",
      note: "Stated loss against the stored energy.",
    }),
  ];
  const bad = claims.some(({ verdict }) => verdict === "fail");
  const nothing = peakCurrent === null && loss === null;
  if (nothing)
    claims.push(
      remark("pulse.stated.none", "not assessed", "methods-derived", "Neither a peak nor a loss was stated."),
    );
  return {
    verdict: bad ? "inconsistent" : nothing ? "not assessed" : "plausible",
    stored,
    losslessPeak,
    largestInductance: peakCurrent === null ? null : C * (V / peakCurrent) ** 2,
    leastFrequency: peakCurrent === null ? null : peakCurrent / (2 * Math.PI * C * V),
    lossFraction: loss === null ? null : loss / stored,
    findings: claims,
  };
}
