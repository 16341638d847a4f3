// One chain's stages as distributions, smooth laws on lattices: the stage that is over, another, and the sums of n - 2 and n - 1 others.
import { below, convolve, type Lattice, power, reciprocal, sigmasAcross, trimmed } from "./tailLattice.ts";
import { lawMasses, lawRange, type TailCase } from "./tailLaw.ts";

export interface Stages {
  /** 1/C of the stage that is over, descending, and the chance of each. */
  readonly victim: { readonly values: Float64Array; readonly masses: Float64Array };
  /** 1/C of one other stage. */
  readonly other: Lattice;
  /** Chance that n - 2 and that n - 1 others sum to less than a value; null for n = 2. */
  readonly butTwoBelow: ((value: number) => number) | null;
  readonly butOneBelow: (value: number) => number;
}

/** At scale 1: cells of a stage's window, at least so many of a unit's, and so many to one sigma of 1/C. */
const STAGE_CELLS = 192;
const UNIT_CELLS = { uniform: 8, normal: 20, lot: 32 };
/** And never more cells of 1/C than this: a lot's stray value can stand any number of sigmas off. */
const MOST_CELLS = 400;
const SIGMA_CELLS = 6;

export interface Window {
  readonly low: number;
  readonly high: number;
}

export interface Windows {
  readonly victim: Window;
  readonly other: Window;
}

/** Capacitances (F) of a unit that can take part in an excess: in the stage that is over, and in the others. Null: none can. */
export function tailWindows(given: TailCase, kappa: number): Windows | null {
  const { n, p, law } = given;
  const { low, high } = lawRange(law);
  const largest = 1 / (p * low);
  const least = 1 / (p * high);
  if (kappa * largest <= (n - 1) * least * (1 + 1e-12)) return null;
  const stageMost = kappa / ((n - 1) * least);
  const stageLeast = 1 / (kappa * largest - (n - 2) * least);
  // A lot may leave a single value on one side; its window still needs a width.
  const hair = 1e-9 * low;
  return {
    victim: { low, high: Math.max(low + hair, Math.min(high, stageMost - (p - 1) * low)) },
    other: { low: Math.min(high - hair, Math.max(low, stageLeast - (p - 1) * high)), high },
  };
}

/** The stages of a chain at one fineness. */
export function smoothStages(given: TailCase, span: Windows, scale: number): Stages {
  const { n, p, law } = given;
  const cells = scale * Math.max(Math.ceil(STAGE_CELLS / p), UNIT_CELLS[law.kind]);
  const stage = ({ low, high }: Window): Lattice =>
    power({ first: low, step: (high - low) / cells, masses: lawMasses(law, low, high, cells) }, p);
  const over = stage(span.victim);
  const company = stage(span.other);
  const wide = Math.max(STAGE_CELLS / (n - 1), SIGMA_CELLS * sigmasAcross(company));
  const other = trimmed(reciprocal(company, scale * Math.ceil(Math.min(wide, MOST_CELLS))));
  const butTwo = n > 2 ? power(other, n - 2) : null;
  return {
    victim: {
      values: over.masses.map((_, k) => 1 / (over.first + k * over.step)),
      masses: over.masses,
    },
    other,
    butTwoBelow: butTwo === null ? null : below(butTwo),
    butOneBelow: below(butTwo === null ? other : convolve(butTwo, other)),
  };
}

/** Chance that one given stage is over. */
export function singleRisk(stages: Stages, kappa: number): number {
  let sum = 0;
  for (const [k, mass] of stages.victim.masses.entries())
    sum += mass * stages.butOneBelow(kappa * stages.victim.values[k]!);
  return sum;
}
