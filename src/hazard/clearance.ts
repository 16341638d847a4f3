/*
 * Advice on the distance through air between parts at a voltage. ADVICE ONLY: the standard decides, and its table ends at
 * 1 500 V dc and 2 000 m; for a kilovolt bank all this is extrapolation, and it says so.
 *
 *   symbol  name        unit  range
 *   V       voltage     V     > 0, taken as the impulse to be withstood
 *   h       altitude    m     0 to 10 000; above that public copies of the factor disagree, so no advice is given
 *   k       -           1     factor for thin air, linear between rows
 *
 *   clearance = max(base of the next row up, floor for dirt) k(h)
 * Base: inhomogeneous field (case A); the row at or above V, never between rows. From memory, confirm before use.
 * Source: [IEC60664-1] tables F.2 (memory) and A.2 (second hand).
 */

import { accepted, type Read, refused } from "../quantity/index.ts";

/** Impulse, V, and clearance, m. Source: [IEC60664-1] table F.2 case A, from memory. */
export const CLEARANCES: readonly (readonly [number, number])[] = [
  [500, 0.04e-3],
  [800, 0.1e-3],
  [1000, 0.15e-3],
  [1500, 0.5e-3],
  [2000, 1e-3],
  [2500, 1.5e-3],
  [3000, 2e-3],
  [4000, 3e-3],
  [5000, 4e-3],
  [6000, 5.5e-3],
  [8000, 8e-3],
  [10e3, 11e-3],
  [12e3, 14e-3],
  [15e3, 18e-3],
  [20e3, 25e-3],
  [25e3, 33e-3],
  [30e3, 40e-3],
  [40e3, 60e-3],
  [50e3, 75e-3],
  [60e3, 90e-3],
  [80e3, 130e-3],
  [100e3, 170e-3],
];

/** Altitude, m, and factor. Source: [IEC60664-1] table A.2, second hand. */
export const ALTITUDES: readonly (readonly [number, number])[] = [
  [2000, 1],
  [3000, 1.14],
  [4000, 1.29],
  [5000, 1.48],
  [6000, 1.7],
  [7000, 1.95],
  [8000, 2.25],
  [9000, 2.62],
  [10e3, 3.02],
];

/** Least clearance by pollution degree, m. Source: [IEC60664-1] table F.2, from memory. */
export const POLLUTION_FLOORS = { 1: 0, 2: 0.2e-3, 3: 0.8e-3, 4: 1.6e-3 } as const;

/** Bench rules, m/V: a bare least in clean dry air, and for sharp edges and dust. From memory; common practice, no source. */
export const BENCH_RULES = { clean: 1e-6, dirty: 3e-6 } as const;

export interface ClearanceAdvice {
  /** m, by the table, with the factor for altitude. */
  readonly byTable: number;
  readonly base: number;
  readonly factor: number;
  /** m, by the bench rule for sharp edges and dust, with the factor for altitude. */
  readonly byBench: number;
  /** m, the larger: what is advised. */
  readonly advised: number;
  /** True above 1 500 V dc or 2 000 m: outside what the standard covers. */
  readonly extrapolated: boolean;
}

/** Factor for thin air, linear between rows; 1 up to 2 000 m. Range: altitude <= 10 000 m. */
export function altitudeFactor(altitude: number): number {
  const above = ALTITUDES.findIndex(([height]) => altitude <= height);
  if (above <= 0) return 1;
  const [low, high] = [ALTITUDES[above - 1]!, ALTITUDES[above]!];
  return low[1] + ((altitude - low[0]) / (high[0] - low[0])) * (high[1] - low[1]);
}

/** Advised clearance. Refuses (`out-of-range`) a voltage over 100 kV or an altitude over 10 000 m. Source: [IEC60664-1]. */
export function clearanceAdvice(want: {
  readonly voltage: number;
  readonly altitude?: number;
  readonly pollution?: keyof typeof POLLUTION_FLOORS;
}): Read<ClearanceAdvice> {
  const { voltage, altitude = 0, pollution = 2 } = want;
  const wrong = (field: string, read: number, most: string) =>
    refused({ code: "out-of-range", place: { field }, read: String(read), want: most });
  if (!(altitude <= 10e3)) return wrong("altitude", altitude, "at most 10 000 m");
  if (!(voltage > 0)) return wrong("voltage", voltage, "a voltage above zero");
  const row = CLEARANCES.find(([impulse]) => voltage <= impulse);
  if (row === undefined) return wrong("voltage", voltage, "at most 100 kV");
  const factor = altitudeFactor(altitude);
  const base = Math.max(row[1], POLLUTION_FLOORS[pollution]);
  const [byTable, byBench] = [base * factor, BENCH_RULES.dirty * voltage * factor];
  const extrapolated = voltage > 1500 || altitude > 2000;
  return accepted({ byTable, base, factor, byBench, advised: Math.max(byTable, byBench), extrapolated });
}
