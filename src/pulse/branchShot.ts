/*
 * A shot of unlike capacitors in parallel: each branch a C with its own R and L, all into one load of R and L.
 *
 *   symbol  name         unit  meaning
 *   C, R, L capacitance, resistance, inductance   F, ohm, H   of a branch; R and L of the load with bus and switch as `outer`
 *   v, i                 V, A  voltage and current of a branch: C dv/dt = -i, L di/dt = v - R i - u
 *   u                    V     voltage of the common bus: sum((v - R i)/L) + R_o I/L_o = u (sum(1/L) + 1/L_o), I = sum i;
 *                              u = R_o I where the load has no inductance
 *
 * The state moves as y' = A y, so y(t + h) = exp(A h) y(t) without error in the step. Steps double from far below the fastest time
 * constant to far beyond the slowest, and each highest point is looked at again in finer steps. The action is the integral of
 * y' Q y, doubled in the same way. Holds for a linear load and a switch that does not open; one that opens at the first zero
 * of the current leaves less action and no more reversal.
 * Source: [methods-derived] state equations of parallel branches; the exponential by scaling and squaring, as in Moler and Van Loan,
 * SIAM Review 20 (1978) (from memory).
 */
import { exponential, identity, multiply, transform } from "./smallMatrix.ts";

/** One capacitor bank with its inner losses; all above zero. */
export interface Branch {
  readonly capacitance: number;
  readonly resistance: number;
  readonly inductance: number;
}

export interface BranchDuty {
  /** Highest current [A], and the same over the whole shot squared and summed [A2 s]. */
  readonly peakCurrent: number;
  readonly action: number;
  /** First opposite voltage over the charge voltage. */
  readonly reversal: number;
}

export interface Outer {
  readonly resistance: number;
  readonly inductance: number;
}

const STEPS = 48;
/** A highest point is looked at again in steps halved so many times. */
const FINER = 3;

/** What each branch bears. `outer` may be without resistance, without inductance, or without both (a dead short). */
export function branchShot(branches: readonly Branch[], outer: Outer, voltage: number): readonly BranchDuty[] {
  const m = branches.length;
  const size = 2 * m;
  const matrix = stateMatrix(branches, outer);
  const { fastest, slowest } = timesOf(branches, outer);
  const levels = Math.max(1, Math.ceil(Math.log2((8 * slowest) / fastest)));
  const powers: Float64Array[] = [exponential(matrix, size, fastest / 256)];
  while (powers.length < levels + FINER + 6)
    powers.push(multiply(powers[powers.length - 1]!, powers[powers.length - 1]!, size));
  const start = new Float64Array(size).fill(voltage, 0, m);
  const peak = new Float64Array(m);
  const lowest = new Float64Array(m);
  const look = (y: Float64Array): void => {
    for (let k = 0; k < m; k += 1) {
      peak[k] = Math.max(peak[k]!, Math.abs(y[m + k]!));
      lowest[k] = Math.min(lowest[k]!, y[k]!);
    }
  };
  let y = start;
  for (let level = FINER; level < powers.length; level += 1) {
    const step = powers[level]!;
    for (let at = 0; at < STEPS; at += 1) {
      const before = y;
      const known = [...peak, ...lowest];
      y = transform(step, y, size);
      look(y);
      // A new height: the true one may stand between the samples.
      if (known.some((one, k) => (k < m ? peak[k]! > one : lowest[k - m]! < one))) {
        let z = before;
        const fine = powers[level - FINER]!;
        for (let part = 0; part < 2 << FINER; part += 1) {
          z = transform(fine, z, size);
          look(z);
        }
      }
    }
  }
  const actions = actionsOf(matrix, size, fastest / 64, powers.length + 12, start);
  return branches.map((_, k) => ({
    peakCurrent: peak[k]!,
    action: actions[k]!,
    reversal: -lowest[k]! / voltage,
  }));
}

function stateMatrix(branches: readonly Branch[], { resistance, inductance }: Outer): Float64Array {
  const m = branches.length;
  const size = 2 * m;
  const a = new Float64Array(size * size);
  const sum = branches.reduce((total, one) => total + 1 / one.inductance, inductance > 0 ? 1 / inductance : 0);
  // The bus voltage as a row over the state.
  const bus = new Float64Array(size);
  branches.forEach((one, k) => {
    if (inductance > 0) {
      bus[k] = 1 / one.inductance / sum;
      bus[m + k] = (-one.resistance / one.inductance + resistance / inductance) / sum;
    } else bus[m + k] = resistance;
  });
  branches.forEach((one, k) => {
    a[k * size + m + k] = -1 / one.capacitance;
    const row = (m + k) * size;
    for (let at = 0; at < size; at += 1) a[row + at] = -bus[at]! / one.inductance;
    a[row + k] = a[row + k]! + 1 / one.inductance;
    a[row + m + k] = a[row + m + k]! - one.resistance / one.inductance;
  });
  return a;
}

/** Shortest and longest time that anything in the loop may take [s]. */
function timesOf(branches: readonly Branch[], outer: Outer) {
  const l = branches.map((one) => one.inductance);
  const c = branches.map((one) => one.capacitance);
  const least = Math.min(...l, ...(outer.inductance > 0 ? [outer.inductance] : []));
  const r = branches.reduce((sum, one) => sum + one.resistance, outer.resistance);
  const all = c.reduce((sum, one) => sum + one, 0);
  const coil = outer.inductance + Math.max(...l);
  return {
    fastest: Math.min(Math.sqrt(least * Math.min(...c)), least / r),
    slowest: Math.max(Math.sqrt(coil * all), r * all, coil / Math.max(1e-12, r)),
  };
}

/** Integral of each branch current squared, by doubling the time. */
function actionsOf(
  matrix: Float64Array,
  size: number,
  step: number,
  doublings: number,
  start: Float64Array,
): readonly number[] {
  const m = size / 2;
  return Array.from({ length: m }, (_, k) => {
    let move = exponential(matrix, size, step);
    // Over one short step by the trapezoid of y' Q y, whose error is of the third power of the step.
    let form = new Float64Array(size * size);
    for (let i = 0; i < size; i += 1)
      for (let j = 0; j < size; j += 1) {
        const now = i === m + k && j === m + k ? 1 : 0;
        form[i * size + j] = (step / 2) * (now + move[(m + k) * size + i]! * move[(m + k) * size + j]!);
      }
    for (let turn = 0; turn < doublings + 8; turn += 1) {
      const later = congruence(move, form, size);
      form = form.map((value, at) => value + later[at]!);
      move = multiply(move, move, size);
    }
    let sum = 0;
    for (let i = 0; i < size; i += 1)
      for (let j = 0; j < size; j += 1) sum += start[i]! * form[i * size + j]! * start[j]!;
    return sum;
  });
}

/** M' F M. */
function congruence(move: Float64Array, form: Float64Array, size: number): Float64Array {
  const turned = identity(size);
  for (let i = 0; i < size; i += 1) for (let j = 0; j < size; j += 1) turned[i * size + j] = move[j * size + i]!;
  return multiply(turned, multiply(form, move, size), size);
}
