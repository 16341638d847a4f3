/*
 * The peak current of very many layouts, without an exponential and an arcsine for each.
 *
 *   symbol  name     unit  range
 *   zeta    damping  1     0 <= zeta; from 8 on the exact form is used
 *   k       factor   1     exp(-zeta A(zeta)), as in damping.ts
 *
 * Cubics through Chebyshev points on pieces of width 1/512 miss k by less than 1e-12 of itself, far inside the 1e-9 by which
 * layouts are compared; `peakCurrentOf` has the last digits. The table is made from the exact form when first imported.
 * Source: [methods-derived]; the error is measured in the tests.
 */

import type { BusPath } from "./busPath.ts";
import { peakFactor } from "./damping.ts";

const PIECES_PER_ONE = 512;
const END = 8;
const TERMS = 4;

function table(): Float64Array {
  const out = new Float64Array(END * PIECES_PER_ONE * TERMS);
  const angles = Array.from({ length: TERMS }, (_, k) => (Math.PI * (k + 0.5)) / TERMS);
  const waves = angles.map((angle) => [1, Math.cos(angle), Math.cos(2 * angle), Math.cos(3 * angle)] as const);
  for (let piece = 0; piece < END * PIECES_PER_ONE; piece++) {
    let [a, b, c, d] = [0, 0, 0, 0];
    for (const wave of waves) {
      const value = peakFactor((piece + 0.5 + wave[1] / 2) / PIECES_PER_ONE);
      a += value / 4;
      b += (value * wave[1]) / 2;
      c += (value * wave[2]) / 2;
      d += (value * wave[3]) / 2;
    }
    // from Chebyshev terms on -1..1 to powers on 0..1
    out.set([a - b + c - d, 2 * b - 8 * c + 18 * d, 8 * c - 48 * d, 32 * d], piece * TERMS);
  }
  return out;
}

const TABLE = table();

/** k(zeta) to 1e-12 of itself, for zeta >= 0. Source: [methods-derived] file head. */
export function quickPeakFactor(damping: number): number {
  if (!(damping < END)) return peakFactor(damping);
  const scaled = damping * PIECES_PER_ONE;
  const piece = scaled | 0;
  const at = piece << 2;
  const x = scaled - piece;
  return TABLE[at]! + TABLE[at + 1]! * x + x * x * (TABLE[at + 2]! + x * TABLE[at + 3]!);
}

/** A layout as a search holds it: F, ohm and H of one unit, counts, volts. */
export interface QuickLayout {
  readonly capacitance: number;
  readonly esr: number;
  readonly esl: number;
  readonly series: number;
  readonly parallel: number;
  readonly voltage: number;
}

/**
 * Peak current [A] of a layout into resistance and inductance outside it, to 1e-12; one division and one root. With no
 * inductance at all it is V/R. Needs some resistance or inductance somewhere.
 */
export function quickBankPeak(layout: QuickLayout, outside: BusPath): number {
  const { series, parallel, voltage } = layout;
  const resistance = layout.esr * series + outside.resistance * parallel;
  const inductance = layout.esl * series + outside.inductance * parallel;
  if (inductance === 0) return (voltage * parallel) / resistance;
  const root = Math.sqrt(layout.capacitance / (series * inductance));
  return voltage * parallel * root * quickPeakFactor(resistance * 0.5 * root);
}
