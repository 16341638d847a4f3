/*
 * The four functions of the damping ratio that the whole series discharge hangs on, free of cancellation at critical.
 *
 *   symbol  name      unit  range         meaning
 *   zeta    damping   1     0 <= zeta     R / (2 sqrt(L/C))
 *   tau     time      1     0 <= tau      t / sqrt(LC)
 *   A       angleRatio      0 < A <= pi/2 acos(zeta)/sqrt(1 - zeta^2), continued as acosh(zeta)/sqrt(zeta^2 - 1)
 *   k       peakFactor      0 < k <= 1    I_peak / (V/Z0) = exp(-zeta A)
 *   VR      reversalFactor  0 <= VR <= 1  exp(-pi zeta / sqrt(1 - zeta^2)), 0 from critical up
 *
 * With z = (1 - zeta)/2, which rounds to nothing near critical, A = asin(sqrt z)/sqrt(z(1 - z)): no difference of near equals.
 * Holds for linear, constant R, L and C. Source: [Cona] the three damping cases; the continued form is [methods-derived].
 */

/** A(zeta): time of the current peak in units of sqrt(LC); 1 at critical damping. Source: [methods-derived] file head. */
export function angleRatio(damping: number): number {
  const z = (1 - damping) / 2;
  if (z === 0) return 1;
  const root = Math.sqrt(Math.abs(z));
  return (z > 0 ? Math.asin(root) : Math.asinh(root)) / (root * Math.sqrt(1 - z));
}

/** Peak current in units of V/sqrt(L/C); 1 lossless, 1/e at critical, 1/(2 zeta) far above. Source: [Cona]. */
export const peakFactor = (damping: number): number => Math.exp(-damping * angleRatio(damping));

/** Ratio of one half-cycle's end voltage to its start, both as sizes; 0 from critical damping up. Source: [Cona]. */
export function reversalFactor(damping: number): number {
  if (damping >= 1) return 0;
  return Math.exp((-Math.PI * damping) / Math.sqrt((1 - damping) * (1 + damping)));
}

/**
 * The discharge at `time` (in sqrt(LC)): current in V/Z0, capacitor voltage in V.
 * Overdamped it is written with expm1 and the slow root 1/(zeta + beta), so nothing overflows or cancels.
 * Source: [Cona] three cases; arrangement [methods-derived].
 */
export function normalDischarge(damping: number, time: number): { readonly current: number; readonly voltage: number } {
  const square = (1 - damping) * (1 + damping);
  if (square > 0) {
    const ring = Math.sqrt(square);
    const fade = Math.exp(-damping * time);
    const sine = (fade * Math.sin(ring * time)) / ring;
    return { current: sine, voltage: fade * Math.cos(ring * time) + damping * sine };
  }
  const beta = Math.sqrt(-square);
  const slow = Math.exp(-time / (damping + beta));
  const lost = -Math.expm1(-2 * beta * time);
  const sine = beta === 0 ? slow * time : (slow * lost) / (2 * beta);
  return { current: sine, voltage: slow * (1 - lost / 2) + damping * sine };
}
