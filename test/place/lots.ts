// Seeded lots of measured units for the tests, the campaign and the bench: four kinds of spread.
import { seeded } from "../../src/place/random.ts";
import type { MeasuredUnit } from "../../src/place/unit.ts";

export const KINDS = ["uniform", "normal", "bimodal", "lots"] as const;
export type Kind = (typeof KINDS)[number];

export const normal = (random: () => number): number =>
  Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());

function factor(kind: Kind, i: number, random: () => number): number {
  if (kind === "uniform") return 0.9 + 0.2 * random();
  if (kind === "normal") {
    for (;;) {
      const x = 1 + 0.0333 * normal(random);
      if (Math.abs(x - 1) <= 0.1) return x;
    }
  }
  const high = kind === "bimodal" ? i % 2 === 1 : random() < 0.5;
  return (high ? 1.04 : 0.96) + 0.01 * normal(random);
}

/** Capacitances about 1000 uF in whole nF, as a bench meter prints them. */
export function capacitances(kind: Kind, count: number, seed: number): number[] {
  const random = seeded(seed * 7919 + 13);
  return Array.from({ length: count }, (_, i) => Math.round(factor(kind, i, random) * 1e6) / 1e9);
}

/** Measured units; leakage lognormal with the given sigma of its logarithm about 400 uA when asked. */
export function units(kind: Kind, count: number, seed: number, leakageSpread?: number): MeasuredUnit[] {
  const random = seeded(seed + 104729);
  return capacitances(kind, count, seed).map((capacitance, i) => ({
    serial: `U${String(i + 1).padStart(3, "0")}`,
    capacitance,
    ...(leakageSpread === undefined ? {} : { leakage: 4e-4 * Math.exp(leakageSpread * normal(random)) }),
  }));
}

/** Few small whole numbers, for comparison with full enumeration. */
export function wholes(count: number, seed: number, least = 50, most = 150): number[] {
  const random = seeded(seed * 31 + 7);
  return Array.from({ length: count }, () => least + Math.floor(random() * (most - least + 1)));
}
