// A rigorous upper bound on the chance that any unit of a chain is over its limit: quick, and good where the lattices underflow.
//
// | symbol | in code | unit | meaning |
// | ------ | ------- | ---- | ------- |
// | n, p   | n, p    | 1    | series and parallel count |
// | k      | kappa   | 1    | (1 - s)/s, s the limit over the bank's voltage |
// | K(x)   | logMean | 1    | log of the mean of e^(x C) of one unit |
//
// Stage 1 is over when sum(1/C_j) of the others is below k/C_1. The harmonic mean is at most the arithmetic one, so then
// (n - 1)^2 C_1 < k sum(C_j): a sum of independent units, whose chance is at most exp(p (n - 1) K(k x) + p K(-(n - 1)^2 x)) for any x > 0.
// The least over x, times n stages (and p strings). Source: [Chernoff1952] (from memory); [methods-derived] 1.3

import { lawRange, type TailCase, type UnitLaw } from "./tailLaw.ts";

/** Nodes that stand for a cut normal; a lot stands for itself. */
const NODES = 400;

/** Values of a law and the log of the chance of each, for the laws without a closed form. */
function atoms(
  law: Exclude<UnitLaw, { kind: "uniform" }>,
): readonly { readonly value: number; readonly logMass: number }[] {
  if (law.kind === "lot") return law.values.map((value) => ({ value, logMass: -Math.log(law.values.length) }));
  const { low, high } = lawRange(law);
  const raw = Array.from({ length: NODES + 1 }, (_, k) => {
    const value = low + ((high - low) * k) / NODES;
    const sigma = ((value < law.nominal ? law.tLow : law.tHigh) * law.nominal) / 3;
    const z = sigma > 0 ? (value - law.nominal) / sigma : 0;
    return { value, weight: Math.exp(-(z * z) / 2) };
  });
  const whole = raw.reduce((sum, { weight }) => sum + weight, 0);
  return raw.map(({ value, weight }) => ({ value, logMass: Math.log(weight / whole) }));
}

function logMeanOf(law: UnitLaw): (x: number) => number {
  if (law.kind === "uniform") {
    const [middle, half] = [(law.low + law.high) / 2, (law.high - law.low) / 2];
    return (x) => {
      const y = Math.abs(x * half);
      const spread = y < 1e-4 ? (y * y) / 6 : y + Math.log(-Math.expm1(-2 * y) / (2 * y));
      return x * middle + spread;
    };
  }
  const points = atoms(law);
  return (x) => {
    const most = points.reduce(
      (top, { value, logMass }) => Math.max(top, x * value + logMass),
      Number.NEGATIVE_INFINITY,
    );
    return most + Math.log(points.reduce((sum, { value, logMass }) => sum + Math.exp(x * value + logMass - most), 0));
  };
}

/** Upper bound on the chance that any unit exceeds `share`, at most 1. Call with n >= 2, 0 < share < 1. */
export function riskBound({ n, p, ties, share, law }: TailCase): number {
  const kappa = (1 - share) / share;
  const others = n - 1;
  if (kappa >= others) return 1;
  const inParallel = ties === "cross-tied" ? p : 1;
  const logMean = logMeanOf(law);
  const { low, high } = lawRange(law);
  const exponent = (x: number): number => inParallel * (others * logMean(kappa * x) + logMean(-others * others * x));
  // The exponent is convex in x; in log x it has one valley, and its scale is that of one over the spread of the law.
  const scale = 1 / (others * others * Math.max(high - low, 1e-12 * low));
  let [from, to] = [Math.log(scale) - 14, Math.log(scale) + 14];
  for (let step = 0; step < 60; step++) {
    const [a, b] = [from + (to - from) * 0.382, from + (to - from) * 0.618];
    if (exponent(Math.exp(a)) < exponent(Math.exp(b))) to = b;
    else from = a;
  }
  const chances = ties === "strings" ? n * p : n;
  return Math.min(1, chances * Math.exp(exponent(Math.exp((from + to) / 2))));
}
